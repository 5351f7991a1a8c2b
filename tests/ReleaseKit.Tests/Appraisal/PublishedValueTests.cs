using System.Globalization;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Appraisal;

public sealed class PublishedValueTests
{
    private static PublishedValue Parse(string number) => PublishedValue.Of(decimal.Parse(number, CultureInfo.InvariantCulture));

    [Theory]
    [InlineData("0")]
    [InlineData("-12.50")]
    [InlineData("0.007")]
    [InlineData("9223372036854775807")]
    [InlineData("-9223372036854775808")]
    [InlineData("-9.223372036854775808")]
    public void Number_goes_through_decimal_and_back(string number)
    {
        Assert.Equal(number, Parse(number).ToString());
        Assert.Equal(Parse(number), PublishedValue.Of(Parse(number).ToDecimal()));
    }

    [Fact]
    public void Number_of_too_many_digits_is_refused() => Assert.Throws<OverflowException>(() => PublishedValue.Of(10_000_000_000_000_000_000m));

    [Theory]
    [InlineData(2.50, "2.5")]
    [InlineData(30, "30")]
    [InlineData(0.001, "0.001")]
    public void Shortest_form_has_no_zeros_at_its_end(double number, string expected) => Assert.Equal(expected, PublishedValue.Shortest((decimal)number).ToString());

    [Theory]
    [InlineData("1.234", 1000, "1234")]
    [InlineData("12.4", 1000, "12400")]
    [InlineData("0.516", 100, "51.6")]
    [InlineData("0.5", 100, "50")]
    [InlineData("-1.2345", 100, "-123.45")]
    [InlineData("7.25", 1, "7.25")]
    [InlineData("7.2", 0.5, "3.60")]
    public void Product_is_exact(string number, double factor, string expected) => Assert.Equal(expected, Parse(number).Times(factor).ToString());

    [Theory]
    [InlineData("2.345", 2, "2.35")]
    [InlineData("-2.345", 2, "-2.35")]
    [InlineData("2.3", 2, "2.30")]
    [InlineData("2.5", 0, "3")]
    public void Number_is_rounded_away_from_zero_or_filled_up(string number, int decimals, string expected) =>
        Assert.Equal(expected, Parse(number).RoundedTo(decimals).ToString());

    [Theory]
    [InlineData("12", true)]
    [InlineData("12.00", true)]
    [InlineData("12.01", false)]
    public void Whole_number_is_known(string number, bool expected) => Assert.Equal(expected, Parse(number).IsWhole);
}
