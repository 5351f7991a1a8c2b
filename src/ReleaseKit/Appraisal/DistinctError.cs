using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>
/// The error that many figures share, with its half-widths at the release's coverages. A half-width of zero is raised to one grid step,
/// and the coverage worked out anew: nothing that carries noise is shown as if it carried none.
/// </summary>
internal sealed class DistinctError
{
    private readonly Coverages coverages;

    // Those that are known: a tabulated law may lack the mass for the larger coverages.
    private readonly HalfWidth[] halfWidths;

    public DistinctError(FigureError error, Coverages coverages)
    {
        Error = error;
        this.coverages = coverages;
        halfWidths = [.. coverages.All.TakeWhile(Reaches).Select(HalfWidthAt)];
        LeftAsItWas = HasMain && error.MarginAt(coverages.Main).Width == 0 ? error.Law.Within(0) : null;
    }

    public FigureError Error { get; }

    /// <summary>P(N = 0), where the noise mostly leaves the value as it was.</summary>
    public double? LeftAsItWas { get; }

    /// <summary>Whether the noise and what is made of it lie on whole numbers.</summary>
    public bool IsOnWholeGrid => Error.Law is LatticeLaw { Grid: var grid } && grid == Math.Floor(grid);

    /// <summary>Whether some half-width reaches the main coverage.</summary>
    public bool HasMain => halfWidths.Length > 1;

    public HalfWidth MainHalfWidth => halfWidths[1];

    /// <summary>The half-width at any coverage, raised likewise.</summary>
    public HalfWidth HalfWidthAt(Coverage coverage)
    {
        var found = Error.MarginAt(coverage);
        return found.Width == 0 && Error.Law is LatticeLaw law ? new(law.Grid, Math.Max(law.WithinSteps(1), found.Attained)) : found;
    }

    /// <summary>Whether some half-width reaches the coverage: a tabulated law may lack the mass.</summary>
    public bool Reaches(Coverage coverage) => coverage.IsReachedBy(Error.Law.Within(double.PositiveInfinity));

    /// <summary>Whether one published value has a range at the main coverage.</summary>
    public bool HasMainRange(PublishedValue value, PossibleValues possible) =>
        HasMain && (!Error.DependsOnPublished || HasEnds(RangeAt(value.ToDouble(), 1, possible)));

    /// <summary>
    /// The ranges of one published value at the lower, main and upper coverage, as far as there are any: with the coverage a table of noise can run out of mass,
    /// and an end can come to have no bound (that of a zero that stands for all small values).
    /// </summary>
    public IReadOnlyList<FigureRange> RangesOf(PublishedValue value, Printing printing)
    {
        var ranges = halfWidths.Select((_, at) => RangeAt(value.ToDouble(), at, printing.Possible)).TakeWhile(HasEnds).ToList();
        if (ranges.Count == 0)
            return [];
        var main = Math.Min(1, ranges.Count - 1);
        var unit = printing.UnitFor(value, Margins(value.ToDouble(), main, ranges[main]).Larger);
        return [.. ranges.Select((range, at) => FigureRangeOf(value, at, range, printing, unit))];
    }

    private static bool HasEnds(ErrorRange range) => double.IsFinite(range.Low) && double.IsFinite(range.High);

    private FigureRange FigureRangeOf(PublishedValue value, int at, ErrorRange range, Printing printing, PrintUnit unit)
    {
        var (down, up) = Margins(value.ToDouble(), at, range);
        return new FigureRange
        {
            Coverage = coverages.All[at],
            MarginDown = down,
            MarginUp = up,
            Low = range.Low,
            High = range.High,
            UncutLow = range.UncutLow,
            UncutHigh = range.UncutHigh,
            Attained = range.Attained,
            Printed = printing.Print(value.ToDecimal(), down, up, range, unit),
        };
    }

    /// <summary>Under a threshold a range can go on without end, or far beyond the possible: its margins end with the possible, unless the value itself lies outside.</summary>
    private MarginPair Margins(double value, int at, ErrorRange range)
    {
        if (!Error.DependsOnPublished)
            return new(halfWidths[at].Width, halfWidths[at].Width);
        var isInside = range.Low <= value && value <= range.High;
        var low = isInside || !double.IsFinite(range.UncutLow) ? range.Low : range.UncutLow;
        var high = isInside || !double.IsFinite(range.UncutHigh) ? range.High : range.UncutHigh;
        return new(Math.Max(0, value - low), Math.Max(0, high - value));
    }

    private ErrorRange RangeAt(double value, int at, PossibleValues possible)
    {
        var range = Error.RangeAt(value, coverages.All[at], possible);
        if (range.UncutLow < range.UncutHigh || Error.Law is not LatticeLaw law)
            return range;
        var (low, high) = (value - law.Grid, value + law.Grid);
        return new(
            Math.Min(range.Low, Math.Max(low, possible.Lowest)),
            Math.Max(range.High, Math.Min(high, possible.Highest)),
            low, high, Math.Max(range.Attained, halfWidths[at].Attained));
    }

    private readonly record struct MarginPair(double Down, double Up)
    {
        public double Larger => Math.Max(Down, Up);
    }
}
