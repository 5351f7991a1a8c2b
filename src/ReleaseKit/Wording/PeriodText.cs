using System.Globalization;
using System.Text.RegularExpressions;

namespace ReleaseKit.Wording;

/// <summary>ISO 8601 periods in words: "2031", "March 2031", "January to March 2031", "1 January 2031 to 30 June 2031".</summary>
public static partial class PeriodText
{
    /// <summary>The period in words; as written, if it is no period of a form known here.</summary>
    public static string Of(string iso, ILanguage language) => iso.Split('/') switch
    {
        [var one] => Single(one, language) ?? iso,
        [var first, var last] when IsWholeYear(first, last) => first[..4],
        [var first, var last] when (Single(first, language), Single(last, language)) is ({ } from, { } to) =>
            language.Text("period.between", ("from", from), ("to", to)),
        _ => iso,
    };

    private static bool IsWholeYear(string first, string last) =>
        first.EndsWith("-01-01", StringComparison.Ordinal) && last == string.Concat(first.AsSpan(0, first.Length - 6), "-12-31");

    private static string? Single(string iso, ILanguage language)
    {
        if (DateOnly.TryParseExact(iso, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var day))
            return language.Date(day);
        var parts = YearAndPart().Match(iso);
        if (!parts.Success)
            return null;
        var year = parts.Groups["year"].Value;
        if (parts.Groups["quarter"] is { Success: true } quarter)
            return language.Text($"period.quarter.{quarter.Value}", ("year", year));
        if (parts.Groups["month"] is not { Success: true } month)
            return year;
        var number = int.Parse(month.Value, CultureInfo.InvariantCulture);
        return number is < 1 or > 12 ? null : language.Text("period.month", ("month", language.Text(MonthKey(number))), ("year", year));
    }

    private static string MonthKey(int month) => "date.month." + month.ToString(CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^(?<year>\d{4})(-Q(?<quarter>[1-4])|-(?<month>\d{2}))?$")]
    private static partial Regex YearAndPart();
}
