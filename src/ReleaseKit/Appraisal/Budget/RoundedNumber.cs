using System.Globalization;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>A declared number that is a computed one, rounded to the digits that were declared.</summary>
internal static class RoundedNumber
{
    private const double Tolerance = 1e-9;
    private const double FurthestRounding = 0.05;
    private const int MostDecimals = 28;

    /// <summary>Whether a number, rounded to the declared digits and not far from it, is the declared one.</summary>
    public static bool Is(double declared, double value)
    {
        if (!(declared > 0) || !double.IsFinite(value) || Math.Abs(value - declared) > FurthestRounding * value)
            return false;
        return DecimalsOf(declared) is > 0 and <= MostDecimals and var decimals
            ? Math.Round((decimal)value, decimals, MidpointRounding.AwayFromZero) == (decimal)declared
            : Math.Abs(value - declared) <= Tolerance * declared;
    }

    // "0.0054" has 4, "5.4E-07" has 8.
    private static int DecimalsOf(double declared)
    {
        var parts = declared.ToString("R", CultureInfo.InvariantCulture).Split('E');
        var point = parts[0].IndexOf('.', StringComparison.Ordinal);
        var exponent = parts.Length > 1 ? int.Parse(parts[1], CultureInfo.InvariantCulture) : 0;
        return (point < 0 ? 0 : parts[0].Length - point - 1) - exponent;
    }
}
