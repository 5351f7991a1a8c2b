using System.Globalization;
using System.Text;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>Numbers as one language writes them, from the patterns of its wording file, so that a machine's settings never matter.</summary>
public sealed class Numerals
{
    /// <summary>Binds a number to its unit, a sign to its number.</summary>
    public const char NoBreak = '\u00A0';

    private readonly string groupMark;
    private readonly string point;
    private readonly string tableMinus;
    private readonly string proseMinus;

    public Numerals(WordingTexts texts)
    {
        groupMark = texts.Template("number.group");
        point = texts.Template("number.point");
        tableMinus = texts.Template("number.minus-in-tables");
        proseMinus = texts.Template("number.minus-in-prose");
    }

    /// <summary>"1,842", "−7" with U+2212.</summary>
    public string InTable(PublishedValue value) => Written(value, tableMinus);

    /// <summary>"1,842", "minus 7".</summary>
    public string InProse(PublishedValue value) => Written(value, proseMinus + NoBreak);

    public string Whole(long number) => InProse(new PublishedValue(number, 0));

    private string Written(PublishedValue value, string minus)
    {
        var plain = value.ToString().AsSpan().TrimStart('-');
        var dot = plain.IndexOf('.');
        var whole = dot < 0 ? plain : plain[..dot];
        var written = new StringBuilder(plain.Length + 8);
        if (value.IsNegative)
            written.Append(minus);
        AppendGrouped(written, whole);
        if (dot >= 0)
            written.Append(point).Append(plain[(dot + 1)..]);
        return written.ToString();
    }

    private void AppendGrouped(StringBuilder written, ReadOnlySpan<char> digits)
    {
        for (var at = 0; at < digits.Length; at++)
        {
            if (at > 0 && (digits.Length - at) % 3 == 0)
                written.Append(groupMark);
            written.Append(digits[at]);
        }
    }

    /// <summary>A positive number of a parameter file, in as few digits as it takes: 30, 2.5, 1,000.</summary>
    public string Plain(double number) => InProse(PublishedValue.Shortest((decimal)number));

    /// <summary>A number that is no quantity (a day, a year): bare digits.</summary>
    public static string Digits(int number) => number.ToString(CultureInfo.InvariantCulture);
}
