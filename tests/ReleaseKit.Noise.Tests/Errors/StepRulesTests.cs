using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using static ReleaseKit.Noise.Errors.AfterStep;

namespace ReleaseKit.Noise.Tests.Errors;

/// <summary>Steps that make no sense, or whose error is not worked out, are refused in words that say which.</summary>
public sealed class StepRulesTests
{
    public static TheoryData<string, AfterStep[]> Refused => new()
    {
        { "the unit must be a finite number above 0", [new RoundTo(0)] },
        { "the unit must be a finite number above 0", [new RoundTo(double.NaN)] },
        { "a bound must be finite", [new NotBelow(double.NegativeInfinity)] },
        { "the threshold must be a finite number above 0", [new ZeroBelow(0)] },
        { "the threshold must be finite", [new PublishedFrom(double.NaN)] },
        { "The bound 3 stands before rounding to 5", [new NotBelow(3), new RoundTo(5)] },
        { "Not below 10 and not above 5", [new NotBelow(10), new NotAbove(5)] },
        { "two thresholds", [new ZeroBelow(5), new PublishedFrom(10)] },
        { "no figure could pass it", [new PublishedFrom(30), new NotAbove(20)] },
        { "would change the zeros", [new ZeroBelow(5), new NotBelow(2)] },
        { "leave the threshold out", [new NotBelow(5), new ZeroBelow(5)] },
        { "more than one rounding", [new RoundTo(5), new RoundTo(7), new PublishedFrom(30)] },
        { "round to a whole number of grid steps", [new RoundTo(2.5), new PublishedFrom(30)] },
        { "only after the rounding", [new PublishedFrom(30), new RoundTo(5, RoundingHow.AtRandom)] },
    };

    [Theory, MemberData(nameof(Refused))]
    public void Steps_that_make_no_sense_are_refused(string says, AfterStep[] steps)
    {
        var fault = Assert.Throws<ArgumentException>(() => FigureError.Of(DiscreteLaplaceLaw.Of(4), steps));
        Assert.Contains(says, fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Threshold_after_a_law_whose_range_is_not_worked_out_is_refused()
    {
        Assert.Throws<ArgumentException>(() => FigureError.Of(TabulatedLaw.Of([(0, 0.9m), (1, 0.09m)]), new PublishedFrom(30)));
        Assert.Throws<ArgumentException>(() => FigureError.Of(StaircaseLaw.Of(1e-5, 1, 0.5), new PublishedFrom(30)));
    }

    [Fact]
    public void Several_faults_are_listed_at_once()
    {
        var fault = Assert.Throws<ArgumentException>(
            () => FigureError.Of(DiscreteLaplaceLaw.Of(4), new NotBelow(3), new RoundTo(5), new ZeroBelow(-1)));
        Assert.Contains("The bound 3", fault.Message, StringComparison.Ordinal);
        Assert.Contains("Zero below -1", fault.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(5, true)]
    [InlineData(7, false)]
    [InlineData(0, true)]
    [InlineData(-5, false)]
    [InlineData(12.5, false)]
    public void Value_that_the_steps_cannot_give_is_recognised(double published, bool possible)
    {
        var error = FigureError.Of(DiscreteLaplaceLaw.Of(4), new RoundTo(5), new NotBelow(0));
        Assert.Equal(possible, error.CanPublish(published, PossibleValues.Counts));
    }

    [Theory]
    [InlineData(11, false)]
    [InlineData(12, true)]
    [InlineData(0, true)]
    [InlineData(-3, false)]
    public void Value_under_the_threshold_is_recognised(double published, bool possible) =>
        Assert.Equal(possible, FigureError.Of(GaussianLaw.Of(4), new ZeroBelow(12)).CanPublish(published, PossibleValues.Any));

    [Theory]
    [InlineData(-10, true)]
    [InlineData(-11, false)]
    [InlineData(110, true)]
    [InlineData(111, false)]
    public void Value_farther_from_the_possible_than_the_noise_reaches_is_recognised(double published, bool possible) =>
        Assert.Equal(possible, FigureError.Of(DiscreteUniformLaw.Of(10)).CanPublish(published, new PossibleValues(0, 100, true)));

    // P(N <= -k) = q^k / (1 + q) for the two-sided geometric law, q = e^(-1/5): its textbook sum.
    [Theory]
    [InlineData(-1)]
    [InlineData(-40)]
    [InlineData(-5000)]
    public void Chance_to_reach_a_value_below_all_possible_ones_is_the_tail(double published)
    {
        var q = Math.Exp(-0.2);
        var expected = Math.Pow(q, -published) / (1 + q);
        var found = FigureError.Of(DiscreteLaplaceLaw.Of(5)).ChanceToReach(published, PossibleValues.Counts);
        Assert.InRange(found, expected * (1 - 1e-9), expected * (1 + 1e-9));
    }

    [Fact]
    public void Chance_to_reach_counts_what_a_table_does_not_list() => Assert.Equal(
        1e-7, FigureError.Of(TabulatedLaw.Of([(-1, 0.1m), (0, 0.8m), (1, 0.0999999m)])).ChanceToReach(-2, PossibleValues.Counts), 1e-12);

    // The largest chance is P(|N| <= 2) where 5 steps are rounded to one value, P(N = 0) where none are; at a floor it is 1.
    [Theory]
    [InlineData(10, 1, 1)]
    [InlineData(10, 5, 5)]
    [InlineData(0, 1, double.PositiveInfinity)]
    public void Chance_of_just_one_value_is_that_of_the_best_placed_value_before_noise(double published, double unit, double steps)
    {
        var law = DiscreteLaplaceLaw.Of(5);
        Assert.Equal(law.Within((steps - 1) / 2), FigureError.Of(law, new RoundTo(unit), new NotBelow(0)).ChanceOfJust(published), 1e-12);
    }

    [Fact]
    public void Decimals_of_the_file_after_a_coarser_rounding_change_nothing()
    {
        var law = LaplaceLaw.Of(4);
        var (coarse, both) = (FigureError.Of(law, new RoundTo(5)), FigureError.Of(law, new RoundTo(5), new RoundTo(0.01)));
        Assert.Equal(coarse.MarginAt(Coverage.OfShare(0.95)), both.MarginAt(Coverage.OfShare(0.95)));
    }

    [Fact]
    public void Margin_of_a_rounded_continuous_law_is_named_an_upper_bound()
    {
        var (plain, rounded) = (FigureError.Of(LaplaceLaw.Of(4)), FigureError.Of(LaplaceLaw.Of(4), new RoundTo(0.01)));
        Assert.False(plain.MarginIsUpperBound);
        Assert.True(rounded.MarginIsUpperBound);
        Assert.Equal(plain.MarginAt(Coverage.OfShare(0.95)).Width + 0.005, rounded.MarginAt(Coverage.OfShare(0.95)).Width, 1e-12);
    }

    [Fact]
    public void Margin_of_tiny_noise_is_zero_and_a_step_of_the_grid_covers_nearly_always()
    {
        // P(N = 0) = 1/(1 + 2e^(−1/0.18) + …) ≈ 0.9923 for sigma 0.3: the definition of the law.
        var error = FigureError.Of(DiscreteGaussianLaw.Of(0.3));
        var margin = error.MarginAt(Coverage.OfShare(0.95));
        Assert.Equal(0, margin.Width);
        Assert.Equal(1 / (1 + 2 * Math.Exp(-1 / 0.18)), margin.Attained, 1e-6);
        Assert.Equal(1, error.AttainedAt(1), 1e-9);
    }
}
