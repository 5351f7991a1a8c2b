using ReleaseKit.Appraisal;
using ReleaseKit.Charts.Headlines;
using ReleaseKit.Pages;
using ReleaseKit.Releases;

namespace ReleaseKit.Charts;

/// <summary>The pictures of headlines, to share.</summary>
public static class HeadlineImages
{
    /// <summary>Path in the site of the picture of a headline's figure.</summary>
    public static string PathOf(AppraisedFigure figure) => $"images/headline.{figure.Table.Id}.{figure.Id}.png";

    internal static void Write(SiteContext context, SiteFolder site, Palette palette, TypeCase type)
    {
        var headlines = context.Release.Headlines.Select(headline => (Headline: headline, Figure: context.Appraised.FigureAt(headline.Address)));
        foreach (var (headline, figure) in headlines.Where(pair => pair.Figure.HasNumber).DistinctBy(pair => pair.Figure.Ref))
            site.Write(PathOf(figure), PngPainter.Paint(HeadlineCard.Of(WordsOf(headline, figure, context), MarkSubject.Of(figure), type), 1, palette, type));
    }

    internal static HeadlineWords WordsOf(Headline headline, AppraisedFigure figure, SiteContext context)
    {
        var language = context.Language;
        var (heavy, light, margin) = FigureDigits.Of(figure, language);
        return new HeadlineWords
        {
            Title = headline.Title is { } title ? context.In(title) : FigureName.Of(figure, language),
            Heavy = heavy,
            Light = light,
            Margin = margin,
            Unit = UnitWords.Of(figure, language),
            Ends = figure.Main?.Printed is { } printed ? (language.Number(printed.Low), language.Number(printed.High)) : null,
            Reading = language.ReadingOf(figure).Text,
            Source = ChartImages.Source(context),
        };
    }
}
