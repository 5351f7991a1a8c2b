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
    [InlineData(1e-30, 3, "0.001")]
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

    // 1 ÷ 21 = 0.0476190…
    [Theory]
    [InlineData(1 / 21.0, "0.047", "0.048")]
    [InlineData(0.0625, "0.062", "0.063")]
    [InlineData(0.1, "0.1", "0.1")]
    public void Delta_of_a_lower_bound_is_rounded_down_that_of_an_upper_one_up(double delta, string down, string up) =>
        Assert.Equal((down, up), (LossDigits.Down.Delta(delta).ToString(), LossDigits.Up.Delta(delta).ToString()));

    [Theory]
    [InlineData(0.0477, "0.0477")]
    [InlineData(0.1000003, "0.1000003")]
    [InlineData(1e-9, "0.000000001")]
    [InlineData(1e-30, "0.000000000000000001")]
    public void Written_delta_keeps_its_digits_and_is_never_nothing(double delta, string printed) => Assert.Equal(printed, LossDigits.AsWritten.Delta(delta).ToString());

    [Theory]
    [InlineData(1e-9, "0.000000001")]
    [InlineData(3.21e-10, "0.00000000033")]
    [InlineData(0, "0")]
    public void Delta_has_two_digits_and_no_idle_zeros(double delta, string printed) => Assert.Equal(printed, LossPrint.Delta(delta).ToString());
}
