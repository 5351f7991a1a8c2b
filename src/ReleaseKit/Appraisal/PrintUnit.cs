using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>
/// The unit u = 10^exponent to which the numbers of one figure are printed. All work is in decimal arithmetic on numbers rounded to 12 digits,
/// so that the same digits come out on every machine; only the ends of ranges of large figures need more.
/// </summary>
internal readonly record struct PrintUnit(int Exponent)
{
    private const int Digits = 12;
    private const int MostDigits = 15;
    private const int MostDigitsOfEnd = MostDigits + 1;

    public static PrintUnit One { get; } = new(0);

    /// <summary>The unit that leaves a margin two digits, but no finer than so many decimals.</summary>
    public static PrintUnit OfTwoDigits(decimal margin, int? decimals)
    {
        var leading = margin == 0 ? 0 : LeadingPlace(margin);
        return new(Math.Max(leading - 1, decimals is { } finest ? -finest : int.MinValue));
    }

    /// <summary>A number of the arithmetic as a decimal of 12 significant digits.</summary>
    /// <exception cref="OverflowException">It is infinite or beyond what can be printed.</exception>
    public static decimal Rounded(double number) => Rounded(number, Digits);

    /// <summary>The end of a range, times a factor, with enough digits to tell on which side of a unit it lies.</summary>
    public decimal Rounded(double end, decimal factor)
    {
        var place = end == 0 ? 0 : LeadingPlace(Math.Abs(Rounded(end) * factor));
        return Rounded(end, Math.Clamp(place - Exponent + 3, Digits, MostDigitsOfEnd)) * factor;
    }

    /// <summary>This unit, or the finest to which a double holds the number.</summary>
    public PrintUnit ThatHolds(decimal number) =>
        number == 0 ? this : new(Math.Max(Exponent, LeadingPlace(Math.Abs(number)) - MostDigits + 1));

    private static decimal Rounded(double number, int digits)
    {
        Span<char> written = stackalloc char[32];
        number.TryFormat(written, out var length, $"E{digits - 1}", CultureInfo.InvariantCulture);
        return decimal.Parse(written[..length], NumberStyles.Float, CultureInfo.InvariantCulture);
    }

    public decimal Nearest(decimal number) => decimal.Round(Steps(number), 0, MidpointRounding.AwayFromZero);

    public decimal Down(decimal number) => decimal.Floor(Steps(number));

    public decimal Up(decimal number) => decimal.Ceiling(Steps(number));

    /// <summary>So many units as a number with the digits of the unit.</summary>
    public PublishedValue Print(decimal steps) => Exponent >= 0
        ? new((long)(steps * Power(Exponent)), 0)
        : new((long)steps, (byte)-Exponent);

    public decimal Value(decimal steps) => Exponent >= 0 ? steps * Power(Exponent) : steps / Power(-Exponent);

    private decimal Steps(decimal number) => Exponent >= 0 ? number / Power(Exponent) : number * Power(-Exponent);

    private static int LeadingPlace(decimal positive)
    {
        var place = 0;
        for (; positive >= 10; positive /= 10)
            place++;
        for (; positive < 1; positive *= 10)
            place--;
        return place;
    }

    private static decimal Power(int exponent)
    {
        var power = 1m;
        for (var step = 0; step < exponent; step++)
            power *= 10;
        return power;
    }
}
