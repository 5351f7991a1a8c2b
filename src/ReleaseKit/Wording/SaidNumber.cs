using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>A number in a writer's words, compared with the figure that the words cite.</summary>
/// <param name="Number">As it stands there.</param>
/// <param name="As">What it is to the figure.</param>
/// <param name="IsSure">Whether it can only be meant for the figure: in digits, and none of those that the figure's own table gives it.</param>
internal sealed record SaidNumber(WrittenNumber Number, SaidAs As, bool IsSure)
{
    /// <summary>Whether it says the figure itself, so that no more than its margin needs to stand behind the words.</summary>
    public bool IsTheFigure => As is SaidAs.AsIs && !Number.IsMargin;

    /// <summary>Whether the figure itself must stand behind the words, wherever they are.</summary>
    public bool NeedsTheFigure => As is SaidAs.DoubtfulBound or SaidAs.RoundedFar or SaidAs.Bound or SaidAs.Unsigned or SaidAs.Rounded;

    public bool IsTheMargin => As is SaidAs.AsIs && Number.IsMargin;

    public bool IsRoundedMargin => Number.IsMargin && As is SaidAs.Rounded;

    /// <summary>Whether it says the figure in digits, so that numbers in letters beside it are about something else.</summary>
    public bool SaysTheFigure => !Number.IsInLetters && !Number.IsMargin && As is SaidAs.Unsigned or SaidAs.Rounded or SaidAs.AsIs;

    public static SaidNumber Of(WrittenNumber number, AppraisedFigure figure, FigureScale scale, bool isSure) =>
        new(number, Best([.. scale.Readings(number).Select(read => Compare(read, figure))]), isSure);

    /// <summary>Of two scales that can be meant one makes the figure; a bound is kept by chance in the other.</summary>
    private static SaidAs Best(IReadOnlyList<SaidAs> read) => read.Max() is SaidAs.Bound && read.Min() < SaidAs.Bound ? SaidAs.DoubtfulBound : read.Max();

    private static SaidAs Compare(WrittenNumber number, AppraisedFigure figure)
    {
        if (number.Value is not { } value)
            return SaidAs.Other;
        if (number.IsMargin)
            return Margins(figure).Contains(value) ? SaidAs.AsIs : IsMarginRoundedUp(value, number.Step, figure) ? SaidAs.Rounded : SaidAs.Other;
        if (!figure.HasNumber)
            return SaidAs.Other;
        if (number.Bound == NumberBound.None && Values(figure).Contains(value))
            return SaidAs.AsIs;
        var span = FigureSpan.Of(figure);
        var said = value > 0 && span.IsBelowZero(number.Bound) ? Size(number, value, figure, span) : WriterBound.Of(number, value, span);
        return said < SaidAs.Beside && StandsBeside(number, value, figure) ? SaidAs.Beside : said;
    }

    /// <summary>"A loss of 4.62" for −4.62: the sign is in the words, and the figure with its sign stands behind them.</summary>
    private static SaidAs Size(WrittenNumber number, decimal value, AppraisedFigure figure, FigureSpan span)
    {
        if (number.Bound == NumberBound.None && Values(figure).Contains(-value))
            return SaidAs.Unsigned;
        return WriterBound.Of(number, value, span.Mirrored) switch
        {
            SaidAs.Rounded or SaidAs.Bound => SaidAs.Unsigned,
            SaidAs.Other when WriterBound.Of(number, value, span) != SaidAs.Other => SaidAs.DoubtfulBound,
            var said => said,
        };
    }

    /// <summary>A bound that is an end of the range is judged as a bound; "up to 24 either way" tells of the margin.</summary>
    private static bool StandsBeside(WrittenNumber number, decimal value, AppraisedFigure figure) =>
        Margins(figure).Contains(value) || (number.Bound == NumberBound.None && Ends(figure).Contains(value));

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
