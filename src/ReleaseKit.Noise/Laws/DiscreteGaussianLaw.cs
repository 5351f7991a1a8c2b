using MathNet.Numerics;

namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The discrete Gaussian law: P(K = k) ∝ e^(−k²/2s²) on all whole numbers, s = σ ÷ grid. σ is the parameter; the standard deviation is a
/// little smaller for s below about 1. Canonne, Kamath &amp; Steinke 2020, The discrete Gaussian for differential privacy, Definition 1
/// (numbering from memory).
/// </summary>
/// <remarks>
/// Narrow laws (s &lt; 8) are summed term by term. For wide ones the normaliser is s√(2π) to 1e-500 (Poisson summation) and a tail sum is
/// its integral from half a step before with six terms of the Euler–Maclaurin midpoint formula; the rest is below 1e-19 absolute, and
/// below 1e-9 relative out to ten sigmas.
/// </remarks>
public sealed record DiscreteGaussianLaw : LatticeLaw
{
    private const double Wide = 8;

    // (−1)^j times the coefficients of the midpoint formula, −B₂ⱼ(½)/(2j)!: 1/24, 7/5760, 31/967680, … (Abramowitz & Stegun 1964, 23.1;
    // from memory).
    private static readonly double[] Midpoint =
    [
        -1.0 / 24, 7.0 / 5760, -31.0 / 967680, 127.0 / 154828800, -73.0 / 3503554560, 1414477.0 / 2678117105664000,
    ];

    private readonly double width, whole;

    private DiscreteGaussianLaw(double sigma, double grid)
        : base(grid)
    {
        (Sigma, width) = (sigma, sigma / grid);
        whole = width >= Wide ? width * Constants.Sqrt2Pi : 1 + 2 * SumFrom(1, 0);
        Variance = width >= Wide ? sigma * sigma : 2 * SumFrom(1, 2) / whole * grid * grid;
        MeanAbsoluteDeviation = 2 * (width >= Wide ? WideFirstMoment() : SumFrom(1, 1)) / whole * grid;
    }

    /// <summary>The parameter σ &gt; 0, in the unit of the figure.</summary>
    public double Sigma { get; }

    /// <inheritdoc/>
    public override double Variance { get; }

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation { get; }

    internal override bool IsLogConcave => true;

    /// <summary>The law with a parameter sigma on a grid.</summary>
    /// <param name="sigma">σ &gt; 0, finite, in the unit of the figure.</param>
    /// <param name="grid">g &gt; 0, finite, in the unit of the figure.</param>
    /// <exception cref="ArgumentOutOfRangeException">A parameter is not a finite number above 0.</exception>
    public static DiscreteGaussianLaw Of(double sigma, double grid = 1) =>
        new(Require.Positive(sigma, nameof(sigma), "the unit of the figure"), grid);

    /// <inheritdoc/>
    public override double Probability(long step) => Weight(step) / whole;

    internal override double TailRatio(double from, double distance)
    {
        if (from <= GaussianTail.Far * width)
            return base.TailRatio(from, distance);
        if (from / width / width < GaussianTail.FlattestSum)
            return GaussianTail.Ratio((from - 0.5) / width, distance / width);
        var fall = Math.Exp(-0.5 * (distance / width) * ((from + from + distance) / width));
        return fall == 0 ? 0 : fall * (SumPast(from + distance) / SumPast(from));
    }

    internal override double TailRatioFarOut(double distance) => distance > 0 ? 0 : 1;

    private protected override double TailFrom(long step) => width >= Wide ? WideTail((step - 0.5) / width) : SumFrom(step, 0) / whole;

    private double Weight(double step) => Math.Exp(-0.5 * (step / width) * (step / width));

    // Σ k^power·e^(−k²/2s²) over k ≥ from, power 0 to 2; the terms fall from k = 2s on, until they no longer count.
    private double SumFrom(long from, int power)
    {
        var sum = 0.0;
        for (var k = (double)from; ; k++)
        {
            var term = (power == 0 ? 1 : power == 1 ? k : k * k) * Weight(k);
            sum += term;
            if (term == 0 || (term < 1e-18 * sum && k > 2 * width))
                return sum;
        }
    }

    // Σ e^(−k²/2s²) over k ≥ from ÷ its first term, for a place far out, where the terms fall as fast as a geometric series.
    private double SumPast(double from)
    {
        var sum = 0.0;
        for (var i = 0.0; ; i++)
        {
            var term = Math.Exp(-0.5 * (i / width) * ((from + from + i) / width));
            sum += term;
            if (term < 1e-18 * sum)
                return sum;
        }
    }

    // Standardised place u, half a step before the first term: Q(u) + φ(u)/s · Σ ± cⱼ He₂ⱼ₋₁(u)/s^(2j−1).
    private double WideTail(double u)
    {
        var (correction, lower, hermite) = (0.0, 1.0, u);
        var power = 1 / width;
        for (var j = 0; j < Midpoint.Length; j++)
        {
            correction += Midpoint[j] * power * hermite;
            // Heₙ₊₁ = u·Heₙ − n·Heₙ₋₁, two orders on.
            var n = 2 * j + 1;
            var next = u * hermite - n * lower;
            (lower, hermite) = (next, u * next - (n + 1) * hermite);
            power /= width * width;
        }
        return 0.5 * SpecialFunctions.Erfc(u * Constants.Sqrt1Over2) + correction / width * Math.Exp(-0.5 * u * u) / Constants.Sqrt2Pi;
    }

    // Σ k·e^(−k²/2s²) over k ≥ 1 by the Euler–Maclaurin formula at 0: s² − 1/12 − 1/(240s²) − 1/(2016s⁴) − 1/(11520s⁶).
    private double WideFirstMoment()
    {
        var inverse = 1 / (width * width);
        return width * width - 1.0 / 12 - inverse * (1.0 / 240 + inverse * (1.0 / 2016 + inverse / 11520));
    }
}
