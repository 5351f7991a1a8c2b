namespace ReleaseKit.Privacy.Composition;

/// <summary>From a pure loss to a concentrated one.</summary>
public static class PureConversion
{
    /// <summary>ρ = ε²/2. Bun &amp; Steinke 2016, Proposition 1.4 (from memory).</summary>
    public static Rho QuadraticRho(Epsilon epsilon) => Rho.Of(epsilon.Value * epsilon.Value / 2);

    /// <summary>
    /// ρ = ε·tanh(ε/2), attained by binary randomised response and never above ε²/2. The loss of order α of the worst pair,
    /// ln(cosh((α − ½)ε) ÷ cosh(ε/2)) ÷ (α − 1), divided by α is largest as α falls to 1, where it is this. Derived.
    /// </summary>
    public static Rho SmallestRho(Epsilon epsilon) => epsilon.IsFinite ? Rho.Of(epsilon.Value * Math.Tanh(epsilon.Value / 2)) : Rho.Infinite;

    /// <summary>The largest ε whose <see cref="SmallestRho"/> is at most ρ, rounded down.</summary>
    public static Epsilon LargestEpsilon(Rho rho)
    {
        if (!rho.IsFinite)
            return Epsilon.Infinite;
        var (low, high) = (0.0, rho.Value + Math.Sqrt(2 * rho.Value) + 2);
        for (var step = 0; step < 200 && low < high; step++)
        {
            var middle = low + ((high - low) / 2);
            (low, high) = middle * Math.Tanh(middle / 2) <= rho.Value ? (middle, high) : (low, middle);
        }

        return Epsilon.Of(low);
    }
}
