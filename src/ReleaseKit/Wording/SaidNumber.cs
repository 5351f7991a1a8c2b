using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>What a number in a writer's words is to the figure that they cite.</summary>
internal enum SaidAs
{
    /// <summary>Another number.</summary>
    Other,

    /// <summary>The figure, rounded by the writer: the figure itself must stand beside it.</summary>
    Rounded,

    /// <summary>The figure as published or printed, its margin, or an end of its range.</summary>
    AsIs,
}

/// <summary>Compares the numbers of a writer's words with the figure that the words cite.</summary>
internal static class SaidNumber
{
    /// <summary>A rounding that moves a figure further than this share of it says another thing, unless it stays within its range (own rule: common practice, no source).</summary>
    private const decimal MostRounded = 0.05m;

    public static SaidAs Of(WrittenNumber number, AppraisedFigure figure)
    {
        if (number.Value is not { } value)
            return SaidAs.Other;
        if (Margins(figure).Contains(value))
            return SaidAs.AsIs;
        if (number.IsMargin || !figure.HasNumber)
            return SaidAs.Other;
        return Values(figure).Contains(value) ? SaidAs.AsIs : IsRounded(value, figure) ? SaidAs.Rounded : SaidAs.Other;
    }

    private static bool IsRounded(decimal value, AppraisedFigure figure)
    {
        var published = figure.Value.ToDecimal() * figure.Measure.PrintFactor;
        var moved = Math.Abs(value - published);
        return moved <= StepOf(value) / 2 && (moved <= MostRounded * Math.Abs(published) || IsWithinRange(value, figure));
    }

    private static bool IsWithinRange(decimal value, AppraisedFigure figure) =>
        figure.Main is { Printed: var range } && value >= range.Low.ToDecimal() && value <= range.High.ToDecimal();

    /// <summary>To what a number as written is rounded: its last decimal, or the zeros at its end.</summary>
    private static decimal StepOf(decimal value)
    {
        var step = 1m;
        for (var decimals = value.Scale; decimals > 0; decimals--)
            step /= 10;
        while (step >= 1 && value != 0 && value % (step * 10) == 0)
            step *= 10;
        return step;
    }

    private static IEnumerable<decimal> Values(AppraisedFigure figure)
    {
        var published = figure.Value.ToDecimal();
        return [published, published * figure.Measure.PrintFactor, figure.Printed.ToDecimal(), .. Ends(figure)];
    }

    private static IEnumerable<decimal> Ends(AppraisedFigure figure) =>
        figure.Main is { Printed: var range } ? [range.Low.ToDecimal(), range.High.ToDecimal()] : [];

    // An uneven margin is printed with its signs: −12 +17.
    private static IEnumerable<decimal> Margins(AppraisedFigure figure) => figure.Main switch
    {
        null => [],
        { Printed: { IsUneven: true } range } => [range.MarginDown.ToDecimal(), -range.MarginDown.ToDecimal(), range.MarginUp.ToDecimal()],
        { Printed: var range } => [range.Margin.ToDecimal()],
    };
}
