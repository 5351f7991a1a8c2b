namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The discrete Laplace law (two-sided geometric): P(K = k) = (1 − a)/(1 + a)·a^|k| with a = e^(−1/t) and t = scale ÷ grid.
/// P(|K| ≤ s) = 1 − 2a^(s+1)/(1 + a). Ghosh, Roughgarden &amp; Sundararajan 2012, Universally utility-maximizing privacy mechanisms.
/// </summary>
public sealed record DiscreteLaplaceLaw : LatticeLaw
{
    // a, and 1 − a to full relative accuracy.
    private readonly double ratio, drop;

    private DiscreteLaplaceLaw(double scale, double grid)
        : base(grid)
    {
        Scale = scale;
        (ratio, drop) = (Math.Exp(-grid / scale), -Elementary.ExpM1(-grid / scale));
    }

    /// <summary>The scale &gt; 0, in the unit of the figure (t·grid).</summary>
    public double Scale { get; }

    /// <inheritdoc/>
    public override double Variance => 2 * ratio / (drop * drop) * Grid * Grid;

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation => 2 * ratio / (drop * (1 + ratio)) * Grid;

    internal override bool IsLogConcave => true;

    /// <summary>The law with a scale on a grid.</summary>
    /// <param name="scale">&gt; 0, finite, in the unit of the figure.</param>
    /// <param name="grid">g &gt; 0, finite, in the unit of the figure.</param>
    /// <exception cref="ArgumentOutOfRangeException">A parameter is not a finite number above 0.</exception>
    public static DiscreteLaplaceLaw Of(double scale, double grid = 1) =>
        new(Require.Positive(scale, nameof(scale), "the unit of the figure"), grid);

    /// <inheritdoc/>
    public override double Probability(long step) => drop / (1 + ratio) * Power(Math.Abs((double)step));

    internal override double TailRatio(double from, double distance) =>
        from > 0 ? TailRatioFarOut(distance) : base.TailRatio(from, distance);

    internal override double TailRatioFarOut(double distance) => Power(distance);

    private protected override double TailFrom(long step) => Power(step) / (1 + ratio);

    private double Power(double exponent) => Math.Exp(-exponent * (Grid / Scale));
}
