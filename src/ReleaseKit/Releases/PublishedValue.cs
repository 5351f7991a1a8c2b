using System.Globalization;

namespace ReleaseKit.Releases;

/// <summary>A published number exactly as the CSV gives it: Unscaled × 10^−Decimals. Never printed again from a double.</summary>
public readonly record struct PublishedValue(long Unscaled, byte Decimals)
{
    public double ToDouble() => Unscaled / PowerOfTen(Decimals);

    public bool IsNegative => Unscaled < 0;

    /// <summary>The same number in decimal arithmetic, exactly; its scale is <see cref="Decimals"/>.</summary>
    public decimal ToDecimal()
    {
        var magnitude = unchecked((ulong)(IsNegative ? -Unscaled : Unscaled));
        return new decimal(unchecked((int)magnitude), unchecked((int)(magnitude >> 32)), 0, IsNegative, Decimals);
    }

    /// <summary>The number with the digits it is written with: 2.50 keeps two.</summary>
    /// <exception cref="OverflowException">The digits do not fit into 64 bits.</exception>
    public static PublishedValue Of(decimal number)
    {
        var scale = number.Scale;
        return new((long)(number * PowerOfTenExactly(scale)), scale);
    }

    public bool IsWhole => ToDecimal() == decimal.Floor(ToDecimal());

    /// <summary>The number times a factor, exactly; digits after the point that the factor moved before it are gone: 12.4 × 1000 is 12400.</summary>
    public PublishedValue Times(double factor)
    {
        if (factor == 1)
            return this;
        var product = Shortest(ToDecimal() * (decimal)factor);
        var kept = Math.Max(0, Decimals - (int)Math.Floor(Math.Log10(factor)));
        return product.Decimals >= kept ? product : product.RoundedTo(kept);
    }

    /// <summary>The number to so many decimals, ties away from zero; fewer than it has are filled up with zeros.</summary>
    public PublishedValue RoundedTo(int decimals)
    {
        var rounded = decimal.Round(ToDecimal(), decimals, MidpointRounding.AwayFromZero);
        return new((long)(rounded * PowerOfTenExactly(decimals)), (byte)decimals);
    }

    /// <summary>The number in as few digits as it takes: 2.50 becomes 2.5.</summary>
    public static PublishedValue Shortest(decimal number) => Of(number / 1.0000000000000000000000000000m);

    private static decimal PowerOfTenExactly(int exponent)
    {
        var power = 1m;
        for (var step = 0; step < exponent; step++)
            power *= 10;
        return power;
    }

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
