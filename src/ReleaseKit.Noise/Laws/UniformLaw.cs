namespace ReleaseKit.Noise.Laws;

/// <summary>The uniform (rectangular) law on [−h, h]: density 1 ÷ 2h. The margin at coverage c is c·h. Textbook.</summary>
public sealed record UniformLaw : ContinuousLaw
{
    private UniformLaw(double halfWidth) => HalfWidth = halfWidth;

    /// <summary>The half-width h &gt; 0, in the unit of the figure.</summary>
    public double HalfWidth { get; }

    /// <inheritdoc/>
    public override double Variance => HalfWidth * HalfWidth / 3;

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation => HalfWidth / 2;

    internal override bool IsLogConcave => true;

    /// <summary>The law with a half-width.</summary>
    /// <param name="halfWidth">h &gt; 0, finite, in the unit of the figure.</param>
    /// <exception cref="ArgumentOutOfRangeException">The half-width is not a finite number above 0.</exception>
    public static UniformLaw Of(double halfWidth) => new(Require.Positive(halfWidth, nameof(halfWidth), "the unit of the figure"));

    /// <inheritdoc/>
    public override double Density(double x) => Math.Abs(x) <= HalfWidth ? 0.5 / HalfWidth : 0;

    /// <inheritdoc/>
    public override double Within(double w) => w < 0 ? 0 : Math.Min(1, w / HalfWidth);

    private protected override double TailFrom(double x) => Math.Max(0, 0.5 - 0.5 * (x / HalfWidth));

    private protected override double Quantile(Coverage coverage) => coverage.Share * HalfWidth;
}
