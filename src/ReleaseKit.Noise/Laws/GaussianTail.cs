namespace ReleaseKit.Noise.Laws;

/// <summary>Ratios of tails Q(z) of the standard normal law far out, where Q itself soon is too small for a double.</summary>
internal static class GaussianTail
{
    /// <summary>From so many standard deviations on.</summary>
    public const double Far = 8;

    /// <summary>
    /// Tails of the discrete law that fall by less than this share from step to step are taken as integrals from half a step before. Over a
    /// distance in which a tail falls to the rest of a coverage this errs by less than 1/s², and s is above 4e4 then.
    /// </summary>
    public const double FlattestSum = 2e-4;

    /// <summary>Q(z + distance) ÷ Q(z) for z ≥ 7.5 and a distance ≥ 0: Q(z) = φ(z)·M(z) with Mills' ratio M.</summary>
    public static double Ratio(double z, double distance) =>
        Math.Exp(-0.5 * distance * (z + z + distance)) * (Mills(z + distance) / Mills(z));

    // Laplace's continued fraction 1/(z + 1/(z + 2/(z + 3/(z + …; Abramowitz & Stegun 1964, 26.2.14 (from memory). So far out, sixty terms
    // leave less than 1e-16.
    private static double Mills(double z)
    {
        var rest = z;
        for (var term = 60; term > 0; term--)
            rest = z + term / rest;
        return 1 / rest;
    }
}
