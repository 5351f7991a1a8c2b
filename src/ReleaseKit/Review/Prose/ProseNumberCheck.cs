using Markdig.Syntax;
using Markdig.Syntax.Inlines;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Review.Prose;

/// <summary>
/// A number in the writer's own words of a citation is a claim about the figure, unless the figure's own table has it: it must be the figure as printed
/// or as published, or rounded as the writer rounds, a bound that it keeps, its printed margin, or an end of its printed range.
/// </summary>
internal sealed class ProseNumberCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Appraised: { } appraised, Language: { } language }
        ? appraised.Release.Narrative.SelectMany(page => CheckPage(page, appraised, language))
        : [];

    private static IEnumerable<Finding> CheckPage(ProsePage page, IAppraisedRelease appraised, ILanguage language) => ProseDocument.Parse(page.Markdown)
        .Descendants<LinkInline>()
        .SelectMany(link => CheckLink(link, page, appraised, language));

    private static IEnumerable<Finding> CheckLink(LinkInline link, ProsePage page, IAppraisedRelease appraised, ILanguage language)
    {
        var words = ProseDocument.PlainText(link);
        if (link.IsImage || ProseLink.FigureIn(link.Url) is not { } address || CitationForms.Of(words, language) != CitationForm.OwnWords)
            return [];
        return FigureAt(address, appraised) is { } figure
            ? Compare(SaidNumbers.In(words, figure, appraised.Release, language), link, new(page.File, link.Line + 1, link.Column + 1), new(figure, language))
            : [];
    }

    private static IEnumerable<Finding> Compare(IReadOnlyList<SaidNumber> said, LinkInline link, Place at, FigureWords figure)
    {
        var destination = link.Url!;
        if (Written(said, number => number is { As: SaidAs.Other, IsSure: true }) is { Count: > 0 } wrong)
            yield return ProseProblems.Disagrees(at, wrong, said.Any(number => number.Number.Value is null), figure, destination, FindingOwner.Writer);
        if (Written(said, number => number is { As: SaidAs.Other, IsSure: false }) is { Count: > 0 } doubtful)
            yield return ProseProblems.MayDisagree(at, doubtful, figure, destination, FindingOwner.Writer);
        if (Written(said, number => number.As is SaidAs.DoubtfulBound) is { Count: > 0 } bounds)
            yield return ProseProblems.BoundInRange(at, bounds, said.Any(number => number.Number.Bound is NumberBound.Nearly or NumberBound.JustOver), figure, destination, FindingOwner.Writer);
        if (Written(said, number => number.As is SaidAs.Unsigned) is { Count: > 0 } unsigned && !SignWords.StandBy(link, figure.Language))
            yield return ProseProblems.SignLost(at, unsigned, figure, FindingOwner.Writer);
        if (Written(said, number => number.As is SaidAs.RoundedFar) is { Count: > 0 } far)
            yield return ProseProblems.RoundedFar(at, far, figure, destination, FindingOwner.Writer);
    }

    private static List<string> Written(IReadOnlyList<SaidNumber> said, Func<SaidNumber, bool> which) => [.. said.Where(which).Select(number => number.Number.InFull)];

    /// <summary>Null where the address is broken, which has been reported.</summary>
    private static AppraisedFigure? FigureAt(string address, IAppraisedRelease appraised)
    {
        try
        {
            return appraised.FigureAt(address);
        }
        catch (AddressException)
        {
            return null;
        }
    }
}
