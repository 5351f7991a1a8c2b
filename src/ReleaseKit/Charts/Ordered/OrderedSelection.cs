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
        return new OrderedFigures
        {
            Rows = [.. numbers.Select(figure => RowOf(figure, names.Of(figure), language))],
            WithoutNumber = [.. figures.Where(figure => !figure.HasNumber)],
            Unit = UnitWords.Many(numbers[0].Measure, language),
            Print = language.Number,
            NameOf = names.Of,
        };
    }

    private static OrderedRow RowOf(AppraisedFigure figure, string name, ILanguage language)
    {
        var (heavy, light, margin) = FigureDigits.Of(figure, language);
        return new OrderedRow { Figure = figure, Name = name, Heavy = heavy, Light = light, Margin = margin };
    }
}
