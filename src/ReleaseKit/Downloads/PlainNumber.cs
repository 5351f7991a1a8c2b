using System.Globalization;

namespace ReleaseKit.Downloads;

/// <summary>Numbers for files: every digit of a double, never an exponent, ASCII minus, point.</summary>
internal static class PlainNumber
{
    /// <summary>The shortest digits that read back as the same double; empty for what is no number.</summary>
    public static string Of(double number)
    {
        if (!double.IsFinite(number))
            return "";
        var shortest = (number == 0 ? 0 : number).ToString("R", CultureInfo.InvariantCulture);
        var exponentAt = shortest.IndexOf('E', StringComparison.Ordinal);
        return exponentAt < 0 ? shortest : Expanded(shortest[..exponentAt], int.Parse(shortest.AsSpan(exponentAt + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture));
    }

    /// <summary>A coverage or chance rounded down to four decimals; what lies within 1e-12 of a step counts as on it.</summary>
    public static string RoundedDown(double share) =>
        (Math.Floor(Math.Round(share, 12) * 10_000) / 10_000).ToString("0.####", CultureInfo.InvariantCulture);

    private static string Expanded(string mantissa, int exponent)
    {
        var sign = mantissa[0] == '-' ? "-" : "";
        var digits = mantissa.TrimStart('-').Replace(".", "", StringComparison.Ordinal);
        return exponent < 0
            ? $"{sign}0.{new string('0', -exponent - 1)}{digits}"
            : $"{sign}{digits.PadRight(exponent + 1, '0')}";
    }
}
