using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// The law of E = rounded(x + K) − x in whole steps, at the worst value before noise x: exact, for every x there is.
/// </summary>
/// <remarks>
/// P(|E| ≤ w) depends on x through its remainder and, where ties turn at zero, through whether the window [x − w, x + w] lies above, across
/// or below zero. Two periods (ties to even repeat after two) on both sides of zero show every remainder of a window across zero; two
/// periods far out on either side show the rest. A bound that x respects pulls the published value towards x, so the x without bounds are
/// the worst. As long as the multiples within w of x stay the same, the chance is that of x + K falling between two fixed places (K carries
/// a uniform draw too under random rounding); where the law is log-concave it rises and then falls as x moves, so that the first and the
/// last x of each such run are the worst of it, and no others are looked at.
/// </remarks>
internal sealed class RoundedError(LatticeLaw law, Rounding rounding)
{
    /// <summary>The smallest half-width in steps that reaches the coverage for every x.</summary>
    public long MarginAt(Coverage coverage)
    {
        // Rounding moves a value by less than a unit, so the margin is within a unit of that of the noise.
        var noise = Lattice.ToStep(Math.Round(law.HalfWidthAt(coverage).Width / law.Grid));
        var (fails, works) = (Math.Max(-1, noise - rounding.Unit - 1), noise + rounding.Unit);
        var (below, above) = (AtMostNear(-noise, rounding.Unit + 1), AtMostNear(noise, rounding.Unit + 1));
        while (works - fails > 1)
        {
            var middle = fails + (works - fails) / 2;
            (fails, works) = coverage.IsReachedBy(Smallest(middle, below, above)) ? (fails, middle) : (middle, works);
        }
        return works;
    }

    /// <summary>The smallest P(|E| ≤ w) over all x.</summary>
    public double AttainedAt(long steps) => steps < 0 ? 0 : Smallest(steps, AtMostNear(-steps, 0), AtMostNear(steps, 0));

    private double Smallest(long steps, Func<long, double> below, Func<long, double> above)
    {
        var unit = rounding.Unit;
        var far = (steps / unit + 3) * unit;
        return new[] { -far - 2 * unit, -2 * unit, 0, far }.Min(from => SmallestOver(from, steps, below, above));
    }

    private double SmallestOver(long from, long steps, Func<long, double> below, Func<long, double> above)
    {
        var smallest = 1.0;
        foreach (var x in law.IsLogConcave ? EndsOfRuns(from, steps) : All(from, 2 * rounding.Unit))
        {
            var (lowest, highest) = (CeilingOf(x - steps), FloorOf(x + steps));
            if (lowest > highest)
                return 0;
            smallest = Math.Min(smallest, above(rounding.First(highest + 1) - 1 - x) - below(rounding.First(lowest) - 1 - x));
        }
        return Math.Max(0, smallest);
    }

    // The first and the last x of every run over two periods: a new one begins where x + w comes to a multiple, or x − w has just left one.
    private IEnumerable<long> EndsOfRuns(long from, long steps)
    {
        var beyond = from + 2 * rounding.Unit;
        foreach (var start in new[] { -steps, steps + 1 })
        {
            for (var x = start + CeilingOf(from - start) * rounding.Unit; x < beyond; x += rounding.Unit)
            {
                yield return x;
                yield return Math.Max(from, x - 1);
            }
        }
        yield return from;
        yield return beyond - 1;
    }

    private static IEnumerable<long> All(long from, long count)
    {
        for (var x = from; x < from + count; x++)
            yield return x;
    }

    // P(K ≤ step), or P(K + U ≤ step) under random rounding, for all w within a reach of a place; tabulated where every step is asked for.
    private Func<long, double> AtMostNear(long place, long reach) => law.IsLogConcave && rounding.How is not RoundingHow.AtRandom
        ? law.AtMostStep
        : new Cumulative(law, rounding, place - reach - 2 * rounding.Unit - 1, place + reach + 2 * rounding.Unit + 1).AtMost;

    private long FloorOf(long step) => (long)Math.Floor((double)step / rounding.Unit);

    private long CeilingOf(long step) => (long)Math.Ceiling((double)step / rounding.Unit);

    /// <summary>P(K ≤ step), or P(K + U ≤ step) under random rounding, over a window of steps.</summary>
    private sealed class Cumulative
    {
        private readonly double[] values;
        private readonly long from;

        public Cumulative(LatticeLaw law, Rounding rounding, long from, long to)
        {
            this.from = from;
            var spread = rounding.How is RoundingHow.AtRandom ? (int)rounding.Unit : 1;
            var plain = new double[to - from + spread];
            for (var i = 0; i < plain.Length; i++)
                plain[i] = law.AtMostStep(from - spread + 1 + i);
            values = spread == 1 ? plain : Means(plain, spread);
        }

        public double AtMost(long step) => values[step - from];

        private static double[] Means(double[] plain, int spread)
        {
            var means = new double[plain.Length - spread + 1];
            var sum = plain.Take(spread).Sum();
            for (var i = 0; i < means.Length; i++)
            {
                means[i] = sum / spread;
                if (i + spread < plain.Length)
                    sum += plain[i + spread] - plain[i];
            }
            return means;
        }
    }
}
