using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts.Ordered;

/// <summary>Turns a chart order into rows: the selection by size, largest first, ties in table order; names as short as they can be.</summary>
public static class OrderedSelection
{
    /// <exception cref="ArgumentException">The selection has no figure with a number; the review stops such an order.</exception>
    public static OrderedFigures Of(IAppraisedRelease appraised, ILanguage language, ChartOrder order)
    {
        var figures = appraised.Select(order.Figures).Select(appraised.Figure).ToList();
        var numbers = figures.Where(figure => figure.HasNumber).OrderByDescending(figure => figure.Value.ToDouble()).ToList();
        if (numbers.Count == 0)
            throw new ArgumentException($"The chart \"{order.Id}\" selects no figure with a number.", nameof(order));
        var names = RowNames.Of(figures, language.Tag);
        return new OrderedFigures(
            [.. numbers.Select(figure => RowOf(figure, names.Of(figure), language))],
            [.. figures.Where(figure => !figure.HasNumber)],
            UnitOf(numbers[0].Measure, language.Tag),
            language.Number);
    }

    public static string UnitOf(Measure measure, string tag) => measure.Unit.Forms.TryGetValue(tag, out var forms) ? forms.Other : measure.Unit.Key;

    private static OrderedRow RowOf(AppraisedFigure figure, string name, ILanguage language)
    {
        if (figure.Main?.Printed is not { } printed)
            return new OrderedRow { Figure = figure, Name = name, Heavy = language.Number(figure.Value), Light = "", Margin = WithoutMargin(figure, language) };
        var digits = LightDigits.Of(language.Number(printed.Value), printed);
        return new OrderedRow { Figure = figure, Name = name, Heavy = digits.Heavy, Light = digits.Light, Margin = language.Margin(printed) };
    }

    private static string WithoutMargin(AppraisedFigure figure, ILanguage language) => language.Text(figure.Reliability switch
    {
        Reliability.Exact => "charts.exact",
        Reliability.Public => "charts.public",
        _ => "charts.no-margin",
    });
}
