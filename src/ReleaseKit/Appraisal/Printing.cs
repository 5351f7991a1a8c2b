using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>
/// How the figures of one measure are printed: to whole numbers, or to the place that leaves the main margin two digits.
/// Factor turns the figure's unit into the one that is printed (100 for shares that the files hold in ones).
/// </summary>
internal sealed record Printing(bool Whole, int? Decimals, decimal Factor, PossibleValues Possible)
{
    public static Printing Of(Measure measure, bool onWholeGrid) => new(
        measure.Kind == MeasureKind.Count || onWholeGrid,
        measure.Decimals,
        measure.InOnes ? 100 : 1,
        PossibleOf.Measure(measure));

    /// <summary>The unit for a figure: that of its margin, or a coarser one where a double would not hold the figure so finely.</summary>
    public PrintUnit UnitFor(PublishedValue value, double mainMargin) => UnitFor(mainMargin).ThatHolds(value.ToDecimal() * Factor);

    public PrintUnit UnitFor(double mainMargin) =>
        Whole ? PrintUnit.One : PrintUnit.OfTwoDigits(Scaled(mainMargin), Decimals);

    /// <summary>Value and half-widths to one unit, the half-widths so large that nothing of the range is lost; ends outward, or at what is possible.</summary>
    public PrintedRange Print(decimal value, double marginDown, double marginUp, ErrorRange range, PrintUnit unit)
    {
        var figure = value * Factor;
        var printed = unit.Nearest(figure);
        var shift = unit.Value(printed) - figure;
        var down = unit.Up(Scaled(marginDown) + shift);
        var up = unit.Up(Scaled(marginUp) - shift);
        if (marginDown == marginUp)
            down = up = Math.Max(down, up);
        var (low, lowIsCut) = LowEnd(printed - down, range, unit);
        var (high, highIsCut) = HighEnd(printed + up, range, unit);
        return new(unit.Print(printed), unit.Print(Math.Max(down, 0)), unit.Print(Math.Max(up, 0)), unit.Print(low), unit.Print(high), lowIsCut, highIsCut);
    }

    /// <summary>The largest half-width that Print gives for a margin, whatever the value.</summary>
    public PublishedValue LargestMargin(double margin, PrintUnit unit) =>
        unit.Print(unit.Up(Scaled(margin) + (Whole ? 0 : unit.Value(1) / 2)));

    /// <summary>A distance rounded up to the unit.</summary>
    public PublishedValue Outward(double distance, PrintUnit unit) => unit.Print(unit.Up(Scaled(distance)));

    /// <summary>The end of the half-width, but where the possible ends first, or where the range reaches further than the half-width.</summary>
    private (decimal Steps, bool IsCut) LowEnd(decimal uncut, ErrorRange range, PrintUnit unit)
    {
        var low = unit.Down(unit.Rounded(range.Low, Factor));
        return range.UncutLow < Possible.Lowest || IsBelow(unit.Value(uncut), Possible.Lowest) || low < uncut ? (low, true) : (uncut, false);
    }

    private (decimal Steps, bool IsCut) HighEnd(decimal uncut, ErrorRange range, PrintUnit unit)
    {
        var high = unit.Up(unit.Rounded(range.High, Factor));
        return range.UncutHigh > Possible.Highest || IsBelow(-unit.Value(uncut), -Possible.Highest) || high > uncut ? (high, true) : (uncut, false);
    }

    private bool IsBelow(decimal end, double bound) => double.IsFinite(bound) && end < Scaled(bound);

    private decimal Scaled(double number) => PrintUnit.Rounded(number) * Factor;
}
