using System.Reflection;
using System.Text;

namespace ReleaseKit.Testing;

/// <summary>
/// The public surface of an assembly as text, one member a line in ordinal order: what is compared with an approved file, so that no change
/// of a library's surface goes unseen.
/// </summary>
internal static class PublicSurface
{
    private const BindingFlags Declared =
        BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly;

    public static string Of(Assembly assembly)
    {
        var text = new StringBuilder();
        foreach (var type in assembly.GetExportedTypes().OrderBy(type => type.FullName, StringComparer.Ordinal))
        {
            text.Append(Kind(type)).Append(' ').Append(Name(type)).Append(Bases(type)).Append('\n');
            foreach (var line in Members(type).Order(StringComparer.Ordinal))
                text.Append("    ").Append(line).Append('\n');
        }
        return text.ToString();
    }

    private static string Kind(Type type) => type switch
    {
        { IsEnum: true } => "enum",
        { IsInterface: true } => "interface",
        { IsValueType: true } => "struct",
        { IsAbstract: true, IsSealed: true } => "static class",
        { IsAbstract: true } => "abstract class",
        { IsSealed: true } => "sealed class",
        _ => "class",
    };

    private static string Bases(Type type)
    {
        var bases = type.BaseType is { } parent && parent != typeof(object) && !type.IsValueType ? " : " + Name(parent) : "";
        return type.IsEnum ? "" : bases;
    }

    // Compiler-made members of records (equality, printing, cloning) say nothing that "record" does not.
    private static IEnumerable<string> Members(Type type)
    {
        if (type.IsEnum)
            return Enum.GetNames(type);
        var fields = type.GetFields(Declared).Where(IsOpen).Select(field => $"{Static(field.IsStatic)}{Name(field.FieldType)} {field.Name}");
        var constructors = type.GetConstructors(Declared).Where(IsOpen).Where(made => !IsCopy(made, type)).Select(made => $"new({Parameters(made)})");
        var properties = type.GetProperties(Declared).Where(IsOpen).Select(PropertyLine);
        var methods = type.GetMethods(Declared).Where(IsOpen).Where(method => !IsAccessor(method) && !IsCompilerMade(method)).Select(MethodLine);
        return [.. fields, .. constructors, .. properties, .. methods];
    }

    private static string PropertyLine(PropertyInfo property)
    {
        var accessor = property.GetMethod ?? property.SetMethod!;
        var set = property.SetMethod is { } setter && IsOpen(setter) ? IsInit(setter) ? " init;" : " set;" : "";
        return $"{Static(accessor.IsStatic)}{Name(property.PropertyType)} {property.Name} {{ get;{set} }}";
    }

    private static string MethodLine(MethodInfo method) => $"{Static(method.IsStatic)}{Name(method.ReturnType)} {method.Name}({Parameters(method)})";

    private static string Parameters(MethodBase method) => string.Join(", ", method.GetParameters().Select(ParameterText));

    private static string ParameterText(ParameterInfo parameter)
    {
        var value = parameter.HasDefaultValue ? FormattableString.Invariant($" = {parameter.DefaultValue ?? "null"}") : "";
        return $"{Name(parameter.ParameterType)} {parameter.Name}{value}";
    }

    private static string Static(bool isStatic) => isStatic ? "static " : "";

    private static bool IsOpen(PropertyInfo property) => property.Name != "EqualityContract" && property.GetAccessors(true).Any(IsOpen);

    private static bool IsOpen(MethodBase method) => method.IsPublic || method.IsFamily || method.IsFamilyOrAssembly;

    private static bool IsOpen(FieldInfo field) => (field.IsPublic || field.IsFamily || field.IsFamilyOrAssembly) && !field.IsSpecialName;

    private static bool IsAccessor(MethodInfo method) => method.IsSpecialName && !method.Name.StartsWith("op_", StringComparison.Ordinal);

    private static bool IsInit(MethodInfo setter) =>
        setter.ReturnParameter.GetRequiredCustomModifiers().Contains(typeof(System.Runtime.CompilerServices.IsExternalInit));

    private static bool IsCopy(ConstructorInfo made, Type type) => made.GetParameters() is [var only] && only.ParameterType == type;

    private static bool IsCompilerMade(MethodInfo method) =>
        method.Name is "PrintMembers" or "<Clone>$" or "op_Equality" or "op_Inequality" or "Equals" or "GetHashCode" or "ToString" or "Deconstruct";

    private static string Name(Type type)
    {
        if (type.IsGenericParameter)
            return type.Name;
        var plain = type.Namespace is "System" ? type.Name : type.FullName?.Split('[')[0] ?? type.Name;
        var name = type.DeclaringType is { } outer ? $"{Name(outer)}.{type.Name}" : plain;
        if (!type.IsGenericType)
            return name;
        var arguments = string.Join(", ", type.GetGenericArguments().Select(Name));
        return $"{name.Split('`')[0].Split('.')[^1]}<{arguments}>";
    }
}
