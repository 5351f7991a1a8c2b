using System.Globalization;

namespace ReleaseKit.Privacy.Losses;

/// <summary>Numbers as they stand in a calculation: at most twelve significant digits, no exponent that a reader must decode.</summary>
internal static class Signs
{
    private const double SmallestPlain = 1e-15;
    private const double LargestPlain = 1e15;

    /// <summary>"0.00554016620499", "0.000000001", "1.5 × 10^−20", "∞".</summary>
    public static string Of(double value)
    {
        if (double.IsPositiveInfinity(value))
            return "∞";
        var digits = value.ToString("G12", CultureInfo.InvariantCulture);
        if (value == 0 || !digits.Contains('E', StringComparison.Ordinal))
            return digits;
        if (Math.Abs(value) is >= SmallestPlain and <= LargestPlain)
            return decimal.Parse(digits, NumberStyles.Float, CultureInfo.InvariantCulture).ToString(CultureInfo.InvariantCulture);
        var parts = digits.Split('E');
        return $"{parts[0]} × 10^{int.Parse(parts[1], NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture).ToString(CultureInfo.InvariantCulture).Replace('-', '−')}";
    }

    /// <summary>"0.1 + 0.2 + 0.3"; "0" for an empty list.</summary>
    public static string Plus(IEnumerable<string> parts) => string.Join(" + ", parts) is { Length: > 0 } sum ? sum : "0";
}
