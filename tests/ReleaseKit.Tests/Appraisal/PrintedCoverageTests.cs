using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Appraisal;

/// <summary>
/// The promise of the printed ranges, whatever the count before noise is: added exactly over every noise value, not simulated.
/// The after-steps are applied here by code of its own.
/// </summary>
public sealed class PrintedCoverageTests
{
    private const int Reach = 90;
    private const int LargestCount = 130;

    public static TheoryData<string, AfterStep[]> Steps { get; } = new()
    {
        { "none", [] },
        { "to fives", [new AfterStep.RoundTo(5)] },
        { "to tens, ties to even", [new AfterStep.RoundTo(10, RoundingHow.Nearest, RoundingTies.Even)] },
        { "down to threes", [new AfterStep.RoundTo(3, RoundingHow.Down)] },
        { "not below 0", [new AfterStep.NotBelow(0)] },
        { "to fives, not below 0", [new AfterStep.RoundTo(5), new AfterStep.NotBelow(0)] },
    };

    [Theory]
    [MemberData(nameof(Steps), DisableDiscoveryEnumeration = true)]
    public void Printed_range_holds_every_count_as_often_as_it_says(string name, AfterStep[] steps)
    {
        var law = DiscreteGaussianLaw.Of(9.5);
        var figures = Figures(steps);
        for (var count = 0; count <= LargestCount; count++)
            for (var at = 0; at < 3; at++)
            {
                var held = Noises().Where(noise => Holds(figures[After(steps, count + noise)].Ranges[at], count)).Sum(noise => law.Probability(noise));
                Assert.True(held >= figures[0].Ranges[at].Coverage.Share, $"{name}: {count} is held {held:0.0000} of the time");
            }
    }

    [Fact]
    public void Count_above_the_end_of_a_zero_for_small_values_becomes_zero_as_rarely_as_it_says()
    {
        var law = DiscreteGaussianLaw.Of(9.5);
        var high = (int)new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "0").Figure().Main!.High;
        Assert.True(law.AtMost(29 - (high + 1)) <= 0.025);
        Assert.True(law.AtMost(29 - high) > 0.025);
    }

    [Fact]
    public void Range_of_a_count_that_passed_a_threshold_holds_it_as_often_as_it_says()
    {
        var law = DiscreteGaussianLaw.Of(9.5);
        AfterStep[] steps = [new AfterStep.ZeroBelow(30)];
        var figures = Figures(steps);
        for (var count = 0; count <= LargestCount; count++)
        {
            var passed = Noises().Where(noise => count + noise >= 30).ToList();
            var held = passed.Where(noise => Holds(figures[count + noise].Main!, count)).Sum(noise => law.Probability(noise));
            Assert.True(held >= 0.95 * passed.Sum(noise => law.Probability(noise)) * (1 - 1e-9), $"{count}");
        }
    }

    [Fact]
    public void Printed_ranges_and_zeros_together_miss_a_count_as_rarely_as_the_table_says()
    {
        var law = DiscreteGaussianLaw.Of(9.5);
        AfterStep[] steps = [new AfterStep.ZeroBelow(30)];
        var figures = Figures(steps);
        var most = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, steps), "45").Appraise().FactsOf(0).ExpectedMisses;
        for (var count = 0; count <= LargestCount; count++)
        {
            var missed = Noises().Where(noise => !Holds(figures[After(steps, count + noise)].Main!, count)).Sum(noise => law.Probability(noise));
            Assert.True(missed <= most, $"{count} is missed {missed:0.0000} of the time");
        }
    }

    private static IEnumerable<int> Noises() => Enumerable.Range(-Reach, 2 * Reach + 1);

    private static Dictionary<int, AppraisedFigure> Figures(AfterStep[] steps)
    {
        var values = Enumerable.Range(-Reach, LargestCount + 2 * Reach + 1).Select(value => After(steps, value)).Append(0).Distinct().ToList();
        var release = new SmallRelease()
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, steps), [.. values.Select(value => $"{value}")])
            .Appraise();
        return values.Index().ToDictionary(value => value.Item, value => release.Figure(new FigureRef(0, 0, value.Index)));
    }

    private static bool Holds(FigureRange range, int count) => range.Printed.Low.ToDecimal() <= count && count <= range.Printed.High.ToDecimal();

    private static int After(AfterStep[] steps, int value)
    {
        foreach (var step in steps)
            value = step switch
            {
                AfterStep.RoundTo { How: RoundingHow.Down, Unit: var unit } => (int)(Math.Floor(value / unit) * unit),
                AfterStep.RoundTo { Ties: RoundingTies.Even, Unit: var unit } => (int)(Math.Round(value / unit, MidpointRounding.ToEven) * unit),
                AfterStep.RoundTo { Unit: var unit } => (int)(Math.Round(value / unit, MidpointRounding.AwayFromZero) * unit),
                AfterStep.NotBelow { Bound: var bound } => Math.Max(value, (int)bound),
                AfterStep.ZeroBelow { Threshold: var threshold } => value < threshold ? 0 : value,
                _ => throw new InvalidOperationException("A step that this test does not apply."),
            };
        return value;
    }
}
