using ReleaseKit.Reading;
using ReleaseKit.Releases;
using ReleaseKit.Review;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>Charts that cannot be drawn or read.</summary>
public sealed class ChartCheckTests
{
    [Fact]
    public void Chart_without_any_number_is_a_stop_that_names_it()
    {
        var finding = Assert.Single(Check("Q", "Q"));

        Assert.Equal((FindingLevel.Stop, "chart-without-figures"), (finding.Level, finding.Slug));
        Assert.Equal("The chart \"by-ward\" selects no figure that has a number.", finding.Found);
    }

    [Fact]
    public void Chart_of_more_than_two_hundred_figures_is_a_stop_that_counts_them()
    {
        var finding = Assert.Single(Check([.. Enumerable.Repeat("7", 201)]));

        Assert.Equal("chart-too-long", finding.Slug);
        Assert.Equal("The chart \"by-ward\" selects 201 figures; a chart holds at most 200.", finding.Found);
    }

    [Fact]
    public void Chart_with_figures_is_not_spoken_of() => Assert.Empty(Check("7", "Q", "12"));

    private static IEnumerable<Finding> Check(params string[] values)
    {
        var release = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), values).Build() with
        {
            Charts = [new ChartOrder("by-ward", SmallRelease.Words("By ward"), "table/figure", "ordered")],
        };
        return new ChartCheck().Check(new ReviewSubject(new ReadOutcome(release, []), null));
    }
}
