using System.Globalization;
using System.Text.RegularExpressions;

namespace ReleaseKit.Wording;

/// <summary>Finds the numbers of a text and reads them as one language writes them: <see cref="Numerals"/> the other way round.</summary>
internal sealed class NumberReader
{
    private readonly Regex number;
    private readonly Regex form;
    private readonly string groupMark;
    private readonly string point;

    public NumberReader(WordingTexts texts)
    {
        (groupMark, point) = (texts.Template("number.group"), texts.Template("number.point"));
        var (group, dot) = (Regex.Escape(groupMark), Regex.Escape(point));
        var sign = Regex.Escape(texts.Template("number.minus-in-tables"));
        var word = Regex.Escape(texts.Template("number.minus-in-prose"));
        number = new($@"(?:(?<margin>±)\s*|(?<minus>(?<!\w)(?:{sign}|-)(?=\d)|\b{word}\s+))?(?<digits>\d(?:(?:\d|[.,'’]|{group}|{dot})*\d)?)", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant);
        form = new($@"^(?:[0-9]{{1,3}}(?:{group}[0-9]{{3}})+|[0-9]+)(?:{dot}[0-9]+)?$", RegexOptions.CultureInvariant);
    }

    /// <summary>In the order of the text. Marks of other languages belong to the number, which then has no value.</summary>
    public IReadOnlyList<WrittenNumber> In(string text) =>
        [.. number.Matches(text).Select(match => new WrittenNumber(match.Value, ValueOf(match), match.Groups["margin"].Success))];

    private decimal? ValueOf(Match match)
    {
        var digits = match.Groups["digits"].Value;
        if (!form.IsMatch(digits))
            return null;
        var plain = digits.Replace(groupMark, "", StringComparison.Ordinal).Replace(point, ".", StringComparison.Ordinal);
        return decimal.TryParse(plain, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var value)
            ? match.Groups["minus"].Success ? -value : value
            : null;
    }
}
