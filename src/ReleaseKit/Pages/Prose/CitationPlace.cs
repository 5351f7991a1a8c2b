using System.Text.RegularExpressions;
using Markdig.Extensions.Tables;
using Markdig.Syntax.Inlines;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Prose;

/// <summary>The words that a citation brings along where it stands; in a table it brings none.</summary>
/// <param name="About">What goes before a number rounded for print: with a capital at the beginning of a sentence, empty where it is said already.</param>
/// <param name="Base">What goes after a share or a rate: that it counts in each 100, or per 1,000; empty where the paragraph says so in the writer's words.</param>
internal readonly record struct CitationPlace(string About, string Base)
{
    private const string SentenceEnds = ".!?";

    public static CitationPlace Of(Inline citation, Measure measure, ILanguage language)
    {
        var root = RootOf(citation);
        return root.ParentBlock?.Parent is TableCell ? new("", "") : new(AboutAt(citation, language), BaseOf(measure, ProseDocument.PlainText(root), language));
    }

    private static string BaseOf(Measure measure, string paragraph, ILanguage language)
    {
        if (measure.Kind == MeasureKind.Share)
            return language.Text("unit.share.said").Split('|').Any(said => Says(paragraph, said)) ? "" : language.Text("unit.share");
        if (measure is not { Kind: MeasureKind.Rate, Per: { } per })
            return "";
        var written = language.Number(PublishedValue.Shortest((decimal)per));
        return Says(paragraph, written) ? "" : language.Text("unit.rate", ("per", written));
    }

    /// <summary>Whether the words stand there, and not within a larger number: 2,100 does not say 100.</summary>
    private static bool Says(string text, string words) =>
        Regex.IsMatch(text, $@"(?:(?!\d)|(?<!\d|\d,)){Regex.Escape(words)}(?!\d|,\d)", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant);

    private static string AboutAt(Inline citation, ILanguage language)
    {
        var about = language.Text("prose.about");
        var before = TextBefore(citation).TrimEnd();
        if (before.EndsWith(about, StringComparison.OrdinalIgnoreCase))
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

    private static ContainerInline RootOf(Inline citation)
    {
        var root = citation.Parent!;
        while (root.Parent is { } parent)
            root = parent;
        return root;
    }
}
