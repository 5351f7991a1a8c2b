namespace ReleaseKit.Privacy.Losses;

/// <summary>How many whole steps of a grid a length holds: 0.3 ÷ 0.1 is 3, as it is in decimal.</summary>
internal static class GridSteps
{
    private const double Close = 1e-9;

    /// <summary>The whole steps that fit.</summary>
    public static double Down(double length, double grid) => IsWhole(length / grid) ? Math.Round(length / grid) : Math.Floor(length / grid);

    /// <summary>The whole steps that reach at least as far: none for a length of 0 only.</summary>
    public static double Up(double length, double grid) => length > 0 && IsWhole(length / grid) ? Math.Max(1, Math.Round(length / grid)) : Math.Ceiling(length / grid);

    private static bool IsWhole(double quotient) => Math.Abs(quotient - Math.Round(quotient)) <= Close * Math.Max(1, Math.Abs(quotient));
}
