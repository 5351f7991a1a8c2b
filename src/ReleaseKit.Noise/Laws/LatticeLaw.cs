namespace ReleaseKit.Noise.Laws;

/// <summary>A noise law on the multiples of a grid g: N = g·K with an integer step K.</summary>
public abstract record LatticeLaw : NoiseLaw
{
    private protected LatticeLaw()
    {
    }

    /// <summary>The grid g &gt; 0, in the unit of the figure.</summary>
    public double Grid { get; init; } = 1;

    /// <summary>P(K = step).</summary>
    public abstract double Probability(long step);

    /// <summary>P(K ≤ step).</summary>
    public abstract double AtMostStep(long step);

    /// <summary>P(|K| ≤ steps); 0 for steps &lt; 0.</summary>
    public abstract double WithinSteps(long steps);

    /// <summary>
    /// A step s ≥ 0 beyond which the law has at most the given chance: P(|K| &gt; s) ≤ chance. The least such step, or a little above it.
    /// </summary>
    /// <param name="chance">0 &lt; chance &lt; 1.</param>
    public abstract long StepsBeyondWhich(double chance);
}
