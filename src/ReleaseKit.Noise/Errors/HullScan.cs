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
/// rejected. From one step of the staircase to the next a tail changes by e^±ε. So k steps above a place past the threshold the lower
/// end's condition reads a·e^(kε) + b·e^(−kε) &gt; d with a, b ≥ 0, and k steps above a place past the value the upper end's reads
/// a·e^(−kε) &gt; d: a place that is rejected at the start is accepted from some step on for good, which halving finds.
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
        double[] BlockAt(long k) => Block(staircase, value, start + k * staircase.Sensitivity);
        var last = (long)Math.Ceiling((value - start) / staircase.Sensitivity) + 1;
        return FirstThatHolds(Blocks(BlockBefore(last, k => BlockAt(k).Any(holds)), BlockAt), holds);
    }

    /// <summary>The largest x above a start that satisfies a condition, which rejects all x far enough above; the start if there is
    /// none.</summary>
    public double Highest(double value, double start, double tail, Func<double, bool> holds)
    {
        if (law is TabulatedLaw table)
            return From(value - 1 - table.Rows[0].Step, -1).TakeWhile(x => x > start).Where(holds).FirstOrDefault(start);
        var staircase = (StaircaseLaw)law;
        var reach = Reach(staircase, tail);
        double[] BlockAt(long k) => [.. Block(staircase, value, value + reach - k * staircase.Sensitivity).Reverse()];
        var last = (long)Math.Floor(reach / staircase.Sensitivity);
        var places = Blocks(BlockBefore(last, k => BlockAt(k).Any(holds)), BlockAt);
        return FirstThatHolds(places.TakeWhile(x => x > start).Append(start), x => x <= start || holds(x));
    }

    private static IEnumerable<double> Blocks(long first, Func<long, double[]> blockAt)
    {
        for (var k = first; ; k++)
        {
            foreach (var place in blockAt(k))
                yield return place;
        }
    }

    // The block before the first one of 0..last that satisfies a condition, which stays true from there on; 0 if that one does, and the one
    // before the last if none does.
    private static long BlockBefore(long last, Func<long, bool> holds)
    {
        if (holds(0))
            return 0;
        var (fails, works) = (0L, last);
        while (works - fails > 1)
        {
            var middle = fails + (works - fails) / 2;
            (fails, works) = holds(middle) ? (fails, middle) : (middle, works);
        }
        return fails;
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
