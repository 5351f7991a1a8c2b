using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// The law of E = rounded(x + K) − x in whole steps, at the worst value before noise x: exact, for every x there is.
/// </summary>
/// <remarks>
/// P(|E| ≤ w) depends on x through its remainder and, where ties turn at zero, through whether the window [x − w, x + w] lies above, across
/// or below zero. Two periods (ties to even repeat after two) on both sides of zero show every remainder of a window across zero; two
/// periods far out on either side show the rest. A bound that x respects pulls the published value towards x, so the x without bounds are
/// the worst.
/// </remarks>
internal sealed class RoundedError(LatticeLaw law, Rounding rounding)
{
    /// <summary>The smallest half-width in steps that reaches the coverage for every x.</summary>
    public long MarginAt(Coverage coverage)
    {
        // Rounding moves a value by less than a unit, so the margin is within a unit of that of the noise.
        var noise = Lattice.ToStep(Math.Round(law.HalfWidthAt(coverage).Width / law.Grid));
        var (fails, works) = (Math.Max(-1, noise - rounding.Unit - 1), noise + rounding.Unit);
        while (works - fails > 1)
        {
            var middle = fails + (works - fails) / 2;
            (fails, works) = coverage.IsReachedBy(AttainedAt(middle)) ? (fails, middle) : (middle, works);
        }
        return works;
    }

    /// <summary>The smallest P(|E| ≤ w) over all x.</summary>
    public double AttainedAt(long steps)
    {
        if (steps < 0)
            return 0;
        var unit = rounding.Unit;
        var below = new Cumulative(law, rounding, -steps - 2 * unit - 1, -steps + 2 * unit + 1);
        var above = new Cumulative(law, rounding, steps - 2 * unit - 1, steps + 2 * unit + 1);
        var far = (steps / unit + 3) * unit;
        return new[] { -far - 2 * unit, -2 * unit, 0, far }.Min(from => SmallestOver(from, steps, below, above));
    }

    private double SmallestOver(long from, long steps, Cumulative below, Cumulative above)
    {
        var smallest = 1.0;
        for (var x = from; x < from + 2 * rounding.Unit; x++)
        {
            var (lowest, highest) = (CeilingOf(x - steps), FloorOf(x + steps));
            if (lowest > highest)
                return 0;
            smallest = Math.Min(smallest, above.AtMost(rounding.First(highest + 1) - 1 - x) - below.AtMost(rounding.First(lowest) - 1 - x));
        }
        return Math.Max(0, smallest);
    }

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
