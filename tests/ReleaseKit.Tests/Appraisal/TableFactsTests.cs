using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Appraisal;

public sealed class TableFactsTests
{
    [Fact]
    public void Expected_misses_add_what_the_attained_coverages_leave()
    {
        // Discrete uniform on −1 … 1: the range of ± 1 always holds; of −20 … 20: 39 of 41 steps are 0.951.
        var facts = new SmallRelease()
            .Figures(MeasureKind.Count, SmallRelease.Mechanism("a", LawName.DiscreteUniform, ("halfWidth", 1)), "100", "200", "Q")
            .Figures(SmallRelease.Measure(MeasureKind.Count, "b"), SmallRelease.Mechanism("b", LawName.DiscreteUniform, ("halfWidth", 20)), "100", "200", "300")
            .Appraise().FactsOf(0);
        Assert.Equal(5, facts.Ranges);
        Assert.Equal(3 * 2 / 41.0, facts.ExpectedMisses, 1e-12);
        Assert.False(facts.SharesDraws);
    }

    [Fact]
    public void Measure_that_is_not_shown_has_no_ranges_in_the_table()
    {
        var hidden = SmallRelease.Measure(MeasureKind.Count) with { Shown = false };
        Assert.Equal(0, new SmallRelease().Figures(hidden, SmallRelease.DiscreteGaussian(9.5), "12", "13").Appraise().FactsOf(0).Ranges);
    }

    [Fact]
    public void Column_knows_its_margin_and_the_distance_that_999_of_1000_hold()
    {
        // tests/reference/noise-intervals.csv: discrete Gaussian with sigma 9.5 is ± 19 at 0.95; 3.2905 sigma is 31.3 for the Gaussian beside it.
        var column = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "12", "1300").Appraise().FactsOf(0).Measures[0];
        Assert.Equal((19, 19, 31), (column.SmallestMargin!.Value.Unscaled, column.LargestMargin!.Value.Unscaled, column.Distance999!.Value.Unscaled));
    }

    [Fact]
    public void Column_of_several_laws_gives_the_smallest_and_largest_margin()
    {
        var mechanism = SmallRelease.Mechanism("m", LawName.DiscreteUniform) with
        {
            Parameters = new Dictionary<string, NumberOrColumn> { ["halfWidth"] = NumberOrColumn.From("reach") },
        };
        var column = new SmallRelease().Side("reach", 3, 9, 5).Figures(MeasureKind.Count, mechanism, "100", "200", "300").Appraise().FactsOf(0).Measures[0];
        Assert.Equal((3, 9), (column.SmallestMargin!.Value.Unscaled, column.LargestMargin!.Value.Unscaled));
    }

    [Fact]
    public void Column_margin_is_no_smaller_than_any_margin_in_it()
    {
        var values = Enumerable.Range(0, 500).Select(step => $"{step / 7m:0.000}").ToArray();
        var release = new SmallRelease().Figures(MeasureKind.Mean, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 1.237)), values).Appraise();
        var largest = release.FactsOf(0).Measures[0].LargestMargin!.Value.ToDecimal();
        for (var row = 0; row < values.Length; row++)
            Assert.True(release.Figure(new FigureRef(0, 0, row)).Main!.Printed.Margin.ToDecimal() <= largest);
    }

    [Fact]
    public void Ranges_with_zeros_for_small_values_count_what_can_come_of_the_zeros_too()
    {
        // At most (1 − c)/2 = 0.025 of the figures above the range of a 0 become 0, and of the rest at most 0.05 miss: 0.025 + 0.975 · 0.05.
        var facts = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "45", "0", "30").Appraise().FactsOf(0);
        Assert.Equal(3, facts.Ranges);
        Assert.Equal(3 * 0.07375, facts.ExpectedMisses, 1e-12);
    }

    [Fact]
    public void Figures_without_a_main_range_are_not_counted_among_the_ranges()
    {
        var mechanism = SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30));
        Assert.Equal(1, new SmallRelease().Figures(MeasureKind.Amount, mechanism, "0", "30", "90").Appraise().FactsOf(0).Ranges);
    }

    [Fact]
    public void Column_with_a_threshold_has_no_one_margin()
    {
        var column = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "45").Appraise().FactsOf(0).Measures[0];
        Assert.True(column.HasThreshold);
        Assert.Null(column.LargestMargin);
    }

    [Fact]
    public void Column_without_noise_says_nothing()
    {
        var release = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count), [new NoiseRule.Public(SmallRelease.Words("list"))], [0], "12").Appraise();
        var column = release.FactsOf(0).Measures[0];
        Assert.Equal((null, null, false), (column.LargestMargin, column.Distance999, column.HasThreshold));
    }

    [Fact]
    public void Totals_with_noise_of_their_own_are_told_from_sums()
    {
        var draw = new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(8));
        TableFacts Of(byte totalRule) => new SmallRelease()
            .Stub("ward", "All", "All", "w1", "w2")
            .Figures(SmallRelease.Measure(MeasureKind.Count), [new NoiseRule.SumOver(0), draw], [totalRule, 1, 1], "30", "10", "20")
            .Appraise().FactsOf(0);
        Assert.Equal((true, true, false), (Of(0).HasSums, Of(0).SharesDraws, Of(0).HasTotalsOfOwnNoise));
        Assert.Equal((false, false, true), (Of(1).HasSums, Of(1).SharesDraws, Of(1).HasTotalsOfOwnNoise));
    }
}
