using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>
/// Simulated coverage of every law with every after-step: 10⁵ trials a value before noise, fixed seeds, error level 1e-6 each. Two-sided
/// where the coverage is known exactly, one-sided where it is a floor. For lattice laws the value before noise is the worst one, found by
/// going through all remainders on both sides of zero and of the bounds; for continuous ones it is the bound, values near it, and one far
/// off.
/// </summary>
public sealed class SimulatedCoverageTests
{
    private const int Trials = 100_000;
    private const double Level = BinomialLimits.Level;

    private static readonly string[] Continuous = ["laplace:4", "gaussian:9.5", "uniform:10", "staircase:1:3:0.4"];
    private static readonly string[] OnLattice =
        ["discrete-laplace:4", "discrete-gaussian:9.5", "discrete-uniform:10", "discrete-laplace-truncated:3:12"];

    private static Coverage C95 { get; } = Coverage.OfShare(0.95);

    public static TheoryData<string> AllLaws => [.. Continuous, .. OnLattice];

    public static TheoryData<string, string> ContinuousPlain => Plain(Continuous);

    public static TheoryData<string, string> LatticePlain => Plain(OnLattice);

    public static TheoryData<string, string> Thresholds => [.. from law in Continuous.Concat(OnLattice)
                                                               from steps in Steps.WithThreshold
                                                               where OnLattice.Contains(law) || !steps.Value.Any(IsRandom)
                                                               select (law, steps.Key)];

    [Theory, MemberData(nameof(AllLaws))]
    public void Plain_margin_covers_as_often_as_it_says(string lawName)
    {
        var law = NamedLaws.Of(lawName);
        var margin = FigureError.Of(law).MarginAt(C95);
        var hits = Hits(Trials, law, [], 17, 1, (y, x) => Math.Abs(y!.Value - x) <= margin.Width + 1e-9);
        BinomialLimits.AssertTwoSided(hits, Trials, margin.Attained);
    }

    [Theory, MemberData(nameof(ContinuousPlain))]
    public void Range_of_a_continuous_law_covers_at_least_as_often_as_it_says(string lawName, string stepsName)
    {
        var (law, steps) = (NamedLaws.Of(lawName), Steps.WithoutThreshold[stepsName]);
        var error = FigureError.Of(law, steps);
        var (lowest, highest) = Steps.ValuesBeforeNoise(steps);
        foreach (var x in new[] { lowest, lowest + 0.01, lowest + 2.45, highest - 2.2 })
        {
            var hits = Hits(Trials, law, steps, x, 2, (y, value) => IsWithin(error.RangeAt(y!.Value, C95, PossibleValues.Any), value));
            Assert.True(hits >= BinomialLimits.AcceptFrom(Trials, 0.95, Level), $"x = {x}: {hits}");
        }
    }

    [Theory, MemberData(nameof(LatticePlain))]
    public void Range_of_a_lattice_law_covers_its_worst_value_as_often_as_the_exact_sum_says(string lawName, string stepsName)
    {
        var (law, steps) = ((LatticeLaw)NamedLaws.Of(lawName), Steps.WithoutThreshold[stepsName]);
        var (error, exact) = (FigureError.Of(law, steps), new ExactCoverage(law, steps));
        var (lowest, highest) = Steps.ValuesBeforeNoise(steps);
        bool Holds(double? y, double x) => IsWithin(error.RangeAt(y!.Value, C95, PossibleValues.Any), x);
        var (x, chance) = Enumerable.Range(lowest, highest - lowest + 1)
            .Select(x => (Value: x, Chance: exact.Chance(x, y => Holds(y, x))))
            .MinBy(held => held.Chance);
        BinomialLimits.AssertTwoSided(Hits(Trials, law, steps, x, 3, Holds), Trials, chance);
        Assert.True(chance >= error.MarginAt(C95).Attained - 1e-11);
    }

    [Theory, MemberData(nameof(Thresholds))]
    public void Range_covers_as_often_as_it_says_among_figures_that_passed(string lawName, string stepsName)
    {
        var (law, steps) = (NamedLaws.Of(lawName), Steps.WithThreshold[stepsName]);
        var range = Memo(FigureError.Of(law, steps), PossibleValues.Any);
        // Without a rounding every published value is new and its range is worked out anew: fewer trials, judged by their own limits.
        var trials = law is ContinuousLaw && !steps.Any(step => step is AfterStep.RoundTo) ? 4_000 : Trials;
        foreach (var x in new[] { 0.0, 5, 10, 20 })
        {
            var passed = 0;
            var hits = Hits(trials, law, steps, x, 4, (y, value) => Passed(steps, y) && ++passed > 0 && IsWithin(range(y!.Value), value));
            Assert.True(passed == 0 || hits >= BinomialLimits.AcceptFrom(passed, 0.95, Level), $"x = {x}: {hits} of {passed}");
        }
    }

    [Theory, MemberData(nameof(Thresholds))]
    public void Value_just_above_the_range_of_an_unpublished_cell_is_seldom_unpublished(string lawName, string stepsName)
    {
        var (law, steps) = (NamedLaws.Of(lawName), Steps.WithThreshold[stepsName]);
        var beyond = Math.Floor(FigureError.Of(law, steps).RangeWhenNotPublished(C95, PossibleValues.Any).High) + 1;
        var failed = Hits(Trials, law, steps, beyond, 5, (y, _) => !Passed(steps, y));
        Assert.True(failed <= BinomialLimits.AcceptTo(Trials, 0.025, Level), $"x = {beyond}: {failed}");
    }

    [Theory]
    [InlineData("laplace:4")]
    [InlineData("gaussian:9.5")]
    [InlineData("uniform:10")]
    [InlineData("staircase:1:3:0.4")]
    public void Range_near_the_lowest_possible_value_covers_at_least_as_often_as_it_says(string lawName)
    {
        var (law, steps) = (NamedLaws.Of(lawName), new AfterStep[] { new AfterStep.RoundTo(0.1) });
        var range = Memo(FigureError.Of(law, steps), PossibleValues.Any with { Lowest = 0 });
        foreach (var x in new[] { 0, 0.04, 1.7, 6.3 })
        {
            var hits = Hits(Trials, law, steps, x, 6, (y, value) => IsWithin(range(y!.Value), value));
            Assert.True(hits >= BinomialLimits.AcceptFrom(Trials, 0.95, Level), $"x = {x}: {hits}");
        }
    }

    private static TheoryData<string, string> Plain(string[] laws) =>
        [.. from law in laws from steps in Steps.WithoutThreshold.Keys select (law, steps)];

    private static bool IsRandom(AfterStep step) => step is AfterStep.RoundTo { How: RoundingHow.AtRandom };

    private static bool Passed(AfterStep[] steps, double? published) =>
        published is not null && !(published == 0 && steps.Any(step => step is AfterStep.ZeroBelow));

    private static int Hits(int trials, NoiseLaw law, AfterStep[] steps, double x, int seed, Func<double?, double, bool> isHit)
    {
        var random = new Random(seed);
        var hits = 0;
        for (var trial = 0; trial < trials; trial++)
            hits += isHit(Publisher.Draw(steps, x + Samplers.Draw(law, random), random), x) ? 1 : 0;
        return hits;
    }

    private static Func<double, ErrorRange> Memo(FigureError error, PossibleValues possible)
    {
        Dictionary<double, ErrorRange> ranges = [];
        return published => ranges.TryGetValue(published, out var known) ? known : ranges[published] = error.RangeAt(published, C95, possible);
    }

    private static bool IsWithin(ErrorRange range, double x) => range.Low - 1e-9 <= x && x <= range.High + 1e-9;
}
