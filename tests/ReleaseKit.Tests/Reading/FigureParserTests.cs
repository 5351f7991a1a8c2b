using System.Globalization;
using System.Text;
using CsCheck;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Digits are kept exactly; whatever else stands in a cell is named.</summary>
public sealed class FigureParserTests
{
    [Theory]
    [InlineData("0", 0, 0)]
    [InlineData("-7", -7, 0)]
    [InlineData("-12.50", -1250, 2)]
    [InlineData("-0.05", -5, 2)]
    [InlineData("007", 7, 0)]
    [InlineData("999999999999999999", 999999999999999999, 0)]
    [InlineData("0.123456789012345", 123456789012345, 15)]
    public void Digits_are_read_exactly(string text, long unscaled, byte decimals) => Assert.Equal((NumberFault.None, unscaled, decimals), Parse(text));

    [Theory]
    [InlineData("", nameof(NumberFault.Empty))]
    [InlineData("12,5", nameof(NumberFault.DecimalComma))]
    [InlineData("0,125", nameof(NumberFault.DecimalComma))]
    [InlineData("1.240,50", nameof(NumberFault.DecimalComma))]
    [InlineData("1,240", nameof(NumberFault.ThousandsMarks))]
    [InlineData("1,240,000.5", nameof(NumberFault.ThousandsMarks))]
    [InlineData("1.240.000", nameof(NumberFault.ThousandsMarks))]
    [InlineData("1e5", nameof(NumberFault.Exponent))]
    [InlineData("-1.5E-3", nameof(NumberFault.Exponent))]
    [InlineData("+5", nameof(NumberFault.PlusSign))]
    [InlineData("\u22125", nameof(NumberFault.OtherMinus))]
    [InlineData("5%", nameof(NumberFault.Percent))]
    [InlineData("NaN", nameof(NumberFault.NoNumber))]
    [InlineData("-inf", nameof(NumberFault.NoNumber))]
    [InlineData("-", nameof(NumberFault.Text))]
    [InlineData(".5", nameof(NumberFault.Text))]
    [InlineData("5.", nameof(NumberFault.Text))]
    [InlineData("0x1F", nameof(NumberFault.Text))]
    [InlineData("\u0661\u0662", nameof(NumberFault.Text))]
    [InlineData("1234567890123456789", nameof(NumberFault.TooLong))]
    [InlineData("0.1234567890123456", nameof(NumberFault.TooLong))]
    public void Anything_else_is_named(string text, string fault) => Assert.Equal(fault, Parse(text).Fault.ToString());

    [Fact]
    public void Printed_value_is_read_back_as_it_was() =>
        Gen.Select(Gen.Long[-999_999_999_999_999, 999_999_999_999_999], Gen.Byte[0, 15]).Sample((unscaled, decimals) =>
            Parse(new PublishedValue(unscaled, decimals).ToString()) == (NumberFault.None, unscaled, decimals));

    [Fact]
    public void Whole_numbers_agree_with_the_framework() => Gen.Int.Sample(number =>
        Parse(number.ToString(CultureInfo.InvariantCulture)) == (NumberFault.None, number, 0));

    private static (NumberFault Fault, long Unscaled, byte Decimals) Parse(string text)
    {
        var fault = FigureParser.Parse(Encoding.UTF8.GetBytes(text), out var unscaled, out var decimals);
        return (fault, unscaled, decimals);
    }
}
