namespace ReleaseKit.Noise.Laws;

/// <summary>A noise law on the multiples of a grid g: N = g·K with an integer step K. Symmetric about 0 unless the law says
/// otherwise.</summary>
public abstract record LatticeLaw : NoiseLaw
{
    private protected LatticeLaw(double grid) => Grid = Require.Positive(grid, nameof(grid), "the unit of the figure");

    /// <summary>The grid g &gt; 0, in the unit of the figure.</summary>
    public double Grid { get; }

    /// <summary>P(K = step).</summary>
    public abstract double Probability(long step);

    /// <summary>P(K ≤ step), to full relative accuracy below 0.</summary>
    public virtual double AtMostStep(long step)
    {
        if (step <= -Lattice.Farthest)
            return 0;
        return step < 0 ? TailFrom(-step) : step >= Lattice.Farthest ? 1 : 1 - TailFrom(step + 1);
    }

    /// <summary>P(K ≥ step), to full relative accuracy above 0.</summary>
    public virtual double AtLeastStep(long step) => step <= -Lattice.Farthest ? 1 : AtMostStep(-step);

    /// <summary>P(|K| ≤ steps); 0 for steps &lt; 0.</summary>
    public virtual double WithinSteps(long steps)
    {
        if (steps < 0)
            return 0;
        return steps >= Lattice.Farthest ? 1 : 1 - 2 * TailFrom(steps + 1);
    }

    /// <summary>
    /// A step s ≥ 0 beyond which the law has at most the given chance: P(|K| &gt; s) ≤ chance. The least such step, or a little above it;
    /// the missing mass of a law that lacks some is left aside.
    /// </summary>
    /// <param name="chance">0 &lt; chance &lt; 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The chance is not strictly between 0 and 1.</exception>
    public virtual long StepsBeyondWhich(double chance) => chance is > 0 and < 1
        ? SmallestStep(steps => AtMostStep(-steps - 1) + AtLeastStep(steps + 1) <= chance)
        : throw new ArgumentOutOfRangeException(nameof(chance), chance, "A chance lies strictly between 0 and 1.");

    /// <inheritdoc/>
    public sealed override double AtMost(double x) => AtMostStep(Lattice.ToStep(Lattice.Floor(x / Grid)));

    /// <inheritdoc/>
    public sealed override double AtLeast(double x) => AtLeastStep(Lattice.ToStep(Lattice.Ceiling(x / Grid)));

    /// <inheritdoc/>
    public sealed override double Within(double w) => WithinSteps(Lattice.ToStep(Lattice.Floor(w / Grid)));

    /// <inheritdoc/>
    public override HalfWidth HalfWidthAt(Coverage coverage)
    {
        if (!coverage.IsReachedBy(WithinSteps(Lattice.Farthest)))
        {
            throw new ArgumentOutOfRangeException(
                nameof(coverage), coverage, "The law lacks so much mass that no half-width reaches the coverage.");
        }
        var steps = SmallestStep(candidate => coverage.IsReachedBy(WithinSteps(candidate)));
        return new HalfWidth(steps * Grid, WithinSteps(steps));
    }

    /// <inheritdoc/>
    public override double RelativeDensity(double offset) => Probability(Lattice.ToStep(Math.Round(offset / Grid))) / Probability(0);

    internal override double TailRatio(double from, double distance) => AtLeastStep(Lattice.ToStep(from)) is > 0 and var whole
        ? AtLeastStep(Lattice.ToStep(from + distance)) / whole
        : double.NaN;

    /// <summary>P(K ≥ step) for step ≥ 1, to full relative accuracy.</summary>
    private protected abstract double TailFrom(long step);

    /// <summary>The smallest step ≥ 0 that satisfies a condition which, once true, stays true: doubling, then halving.</summary>
    private protected static long SmallestStep(Func<long, bool> holds)
    {
        if (holds(0))
            return 0;
        var (fails, works) = (0L, 1L);
        while (!holds(works))
            (fails, works) = (works, works * 2);
        while (works - fails > 1)
        {
            var middle = fails + (works - fails) / 2;
            (fails, works) = holds(middle) ? (fails, middle) : (middle, works);
        }
        return works;
    }
}
