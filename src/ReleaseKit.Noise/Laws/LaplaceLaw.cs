namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The Laplace law: density e^(−|x|/b) ÷ 2b with scale b; standard deviation b·√2. Dwork, McSherry, Nissim &amp; Smith 2006.
/// The margin at coverage c is −b·ln(1 − c).
/// </summary>
public sealed record LaplaceLaw : ContinuousLaw
{
    private LaplaceLaw(double scale) => Scale = scale;

    /// <summary>The scale b &gt; 0, in the unit of the figure.</summary>
    public double Scale { get; }

    /// <inheritdoc/>
    public override double Variance => 2 * Scale * Scale;

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation => Scale;

    internal override bool IsLogConcave => true;

    /// <summary>The law with a scale.</summary>
    /// <param name="scale">b &gt; 0, finite, in the unit of the figure.</param>
    /// <exception cref="ArgumentOutOfRangeException">The scale is not a finite number above 0.</exception>
    public static LaplaceLaw Of(double scale) => new(Require.Positive(scale, nameof(scale), "the unit of the figure"));

    /// <inheritdoc/>
    public override double Density(double x) => Math.Exp(-Math.Abs(x) / Scale) / (2 * Scale);

    /// <inheritdoc/>
    public override double Within(double w) => w < 0 ? 0 : -Elementary.ExpM1(-w / Scale);

    internal override double TailRatio(double from, double distance) =>
        from > 0 ? TailRatioFarOut(distance) : base.TailRatio(from, distance);

    internal override double TailRatioFarOut(double distance) => Math.Exp(-distance / Scale);

    private protected override double TailFrom(double x) => 0.5 * Math.Exp(-x / Scale);

    private protected override double Quantile(Coverage coverage) => -Scale * Elementary.Log1P(-coverage.Share);
}
