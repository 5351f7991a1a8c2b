using ReleaseKit.Pages.Budget;
using Xunit;

namespace ReleaseKit.Tests.Pages;

/// <summary>Losses in print: never smaller than they are.</summary>
public sealed class LossPrintTests
{
    [Theory]
    [InlineData(0.22417251, 4, "0.2242")]
    [InlineData(0.2241000001, 4, "0.2242")]
    [InlineData(0.03125, 5, "0.03125")]
    [InlineData(0.1 + 0.2, 4, "0.3000")]
    [InlineData(0, 3, "0.000")]
    public void Loss_is_rounded_up(double loss, int decimals, string printed) =>
        Assert.Equal(printed, LossPrint.Up(loss, decimals).ToString());

    [Theory]
    [InlineData(0.35999, 2, "0.35")]
    [InlineData(0.35, 2, "0.35")]
    public void Allowance_is_rounded_down(double allowance, int decimals, string printed) =>
        Assert.Equal(printed, LossPrint.Down(allowance, decimals).ToString());

    [Theory]
    [InlineData(90.0171, 3, "90.1")]
    [InlineData(12_345, 3, "12400")]
    [InlineData(99.95, 3, "100.0")]
    [InlineData(0.0012341, 4, "0.001235")]
    public void Significant_digits_are_rounded_up(double number, int digits, string printed) =>
        Assert.Equal(printed, LossPrint.UpTo(number, digits).ToString());

    [Fact]
    public void Lower_bound_is_rounded_down() => Assert.Equal("0.2109", LossPrint.DownTo(0.2109876, 4).ToString());

    [Theory]
    [InlineData(1e-9, "0.000000001")]
    [InlineData(3.21e-10, "0.00000000033")]
    [InlineData(0, "0")]
    public void Delta_has_two_digits_and_no_idle_zeros(double delta, string printed) => Assert.Equal(printed, LossPrint.Delta(delta).ToString());
}
