using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Errors;

/// <summary>The upper end below what is possible against the definition of Feldman &amp; Cousins 1998, taken literally.</summary>
public sealed class LikelihoodRatioTests
{
    public static TheoryData<string, double> Cases =>
        [.. from law in new[] { "discrete-laplace:4", "discrete-gaussian:9.5", "discrete-gaussian:2.7", "discrete-laplace:0.8" }
            from share in new[] { 0.5, 0.95, 0.99 }
            select (law, share)];

    [Theory, MemberData(nameof(Cases))]
    public void Upper_end_is_that_of_the_ordering_by_likelihood_ratio(string lawName, double share)
    {
        var law = (LatticeLaw)NamedLaws.Of(lawName);
        var (error, coverage) = (FigureError.Of(law), Coverage.OfShare(share));
        var margin = error.MarginAt(coverage).Width;
        for (var y = -1; y >= -3 * margin; y--)
        {
            var expected = Enumerable.Range(0, (int)(4 * margin) + 4).Where(x => Accepts(law, x, y, share)).Max();
            var range = error.RangeAt(y, coverage, PossibleValues.Counts);
            Assert.Equal(Math.Max(1, Math.Max(y + margin, expected)), range.High);
            Assert.Equal(0, range.Low);
        }
    }

    // The outcomes of x with a higher ratio than y, added up, leave room for y.
    private static bool Accepts(LatticeLaw law, int x, int y, double share)
    {
        double Ratio(int outcome) => law.Probability(outcome - x) / law.Probability(Math.Min(0, outcome));
        var ratio = Ratio(y) * (1 + 1e-11);
        var reach = (int)law.StepsBeyondWhich(1e-13);
        var above = Enumerable.Range(x - reach, 2 * reach + 1).Where(outcome => Ratio(outcome) > ratio);
        return above.Sum(outcome => law.Probability(outcome - x)) < share - 1e-12;
    }

    [Fact]
    public void Lower_end_above_what_is_possible_mirrors_the_upper_end_below()
    {
        var error = FigureError.Of(DiscreteGaussianLaw.Of(9.5));
        var below = error.RangeAt(-25, Coverage.OfShare(0.95), PossibleValues.Any with { Lowest = 0 });
        var above = error.RangeAt(125, Coverage.OfShare(0.95), PossibleValues.Any with { Highest = 100 });
        Assert.Equal((0, 4, 96, 100), (below.Low, below.High, above.Low, above.High));
    }

    [Theory]
    [InlineData("gaussian:9.5", -9.5)]
    [InlineData("gaussian:9.5", -40)]
    [InlineData("laplace:4", -100)]
    [InlineData("uniform:10", -9)]
    [InlineData("uniform:10", -50)]
    [InlineData("staircase:1:3:0.4", -60)]
    [InlineData("discrete-gaussian:9.5", -5000)]
    [InlineData("discrete-uniform:10", -50)]
    [InlineData("discrete-gaussian:0.05", -1)]
    public void Range_below_what_is_possible_is_never_one_value(string lawName, double published)
    {
        var range = FigureError.Of(NamedLaws.Of(lawName)).RangeAt(published, Coverage.OfShare(0.95), PossibleValues.Any with { Lowest = 0 });
        Assert.Equal(0, range.Low);
        Assert.True(range.High > 0);
    }
}
