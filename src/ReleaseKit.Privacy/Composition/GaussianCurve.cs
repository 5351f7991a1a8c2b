using MathNet.Numerics.Integration;

namespace ReleaseKit.Privacy.Composition;

/// <summary>
/// The exact curve of Gaussian noise, μ = Δ₂/σ: δ(ε) = Φ(μ/2 − ε/μ) − e^ε Φ(−μ/2 − ε/μ). Balle &amp; Wang 2018, Theorem 8 (number from memory).
/// </summary>
/// <param name="Mu">Euclidean shift ÷ sigma, a finite number from 0.</param>
public sealed record GaussianCurve(double Mu) : PrivacyCurve
{
    private static readonly Delta Negligible = Delta.Of(1e-18);

    /// <summary>ρ = μ²/2 of the same noise. Bun &amp; Steinke 2016, Proposition 1.6 (number from memory).</summary>
    public Rho Rho => Rho.Of(Mu * Mu / 2);

    /// <inheritdoc/>
    public override Epsilon LastUseful => EpsilonAt(Negligible);

    /// <summary>The largest μ whose δ at ε is at most the given one, rounded down; infinite for δ = 1.</summary>
    public static double LargestMu(Epsilon epsilon, Delta delta)
    {
        if (delta == Delta.One || !epsilon.IsFinite)
            return double.PositiveInfinity;
        var high = 1.0;
        while (new GaussianCurve(high).DeltaAt(epsilon) <= delta)
            high *= 2;
        return Bisection.LastThat(mu => new GaussianCurve(mu).DeltaAt(epsilon) <= delta, 0, high);
    }

    /// <inheritdoc/>
    public override Delta DeltaAt(Epsilon epsilon)
    {
        if (Mu == 0 || !epsilon.IsFinite)
            return Delta.Zero;
        var (from, to) = ((epsilon.Value / Mu) - (Mu / 2), (epsilon.Value / Mu) + (Mu / 2));
        return Delta.AtMost(Mu <= 1 ? NormalTail.Density(from) * MillsFall(from, to) : TailDifference(from, to));
    }

    /// <inheritdoc/>
    public override Epsilon EpsilonAt(Delta delta)
    {
        if (DeltaAt(Epsilon.Zero) <= delta)
            return Epsilon.Zero;
        if (delta == Delta.Zero)
            return Epsilon.Infinite;
        var high = 1.0;
        while (DeltaAt(Epsilon.Of(high)) > delta)
            high *= 2;
        return Epsilon.Of(Bisection.FirstThat(epsilon => DeltaAt(Epsilon.Of(epsilon)) <= delta, 0, high));
    }

    // e^ε φ(to) = φ(from), so δ = φ(from)·(Mills(from) − Mills(to)): an integral of its slope, without cancellation for small μ.
    private static double MillsFall(double from, double to) => GaussLegendreRule.Integrate(NormalTail.MillsSlope, from, to, 20);

    private static double TailDifference(double from, double to) => from < 0
        ? NormalTail.Above(from) - (NormalTail.Density(from) * NormalTail.Mills(to))
        : NormalTail.Density(from) * (NormalTail.Mills(from) - NormalTail.Mills(to));
}
