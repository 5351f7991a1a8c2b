using System.Globalization;

namespace ReleaseKit.Reading.Tables;

/// <summary>The number that a cell written in another notation most likely means, in the files' notation, for the remedy of its message.</summary>
internal static class MeantNumber
{
    private const int LongestText = 40;

    /// <summary>The digits to write, or null where they cannot be told.</summary>
    public static string? Of(string text, NumberFault fault) => text.Length > LongestText ? null : fault switch
    {
        NumberFault.DecimalComma => Plain(Bare(text.Replace(".", "", StringComparison.Ordinal), ',').Replace(',', '.')),
        NumberFault.ThousandsMarks => Plain(Bare(text, '.')),
        NumberFault.Exponent => Spelled(text),
        NumberFault.PlusSign => Plain(text[1..]),
        NumberFault.OtherMinus => Plain($"-{text[1..]}"),
        _ => null,
    };

    /// <summary>The number with a point in the place of its decimal comma; null where there is none, or where the comma may part thousands.</summary>
    public static string? OfDecimalComma(string text) =>
        FigureParser.Parse(System.Text.Encoding.UTF8.GetBytes(text), out _, out _) == NumberFault.DecimalComma ? Of(text, NumberFault.DecimalComma) : null;

    /// <summary>Digits, a minus before them and one mark; all that parts thousands is gone.</summary>
    private static string Bare(string text, char mark) => new([.. text.Where(letter => char.IsAsciiDigit(letter) || letter == '-' || letter == mark)]);

    private static string? Spelled(string text) =>
        decimal.TryParse(text, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture, out var number)
            ? Plain(number.ToString("0.###############", CultureInfo.InvariantCulture))
            : null;

    private static string? Plain(string digits) =>
        FigureParser.Parse(System.Text.Encoding.UTF8.GetBytes(digits), out _, out _) == NumberFault.None ? digits : null;
}
