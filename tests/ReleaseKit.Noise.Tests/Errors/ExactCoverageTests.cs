using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Noise.Tests.Simulation;

namespace ReleaseKit.Noise.Tests.Errors;

/// <summary>
/// The promise of every lattice law with every after-step at every value before noise in a window around zero, the bounds and the
/// thresholds, summed over all noise steps: no sampling, so any shortfall shows.
/// </summary>
public sealed class ExactCoverageTests
{
    private const double Rounding = 1e-11;

    private static readonly string[] Symmetric =
    [
        "discrete-laplace:4", "discrete-laplace:0.4", "discrete-gaussian:9.5", "discrete-gaussian:0.3", "discrete-uniform:10",
        "discrete-laplace-truncated:3:12",
    ];

    private static readonly double[] Shares = [0.5, 0.95, 0.99];

    public static TheoryData<string, string, double> Plain =>
        Cases("tabulated", Steps.WithoutThreshold.Keys);

    public static TheoryData<string, string, double> Thresholds =>
        Cases("tabulated whole", Steps.WithThreshold.Keys);

    [Theory, MemberData(nameof(Plain))]
    public void Margin_is_the_smallest_that_holds_at_every_value(string lawName, string stepsName, double share)
    {
        var (exact, error, steps) = Of(lawName, stepsName);
        var margin = error.MarginAt(Coverage.OfShare(share));
        double Worst(double width) => Enumerable.Range(-45, 91).Min(x => exact.Chance(x, y => Math.Abs(y!.Value - x) <= width));
        if (!steps.Any(step => step is AfterStep.NotBelow or AfterStep.NotAbove))
        {
            Assert.Equal(Worst(margin.Width), margin.Attained, Rounding);
            Assert.True(margin.Width == 0 || Worst(margin.Width - 1) < share);
        }
        Assert.True(margin.Attained >= share - Rounding);
    }

    [Theory]
    [InlineData("discrete-laplace:20", 30, RoundingHow.Nearest, RoundingTies.Away)]
    [InlineData("discrete-gaussian:30", 50, RoundingHow.Nearest, RoundingTies.Even)]
    [InlineData("discrete-gaussian:30", 7, RoundingHow.Nearest, RoundingTies.Up)]
    [InlineData("discrete-uniform:25", 40, RoundingHow.Up, RoundingTies.Away)]
    [InlineData("discrete-laplace-truncated:20:80", 40, RoundingHow.Down, RoundingTies.Away)]
    [InlineData("discrete-gaussian:9.5", 20, RoundingHow.AtRandom, RoundingTies.Away)]
    public void Margin_after_a_wide_rounding_is_the_smallest_that_holds_at_every_value(string lawName, int unit, RoundingHow how, RoundingTies ties)
    {
        var law = (LatticeLaw)NamedLaws.Of(lawName);
        AfterStep[] steps = [new AfterStep.RoundTo(unit, how, ties)];
        var (exact, margin) = (new ExactCoverage(law, steps), FigureError.Of(law, steps).MarginAt(Coverage.OfShare(0.9)));
        var farthest = (int)margin.Width + 3 * unit;
        double Worst(double width) => Enumerable.Range(-farthest, 2 * farthest + 1).Min(x => exact.Chance(x, y => Math.Abs(y!.Value - x) <= width));
        Assert.Equal(Worst(margin.Width), margin.Attained, Rounding);
        Assert.True(Worst(margin.Width - 1) < 0.9);
    }

    [Theory, MemberData(nameof(Plain))]
    public void Range_holds_at_every_possible_value(string lawName, string stepsName, double share)
    {
        var (exact, error, steps) = Of(lawName, stepsName);
        var (lowest, highest) = Steps.ValuesBeforeNoise(steps);
        foreach (var possible in new[] { PossibleValues.Any, PossibleValues.Counts with { Highest = highest } })
        {
            var holds = Holding(error, Coverage.OfShare(share), possible);
            foreach (var x in Enumerable.Range(lowest, highest - lowest + 1).Where(x => x >= possible.Lowest))
                Assert.True(exact.Chance(x, y => holds(y!.Value, x)) >= share - Rounding, $"{possible} {x}");
        }
    }

    [Theory, MemberData(nameof(Thresholds))]
    public void Range_holds_at_every_possible_value_among_figures_that_passed(string lawName, string stepsName, double share)
    {
        var (exact, error, steps) = Of(lawName, stepsName);
        var coverage = Coverage.OfShare(share);
        var (lowest, highest) = Steps.ValuesBeforeNoise(steps);
        var possible = lowest < 0 ? PossibleValues.Any : PossibleValues.Counts with { Highest = highest };
        var zeroed = steps.Any(step => step is AfterStep.ZeroBelow);
        bool Passed(double? y) => y is not null && !(zeroed && y == 0);
        var holds = Holding(error, coverage, possible);
        var failed = error.RangeWhenNotPublished(coverage, possible);
        for (var x = lowest; x <= highest; x++)
        {
            var passed = exact.Chance(x, Passed);
            if (passed > 1e-5)
                Assert.True(exact.Chance(x, y => Passed(y) && holds(y!.Value, x)) >= passed * share - Rounding, $"{x}");
            if (x > failed.High)
                Assert.True(exact.Chance(x, y => !Passed(y)) <= coverage.Rest / 2 + Rounding, $"{x}");
        }
    }

    [Theory, MemberData(nameof(Thresholds))]
    public void Ranges_under_a_threshold_miss_at_most_as_often_as_is_said_zeros_included(string lawName, string stepsName, double share)
    {
        var (exact, error, steps) = Of(lawName, stepsName);
        var (lowest, highest) = Steps.ValuesBeforeNoise(steps);
        var holds = Holding(error, Coverage.OfShare(share), PossibleValues.Any);
        var most = error.MissesAtMost(Coverage.OfShare(share));
        foreach (var x in Enumerable.Range(lowest, highest - lowest + 1))
        {
            var published = exact.Chance(x, y => y is not null);
            if (published > 1e-5)
                Assert.True(exact.Chance(x, y => y is not null && !holds(y.Value, x)) <= published * most + Rounding, $"{x}");
        }
    }

    [Fact]
    public void Ranges_with_zeros_do_miss_more_often_than_the_rest_of_the_coverage()
    {
        // Discrete Gaussian of 9.5, zero below 30: so the promise is one about the figures not set to 0.
        AfterStep[] steps = [new AfterStep.ZeroBelow(30)];
        var (exact, error) = (new ExactCoverage(DiscreteGaussianLaw.Of(9.5), steps), FigureError.Of(DiscreteGaussianLaw.Of(9.5), steps));
        var holds = Holding(error, Coverage.OfShare(0.95), PossibleValues.Counts);
        var missed = Enumerable.Range(0, 130).Max(x => exact.Chance(x, y => !holds(y!.Value, x)));
        Assert.InRange(missed, 0.05, error.MissesAtMost(Coverage.OfShare(0.95)));
    }

    private static TheoryData<string, string, double> Cases(string table, IEnumerable<string> chains) =>
        [.. from law in Symmetric.Append(table) from steps in chains from share in Shares select (law, steps, share)];

    private static (ExactCoverage Exact, FigureError Error, AfterStep[] Steps) Of(string lawName, string stepsName)
    {
        var steps = Steps.All[stepsName];
        var law = Tables.TryGetValue(lawName, out var table) ? table : (LatticeLaw)NamedLaws.Of(lawName);
        return (new ExactCoverage(law, steps), FigureError.Of(law, steps), steps);
    }

    /// <summary>Invented: skewed, with holes; the first lacks 0.0005 of its mass.</summary>
    private static Dictionary<string, LatticeLaw> Tables { get; } = new()
    {
        ["tabulated"] = TabulatedLaw.Of([(-3, 0.05m), (-2, 0.1m), (-1, 0.2m), (0, 0.3m), (2, 0.25m), (3, 0.05m), (4, 0.04m), (7, 0.0095m)]),
        ["tabulated whole"] = TabulatedLaw.Of([(-9, 0.05m), (-2, 0.1m), (-1, 0.2m), (0, 0.3m), (2, 0.25m), (3, 0.05m), (9, 0.05m)]),
    };

    private static Func<double, double, bool> Holding(FigureError error, Coverage coverage, PossibleValues possible)
    {
        Dictionary<double, ErrorRange> ranges = [];
        return (published, x) =>
        {
            if (!ranges.TryGetValue(published, out var range))
                ranges[published] = range = error.RangeAt(published, coverage, possible);
            return range.Low <= x && x <= range.High;
        };
    }
}
