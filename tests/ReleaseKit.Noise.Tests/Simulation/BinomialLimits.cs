using MathNet.Numerics;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>
/// Acceptance limits of a simulated coverage: exact binomial tails at error level 1e-6 (Clopper &amp; Pearson 1934, Biometrika 26, by
/// duality). Accept from the largest L with P(X &lt; L) ≤ level up to the smallest U with P(X &gt; U) ≤ level.
/// </summary>
internal static class BinomialLimits
{
    public const double Level = 1e-6;

    public static int AcceptFrom(int trials, double chance, double level) => Boundary(trials, hits => Below(hits, trials, chance) <= level);

    public static int AcceptTo(int trials, double chance, double level) => trials - AcceptFrom(trials, 1 - chance, level);

    /// <summary>Fails unless the hits of a known chance lie within the two-sided limits.</summary>
    public static void AssertTwoSided(int hits, int trials, double chance) =>
        Assert.InRange(hits, AcceptFrom(trials, chance, Level / 2), AcceptTo(trials, chance, Level / 2));

    // P(X < hits) = I(1 − p; n − hits + 1, hits).
    private static double Below(int hits, int trials, double chance) =>
        hits <= 0 || chance >= 1 ? 0 : chance <= 0 ? 1 : SpecialFunctions.BetaRegularized(trials - hits + 1, hits, 1 - chance);

    private static int Boundary(int trials, Func<int, bool> accepted)
    {
        var (holds, fails) = (0, trials + 1);
        while (fails - holds > 1)
        {
            var middle = (holds + fails) / 2;
            (holds, fails) = accepted(middle) ? (middle, fails) : (holds, middle);
        }
        return holds;
    }
}
