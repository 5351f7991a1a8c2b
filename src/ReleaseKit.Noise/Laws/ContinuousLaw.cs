namespace ReleaseKit.Noise.Laws;

/// <summary>A noise law with a density on the real line, symmetric about 0 and highest there.</summary>
public abstract record ContinuousLaw : NoiseLaw
{
    private protected ContinuousLaw()
    {
    }

    /// <summary>The density at x, per unit of the figure.</summary>
    /// <param name="x">In the unit of the figure.</param>
    public abstract double Density(double x);

    /// <inheritdoc/>
    public sealed override double AtMost(double x) => x < 0 ? TailFrom(-x) : 1 - TailFrom(x);

    /// <inheritdoc/>
    public sealed override double AtLeast(double x) => AtMost(-x);

    /// <inheritdoc/>
    public override double Within(double w) => w < 0 ? 0 : 1 - 2 * TailFrom(w);

    /// <inheritdoc/>
    public override HalfWidth HalfWidthAt(Coverage coverage) => new(Quantile(coverage), coverage.Share);

    /// <inheritdoc/>
    public override double RelativeDensity(double offset) => Density(offset) / Density(0);

    internal override double TailRatio(double from, double distance) => AtLeast(from) is > 0 and var whole
        ? AtLeast(from + distance) / whole
        : double.NaN;

    /// <summary>P(N ≥ x) for x ≥ 0, to full relative accuracy.</summary>
    private protected abstract double TailFrom(double x);

    /// <summary>The w with P(|N| ≤ w) = c.</summary>
    private protected abstract double Quantile(Coverage coverage);
}
