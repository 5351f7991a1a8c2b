using System.Buffers;
using System.Text;

namespace ReleaseKit.Reading.Tables;

internal enum NumberFault { None, Empty, DecimalComma, ThousandsMarks, Exponent, PlusSign, OtherMinus, Percent, NoNumber, SpreadsheetError, TooLong, Text }

/// <summary>Reads a figure's digits exactly: -12.50 becomes −1250 with 2 decimals. Nothing passes through a double. Whatever else stands there is named.</summary>
internal static class FigureParser
{
    public const int MostDecimals = 15;

    private static readonly SearchValues<char> PlainForm = SearchValues.Create("0123456789.");
    private static readonly SearchValues<char> ExponentForm = SearchValues.Create("0123456789.eE+-");
    private static readonly SearchValues<char> GroupedForm = SearchValues.Create("0123456789.,'\u2019 \u00A0\u202F\u2009");

    public static NumberFault Parse(ReadOnlySpan<byte> text, out long unscaled, out byte decimals)
    {
        (unscaled, decimals) = (0, 0);
        if (text.IsEmpty)
            return NumberFault.Empty;
        var isNegative = text[0] == (byte)'-';
        var digits = isNegative ? text[1..] : text;
        var point = digits.IndexOf((byte)'.');
        var count = point < 0 ? digits.Length : digits.Length - 1;
        if (!IsPlain(digits, point))
            return Name(Encoding.UTF8.GetString(text));
        if (count > 18 || (point >= 0 && digits.Length - point - 1 > MostDecimals))
            return NumberFault.TooLong;
        foreach (var digit in digits)
            if (digit != (byte)'.')
                unscaled = unscaled * 10 + (digit - (byte)'0');
        unscaled = isNegative ? -unscaled : unscaled;
        decimals = point < 0 ? (byte)0 : (byte)(digits.Length - point - 1);
        return NumberFault.None;
    }

    /// <summary>Digits, with at most one point that has digits on both sides.</summary>
    private static bool IsPlain(ReadOnlySpan<byte> digits, int point)
    {
        if (digits.IsEmpty || point == 0 || point == digits.Length - 1)
            return false;
        for (var index = 0; index < digits.Length; index++)
            if (index != point && digits[index] is < (byte)'0' or > (byte)'9')
                return false;
        return true;
    }

    private static NumberFault Name(string text)
    {
        if (text[0] is '\u2212' or '\u2013' && text.Length > 1 && char.IsAsciiDigit(text[1]))
            return NumberFault.OtherMinus;
        if (text[0] == '+' && text.Length > 1 && char.IsAsciiDigit(text[1]))
            return NumberFault.PlusSign;
        if (text[^1] == '%' && char.IsAsciiDigit(text[0]))
            return NumberFault.Percent;
        if (text.ToLowerInvariant().TrimStart('-') is "nan" or "inf" or "infinity" or "na" or "n/a" or "null" or "none")
            return NumberFault.NoNumber;
        if (text.ToUpperInvariant() is "#N/A" or "#REF!" or "#VALUE!" or "#NAME?" or "#DIV/0!" or "#NULL!" or "#NUM!" or "#SPILL!" or "#CALC!")
            return NumberFault.SpreadsheetError;
        return Grouped(text.AsSpan().TrimStart('-'));
    }

    private static NumberFault Grouped(ReadOnlySpan<char> text)
    {
        if (!char.IsAsciiDigit(text.IsEmpty ? ' ' : text[0]))
            return NumberFault.Text;
        if (!text.ContainsAnyExcept(ExponentForm) && text.IndexOfAny('e', 'E') > 0)
            return NumberFault.Exponent;
        if (text.ContainsAnyExcept(GroupedForm))
            return NumberFault.Text;
        if (!text.ContainsAnyExcept(PlainForm) && text.Count('.') == 1)
            return NumberFault.Text;
        return IsDecimalComma(text) ? NumberFault.DecimalComma : NumberFault.ThousandsMarks;
    }

    /// <summary>One comma, and what stands around it cannot be thousands: 12,5 and 0,125 and 1.240,500, but not 1,240.</summary>
    private static bool IsDecimalComma(ReadOnlySpan<char> text)
    {
        var (comma, point) = (text.IndexOf(','), text.IndexOf('.'));
        return text.Count(',') == 1 && (text.Length - comma - 1 != 3 || comma is 0 or > 3 || text[0] == '0' || (point >= 0 && point < comma));
    }
}
