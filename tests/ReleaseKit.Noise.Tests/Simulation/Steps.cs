using ReleaseKit.Noise.Errors;
using static ReleaseKit.Noise.Errors.AfterStep;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>The after-steps that the tests go through, by name.</summary>
internal static class Steps
{
    public static IReadOnlyDictionary<string, AfterStep[]> WithoutThreshold { get; } = new Dictionary<string, AfterStep[]>
    {
        ["none"] = [],
        ["nearest 5"] = [new RoundTo(5)],
        ["nearest 10, ties away"] = [new RoundTo(10)],
        ["nearest 10, ties up"] = [new RoundTo(10, RoundingHow.Nearest, RoundingTies.Up)],
        ["nearest 10, ties even"] = [new RoundTo(10, RoundingHow.Nearest, RoundingTies.Even)],
        ["nearest 2, ties even"] = [new RoundTo(2, RoundingHow.Nearest, RoundingTies.Even)],
        ["down to 4"] = [new RoundTo(4, RoundingHow.Down)],
        ["up to 4"] = [new RoundTo(4, RoundingHow.Up)],
        ["at random to 5"] = [new RoundTo(5, RoundingHow.AtRandom)],
        ["not below 0"] = [new NotBelow(0)],
        ["not below 0, not above 20"] = [new NotBelow(0), new NotAbove(20)],
        ["nearest 5, then not below 0"] = [new RoundTo(5), new NotBelow(0)],
        ["not below 0, then nearest 5"] = [new NotBelow(0), new RoundTo(5)],
        ["nearest 10, then not below 3"] = [new RoundTo(10), new NotBelow(3)],
        ["at random to 5, then not below 0"] = [new RoundTo(5, RoundingHow.AtRandom), new NotBelow(0)],
        ["not below 0, then at random to 5"] = [new NotBelow(0), new RoundTo(5, RoundingHow.AtRandom)],
    };

    public static IReadOnlyDictionary<string, AfterStep[]> WithThreshold { get; } = new Dictionary<string, AfterStep[]>
    {
        ["zero below 7"] = [new ZeroBelow(7)],
        ["published from 12"] = [new PublishedFrom(12)],
        ["not below 0, published from 12"] = [new NotBelow(0), new PublishedFrom(12)],
        ["nearest 5, zero below 10"] = [new RoundTo(5), new ZeroBelow(10)],
        ["zero below 12, nearest 5"] = [new ZeroBelow(12), new RoundTo(5)],
        ["zero below 12, up to 4"] = [new ZeroBelow(12), new RoundTo(4, RoundingHow.Up)],
        ["zero below 12, down to 4"] = [new ZeroBelow(12), new RoundTo(4, RoundingHow.Down)],
        ["zero below 2, nearest 10"] = [new ZeroBelow(2), new RoundTo(10)],
        ["nearest 10, ties even, published from 30"] = [new RoundTo(10, RoundingHow.Nearest, RoundingTies.Even), new PublishedFrom(30)],
        ["down to 4, published from 8"] = [new RoundTo(4, RoundingHow.Down), new PublishedFrom(8)],
        ["up to 4, not below 0, published from 8"] = [new RoundTo(4, RoundingHow.Up), new NotBelow(0), new PublishedFrom(8)],
        ["at random to 5, zero below 10"] = [new RoundTo(5, RoundingHow.AtRandom), new ZeroBelow(10)],
        ["published from 12, not above 30"] = [new PublishedFrom(12), new NotAbove(30)],
    };

    public static IReadOnlyDictionary<string, AfterStep[]> All { get; } = WithoutThreshold.Concat(WithThreshold).ToDictionary();

    /// <summary>The lowest and highest whole value before noise that respect the bounds among the steps, within a window wide enough for
    /// every case here.</summary>
    public static (int Lowest, int Highest) ValuesBeforeNoise(IReadOnlyList<AfterStep> steps) => (
        (int)steps.OfType<NotBelow>().Select(step => step.Bound).DefaultIfEmpty(-25).Max(),
        (int)steps.OfType<NotAbove>().Select(step => step.Bound).DefaultIfEmpty(60).Min());
}
