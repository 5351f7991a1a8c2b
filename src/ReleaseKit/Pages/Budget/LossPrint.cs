using System.Globalization;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Budget;

/// <summary>
/// Privacy losses in print. A loss is never printed smaller than it is, nor a promise larger: losses are rounded up, what is authorised is
/// rounded down. All decisions are taken on numbers of twelve digits, so that the same digits come out on every machine.
/// </summary>
internal static class LossPrint
{
    private const int MostDecimals = 18;

    /// <summary>So many decimals, rounded up; never to nothing, however small.</summary>
    public static PublishedValue Up(double number, int decimals) => At(Math.Max(decimal.Ceiling(Scaled(number, decimals)), number > 0 ? 1 : decimal.MinValue), decimals);

    /// <summary>So many decimals, rounded down.</summary>
    public static PublishedValue Down(double number, int decimals) => At(decimal.Floor(Scaled(number, decimals)), decimals);

    /// <summary>So many significant digits, rounded up; whole numbers keep all their places.</summary>
    public static PublishedValue UpTo(double number, int digits) => Up(RoundedAbove(number, digits, decimal.Ceiling), DecimalsFor(number, digits));

    /// <summary>So many significant digits, rounded down.</summary>
    public static PublishedValue DownTo(double number, int digits) => Down(RoundedAbove(number, digits, decimal.Floor), DecimalsFor(number, digits));

    /// <summary>A delta: two significant digits rounded up, without idle zeros at the end.</summary>
    public static PublishedValue Delta(double delta) => Shortest(UpTo(delta, 2));

    /// <summary>The decimals that show so many significant digits of a number.</summary>
    public static int DecimalsFor(double number, int digits) =>
        number == 0 ? 0 : Math.Clamp(digits - 1 - (int)Math.Floor(Math.Log10(Math.Abs(number)) + 1e-12), 0, MostDecimals);

    /// <summary>A number as it was written: the shortest digits that stand for it; rounded up where it is too small for that.</summary>
    public static PublishedValue AsWritten(double number) =>
        PublishedValue.Shortest((decimal)number) is var written && number > 0 && written.Unscaled == 0 ? Up(number, MostDecimals) : written;

    /// <summary>Without idle zeros at the end.</summary>
    public static PublishedValue Shortest(PublishedValue value) => PublishedValue.Shortest(value.ToDecimal());

    /// <summary>The number, or the words for a bound that does not exist.</summary>
    public static string OrNoBound(double number, Func<double, PublishedValue> print, ILanguage language) =>
        double.IsFinite(number) && Math.Abs(number) < 1e12 ? language.Number(print(number)) : language.Text("budget.no-bound");

    // Above one, places before the point are rounded as well: 12,345 to three digits is 12,400.
    private static double RoundedAbove(double number, int digits, Func<decimal, decimal> round)
    {
        var places = (int)Math.Floor(Math.Log10(Math.Max(Math.Abs(number), 1)) + 1e-12) + 1 - digits;
        return places <= 0 ? number : (double)round(Digits12(number) / Power(places)) * (double)Power(places);
    }

    private static decimal Scaled(double number, int decimals) => Digits12(number) * Power(decimals);

    private static decimal Digits12(double number) =>
        decimal.Parse(number.ToString("E11", CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture);

    private static PublishedValue At(decimal unscaled, int decimals) => new((long)unscaled, (byte)decimals);

    private static decimal Power(int exponent)
    {
        var power = 1m;
        for (var times = 0; times < exponent; times++)
            power *= 10;
        return power;
    }
}
