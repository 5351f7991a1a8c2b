using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>Which steps make sense, alone, together and with a law; what does not is refused in words.</summary>
internal static class StepRules
{
    /// <exception cref="ArgumentException">Lists every fault.</exception>
    public static void Check(NoiseLaw law, IReadOnlyList<AfterStep> steps)
    {
        List<string> faults = [.. steps.Select(Alone).OfType<string>(), .. Bounds(steps), .. Thresholds(law, steps)];
        if (faults.Count > 0)
            throw new ArgumentException(string.Join(' ', faults), nameof(steps));
    }

    /// <summary>The bound of a step that keeps values from passing it, or null.</summary>
    public static double? BoundOf(AfterStep step) => step switch
    {
        AfterStep.NotBelow lower => lower.Bound,
        AfterStep.NotAbove upper => upper.Bound,
        _ => null,
    };

    private static string? Alone(AfterStep step) => step switch
    {
        AfterStep.RoundTo round when !IsPositive(round.Unit) =>
            Say($"Rounding to {round.Unit}: the unit must be a finite number above 0."),
        AfterStep.ZeroBelow zero when !IsPositive(zero.Threshold) =>
            Say($"Zero below {zero.Threshold}: the threshold must be a finite number above 0."),
        AfterStep.PublishedFrom from when !double.IsFinite(from.Threshold) =>
            Say($"Published from {from.Threshold}: the threshold must be finite."),
        _ when BoundOf(step) is { } bound && !double.IsFinite(bound) =>
            Say($"A bound of {bound}: a bound must be finite; leave the step out if there is none."),
        _ => null,
    };

    private static IEnumerable<string> Bounds(IReadOnlyList<AfterStep> steps)
    {
        for (var i = 0; i < steps.Count; i++)
        {
            if (BoundOf(steps[i]) is not { } bound)
                continue;
            foreach (var later in steps.Skip(i + 1).OfType<AfterStep.RoundTo>().Where(later => !Lattice.IsWhole(bound / later.Unit)))
            {
                yield return Say($"The bound {bound} stands before rounding to {later.Unit} and is no multiple of it, so that ")
                    + "rounding can cross the bound: put it after the rounding.";
            }
        }
        var (lower, upper) = (Highest<AfterStep.NotBelow>(steps), Lowest<AfterStep.NotAbove>(steps));
        if (lower > upper)
            yield return Say($"Not below {lower} and not above {upper}: nothing lies between.");
    }

    private static IEnumerable<string> Thresholds(NoiseLaw law, IReadOnlyList<AfterStep> steps)
    {
        var at = steps.Index().Where(step => ThresholdOf(step.Item) is not null).ToList();
        if (at.Count == 0)
            yield break;
        var (place, step) = at[0];
        var threshold = ThresholdOf(step)!.Value;
        if (at.Count > 1)
            yield return "There are two thresholds: give one.";
        if (!law.IsLogConcave && !HullScan.Knows(law))
        {
            yield return Say($"A threshold after {law.GetType().Name} with these parameters is not worked out: ")
                + "its figures have no valid range.";
        }
        var (lowest, highest) = (Highest<AfterStep.NotBelow>(steps.Take(place)), Lowest<AfterStep.NotAbove>(steps));
        if (highest < threshold)
            yield return Say($"Nothing above {highest} is published, yet the threshold is {threshold}: no figure could pass it.");
        if (lowest >= threshold)
            yield return Say($"Every value is at least {lowest} before the threshold {threshold}: leave the threshold out.");
        if (step is AfterStep.ZeroBelow && Highest<AfterStep.NotBelow>(steps.Skip(place)) > 0)
            yield return "A lower bound above 0 after the threshold would change the zeros: put it before the threshold.";
        foreach (var fault in ThresholdAndRounding(law, steps, place))
            yield return fault;
    }

    private static IEnumerable<string> ThresholdAndRounding(NoiseLaw law, IReadOnlyList<AfterStep> steps, int place)
    {
        var roundings = StepChain.EffectiveRoundings(law, steps).ToList();
        if (roundings.Count > 1)
            yield return "A threshold together with more than one rounding is not worked out.";
        foreach (var rounding in roundings)
        {
            if (law is LatticeLaw lattice && !StepChain.IsExact(rounding, lattice))
            {
                yield return Say($"A threshold together with rounding to {rounding.Unit} on a grid of {lattice.Grid} is not worked out: ")
                    + Say($"round to a whole number of grid steps, at most {StepChain.LargestExactUnit}.");
            }
            if (rounding.How is RoundingHow.AtRandom && (law is not LatticeLaw || steps.Skip(place).Contains(rounding)))
                yield return "A threshold together with random rounding is worked out for lattice laws alone, and only after the rounding.";
        }
    }

    public static double? ThresholdOf(AfterStep step) => step switch
    {
        AfterStep.ZeroBelow zero => zero.Threshold,
        AfterStep.PublishedFrom from => from.Threshold,
        _ => null,
    };

    private static bool IsPositive(double value) => double.IsFinite(value) && value > 0;

    private static double Highest<T>(IEnumerable<AfterStep> steps)
        where T : AfterStep => steps.OfType<T>().Select(step => BoundOf(step)!.Value).DefaultIfEmpty(double.NegativeInfinity).Max();

    private static double Lowest<T>(IEnumerable<AfterStep> steps)
        where T : AfterStep => steps.OfType<T>().Select(step => BoundOf(step)!.Value).DefaultIfEmpty(double.PositiveInfinity).Min();

    private static string Say(FormattableString text) => FormattableString.Invariant(text);
}
