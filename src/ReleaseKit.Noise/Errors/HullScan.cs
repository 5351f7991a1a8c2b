using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// Places to look at, in order, for the ends of a set of values before noise under laws that are not log-concave, where the set may be in
/// several pieces: its hull is wanted.
/// </summary>
/// <remarks>
/// Tabulated laws: every step at which the table can reach the value. Staircase law: both tails are linear in x between the places where an
/// edge of the density passes the value or the threshold, so their ratio moves one way in between, and looking at those places misses no
/// piece. Past the threshold the chance of passing it is at least 1/2, so that beyond the distance z with P(N ≥ z) = β/2 every x is
/// rejected.
/// </remarks>
internal sealed class HullScan(NoiseLaw law, double passing, long blur)
{
    /// <summary>Tables wider than this many steps are not gone through.</summary>
    public const long WidestTable = 1_000_000;

    /// <summary>Staircases flatter than this have too many edges to be gone through.</summary>
    public const double SmallestEpsilon = 1e-4;

    /// <summary>Whether the ends can be found for a law.</summary>
    public static bool Knows(NoiseLaw law) => law switch
    {
        StaircaseLaw staircase => staircase.Epsilon >= SmallestEpsilon,
        // Mass that the table leaves out could be all that passes a threshold: then nothing can be promised of the figures that passed.
        TabulatedLaw table => table.MissingMass == 0 && table.Rows[^1].Step - table.Rows[0].Step <= WidestTable,
        _ => false,
    };

    /// <summary>The smallest x that satisfies a condition, which rejects all x far enough below; −∞ if it never does.</summary>
    public double Lowest(double value, double tail, Func<double, bool> holds)
    {
        if (law is TabulatedLaw table)
            return From(value - table.Rows[^1].Step - blur, 1).First(holds);
        var staircase = (StaircaseLaw)law;
        // Below the threshold the ratio of the tails repeats with every step of the staircase.
        if (Block(staircase, value, passing - staircase.Sensitivity).Append(passing).Any(holds))
            return double.NegativeInfinity;
        var start = Math.Max(passing, value - Reach(staircase, tail));
        return FirstThatHolds(From(start, staircase.Sensitivity).SelectMany(from => Block(staircase, value, from)), holds);
    }

    /// <summary>The largest x above a start that satisfies a condition, which rejects all x far enough above; the start if there is
    /// none.</summary>
    public double Highest(double value, double start, double tail, Func<double, bool> holds)
    {
        if (law is TabulatedLaw table)
            return From(value - 1 - table.Rows[0].Step, -1).TakeWhile(x => x > start).Where(holds).FirstOrDefault(start);
        var staircase = (StaircaseLaw)law;
        var blocks = From(value + Reach(staircase, tail), -staircase.Sensitivity)
            .SelectMany(from => Block(staircase, value, from).Reverse());
        return FirstThatHolds(blocks.TakeWhile(x => x > start).Append(start), x => x <= start || holds(x));
    }

    private static IEnumerable<double> From(double start, double stride)
    {
        for (var k = 0L; ; k++)
            yield return start + k * stride;
    }

    private static double FirstThatHolds(IEnumerable<double> places, Func<double, bool> holds)
    {
        var before = double.NaN;
        foreach (var place in places)
        {
            if (holds(place))
                return double.IsNaN(before) ? place : Search.Between(before, place, holds);
            before = place;
        }
        return before;
    }

    // The start of a block one step of the staircase long, and the places in it where an edge of the density can pass the value or the
    // threshold.
    private double[] Block(StaircaseLaw staircase, double value, double from)
    {
        var (length, high) = (staircase.Sensitivity, staircase.Sensitivity * staircase.Gamma);
        double[] edges = [value, value + high, value - high, passing, passing + high, passing - high];
        return [from, .. edges.Select(edge => edge + Math.Ceiling((from - edge) / length) * length).Order()];
    }

    private static double Reach(StaircaseLaw staircase, double tail) =>
        staircase.HalfWidthAt(Coverage.OfShare(1 - Math.Min(tail, 0.5))).Width;
}
