using Markdig.Syntax;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Prose;

/// <summary>The first heading of a page is its title; the others go down one level at a time.</summary>
internal sealed class ProseHeadingCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release?.Narrative.SelectMany(CheckPage) ?? [];

    private static IEnumerable<Finding> CheckPage(ProsePage page)
    {
        var headings = ProseDocument.Parse(page.Markdown).OfType<HeadingBlock>().ToList();
        if (headings.Count == 0 || ProseDocument.PlainText(headings[0].Inline).Trim().Length == 0)
            return [ProseProblems.NoTitle(headings.Count == 0 ? new Place(page.File, 1, 1) : PlaceOf(headings[0], page), FindingOwner.Writer)];
        return headings.Skip(1).Zip(headings, (heading, before) => CheckLevel(heading, before, page)).OfType<Finding>();
    }

    private static Place PlaceOf(HeadingBlock heading, ProsePage page) => new(page.File, heading.Line + 1, heading.Column + 1);

    private static Finding? CheckLevel(HeadingBlock heading, HeadingBlock before, ProsePage page)
    {
        var at = PlaceOf(heading, page);
        if (heading.Level == 1)
            return ProseProblems.SecondTitle(at, FindingOwner.Writer);
        return heading.Level > before.Level + 1 ? ProseProblems.HeadingSkips(at, before.Level, heading.Level, FindingOwner.Writer) : null;
    }
}
