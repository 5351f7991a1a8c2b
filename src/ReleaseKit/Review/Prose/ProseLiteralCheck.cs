using System.Collections;
using System.Text.RegularExpressions;
using Markdig.Syntax;
using Markdig.Syntax.Inlines;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Prose;

/// <summary>What stands literally in the text and was meant to do something: links that were not understood, HTML, characters that cannot be seen.</summary>
internal sealed partial class ProseLiteralCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release?.Narrative.SelectMany(CheckPage) ?? [];

    private static IEnumerable<Finding> CheckPage(ProsePage page)
    {
        var (understood, lines) = (Understood(page.Markdown), new ProseLines(page));
        var links = LiteralLink.Matches(page.Markdown).Where(match => !understood[match.Index])
            .Select(match => ProseProblems.LiteralLink(lines.PlaceOf(match.Index), FindingOwner.Writer));
        var html = Tag.Matches(page.Markdown).Where(match => !understood[match.Index])
            .Select(match => ProseProblems.Html(lines.PlaceOf(match.Index), match.Value, FindingOwner.Writer));
        return links.Concat(html).Concat(Hidden(page, lines));
    }

    private static IEnumerable<Finding> Hidden(ProsePage page, ProseLines lines) => page.Markdown
        .Select((letter, index) => (letter, index))
        .Where(pair => pair.letter is not ('\n' or '\r' or '\t') && HiddenCharacters.IsOne(pair.letter))
        .Select(pair => ProseProblems.HiddenCharacter(lines.PlaceOf(pair.index), pair.letter, FindingOwner.Writer));

    /// <summary>For each character, whether it belongs to a link, an image or code.</summary>
    private static BitArray Understood(string markdown)
    {
        var document = ProseDocument.Parse(markdown);
        var spans = document.Descendants<Inline>().Where(inline => inline is LinkInline or AutolinkInline or CodeInline).Select(inline => inline.Span)
            .Concat(document.Descendants<CodeBlock>().Select(block => block.Span));
        var understood = new BitArray(markdown.Length);
        foreach (var span in spans)
            for (var at = Math.Max(span.Start, 0); at <= span.End && at < markdown.Length; at++)
                understood[at] = true;
        return understood;
    }

    [GeneratedRegex(@"\]\((figure|chart):")]
    private static partial Regex LiteralLink { get; }

    [GeneratedRegex(@"</?[A-Za-z][A-Za-z0-9-]*(\s[^<>\n]{0,200})?/?>|<!--")]
    private static partial Regex Tag { get; }
}
