using Scriban;
using Scriban.Runtime;
using Scriban.Syntax;

namespace ReleaseKit.Pages;

/// <summary>A function that templates can call, written without reflection so that the program can be compiled ahead of time.</summary>
internal abstract class TemplateFunction : IScriptCustomFunction
{
    public abstract int RequiredParameterCount { get; }
    public abstract int ParameterCount { get; }
    public virtual ScriptVarParamKind VarParamKind => ScriptVarParamKind.None;
    public Type ReturnType => typeof(object);
    public ScriptParameterInfo GetParameterInfo(int index) => new(typeof(object), "value");

    public abstract object Invoke(TemplateContext context, ScriptArray arguments);

    public object Invoke(TemplateContext context, ScriptNode? callerContext, ScriptArray arguments, ScriptBlockStatement? blockStatement) =>
        Invoke(context, arguments);

    public ValueTask<object?> InvokeAsync(TemplateContext context, ScriptNode? callerContext, ScriptArray arguments, ScriptBlockStatement? blockStatement) =>
        ValueTask.FromResult<object?>(Invoke(context, arguments));
}
