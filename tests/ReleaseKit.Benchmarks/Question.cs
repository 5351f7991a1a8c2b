using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Benchmarks;

/// <summary>
/// One question a figure asks of its law at a scale, and how it is asked: every call comes with a coverage of its own, so that no kept
/// answer is measured. Null where the question is refused.
/// </summary>
public sealed record Question(string Name, Func<NoiseLaw, double, Action<Coverage>?> Of)
{
    public static IReadOnlyList<Question> All { get; } =
    [
        new("half-width", (law, _) => coverage => law.HalfWidthAt(coverage)),
        new("attained coverage", (law, scale) => coverage => law.Within(coverage.Share * scale)),
        new("distribution function", (law, scale) => coverage => law.AtMost(coverage.Share * scale)),
        new("density or pmf", (law, scale) => coverage => law.RelativeDensity(coverage.Share * scale)),
        Range("range, cut to possible", 1.5),
        Range("range at 0", 0),
        Range("range below 0", -1),
        Range("range far below 0", -4),
        Range("range, at a threshold", 3, law => [Threshold(law, 3)]),
        Range("range, far above a threshold", 15, law => [Threshold(law, 3)]),
        Range("range, threshold after rounding to 100 at random", 3, law => [ToStepsOf(law, 100, RoundingHow.AtRandom), Threshold(law, 3)]),
        new("range, unpublished", (law, _) => Try(law, [Threshold(law, 3)]) is { } error
            ? coverage => error.RangeWhenNotPublished(coverage, PossibleValues.Counts)
            : null),
        Margin("margin, rounded to 5 steps", 5),
        Margin("margin, rounded to 100 steps", 100),
        Margin("margin, rounded to 10000 steps", 10_000),
        Margin("margin, rounded to 100 steps at random", 100, RoundingHow.AtRandom),
        Margin("margin, rounded to 1000 steps at random", 1000, RoundingHow.AtRandom),
    ];

    private static Question Range(string name, double deviations, Func<NoiseLaw, AfterStep[]>? steps = null) => new(name, (law, _) =>
        Try(law, steps is null ? [] : steps(law)) is { } error
            ? coverage => error.RangeAt(OnGrid(law, deviations), coverage, PossibleValues.Counts)
            : null);

    private static Question Margin(string name, double steps, RoundingHow how = RoundingHow.Nearest) => new(name, (law, _) =>
        Try(law, [ToStepsOf(law, steps, how)]) is { } error ? coverage => error.MarginAt(coverage) : null);

    private static AfterStep.PublishedFrom Threshold(NoiseLaw law, double deviations) => new(OnGrid(law, deviations));

    private static AfterStep.RoundTo ToStepsOf(NoiseLaw law, double steps, RoundingHow how) => new(steps * Step(law), how);

    private static double OnGrid(NoiseLaw law, double deviations) => Math.Ceiling(deviations * Math.Sqrt(law.Variance) / Step(law)) * Step(law);

    private static double Step(NoiseLaw law) => (law as LatticeLaw)?.Grid ?? 1;

    private static FigureError? Try(NoiseLaw law, AfterStep[] steps)
    {
        try
        {
            return FigureError.Of(law, steps);
        }
        catch (ArgumentException)
        {
            return null;
        }
    }
}
