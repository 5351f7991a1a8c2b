using MathNet.Numerics;

namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The Gaussian (normal) law with standard deviation σ: density e^(−x²/2σ²) ÷ (σ√(2π)).
/// The margin at coverage c is σ·Φ⁻¹((1 + c)/2) = σ·√2·erfc⁻¹(1 − c).
/// </summary>
public sealed record GaussianLaw : ContinuousLaw
{
    private GaussianLaw(double sigma) => Sigma = sigma;

    /// <summary>The standard deviation σ &gt; 0, in the unit of the figure.</summary>
    public double Sigma { get; }

    /// <inheritdoc/>
    public override double Variance => Sigma * Sigma;

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation => Sigma * Math.Sqrt(2 / Math.PI);

    internal override bool IsLogConcave => true;

    /// <summary>The law with a standard deviation.</summary>
    /// <param name="sigma">σ &gt; 0, finite, in the unit of the figure.</param>
    /// <exception cref="ArgumentOutOfRangeException">Sigma is not a finite number above 0.</exception>
    public static GaussianLaw Of(double sigma) => new(Require.Positive(sigma, nameof(sigma), "the unit of the figure"));

    /// <inheritdoc/>
    public override double Density(double x) => Math.Exp(-0.5 * (x / Sigma) * (x / Sigma)) / (Sigma * Constants.Sqrt2Pi);

    /// <inheritdoc/>
    public override double Within(double w) => w < 0 ? 0 : SpecialFunctions.Erf(w / Sigma * Constants.Sqrt1Over2);

    internal override double TailRatio(double from, double distance) => from > GaussianTail.Far * Sigma
        ? GaussianTail.Ratio(from / Sigma, distance / Sigma)
        : base.TailRatio(from, distance);

    internal override double TailRatioFarOut(double distance) => distance > 0 ? 0 : 1;

    private protected override double TailFrom(double x) => 0.5 * SpecialFunctions.Erfc(x / Sigma * Constants.Sqrt1Over2);

    private protected override double Quantile(Coverage coverage) => Sigma * Constants.Sqrt2 * SpecialFunctions.ErfcInv(coverage.Rest);
}
