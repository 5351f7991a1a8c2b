using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>A number in a writer's words, compared with the figure that the words cite.</summary>
/// <param name="Number">As it stands there.</param>
/// <param name="As">What it is to the figure.</param>
/// <param name="IsSure">Whether it can only be meant for the figure: in digits, and none of those that the figure's own table gives it.</param>
internal sealed record SaidNumber(WrittenNumber Number, SaidAs As, bool IsSure)
{
    public bool IsRounded => As is SaidAs.Rounded or SaidAs.RoundedFar;

    /// <summary>Whether it says the figure in digits, so that numbers in letters beside it are about something else.</summary>
    public bool SaysTheFigure => !Number.IsInLetters && !Number.IsMargin && As is SaidAs.Rounded or SaidAs.AsIs;

    public static SaidNumber Of(WrittenNumber number, AppraisedFigure figure, FigureScale scale, bool isSure) =>
        new(number, scale.Readings(number).Select(read => Compare(read, figure)).Max(), isSure);

    private static SaidAs Compare(WrittenNumber number, AppraisedFigure figure)
    {
        if (number.Value is not { } value)
            return SaidAs.Other;
        if (number.IsMargin)
            return Margins(figure).Contains(value) ? SaidAs.AsIs : IsMarginRoundedUp(value, number.Step, figure) ? SaidAs.Rounded : SaidAs.Other;
        if (!figure.HasNumber || Values(figure).Contains(value))
            return figure.HasNumber ? SaidAs.AsIs : SaidAs.Other;
        var said = figure.Value.IsNegative && value > 0 ? Size(-value, number.Step, figure) : WriterRounding.Of(value, number.Step, figure);
        return said < SaidAs.Beside && Margins(figure).Concat(Ends(figure)).Contains(value) ? SaidAs.Beside : said;
    }

    /// <summary>"A loss of 4.62" for −4.62: the sign is in the words, and the figure with its sign stands behind them.</summary>
    private static SaidAs Size(decimal value, decimal step, AppraisedFigure figure) =>
        Values(figure).Contains(value) ? SaidAs.Rounded : WriterRounding.Of(value, step, figure);

    private static bool IsMarginRoundedUp(decimal value, decimal step, AppraisedFigure figure) => figure.Main is { Printed: { IsUneven: false } range }
        && value - range.Margin.ToDecimal() is var more && more >= 0 && more <= step / 2;

    private static IEnumerable<decimal> Values(AppraisedFigure figure)
    {
        var published = figure.Value.ToDecimal();
        return [published, published * figure.Measure.PrintFactor, figure.Printed.ToDecimal()];
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
