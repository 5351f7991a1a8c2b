using System.Globalization;

namespace ReleaseKit.Releases;

/// <summary>A published number exactly as the CSV gives it: Unscaled × 10^−Decimals. Never printed again from a double.</summary>
public readonly record struct PublishedValue(long Unscaled, byte Decimals)
{
    public double ToDouble() => Unscaled / PowerOfTen(Decimals);

    public bool IsNegative => Unscaled < 0;

    /// <summary>The number in the files' notation: "-12.50", ASCII minus, point, no group marks.</summary>
    public override string ToString()
    {
        if (Decimals == 0)
            return Unscaled.ToString(CultureInfo.InvariantCulture);
        var digits = Unscaled.ToString(CultureInfo.InvariantCulture).TrimStart('-').PadLeft(Decimals + 1, '0');
        return $"{(Unscaled < 0 ? "-" : "")}{digits[..^Decimals]}.{digits[^Decimals..]}";
    }

    /// <summary>10^decimals, exact up to 10^18 as far as a double holds it.</summary>
    public static double PowerOfTen(int decimals) => Math.Pow(10, decimals);
}
