using ReleaseKit.Noise;

namespace ReleaseKit.Privacy.Composition;

/// <summary>
/// From ρ to (ε, δ) and back. "Simple" is Bun &amp; Steinke 2016, Proposition 1.3: ε = ρ + 2√(ρ ln(1/δ)). The others are
/// Canonne, Kamath &amp; Steinke 2020, Corollary 13: δ = inf over α &gt; 1 of e^((α−1)(αρ−ε)) ÷ (α − 1) · (1 − 1/α)^α. (Numbers of
/// propositions from memory.) Every α gives a valid bound, so that an inexact minimiser errs to the side of a larger loss.
/// </summary>
public static class ConcentratedConversion
{
    /// <summary>ε = ρ + 2√(ρ ln(1/δ)); infinite for δ = 0 and ρ &gt; 0.</summary>
    public static Epsilon SimpleEpsilonAt(Rho rho, Delta delta) =>
        rho == Rho.Zero ? Epsilon.Zero : Epsilon.Of(rho.Value + (2 * Math.Sqrt(rho.Value * -Math.Log(delta.Value))));

    /// <summary>The largest ρ whose simple conversion at δ is at most ε; 0 for δ = 0.</summary>
    public static Rho SimpleLargestRho(Epsilon epsilon, Delta delta)
    {
        if (!epsilon.IsFinite)
            return Rho.Infinite;
        var log = -Math.Log(delta.Value);
        var root = epsilon.Value / (Math.Sqrt(log + epsilon.Value) + Math.Sqrt(log));
        return epsilon == Epsilon.Zero ? Rho.Zero : Rho.Of(root * root);
    }

    /// <summary>The δ that ρ gives at ε, at most 1.</summary>
    public static Delta DeltaAt(Rho rho, Epsilon epsilon)
    {
        if (rho == Rho.Zero || !epsilon.IsFinite)
            return rho.IsFinite ? Delta.Zero : Delta.One;
        return rho.IsFinite ? Delta.AtMost(Math.Exp(LogDelta(rho.Value, epsilon.Value, BestOrder(rho.Value, epsilon.Value)))) : Delta.One;
    }

    /// <summary>The smallest ε ≥ 0 that ρ gives at δ; infinite for δ = 0 and ρ &gt; 0.</summary>
    public static Epsilon EpsilonAt(Rho rho, Delta delta)
    {
        if (rho == Rho.Zero || delta == Delta.One)
            return Epsilon.Zero;
        if (delta == Delta.Zero || !rho.IsFinite)
            return Epsilon.Infinite;
        return Epsilon.Of(Descend(rho.Value, Math.Log(delta.Value), SimpleEpsilonAt(rho, delta).Value));
    }

    /// <summary>The largest ρ whose conversion at δ is at most ε; 0 for δ = 0, infinite for δ = 1 or an infinite ε.</summary>
    public static Rho LargestRho(Epsilon epsilon, Delta delta)
    {
        if (delta == Delta.One || !epsilon.IsFinite)
            return Rho.Infinite;
        if (delta == Delta.Zero)
            return Rho.Zero;
        return Rho.Of(Ascend(epsilon.Value, Math.Log(delta.Value)));
    }

    /// <summary>The order α at which the conversion of ρ at ε is smallest: to follow it with a calculator.</summary>
    /// <exception cref="ArgumentOutOfRangeException">ρ is 0 or infinite, or ε infinite: there is no such order.</exception>
    public static double OrderAt(Rho rho, Epsilon epsilon) => rho is { IsFinite: true, Value: > 0 } && epsilon.IsFinite
        ? BestOrder(rho.Value, epsilon.Value)
        : throw new ArgumentOutOfRangeException(nameof(rho), rho, "The conversion of 0 or of no bound has no order.");

    // ln δ is a minimum of lines in ε, so concave: Newton's steps from above stay above the root and never pass it.
    private static double Descend(double rho, double logDelta, double epsilon)
    {
        for (var step = 0; step < 100 && epsilon > 0; step++)
        {
            var order = BestOrder(rho, epsilon);
            var next = epsilon + ((LogDelta(rho, epsilon, order) - logDelta) / (order - 1));
            if (!(next < epsilon))
                return epsilon;
            epsilon = Math.Max(0, next);
        }

        return epsilon;
    }

    // The same in ρ from below: every value on the way is one whose conversion still meets δ.
    private static double Ascend(double epsilon, double logDelta)
    {
        var rho = Math.Max(SimpleLargestRho(Epsilon.Of(epsilon), Delta.Of(Math.Exp(logDelta))).Value, 1e-300);
        for (var step = 0; step < 100; step++)
        {
            var order = BestOrder(rho, epsilon);
            var next = rho + ((logDelta - LogDelta(rho, epsilon, order)) / (order * (order - 1)));
            if (!(next > rho))
                return rho;
            rho = next;
        }

        return rho;
    }

    private static double LogDelta(double rho, double epsilon, double order) =>
        ((order - 1) * ((order * rho) - epsilon)) - Math.Log(order - 1) + (order * LogOneLessReciprocal(order));

    // The stationary order: (2α − 1)ρ − ε + ln(1 − 1/α) = 0, whose left side rises in α from −∞ to ∞. Bisection in ln(α − 1).
    private static double BestOrder(double rho, double epsilon)
    {
        var (low, high) = (-700.0, Math.Log((epsilon / (2 * rho)) + (1 / rho) + 2));
        for (var step = 0; step < 80; step++)
        {
            var middle = (low + high) / 2;
            var order = 1 + Math.Exp(middle);
            (low, high) = ((2 * order) - 1) * rho - epsilon + LogOneLessReciprocal(order) < 0 ? (middle, high) : (low, middle);
        }

        return 1 + Math.Exp(high);
    }

    // ln(1 − 1/α), without cancellation for large α.
    private static double LogOneLessReciprocal(double order) => Elementary.Log1P(-1 / order);
}
