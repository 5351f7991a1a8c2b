using ReleaseKit.Privacy.Losses;

namespace ReleaseKit.Privacy.Tests.Losses;

public sealed class SignsTests
{
    [Theory]
    [InlineData(0, "0")]
    [InlineData(0.5, "0.5")]
    [InlineData(1e-9, "0.000000001")]
    [InlineData(7.18221362211e-10, "0.000000000718221362211")]
    [InlineData(1.5e-20, "1.5 × 10^−20")]
    [InlineData(2e18, "2 × 10^18")]
    [InlineData(1234567890123.0, "1234567890120")]
    [InlineData(double.PositiveInfinity, "∞")]
    public void Number_stands_as_a_calculator_takes_it(double value, string expected) => Assert.Equal(expected, Signs.Of(value));
}
