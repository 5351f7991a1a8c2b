using System.Diagnostics;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Laws;

/// <summary>Scales from 1e-3 to 1e12 and coverages near 0 and 1 give finite, ordered answers and never hang.</summary>
public sealed class ExtremesTests
{
    private static readonly double[] Scales = [1e-3, 0.01, 0.5, 15.999, 16, 1e3, 1e6, 1e9, 1e12];
    private static readonly double[] Shares = [1e-9, 0.5, 0.95, 1 - 1e-9, 1 - 1e-15];
    private static readonly AfterStep[][] Chains = [[], [new AfterStep.RoundTo(10)], [new AfterStep.PublishedFrom(30)]];

    private static readonly string[] Names =
        ["laplace", "gaussian", "uniform", "staircase", "discrete-laplace", "discrete-gaussian", "discrete-uniform", "truncated"];

    public static TheoryData<string, double> Cases => [.. from law in Names from scale in Scales select (law, scale)];

    [Theory, MemberData(nameof(Cases))]
    public void Answers_are_finite_and_quick(string lawName, double scale)
    {
        var clock = Stopwatch.StartNew();
        var law = LawOf(lawName, scale);
        foreach (var coverage in Shares.Select(Coverage.OfShare))
        {
            var half = law.HalfWidthAt(coverage);
            Assert.True(double.IsFinite(half.Width) && half.Width >= 0);
            Assert.InRange(half.Attained, coverage.Share - 2e-12, 1);
            foreach (var steps in Chains.Where(steps => !(steps is [AfterStep.PublishedFrom] && law is StaircaseLaw { Epsilon: < 1e-4 })))
            {
                var error = FigureError.Of(law, steps);
                foreach (var published in new[] { 40, 1e6, 1e12, -10, -1e12 })
                    AssertOrdered(error.RangeAt(published, coverage, PossibleValues.Counts));
            }
        }
        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(20));
    }

    [Theory, MemberData(nameof(Cases))]
    public void Probabilities_at_the_ends_of_the_line_are_0_and_1(string lawName, double scale)
    {
        var law = LawOf(lawName, scale);
        Assert.Equal((0.0, 1.0), (law.AtMost(double.NegativeInfinity), law.AtMost(double.PositiveInfinity)));
        Assert.Equal((1.0, 0.0), (law.AtLeast(double.NegativeInfinity), law.AtLeast(double.PositiveInfinity)));
        Assert.Equal((0.0, 1.0), (law.Within(-1), law.Within(double.PositiveInfinity)));
        Assert.Equal((0.0, 0.0), (law.AtMost(double.MinValue), law.AtLeast(double.MaxValue)));
    }

    private static NoiseLaw LawOf(string name, double scale) => name switch
    {
        "staircase" => StaircaseLaw.Of(1 / scale, 1, 0.4),
        "discrete-uniform" => DiscreteUniformLaw.Of(Math.Ceiling(scale)),
        "truncated" => TruncatedDiscreteLaplaceLaw.Of(scale, Math.Ceiling(5 * scale)),
        _ => NamedLaws.Of(name, [scale]),
    };

    private static void AssertOrdered(ErrorRange range)
    {
        Assert.True(range.Low <= range.High, $"{range}");
        Assert.True(range.Low >= 0 && double.IsFinite(range.High), $"{range}");
    }

    /// <summary>Between these cutoffs a^cutoff is no full double any more; the law is that without a cutoff to the last digits.</summary>
    [Theory]
    [InlineData(700)]
    [InlineData(720)]
    [InlineData(739.811)]
    [InlineData(744)]
    [InlineData(800)]
    public void Cutoff_far_out_changes_no_digit(double cutoffInScales)
    {
        var (cut, whole) = (TruncatedDiscreteLaplaceLaw.Of(1000, 1000 * cutoffInScales), DiscreteLaplaceLaw.Of(1000));
        Assert.All(Enumerable.Range(-5, 11), step =>
        {
            Assert.Equal(whole.Probability(step), cut.Probability(step), 1e-14 * whole.Probability(step));
            Assert.Equal(whole.AtMostStep(step), cut.AtMostStep(step), 1e-15);
        });
    }
}
