using System.Globalization;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>Numbers of a calculation: at most twelve significant digits, "∞" for no bound.</summary>
internal static class Signs
{
    public static string Of(double value) => double.IsPositiveInfinity(value) ? "∞" : value.ToString("G12", CultureInfo.InvariantCulture);

    /// <summary>"0.1 + 0.2 + 0.3"; "0" for an empty list.</summary>
    public static string Plus(IEnumerable<string> parts) => string.Join(" + ", parts) is { Length: > 0 } sum ? sum : "0";
}
