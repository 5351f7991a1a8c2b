using ReleaseKit.Noise.Errors;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>
/// What an office does to a noised value, step by step and in decimal arithmetic: written from the meaning of the steps, sharing nothing
/// with the code under test. Null is "not published".
/// </summary>
internal static class Publisher
{
    /// <summary>Every published value there can be, with its chance; several only under random rounding.</summary>
    public static IEnumerable<(double? Published, double Chance)> Outcomes(IReadOnlyList<AfterStep> steps, double noised)
    {
        var place = steps.ToList().FindIndex(step => step is AfterStep.RoundTo { How: RoundingHow.AtRandom });
        if (place < 0)
            return [(Publish(steps, noised, false), 1)];
        var up = ChanceOfUp((AfterStep.RoundTo)steps[place], Publish([.. steps.Take(place)], noised, false));
        return [(Publish(steps, noised, false), 1 - up), (Publish(steps, noised, true), up)];
    }

    /// <summary>One published value, random rounding drawn.</summary>
    public static double? Draw(IReadOnlyList<AfterStep> steps, double noised, Random random)
    {
        decimal? value = (decimal)noised;
        for (var i = 0; i < steps.Count && value is not null; i++)
        {
            var up = steps[i] is AfterStep.RoundTo { How: RoundingHow.AtRandom } round && random.NextDouble() < ChanceOfUp(round, (double?)value);
            value = After(steps[i], value.Value, up);
        }
        return (double?)value;
    }

    private static double? Publish(IReadOnlyList<AfterStep> steps, double noised, bool up)
    {
        decimal? value = (decimal)noised;
        for (var i = 0; i < steps.Count && value is not null; i++)
            value = After(steps[i], value.Value, up);
        return (double?)value;
    }

    private static decimal? After(AfterStep step, decimal value, bool up) => step switch
    {
        AfterStep.RoundTo round => Rounded(round, value / (decimal)round.Unit, up) * (decimal)round.Unit,
        AfterStep.NotBelow lower => Math.Max(value, (decimal)lower.Bound),
        AfterStep.NotAbove upper => Math.Min(value, (decimal)upper.Bound),
        AfterStep.ZeroBelow zero => value < (decimal)zero.Threshold ? 0 : value,
        AfterStep.PublishedFrom from => value < (decimal)from.Threshold ? null : value,
        _ => throw new ArgumentException($"No step is called {step}."),
    };

    private static decimal Rounded(AfterStep.RoundTo round, decimal quotient, bool up) => (round.How, round.Ties) switch
    {
        (RoundingHow.Down, _) => Math.Floor(quotient),
        (RoundingHow.Up, _) => Math.Ceiling(quotient),
        (RoundingHow.AtRandom, _) => up ? Math.Ceiling(quotient) : Math.Floor(quotient),
        (_, RoundingTies.Away) => Math.Round(quotient, MidpointRounding.AwayFromZero),
        (_, RoundingTies.Even) => Math.Round(quotient, MidpointRounding.ToEven),
        _ => Math.Floor(quotient + 0.5m),
    };

    private static double ChanceOfUp(AfterStep.RoundTo round, double? value)
    {
        var quotient = (decimal)value!.Value / (decimal)round.Unit;
        return (double)(quotient - Math.Floor(quotient));
    }
}
