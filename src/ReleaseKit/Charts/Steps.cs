namespace ReleaseKit.Charts;

/// <summary>Round steps for scales: 1, 2 or 5 times a power of ten.</summary>
internal static class Steps
{
    /// <summary>The smallest round step that cuts a length into at most so many parts, and the decimals its multiples need.</summary>
    public static (double Size, int Decimals) LabelStep(double length, int most)
    {
        var power = (int)Math.Floor(Math.Log10(length / most));
        int[] factors = [1, 2, 5, 10];
        var factor = factors.First(factor => factor * Math.Pow(10, power) * most >= length * (1 - 1e-9));
        return factor == 10 ? (Math.Pow(10, power + 1), Math.Max(0, -power - 1)) : (factor * Math.Pow(10, power), Math.Max(0, -power));
    }

    /// <summary>How many multiples of a step lie strictly between 0 and a length.</summary>
    public static int CountBelow(double length, double step) => (int)Math.Ceiling((length / step) - 1e-9) - 1;
}
