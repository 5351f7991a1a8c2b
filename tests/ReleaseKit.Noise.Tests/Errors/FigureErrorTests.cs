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
}
