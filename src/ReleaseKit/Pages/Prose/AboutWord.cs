using Markdig.Extensions.Tables;
using Markdig.Syntax.Inlines;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Prose;

/// <summary>The word "about" as the place of a citation asks for it: with a capital at the beginning of a sentence, not twice, and not in a table.</summary>
internal static class AboutWord
{
    private const string SentenceEnds = ".!?";

    public static string At(Inline citation, ILanguage language)
    {
        var about = language.Text("prose.about");
        var before = TextBefore(citation).TrimEnd();
        if (IsInTable(citation) || before.EndsWith(about, StringComparison.OrdinalIgnoreCase))
            return "";
        return before.Length == 0 || SentenceEnds.Contains(before[^1], StringComparison.Ordinal) ? language.Text("prose.about.first") : about;
    }

    /// <summary>The text from the beginning of the paragraph, or from the last inline that is no plain text.</summary>
    private static string TextBefore(Inline citation)
    {
        var text = "";
        var outermost = citation;
        while (outermost is { PreviousSibling: null, Parent: { Parent: not null } emphasis })
            outermost = emphasis;
        var before = outermost.PreviousSibling;
        for (; before is LiteralInline or LineBreakInline; before = before.PreviousSibling)
            text = (before is LiteralInline literal ? literal.Content.ToString() : " ") + text;
        return before is null ? text : "\uFFFC" + text;
    }

    private static bool IsInTable(Inline citation)
    {
        var root = citation.Parent;
        while (root?.Parent is { } parent)
            root = parent;
        return root?.ParentBlock?.Parent is TableCell;
    }
}
