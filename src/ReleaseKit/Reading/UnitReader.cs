using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading;

/// <summary>Units and their plural forms.</summary>
internal static class UnitReader
{
    public static UnitForms? Forms(ObjectReader keys) =>
        keys.Text("one") is { } one && keys.Text("other") is { } other ? new UnitForms(one, other) : null;

    /// <summary>A unit that is used but not declared: as written, whatever the number.</summary>
    public static Unit AsWritten(string word, string language) =>
        new(word, new Dictionary<string, UnitForms> { [language] = new UnitForms(word, word) });

    /// <summary>The units of release.json by their keys: forms by language, or forms alone for the main language.</summary>
    public static IReadOnlyDictionary<string, Unit> Read(ObjectReader release)
    {
        var units = new Dictionary<string, Unit>();
        foreach (var member in release.Members("units"))
            if (ReadOne(member, release.Context) is { } unit)
                units[member.Name] = unit;
        return units;
    }

    private static Unit? ReadOne(JsonMember member, ReadContext context)
    {
        if (member.Value is JsonObject json && json.Member("other") is not null)
            return Forms(member.Value, member.Name, context) is { } plain ? new Unit(member.Name, Plain(plain, context)) : null;
        var forms = new Dictionary<string, UnitForms>();
        foreach (var language in Values.Members(member.Value, member.Name, context))
            if (Forms(language.Value, language.Name, context) is { } read)
                forms[language.Name] = read;
        if (forms.ContainsKey(context.Language))
            return new Unit(member.Name, forms);
        context.Add(KeyProblems.TextMissing(member.Value.At, member.Name, context.Language, context.Owner));
        return null;
    }

    private static UnitForms? Forms(JsonValue value, string key, ReadContext context) =>
        ObjectReader.Open(value, key, ReleaseShapes.Forms, context) is { } keys ? Forms(keys) : null;

    private static Dictionary<string, UnitForms> Plain(UnitForms forms, ReadContext context) => new() { [context.Language] = forms };
}
