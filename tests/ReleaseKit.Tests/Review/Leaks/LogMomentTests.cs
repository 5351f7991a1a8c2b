using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Review.Leaks;
using Xunit;

namespace ReleaseKit.Tests.Review.Leaks;

/// <summary>The bound on a gap against moments added up value by value, and against the exact law of sums: never below them, and near them.</summary>
public sealed class LogMomentTests
{
    public static TheoryData<string> Names => [.. Laws.Keys];

    private static readonly Dictionary<string, NoiseLaw> Laws = new()
    {
        ["laplace"] = LaplaceLaw.Of(4),
        ["gaussian"] = GaussianLaw.Of(4),
        ["uniform"] = UniformLaw.Of(4),
        ["staircase"] = StaircaseLaw.Of(0.5, 2, 0.3),
        ["staircase without high parts"] = StaircaseLaw.Of(0.5, 2, 0),
        ["discrete Laplace"] = DiscreteLaplaceLaw.Of(4),
        ["narrow discrete Laplace"] = DiscreteLaplaceLaw.Of(0.4, 0.5),
        ["discrete Gaussian"] = DiscreteGaussianLaw.Of(0.6),
        ["discrete uniform"] = DiscreteUniformLaw.Of(1),
        ["truncated discrete Laplace"] = TruncatedDiscreteLaplaceLaw.Of(4, 6),
        ["lopsided table"] = TabulatedLaw.Of([(-1, 0.5m), (0, 0.2m), (3, 0.3m)], 2),
        ["sum"] = IntegerSum.Of((DiscreteLaplaceLaw.Of(3), 3), (DiscreteUniformLaw.Of(2), 1)),
    };

    [Theory]
    [MemberData(nameof(Names))]
    public void Moment_is_bounded_from_above(string name)
    {
        foreach (var rate in new[] { 0.001, 0.05, 0.15, 0.2 })
        {
            var bound = LogMoment.Of(FigureError.Of(Laws[name]), rate);
            Assert.InRange(Math.Max(Moment(Laws[name], x => rate * x), Moment(Laws[name], x => -rate * x)), -1, bound + 1e-6);
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Moment_above_a_floor_is_bounded_from_above(string name)
    {
        foreach (var rate in new[] { 0.001, 0.05, 0.15, 0.2 })
        {
            var bound = LogMoment.Of(FigureError.Of(Laws[name], new AfterStep.NotBelow(0)), rate);
            Assert.InRange(Moment(Laws[name], x => Math.Max(0, rate * x)), -1, bound + 1e-6);
        }
    }

    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    [InlineData(40)]
    public void Bound_of_a_sum_is_no_smaller_than_its_chance_and_not_far_from_it(int count)
    {
        // A floor far below takes the exact law away and leaves the noise as it is; its own bound is a little wider.
        foreach (var law in Laws.Values.OfType<LatticeLaw>().Where(law => law is not TabulatedLaw))
        {
            var (sum, spread) = (IntegerSum.Of((law, count)), Math.Sqrt(count * law.Variance));
            foreach (var width in new[] { 2, 4, 5, 6 }.Select(times => times * spread))
            {
                var chance = 2 * sum.AtLeast(width);
                Assert.InRange(ChanceOfGap.Of([.. Enumerable.Repeat(FigureError.Of(law), count)], width), chance, 1);
                Assert.InRange(ChanceOfGap.Of([.. Enumerable.Repeat(FigureError.Of(law, new AfterStep.NotAbove(1e9)), count)], width), chance, 1);
            }
        }
    }

    [Theory]
    [InlineData(8, 1.2e-15, 1e-13)]
    [InlineData(5, 5.7e-7, 1e-5)]
    public void Continuous_noise_with_rounding_is_told_by_the_bound(double spreads, double least, double most)
    {
        var errors = Enumerable.Repeat(FigureError.Of(GaussianLaw.Of(5), new AfterStep.RoundTo(0.01)), 16).ToList();
        Assert.InRange(ChanceOfGap.Of(errors, spreads * 20), least, most);
    }

    private static double Moment(NoiseLaw law, Func<double, double> exponent) => Math.Log(law is LatticeLaw lattice
        ? Enumerable.Range(-400, 801).Sum(step => lattice.Probability(step) * Math.Exp(exponent(step * lattice.Grid)))
        : Enumerable.Range(-200_000, 400_000).Sum(cell => ((ContinuousLaw)law).Density((cell + 0.5) / 1000) * Math.Exp(exponent((cell + 0.5) / 1000)) / 1000));
}
