using ReleaseKit.Noise.Errors;
using static ReleaseKit.Noise.Errors.AfterStep;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>The test helper against the meaning of each step, worked out by hand.</summary>
public sealed class PublisherTests
{
    public static TheoryData<AfterStep, double, double?> Cases => new()
    {
        { new RoundTo(5), 12.5, 15 }, { new RoundTo(5), -12.5, -15 }, { new RoundTo(5), 12.4, 10 },
        { new RoundTo(5, RoundingHow.Nearest, RoundingTies.Up), -12.5, -10 },
        { new RoundTo(5, RoundingHow.Nearest, RoundingTies.Even), 12.5, 10 }, { new RoundTo(5, RoundingHow.Nearest, RoundingTies.Even), 17.5, 20 },
        { new RoundTo(5, RoundingHow.Down), -1, -5 }, { new RoundTo(5, RoundingHow.Up), -4, 0 },
        { new NotBelow(3), 2, 3 }, { new NotAbove(3), 4, 3 }, { new ZeroBelow(7), 6, 0 }, { new ZeroBelow(7), 7, 7 },
        { new PublishedFrom(7), 6, null }, { new PublishedFrom(7), 7, 7 },
    };

    [Theory, MemberData(nameof(Cases))]
    public void Step_does_what_it_says(AfterStep step, double noised, double? published)
    {
        Assert.Equal([(published, 1.0)], Publisher.Outcomes([step], noised));
        Assert.Equal(published, Publisher.Draw([step], noised, new Random(1)));
    }

    [Fact]
    public void Random_rounding_is_unbiased()
    {
        var outcomes = Publisher.Outcomes([new RoundTo(5, RoundingHow.AtRandom)], 12);
        Assert.Equal(12, outcomes.Sum(outcome => outcome.Published!.Value * outcome.Chance), 1e-12);
        Assert.Equal([10.0, 15.0], outcomes.Select(outcome => outcome.Published));
    }
}
