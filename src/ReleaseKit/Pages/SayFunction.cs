using ReleaseKit.Wording;
using Scriban;
using Scriban.Runtime;

namespace ReleaseKit.Pages;

/// <summary>
/// <c>say 'key'</c> in a template: a text of the wording file. Pairs after the key fill its {names}:
/// <c>say 'foot.published' 'date' date</c>.
/// </summary>
internal sealed class SayFunction(ILanguage language) : TemplateFunction
{
    public override int RequiredParameterCount => 1;
    public override int ParameterCount => 1;
    public override ScriptVarParamKind VarParamKind => ScriptVarParamKind.Direct;

    public override object Invoke(TemplateContext context, ScriptArray arguments)
    {
        var words = arguments.Select(argument => context.ObjectToString(argument) ?? "").ToArray();
        var fill = Enumerable.Range(0, (words.Length - 1) / 2).Select(pair => (words[2 * pair + 1], words[2 * pair + 2]));
        return language.Text(words[0], [.. fill]);
    }
}
