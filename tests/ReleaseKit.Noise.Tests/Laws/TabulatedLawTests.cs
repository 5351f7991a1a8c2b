using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Laws;

/// <summary>A law from a table; the expected numbers are sums of its decimals, done by hand.</summary>
public sealed class TabulatedLawTests
{
    private static TabulatedLaw Law { get; } = TabulatedLaw.Of([(-2, 0.1m), (0, 0.6m), (1, 0.2m), (3, 0.09m)], 0.5);

    [Fact]
    public void Chances_are_summed_in_decimal()
    {
        // Ten times 0.1 is 1 in decimal, not 0.9999999999999999.
        var law = TabulatedLaw.Of(Enumerable.Range(0, 10).Select(step => ((long)step, 0.1m)));
        Assert.Equal(1.0, law.WithinSteps(9));
        Assert.Equal(0.3, law.AtMostStep(2));
    }

    [Fact]
    public void Missing_mass_counts_as_outside()
    {
        Assert.Equal(0.01m, Law.MissingMass);
        Assert.Equal(0.99, Law.WithinSteps(long.MaxValue));
        Assert.Throws<ArgumentOutOfRangeException>(() => Law.HalfWidthAt(Coverage.OfShare(0.995)));
    }

    [Theory]
    [InlineData(0.5, 0, 0.6)]
    [InlineData(0.8, 0.5, 0.8)]
    [InlineData(0.85, 1, 0.9)]
    [InlineData(0.95, 1.5, 0.99)]
    public void Half_width_is_on_the_grid(double share, double width, double attained) =>
        Assert.Equal(new HalfWidth(width, attained), Law.HalfWidthAt(Coverage.OfShare(share)));

    [Fact]
    public void Tails_of_a_skewed_table_differ()
    {
        Assert.Equal(0.1, Law.AtMostStep(-1));
        Assert.Equal(0.29, Law.AtLeastStep(1));
        Assert.Equal(0.2 / 0.6, Law.RelativeDensity(0.5), 1e-15);
    }

    [Fact]
    public void Moments_are_those_of_the_listed_steps()
    {
        // Mean of |K|: (0.2 + 0.2 + 0.27)/0.99; mean of K: (−0.2 + 0.2 + 0.27)/0.99; mean of K²: (0.4 + 0.2 + 0.81)/0.99.
        Assert.Equal(0.67 / 0.99 * 0.5, Law.MeanAbsoluteDeviation, 1e-14);
        Assert.Equal((1.41 / 0.99 - 0.27 / 0.99 * (0.27 / 0.99)) * 0.25, Law.Variance, 1e-14);
    }

    [Fact]
    public void Table_that_is_no_law_is_refused()
    {
        Assert.Contains("no row", Fault([]), StringComparison.Ordinal);
        Assert.Contains("negative chance", Fault([(0, 1), (1, -0.1m)]), StringComparison.Ordinal);
        Assert.Contains("stands twice", Fault([(0, 0.5m), (0, 0.5m)]), StringComparison.Ordinal);
        Assert.Contains("add up to 1.1", Fault([(0, 0.6m), (1, 0.5m)]), StringComparison.Ordinal);
    }

    private static string Fault((long, decimal)[] rows) => Assert.Throws<ArgumentException>(() => TabulatedLaw.Of(rows)).Message;
}
