namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The staircase law: a density of steps, a on [0, γΔ), a·e^−ε on [γΔ, Δ), times e^(−kε) on [kΔ, (k + 1)Δ), symmetric,
/// with a = (1 − e^−ε) ÷ (2Δ(γ + e^−ε(1 − γ))). Geng &amp; Viswanath 2014, The optimal mechanism in differential privacy (equation from
/// memory; the reference values integrate it to 1).
/// </summary>
public sealed record StaircaseLaw : ContinuousLaw
{
    // e^−ε; its distance from 1; the density a at 0; the lengths γΔ and (1 − γ)Δ of the higher and the lower part of a step.
    private readonly double ratio, drop, top, high, low;

    private StaircaseLaw(double epsilon, double sensitivity, double gamma)
    {
        (Epsilon, Sensitivity, Gamma) = (epsilon, sensitivity, gamma);
        (ratio, drop) = (Math.Exp(-epsilon), -Elementary.ExpM1(-epsilon));
        (high, low) = (gamma * sensitivity, (1 - gamma) * sensitivity);
        top = drop / (2 * (high + ratio * low));
    }

    /// <summary>The height ratio of neighbouring steps is e^−ε; ε &gt; 0, a pure number.</summary>
    public double Epsilon { get; }

    /// <summary>The length Δ &gt; 0 of a step, in the unit of the figure.</summary>
    public double Sensitivity { get; }

    /// <summary>The share γ of a step that keeps the higher density, 0 ≤ γ ≤ 1.</summary>
    public double Gamma { get; }

    /// <inheritdoc/>
    public override double Variance
    {
        get
        {
            // Σ k^p e^(−kε) for p = 0, 1, 2, and the integral of x² over each part of step k, which starts at kΔ.
            var (s0, s1, s2) = (1 / drop, ratio / (drop * drop), ratio * (1 + ratio) / (drop * drop * drop));
            var step = Sensitivity;
            var higher = s2 * step * step * high + s1 * step * high * high + s0 * high * high * high / 3;
            var lower = s2 * step * step * low + s1 * step * low * (step + high) + s0 * low * (step * step + step * high + high * high) / 3;
            return 2 * top * (higher + ratio * lower);
        }
    }

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation
    {
        get
        {
            var (s0, s1) = (1 / drop, ratio / (drop * drop));
            var higher = s1 * Sensitivity * high + s0 * high * high / 2;
            var lower = s1 * Sensitivity * low + s0 * low * (Sensitivity + high) / 2;
            return 2 * top * (higher + ratio * lower);
        }
    }

    internal override bool IsLogConcave => false;

    /// <summary>The law with its three parameters.</summary>
    /// <param name="epsilon">ε &gt; 0, finite, a pure number.</param>
    /// <param name="sensitivity">Δ &gt; 0, finite, in the unit of the figure.</param>
    /// <param name="gamma">γ from 0 to 1, a pure number.</param>
    /// <exception cref="ArgumentOutOfRangeException">A parameter is outside its range.</exception>
    public static StaircaseLaw Of(double epsilon, double sensitivity, double gamma) => new(
        Require.Positive(epsilon, nameof(epsilon), "no unit"),
        Require.Positive(sensitivity, nameof(sensitivity), "the unit of the figure"),
        Require.Share(gamma, nameof(gamma)));

    /// <inheritdoc/>
    public override double Density(double x)
    {
        var (step, past) = StepAt(Math.Abs(x));
        return top * Math.Exp(-Epsilon * (past < high ? step : step + 1));
    }

    private protected override double TailFrom(double x)
    {
        if (double.IsPositiveInfinity(x))
            return 0;
        var (step, past) = StepAt(x);
        var passed = 2 * top * (Math.Min(past, high) + ratio * Math.Max(0, past - high));
        return 0.5 * Math.Exp(-Epsilon * step) * (1 - passed);
    }

    private protected override double Quantile(Coverage coverage)
    {
        // P(|N| > kΔ) = e^(−kε): the step in which the tail falls to the rest, then the place inside it, where the density is flat.
        var step = Math.Floor(-Math.Log(coverage.Rest) / Epsilon);
        var toPass = 1 - coverage.Rest * Math.Exp(Epsilon * step);
        var inHigh = toPass / (2 * top);
        return step * Sensitivity + (inHigh <= high ? Math.Max(0, inHigh) : high + (toPass - 2 * top * high) / (2 * top * ratio));
    }

    private (double Step, double Past) StepAt(double x)
    {
        var step = Math.Floor(x / Sensitivity);
        return (step, Math.Max(0, x - step * Sensitivity));
    }
}
