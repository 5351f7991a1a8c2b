namespace ReleaseKit.Noise;

/// <summary>Whole numbers of grid steps held in doubles: 0.3 ÷ 0.1 is 3 here, as it is in decimal.</summary>
internal static class Lattice
{
    /// <summary>Up to here a double holds every whole number and every half.</summary>
    public const long Exact = 1L << 52;

    /// <summary>Steps beyond this are treated as infinitely far away.</summary>
    public const long Farthest = 1L << 62;

    public static bool IsWhole(double quotient) => Math.Abs(quotient - Math.Round(quotient)) <= Tolerance(quotient);

    /// <summary>The largest whole number not above a quotient.</summary>
    public static double Floor(double quotient) => IsWhole(quotient) ? Math.Round(quotient) : Math.Floor(quotient);

    /// <summary>The smallest whole number not below a quotient.</summary>
    public static double Ceiling(double quotient) => IsWhole(quotient) ? Math.Round(quotient) : Math.Ceiling(quotient);

    /// <summary>A whole double as a step, kept within ± <see cref="Farthest"/>.</summary>
    public static long ToStep(double whole) => (long)Math.Clamp(whole, -Farthest, Farthest);

    // A quotient of two decimals is off by a few units in its last place; 1e-9 is far above that and far below a step.
    private static double Tolerance(double quotient) =>
        double.IsFinite(quotient) ? Math.Max(1e-9, 4 * (Math.BitIncrement(Math.Abs(quotient)) - Math.Abs(quotient))) : 0;
}
