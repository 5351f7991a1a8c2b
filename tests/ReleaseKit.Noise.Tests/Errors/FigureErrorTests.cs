using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Errors;

/// <summary>Ranges of single figures. The examples for sigma 9.5 are those of the design of the release (derived, worked out there by
/// hand).</summary>
public sealed class FigureErrorTests
{
    private static Coverage C95 { get; } = Coverage.OfShare(0.95);

    private static FigureError Ward(params IReadOnlyList<AfterStep> steps) => FigureError.Of(DiscreteGaussianLaw.Of(9.5), steps);

    [Theory]
    [InlineData(-40, 3)]
    [InlineData(-25, 4)]
    [InlineData(-19, 5)]
    [InlineData(-15, 7)]
    [InlineData(-10, 10)]
    public void Range_below_zero_reaches_from_zero_to_the_likelihood_ratio_end(double published, double high)
    {
        var range = Ward().RangeAt(published, C95, PossibleValues.Counts);
        Assert.Equal((0, high), (range.Low, range.High));
    }

    [Fact]
    public void Range_of_a_plain_figure_is_the_value_and_its_margin()
    {
        var range = Ward().RangeAt(1240, C95, PossibleValues.Counts);
        Assert.Equal((1221, 1259), (range.Low, range.High));
    }

    [Fact]
    public void Range_at_the_threshold_has_no_lower_end()
    {
        var range = Ward(new AfterStep.PublishedFrom(30)).RangeAt(30, C95, PossibleValues.Counts);
        Assert.Equal((0, 40), (range.Low, range.High));
    }

    [Fact]
    public void Range_far_above_the_threshold_is_that_of_central_tails()
    {
        var range = Ward(new AfterStep.PublishedFrom(30)).RangeAt(1000, C95, PossibleValues.Counts);
        Assert.Equal((981, 1019), (range.Low, range.High));
    }

    [Fact]
    public void Range_of_an_unpublished_cell_ends_where_failing_is_rare()
    {
        // P(48 + N < 30) = P(N ≤ −19) = 0.0257; for 49 it is 0.0217, below (1 − 0.95)/2.
        var range = Ward(new AfterStep.PublishedFrom(30)).RangeWhenNotPublished(C95, PossibleValues.Counts);
        Assert.Equal((0, 48), (range.Low, range.High));
    }

    [Fact]
    public void Range_under_a_threshold_is_without_end_where_the_law_given_that_it_passed_stays_the_same()
    {
        // Past the threshold a Laplace law has no memory: P(Y ≥ 12 | Y ≥ 3; x) = e^(−9/2.5) = 0.0273 for every x below 3, and e^(−12/2.5) = 0.0082 for 15.
        var error = FigureError.Of(LaplaceLaw.Of(2.5), new AfterStep.ZeroBelow(3));
        Assert.Equal(double.NegativeInfinity, error.RangeAt(12, C95, PossibleValues.Any).Low);
        Assert.InRange(error.RangeAt(15, C95, PossibleValues.Any).Low, 3, 12);
    }

    [Fact]
    public void Range_of_a_discrete_laplace_value_near_a_threshold_is_without_end()
    {
        // e^(−11/3) = 0.0256, e^(−12/3) = 0.0183.
        var error = FigureError.Of(DiscreteLaplaceLaw.Of(3), new AfterStep.PublishedFrom(10));
        Assert.Equal(double.NegativeInfinity, error.RangeAt(21, C95, PossibleValues.Any).Low);
        Assert.True(double.IsFinite(error.RangeAt(22, C95, PossibleValues.Any).Low));
    }

    [Theory]
    [InlineData(9.5, 30, 0.95, -302)]
    [InlineData(1, 30, 0.99, 26)]
    [InlineData(30, 100, 0.95, -3219)]
    public void Lower_end_one_step_above_a_threshold_lies_where_the_tails_say_however_small_they_are(double sigma, double threshold, double share, double low)
    {
        // The smallest x with P(Y ≥ threshold + 1 | Y ≥ threshold; x) > (1 − c)/2, the tails added term by term with 30 digits (mpmath).
        var error = FigureError.Of(DiscreteGaussianLaw.Of(sigma), new AfterStep.PublishedFrom(threshold));
        Assert.Equal(low, error.RangeAt(threshold + 1, Coverage.OfShare(share), PossibleValues.Any).Low);
    }

    [Fact]
    public void Lower_end_just_above_a_threshold_of_gaussian_noise_lies_where_the_tails_say()
    {
        // Q((3.35 − x)/3.7) ÷ Q((3.25 − x)/3.7) = 0.025, with 60 digits (mpmath): 135 standard deviations away.
        var error = FigureError.Of(GaussianLaw.Of(3.7), new AfterStep.ZeroBelow(3.25), new AfterStep.RoundTo(0.1));
        Assert.Equal(-501.680490219897, error.RangeAt(3.4, C95, PossibleValues.Any).Low, 1e-5);
    }

    [Fact]
    public void Value_at_a_cap_under_a_threshold_has_a_range_without_upper_end()
    {
        var error = FigureError.Of(DiscreteGaussianLaw.Of(4), new AfterStep.ZeroBelow(6), new AfterStep.NotAbove(40));
        var range = error.RangeAt(40, C95, PossibleValues.Counts with { Highest = 40 });
        Assert.Equal((32, 40, double.PositiveInfinity), (range.Low, range.High, range.UncutHigh));
    }

    [Fact]
    public void Value_above_what_is_possible_under_a_threshold_has_a_range_of_more_than_one_value()
    {
        var error = FigureError.Of(LaplaceLaw.Of(2.5), new AfterStep.ZeroBelow(3));
        var plain = FigureError.Of(LaplaceLaw.Of(2.5));
        var possible = new PossibleValues(-50, 75.5, false);
        var range = error.RangeAt(100, C95, possible);
        Assert.Equal(plain.RangeAt(100, C95, possible).Low, range.Low);
        Assert.True(range.Low < range.High);
    }

    [Fact]
    public void Value_outside_what_is_possible_keeps_a_step_of_a_table_that_leaves_values_as_they_were()
    {
        var error = FigureError.Of(TabulatedLaw.Of([(-1, 0.025m), (0, 0.95m), (1, 0.025m)]));
        var range = error.RangeAt(-2, C95, PossibleValues.Counts);
        Assert.Equal((0, 1), (range.Low, range.High));
    }

    [Fact]
    public void Margin_after_two_roundings_of_whole_numbers_is_a_whole_number()
    {
        // 3/2 + 10/2 = 6.5 beside a margin of the noise of 8: what is whole lies within 14.
        var margin = FigureError.Of(DiscreteGaussianLaw.Of(4), new AfterStep.RoundTo(3), new AfterStep.RoundTo(10));
        Assert.Equal(14, margin.MarginAt(C95).Width);
        Assert.Equal(margin.MarginAt(C95).Attained, margin.AttainedAt(14));
    }
}
