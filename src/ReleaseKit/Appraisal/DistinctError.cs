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
    private readonly HalfWidth[] halfWidths;

    public DistinctError(FigureError error, Coverages coverages)
    {
        Error = error;
        this.coverages = coverages;
        halfWidths = [.. coverages.All.Select(HalfWidthAt)];
        LeftAsItWas = error.MarginAt(coverages.Main).Width == 0 ? error.Law.Within(0) : null;
    }

    public FigureError Error { get; }

    /// <summary>P(N = 0), where the noise mostly leaves the value as it was.</summary>
    public double? LeftAsItWas { get; }

    /// <summary>Whether the noise and what is made of it lie on whole numbers.</summary>
    public bool IsOnWholeGrid => Error.Law is LatticeLaw { Grid: var grid } && grid == Math.Floor(grid);

    public HalfWidth MainHalfWidth => halfWidths[1];

    /// <summary>The half-width at any coverage, raised likewise.</summary>
    public HalfWidth HalfWidthAt(Coverage coverage)
    {
        var found = Error.MarginAt(coverage);
        return found.Width == 0 && Error.Law is LatticeLaw law ? new(law.Grid, Math.Max(law.WithinSteps(1), found.Attained)) : found;
    }

    /// <summary>Whether some half-width reaches the coverage: a tabulated law may lack the mass.</summary>
    public bool Reaches(Coverage coverage) => Error.Law.Within(double.PositiveInfinity) >= coverage.Share;

    /// <summary>The ranges of one published value at the lower, main and upper coverage; none where an end is without bound (a zero that stands for all small values).</summary>
    public IReadOnlyList<FigureRange> RangesOf(PublishedValue value, Printing printing)
    {
        var ranges = new ErrorRange[halfWidths.Length];
        for (var at = 0; at < ranges.Length; at++)
            ranges[at] = RangeAt(value.ToDouble(), at, printing.Possible);
        if (ranges.Any(range => !double.IsFinite(range.Low) || !double.IsFinite(range.High)))
            return [];
        var unit = printing.UnitFor(value, Margins(value.ToDouble(), 1, ranges[1]).Larger);
        return [.. ranges.Select((range, at) => FigureRangeOf(value, at, range, printing, unit))];
    }

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

    private MarginPair Margins(double value, int at, ErrorRange range) => Error.DependsOnPublished
        ? new(Math.Max(0, value - (double.IsFinite(range.UncutLow) ? range.UncutLow : range.Low)), Math.Max(0, range.UncutHigh - value))
        : new(halfWidths[at].Width, halfWidths[at].Width);

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
