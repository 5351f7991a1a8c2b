using System.Globalization;
using System.Text.RegularExpressions;

namespace ReleaseKit.Wording;

/// <summary>ISO 8601 periods in words: "2031", "March 2031", "week 1 of 2031", "January to June 2031", "1 January 2031 to 30 June 2031".</summary>
public static partial class PeriodText
{
    private const int MonthsOfQuarter = 3;

    /// <summary>The period in words; as written, if it is no period of a form known here.</summary>
    public static string Of(string iso, ILanguage language) => iso.Split('/') switch
    {
        [var one] => Single(one, language) ?? iso,
        [var first, var last] when IsWholeYear(first, last) => first[..4],
        [var first, var last] => WithinAYear(first, last, language) ?? Between(first, last, language) ?? iso,
        _ => iso,
    };

    private static bool IsWholeYear(string first, string last) =>
        first.EndsWith("-01-01", StringComparison.Ordinal) && last == string.Concat(first.AsSpan(0, first.Length - 6), "-12-31");

    private static string? Single(string iso, ILanguage language)
    {
        if (DateOnly.TryParseExact(iso, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var day))
            return language.Date(day);
        if (Week().Match(iso) is { Success: true } week)
            return language.Text("period.week", ("week", WeekOf(week)), ("year", week.Groups["year"].Value));
        if (MonthsOf(iso) is not var (year, first, last))
            return iso.Length == 4 && YearAndPart().IsMatch(iso) ? iso : null;
        return first == last ? Month(year, first, language) : Months(year, first, last, language);
    }

    /// <summary>Months, quarters or weeks of one year, with the year once; null for others.</summary>
    private static string? WithinAYear(string from, string to, ILanguage language)
    {
        if (MonthsOf(from) is var (year, first, _) && MonthsOf(to) is var (lastYear, _, last) && year == lastYear && first < last)
            return Months(year, first, last, language);
        return Week().Match(from) is { Success: true } one && Week().Match(to) is { Success: true } other && one.Groups["year"].Value == other.Groups["year"].Value
            ? language.Text("period.weeks", ("first", WeekOf(one)), ("last", WeekOf(other)), ("year", one.Groups["year"].Value))
            : null;
    }

    private static string? Between(string from, string to, ILanguage language) => (End(from, isFirst: true, language), End(to, isFirst: false, language)) is ({ } first, { } last)
        ? language.Text("period.between", ("from", first), ("to", last))
        : null;

    /// <summary>The first or the last month of a quarter, so that no span is made of spans; any other period as it is.</summary>
    private static string? End(string iso, bool isFirst, ILanguage language) =>
        MonthsOf(iso) is var (year, first, last) ? Month(year, isFirst ? first : last, language) : Single(iso, language);

    private static (string Year, int First, int Last)? MonthsOf(string iso)
    {
        var parts = YearAndPart().Match(iso);
        var year = parts.Groups["year"].Value;
        if (parts.Groups["quarter"] is { Success: true } quarter && Whole(quarter) is var number)
            return (year, (MonthsOfQuarter * (number - 1)) + 1, MonthsOfQuarter * number);
        return parts.Groups["month"] is { Success: true } month && Whole(month) is >= 1 and <= 12 and var only ? (year, only, only) : null;
    }

    private static string Month(string year, int month, ILanguage language) => language.Text("period.month", ("month", Name(month, language)), ("year", year));

    private static string Months(string year, int first, int last, ILanguage language) =>
        language.Text("period.months", ("first", Name(first, language)), ("last", Name(last, language)), ("year", year));

    private static string Name(int month, ILanguage language) => language.Text("date.month." + month.ToString(CultureInfo.InvariantCulture));

    private static string WeekOf(Match week) => Whole(week.Groups["week"]).ToString(CultureInfo.InvariantCulture);

    private static int Whole(Group digits) => int.Parse(digits.Value, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^(?<year>\d{4})(-Q(?<quarter>[1-4])|-(?<month>\d{2}))?$")]
    private static partial Regex YearAndPart();

    [GeneratedRegex(@"^(?<year>\d{4})-W(?<week>0[1-9]|[1-4]\d|5[0-3])$")]
    private static partial Regex Week();
}
