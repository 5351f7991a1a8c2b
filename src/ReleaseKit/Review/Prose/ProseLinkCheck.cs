using Markdig.Syntax;
using Markdig.Syntax.Inlines;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Prose;

/// <summary>Links and images of the prose: cited figures are one figure each, placed charts are in the release, other links lead where a page may lead.</summary>
internal sealed class ProseLinkCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release is { } release
        ? release.Narrative.SelectMany(page => CheckPage(page, release, subject.Read.TablesAreWhole))
        : [];

    private static IEnumerable<Finding> CheckPage(ProsePage page, Release release, bool resolves) => ProseDocument.Parse(page.Markdown)
        .Descendants<Inline>()
        .Select(inline => inline switch
        {
            LinkInline { IsImage: true } image => CheckImage(image, page, release),
            LinkInline link => CheckLink(link, page, release, resolves),
            AutolinkInline { IsEmail: false } address => CheckDestination(address.Url, PlaceOf(address, page), release, resolves),
            _ => null,
        })
        .OfType<Finding>()
        .Concat(ChartsAgain(page));

    private static IEnumerable<Finding> ChartsAgain(ProsePage page) => ProseDocument.Parse(page.Markdown)
        .Descendants<LinkInline>().Where(image => image.IsImage && ProseLink.ChartIn(image.Url) is not null)
        .GroupBy(image => ProseLink.ChartIn(image.Url)!)
        .SelectMany(same => same.Skip(1).Select(image => ProseProblems.ChartAgain(PlaceOf(image, page), same.Key, same.First().Line + 1, FindingOwner.Writer)));

    private static Finding? CheckLink(LinkInline link, ProsePage page, Release release, bool resolves)
    {
        var isEmpty = ProseDocument.PlainText(link).Trim().Length == 0;
        return isEmpty && ProseLink.FigureIn(link.Url) is not null
            ? ProseProblems.EmptyCitation(PlaceOf(link, page), FindingOwner.Writer)
            : CheckDestination(link.Url ?? "", PlaceOf(link, page), release, resolves);
    }

    private static Finding? CheckDestination(string destination, Place at, Release release, bool resolves)
    {
        if (ProseLink.FigureIn(destination) is { } address)
            return resolves ? CheckCitation(address, at, release) : null;
        return ProseLink.IsAllowed(destination) ? null : ProseProblems.LinkScheme(at, destination, FindingOwner.Writer);
    }

    private static Finding? CheckCitation(string address, Place at, Release release)
    {
        try
        {
            FigureAddress.Of(release, address).ResolveOne(release);
            return null;
        }
        catch (AddressException problem)
        {
            return ProseProblems.Citation(at, problem, FindingOwner.Writer);
        }
    }

    private static Finding? CheckImage(LinkInline image, ProsePage page, Release release)
    {
        var at = PlaceOf(image, page);
        if (ProseLink.ChartIn(image.Url) is not { } id)
            return ProseProblems.ImageNotChart(at, image.Url ?? "", FindingOwner.Writer);
        if (release.Charts.All(chart => chart.Id != id))
            return ProseProblems.UnknownChart(at, id, [.. release.Charts.Select(chart => chart.Id)], FindingOwner.Writer);
        return ProseDocument.PlainText(image).Trim().Length == 0 ? ProseProblems.NoAlt(at, FindingOwner.Writer) : null;
    }

    private static Place PlaceOf(Inline inline, ProsePage page) => new(page.File, inline.Line + 1, inline.Column + 1);
}
