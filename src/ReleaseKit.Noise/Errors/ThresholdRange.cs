using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// Ranges where small values are published as 0 or not at all: the law of the published value given that it passed the threshold, inverted.
/// </summary>
/// <remarks>
/// A value before noise x belongs to the range of y if P(Y ≥ y | passed; x) and P(Y ≤ y | passed; x) are both above β = (1 − c)/2. Each
/// tail misses with at most β, so among the figures that passed the range holds x in at least c of the cases, for every x. For log-concave
/// noise both chances move one way as x moves, so that the set is an interval (Lehmann &amp; Romano 2005, Testing Statistical Hypotheses,
/// 3.4: monotone likelihood ratio, kept by conditioning on a half-line; numbering from memory). For other laws the hull of the set is
/// taken, which holds x too.
/// </remarks>
internal sealed class ThresholdRange(NoiseLaw law, StepChain chain)
{
    // The slack goes to the side of the wider range.
    private const double Slack = 1e-9;

    private readonly LatticeLaw? lattice = law as LatticeLaw;
    private readonly double passing = chain.Passing();
    private readonly double stride = law is LatticeLaw ? 1 : Math.Sqrt(law.Variance);

    private readonly HullScan? scan = law.IsLogConcave
        ? null
        : new HullScan(law, chain.Passing(), chain.ExactRounding is { How: RoundingHow.AtRandom } random ? random.Unit - 1 : 0);

    /// <summary>The ends for a value that passed the threshold, in the figure's unit; the published value is never outside.</summary>
    public (double Low, double High) At(double published, Coverage coverage)
    {
        var tail = coverage.Rest / 2 * (1 - Slack);
        var (reaching, exceeding) = (Math.Max(passing, chain.Reaching(published)), chain.Exceeding(published));
        var start = lattice is null ? published : Lattice.Floor(published / chain.Unit);
        reaching = double.IsFinite(reaching) ? reaching : start;
        var (low, high) = (LowEnd(reaching, tail), HighEnd(exceeding, start, tail));
        return (Math.Min(low, start) * chain.Unit, high * chain.Unit);
    }

    /// <summary>The largest value before noise, in the figure's unit, that fails the threshold with a chance above (1 − c)/2.</summary>
    public double HighestBelow(Coverage coverage)
    {
        var tail = coverage.Rest / 2 * (1 - Slack);
        var start = passing - (chain.ExactRounding?.Unit ?? 1) * stride;
        return Search.Farthest(start, stride, lattice is not null, x => ChanceBelow(passing - x) > tail) * chain.Unit;
    }

    private double LowEnd(double reaching, double tail)
    {
        bool Holds(double x) => RatioOfPassed(reaching, x) > tail;
        if (scan is not null)
            return scan.Lowest(reaching, tail, Holds);
        // The ratio falls with x: where its limit still holds, every x below does, and the range has no lower end.
        return law.TailRatioFarOut(reaching - passing) > tail
            ? double.NegativeInfinity
            : Search.Farthest(reaching, -stride, lattice is not null, Holds);
    }

    private double HighEnd(double exceeding, double start, double tail)
    {
        bool Holds(double x) => 1 - RatioOfPassed(exceeding, x) > tail;
        if (double.IsPositiveInfinity(exceeding) || exceeding <= passing)
            return exceeding <= passing ? start : exceeding;
        if (scan is not null)
            return scan.Highest(exceeding, start, tail, Holds);
        return Holds(start) ? Search.Farthest(start, stride, lattice is not null, Holds) : start;
    }

    // P(noised ≥ place | passed; x) for a place from the threshold up; NaN where x never passes. Under random rounding the noise carries a
    // uniform 0..r − 1 as well; chances are taken relative to the largest one that passes, none of which need be one that a double can hold.
    private double RatioOfPassed(double place, double x)
    {
        var blur = RandomUnit - 1;
        var from = passing - x - blur;
        double Tail(double distance) => Mean(shift => law.TailRatio(from, distance + blur - shift));
        return Tail(place - passing) / Tail(0);
    }

    private double ChanceBelow(double place) => lattice is null
        ? law.AtMost(place)
        : Mean(shift => lattice.AtMostStep(Lattice.ToStep(place - shift - 1)));

    private double Mean(Func<long, double> chance)
    {
        var sum = 0.0;
        for (var shift = 0L; shift < RandomUnit; shift++)
            sum += chance(shift);
        return sum / RandomUnit;
    }

    private long RandomUnit => chain.ExactRounding is { How: RoundingHow.AtRandom } random ? random.Unit : 1;
}
