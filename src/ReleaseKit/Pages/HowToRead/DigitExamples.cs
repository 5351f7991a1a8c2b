using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;
using Scriban.Runtime;

namespace ReleaseKit.Pages.HowToRead;

/// <summary>Figures of the release that show where light digits begin: one for each place of the margin, one that is light throughout, one below zero.</summary>
internal static class DigitExamples
{
    private const int Most = 6;

    // Places that have a name in the wording files: thousandths to millions.
    private const int LowestPlace = -3;
    private const int HighestPlace = 6;

    public static ScriptArray Of(SiteContext context)
    {
        var examples = FirstRows.Of(context.Appraised)
            .Where(figure => figure.Main is { Printed.Margin.Unscaled: > 0 } && PlaceOf(figure) is >= LowestPlace and <= HighestPlace)
            .DistinctBy(figure => (PlaceOf(figure), IsLight(figure, context.Language), figure.Value.IsNegative))
            .Take(Most)
            .OrderBy(figure => figure.Main!.Printed.Margin.ToDecimal()).ThenByDescending(figure => figure.Value.ToDecimal());
        return new ScriptArray(examples.Select(figure => Row(context, figure)));
    }

    private static ScriptObject Row(SiteContext context, AppraisedFigure figure) => new()
    {
        ["number"] = new RawHtml(FigureHtml.Number(figure, context.Language)),
        ["margin"] = FigureHtml.Margin(figure, context.Language),
        ["from"] = LightFrom(context.Language, figure),
        ["name"] = FigureName.Of(figure, context.Language),
        ["href"] = Link.From(PageMap.Reading, context.Pages.Of(figure.Ref)),
    };

    private static string LightFrom(ILanguage language, AppraisedFigure figure)
    {
        var place = language.Text("reading.place." + PlaceOf(figure).ToString(CultureInfo.InvariantCulture));
        return figure.Value.IsNegative && IsLight(figure, language) ? language.Text("reading.place.and-sign", ("place", place)) : place;
    }

    /// <summary>The leading place of the margin: 0 for units, 1 for tens.</summary>
    private static int PlaceOf(AppraisedFigure figure)
    {
        PublishedValue margin = figure.Main!.Printed.Margin;
        return margin.Unscaled.ToString(CultureInfo.InvariantCulture).Length - 1 - margin.Decimals;
    }

    private static bool IsLight(AppraisedFigure figure, ILanguage language)
    {
        var printed = figure.Main!.Printed;
        return LightDigits.Of(language.Number(printed.Value), printed).Heavy.Length == 0;
    }
}
