using ReleaseKit.Charts;
using Xunit;

namespace ReleaseKit.Tests.Charts;

public sealed class TicksTests
{
    [Theory]
    [InlineData(0, 435, 5, "0 100 200 300 400")]
    [InlineData(-60, 435, 3, "0 200 400")]
    [InlineData(0, 1000, 5, "0 250 500 750 1000")]
    [InlineData(0, 1.9, 4, "0.0 0.5 1.0 1.5")]
    [InlineData(0, 98765, 5, "0 20000 40000 60000 80000")]
    public void Ticks_are_round_numbers_inside_the_ends(double from, double to, int atMost, string expected) =>
        Assert.Equal(expected, string.Join(' ', Ticks.Between(from, to, atMost)));

    [Theory]
    [InlineData(358, 466, "350 500")]
    [InlineData(3207, 3629, "3200 3800")]
    [InlineData(0, 3, "0 3")]
    public void Ends_around_a_stretch_are_round_numbers_outside_it(double from, double to, string expected)
    {
        var (low, high) = Ticks.Around(from, to, 4);

        Assert.True(low.ToDouble() <= from && high.ToDouble() >= to);
        Assert.Equal(expected, $"{low} {high}");
    }
}
