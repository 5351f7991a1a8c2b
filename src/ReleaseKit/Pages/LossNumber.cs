using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>Amounts of privacy loss as pages print them: always rounded up, so that no loss looks smaller than it is.</summary>
public static class LossNumber
{
    private const int DigitsOfTotal = 4;
    private const int MostDecimals = 12;

    /// <summary>How many decimals an account is printed with, so that its total has four significant digits.</summary>
    public static int DecimalsFor(double total) =>
        total > 0 && double.IsFinite(total) ? Math.Clamp(DigitsOfTotal - 1 - (int)Math.Floor(Math.Log10(total)), 0, MostDecimals) : 0;

    /// <summary>The amount rounded up. It is first taken to 12 significant digits, so that all machines round alike.</summary>
    /// <param name="amount">Zero or more, finite.</param>
    /// <param name="decimals">Digits after the point, 0 to 12.</param>
    public static PublishedValue Up(double amount, int decimals)
    {
        var written = decimal.Parse(amount.ToString("G12", CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture);
        return new PublishedValue((long)Math.Ceiling(written * (decimal)PublishedValue.PowerOfTen(decimals)), (byte)decimals);
    }
}
