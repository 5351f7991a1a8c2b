using Scriban;
using Scriban.Functions;
using Scriban.Parsing;
using Scriban.Runtime;
using Scriban.Syntax;

namespace ReleaseKit.Pages;

/// <summary>
/// A template context that escapes every value it writes, fails on every name it does not know, and cuts nothing off: Scriban's own
/// limits cut output silently at 1 MiB and loops at 1,000, and its member access is relaxed by default.
/// </summary>
internal sealed class HtmlTemplateContext : TemplateContext
{
    public HtmlTemplateContext(ITemplateLoader loader)
    {
        LoopLimit = 0;
        LimitToString = 0;
        StrictVariables = true;
        EnableRelaxedMemberAccess = false;
        EnableRelaxedIndexerAccess = false;
        AutoIndent = false;
        TemplateLoader = loader;
        PushGlobal(new ScriptObject { ["raw"] = new RawFunction(), ["include"] = new RawInclude() });
    }

    /// <summary>Only values come here; a template's own text does not.</summary>
    public override TemplateContext Write(SourceSpan span, object? textAsObject)
    {
        if (textAsObject is not null)
            Write(textAsObject is RawHtml raw ? raw.Html : HtmlText.Encode(ObjectToString(textAsObject) ?? ""));
        return this;
    }

    /// <summary><c>raw</c>: the value is markup of ours.</summary>
    private sealed class RawFunction : TemplateFunction
    {
        public override int RequiredParameterCount => 1;
        public override int ParameterCount => 1;
        public override object Invoke(TemplateContext context, ScriptArray arguments) => new RawHtml(context.ObjectToString(arguments[0]) ?? "");
    }

    /// <summary><c>include</c>: what a template gives is markup already and must not be escaped again.</summary>
    private sealed class RawInclude : IScriptCustomFunction
    {
        private readonly IncludeFunction inner = new();
        public int RequiredParameterCount => inner.RequiredParameterCount;
        public int ParameterCount => inner.ParameterCount;
        public ScriptVarParamKind VarParamKind => inner.VarParamKind;
        public Type ReturnType => typeof(RawHtml);
        public ScriptParameterInfo GetParameterInfo(int index) => inner.GetParameterInfo(index);

        public object Invoke(TemplateContext context, ScriptNode? callerContext, ScriptArray arguments, ScriptBlockStatement? blockStatement) =>
            new RawHtml(inner.Invoke(context, callerContext, arguments, blockStatement)?.ToString() ?? "");

        public ValueTask<object?> InvokeAsync(TemplateContext context, ScriptNode? callerContext, ScriptArray arguments, ScriptBlockStatement? blockStatement) =>
            ValueTask.FromResult<object?>(Invoke(context, callerContext, arguments, blockStatement));
    }
}
