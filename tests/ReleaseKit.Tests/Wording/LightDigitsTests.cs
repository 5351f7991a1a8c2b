using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;
using Xunit;

namespace ReleaseKit.Tests.Wording;

public sealed class LightDigitsTests
{
    private static LightDigits Of(PublishedValue value, PublishedValue margin) =>
        LightDigits.Of(English.Language.Number(value), new PrintedRange(value, margin, margin, value, value, false, false));

    private static PublishedValue Parse(string number) => PublishedValue.Of(decimal.Parse(number, System.Globalization.CultureInfo.InvariantCulture));

    // The examples of the rule as readers are shown it, the signs, and the places around the point.
    [Theory]
    [InlineData("1842", "9", "1,84", "2")]
    [InlineData("1842", "30", "1,8", "42")]
    [InlineData("1842", "95", "1,8", "42")]
    [InlineData("1842", "410", "1,", "842")]
    [InlineData("33", "30", "", "33")]
    [InlineData("51.6", "4.4", "5", "1.6")]
    [InlineData("51.6", "0.4", "51.", "6")]
    [InlineData("1842", "0", "1,842", "")]
    [InlineData("1842", "2000", "", "1,842")]
    [InlineData("-33", "40", "", "\u221233")]
    [InlineData("-33", "33", "", "\u221233")]
    [InlineData("-33", "30", "\u2212", "33")]
    [InlineData("-1842", "30", "\u22121,8", "42")]
    [InlineData("0", "19", "", "0")]
    public void Digits_within_reach_of_the_noise_are_light(string value, string margin, string heavy, string light) =>
        Assert.Equal(new LightDigits(heavy, light), Of(Parse(value), Parse(margin)));

    [Fact]
    public void Uneven_margins_are_judged_by_the_larger()
    {
        var range = new PrintedRange(new(1842, 0), new(9, 0), new(30, 0), new(1833, 0), new(1872, 0), false, false);
        Assert.Equal(new LightDigits("1,8", "42"), LightDigits.Of("1,842", range));
    }

    [Fact]
    public void Number_of_the_heavy_digits_moves_by_one_at_most_within_the_margin()
    {
        int[] margins = [.. Enumerable.Range(1, 120), 199, 200, 499, 500, 501, 998, 999, 1000, 1001, 2999, 3000];
        for (var value = -2999; value < 3000; value++)
            foreach (var margin in margins)
                Assert.True(MovesByOneAtMost(value, margin), $"{value} ± {margin}");
    }

    /// <summary>The heavy digits say in which step of the next power of ten above the margin a value lies; the margin leads to a neighbouring step at most.</summary>
    private static bool MovesByOneAtMost(int value, int margin)
    {
        var split = Of(new(value, 0), new(margin, 0));
        var step = margin < 10 ? 10 : margin < 100 ? 100 : margin < 1000 ? 1000 : 10000;
        var heavy = HeavyNumber(split);
        return heavy == value / step && Math.Abs((value + margin) / step - heavy) <= 1 && Math.Abs((value - margin) / step - heavy) <= 1;
    }

    private static long HeavyNumber(LightDigits split)
    {
        var digits = new string([.. split.Heavy.Where(char.IsAsciiDigit)]);
        var number = digits.Length == 0 ? 0 : long.Parse(digits, System.Globalization.CultureInfo.InvariantCulture);
        return split.Heavy.StartsWith('\u2212') ? -number : number;
    }

    [Fact]
    public void Minus_sign_is_light_exactly_where_zero_is_in_reach()
    {
        for (var value = -300; value < 0; value++)
            for (var margin = 1; margin <= 310; margin++)
                Assert.Equal(value + margin >= 0, Of(new(value, 0), new(margin, 0)).Light.StartsWith('\u2212'));
    }

    [Fact]
    public void Both_parts_together_are_the_number()
    {
        for (var value = -2999; value < 3000; value += 7)
            for (var margin = 0; margin < 3000; margin += 11)
            {
                var split = Of(new(value, 1), new(margin, 1));
                Assert.Equal(English.Language.Number(new(value, 1)), split.Heavy + split.Light);
            }
    }
}
