using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>
/// A number cut where the noise begins to reach its digits. Within the margin, the number made by the heavy digits moves by at most one.
/// </summary>
/// <param name="Heavy">The part that holds; empty if the noise reaches every digit.</param>
/// <param name="Light">The part within reach of the noise; empty for a margin of zero.</param>
public readonly record struct LightDigits(string Heavy, string Light)
{
    /// <summary>Cuts a number as a language writes it in tables.</summary>
    /// <param name="text">The number: minus sign, digits with group marks and point.</param>
    /// <param name="range">Its value and margins as printed; of uneven margins the larger counts.</param>
    public static LightDigits Of(string text, PrintedRange range)
    {
        var cut = range.Margin.Unscaled == 0 ? text.Length : CutAt(text, range);
        return new(text[..cut], text[cut..]);
    }

    /// <summary>A digit of place value 10^k is light if k ≤ p, the leading place of the margin; group marks and the point follow the digit to their left.</summary>
    private static int CutAt(string text, PrintedRange range)
    {
        var light = LeadingPlace(range.Margin) + range.Value.Decimals + 1;
        var cut = text.Length;
        for (var at = text.Length - 1; at >= 0 && light > 0; at--)
            if (char.IsAsciiDigit(text[at]))
                (cut, light) = (at, light - 1);
        return MinusIsLight(range) ? 0 : cut;
    }

    /// <summary>A minus sign is light if zero is in reach: then every digit is light too.</summary>
    private static bool MinusIsLight(PrintedRange range) =>
        range.Value.IsNegative && range.Value.ToDecimal() + range.Margin.ToDecimal() >= 0;

    private static int LeadingPlace(PublishedValue margin) =>
        margin.Unscaled.ToString(CultureInfo.InvariantCulture).Length - 1 - margin.Decimals;
}
