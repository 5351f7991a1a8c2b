using ReleaseKit.Noise.Errors;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;

namespace ReleaseKit.Reading.Mechanisms;

/// <summary>Reads "afterwards": the steps after the noise, in order.</summary>
internal static class AfterStepsReader
{
    private static readonly string[] Steps = ["roundTo", "notBelow", "notAbove", "zeroBelow"];

    private static readonly Dictionary<string, RoundingHow> Hows = new()
    {
        ["nearest"] = RoundingHow.Nearest,
        ["down"] = RoundingHow.Down,
        ["up"] = RoundingHow.Up,
        ["at-random"] = RoundingHow.AtRandom,
    };

    private static readonly Dictionary<string, RoundingTies> Ties = new()
    {
        ["away"] = RoundingTies.Away,
        ["up"] = RoundingTies.Up,
        ["even"] = RoundingTies.Even,
    };

    /// <summary>The steps, or null if one of them is wrong.</summary>
    public static IReadOnlyList<AfterStep>? Read(ObjectReader mechanism)
    {
        var values = mechanism.List("afterwards");
        var steps = values.Select(value => Step(value, mechanism.Context)).OfType<AfterStep>().ToList();
        return steps.Count == values.Count && BoundsStand(steps, values, mechanism.Context) ? steps : null;
    }

    private static AfterStep? Step(JsonValue value, ReadContext context)
    {
        if (ObjectReader.Open(value, "afterwards", MechanismShapes.AfterStep, context) is not { } keys || keys.Has("adjusted"))
            return null;
        if (Steps.Count(keys.Has) == 1)
            return Rounding(keys) ?? Bound(keys);
        context.Add(MechanismProblems.StepUnclear(keys.At, context.Owner));
        return null;
    }

    private static AfterStep? Rounding(ObjectReader keys)
    {
        var how = keys.Choice("how", Hows) ?? RoundingHow.Nearest;
        var ties = keys.Choice("ties", Ties) ?? RoundingTies.Away;
        return keys.Number("roundTo", NumberRange.RoundingUnit) is { } unit ? new AfterStep.RoundTo(unit, how, ties) : null;
    }

    private static AfterStep? Bound(ObjectReader keys)
    {
        if (keys.Number("notBelow", NumberRange.Any) is { } lowest)
            return new AfterStep.NotBelow(lowest);
        if (keys.Number("notAbove", NumberRange.Any) is { } highest)
            return new AfterStep.NotAbove(highest);
        return keys.Number("zeroBelow", NumberRange.Positive) is { } threshold ? new AfterStep.ZeroBelow(threshold) : null;
    }

    /// <summary>A bound before a rounding must be a multiple of its unit.</summary>
    private static bool BoundsStand(IReadOnlyList<AfterStep> steps, IReadOnlyList<JsonValue> values, ReadContext context)
    {
        var stand = true;
        for (var index = 0; index < steps.Count; index++)
        {
            var bound = steps[index] switch { AfterStep.NotBelow low => low.Bound, AfterStep.NotAbove high => high.Bound, _ => (double?)null };
            var off = steps.Skip(index + 1).OfType<AfterStep.RoundTo>().FirstOrDefault(round => bound is not null && !LawReader.IsMultiple(bound.Value, round.Unit));
            if (off is null)
                continue;
            context.Add(MechanismProblems.BoundOffRounding(values[index].At, steps[index] is AfterStep.NotBelow ? "notBelow" : "notAbove", bound!.Value, off.Unit, context.Owner));
            stand = false;
        }
        return stand;
    }
}
