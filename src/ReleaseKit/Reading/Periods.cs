using System.Globalization;
using System.Text.RegularExpressions;

namespace ReleaseKit.Reading;

/// <summary>ISO 8601 periods: years, quarters (as SDMX writes them), months, weeks, days, and intervals of two of them.</summary>
internal static partial class Periods
{
    public static bool IsPeriod(string text) => text.Split('/') switch
    {
        [var one] => IsSingle(one),
        [var from, var to] => IsSingle(from) && IsSingle(to) && string.CompareOrdinal(from, to) <= 0,
        _ => false,
    };

    /// <summary>Whether a row heading reads like a period, written as ISO 8601 has it or not: 2031-Q1, 2031, 2030/31, Q1 2031; years of the last and the next century alone.</summary>
    public static bool ReadsLikePeriod(string text) => Like.IsMatch(text.Trim());

    private static bool IsSingle(string text) =>
        Form.IsMatch(text) && (text.Length != 10 || DateOnly.TryParseExact(text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out _));

    [GeneratedRegex(@"^\d{4}(-Q[1-4]|-W(0[1-9]|[1-4]\d|5[0-3])|-(0[1-9]|1[0-2])(-\d{2})?)?$")]
    private static partial Regex Form { get; }

    [GeneratedRegex(@"^((19|20|21)\d\d([ -]?[QHMW]\d{1,2}|[ /-]\d\d(-\d\d)?|[/-](19|20|21)\d\d|-\d\d(-\d\d)?/(19|20|21)\d\d-\d\d(-\d\d)?)?|[QH][1-4][ -](19|20|21)\d\d)$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Like { get; }
}
