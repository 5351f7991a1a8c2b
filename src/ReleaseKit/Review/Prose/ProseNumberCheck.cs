using Markdig.Syntax;
using Markdig.Syntax.Inlines;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Review.Prose;

/// <summary>
/// A number in the writer's own words of a citation is a claim about the figure: it must be the figure as printed or as published, or rounded,
/// its printed margin, or an end of its printed range.
/// </summary>
internal sealed class ProseNumberCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Appraised: { } appraised, Language: { } language }
        ? appraised.Release.Narrative.SelectMany(page => CheckPage(page, appraised, language))
        : [];

    private static IEnumerable<Finding> CheckPage(ProsePage page, IAppraisedRelease appraised, ILanguage language) => ProseDocument.Parse(page.Markdown)
        .Descendants<LinkInline>()
        .Select(link => CheckLink(link, page, appraised, language))
        .OfType<Finding>();

    private static Finding? CheckLink(LinkInline link, ProsePage page, IAppraisedRelease appraised, ILanguage language)
    {
        var words = ProseDocument.PlainText(link);
        if (link.IsImage || ProseLink.FigureIn(link.Url) is not { } address || CitationForms.Of(words, language) != CitationForm.OwnWords)
            return null;
        var numbers = language.NumbersIn(words);
        if (numbers.Count == 0 || FigureAt(address, appraised) is not { } figure)
            return null;
        var wrong = numbers.Where(number => SaidNumber.Of(number, figure) is SaidAs.Other).Select(number => number.Text).ToList();
        return wrong.Count == 0
            ? null
            : ProseProblems.Disagrees(new(page.File, link.Line + 1, link.Column + 1), wrong, new(figure, language), link.Url!, FindingOwner.Writer);
    }

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
