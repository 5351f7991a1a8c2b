using ReleaseKit.Noise.Errors;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>
/// What an office does to a noised value, step by step and in decimal arithmetic: written from the meaning of the steps, sharing nothing with the code
/// under test. Every outcome comes with its chance (1, but for random rounding); null is "not published".
/// </summary>
internal static class Publisher
{
    public static IEnumerable<(double? Published, double Chance)> Outcomes(IReadOnlyList<AfterStep> steps, double noised)
    {
        IEnumerable<(decimal? Value, double Chance)> outcomes = [((decimal)noised, 1.0)];
        foreach (var step in steps)
            outcomes = outcomes.SelectMany(outcome => outcome.Value is { } value
                ? After(step, value).Select(next => (next.Value, outcome.Chance * next.Chance))
                : [outcome]);
        return outcomes.Where(outcome => outcome.Chance > 0).Select(outcome => ((double?)outcome.Value, outcome.Chance));
    }

    public static double? Draw(IReadOnlyList<AfterStep> steps, double noised, Random random)
    {
        var left = random.NextDouble();
        foreach (var (published, chance) in Outcomes(steps, noised))
        {
            left -= chance;
            if (left < 0)
                return published;
        }
        return Outcomes(steps, noised).Last().Published;
    }

    private static IEnumerable<(decimal? Value, double Chance)> After(AfterStep step, decimal value) => step switch
    {
        AfterStep.RoundTo round => Rounded(round, value),
        AfterStep.NotBelow lower => [(Math.Max(value, (decimal)lower.Bound), 1)],
        AfterStep.NotAbove upper => [(Math.Min(value, (decimal)upper.Bound), 1)],
        AfterStep.ZeroBelow zero => [(value < (decimal)zero.Threshold ? 0 : value, 1)],
        AfterStep.PublishedFrom from => [(value < (decimal)from.Threshold ? null : value, 1)],
        _ => throw new ArgumentException($"No step is called {step}."),
    };

    private static IEnumerable<(decimal? Value, double Chance)> Rounded(AfterStep.RoundTo round, decimal value)
    {
        var unit = (decimal)round.Unit;
        var quotient = value / unit;
        var up = (double)(quotient - Math.Floor(quotient));
        return round.How switch
        {
            RoundingHow.Down => [(Math.Floor(quotient) * unit, 1)],
            RoundingHow.Up => [(Math.Ceiling(quotient) * unit, 1)],
            RoundingHow.AtRandom => [(Math.Floor(quotient) * unit, 1 - up), (Math.Ceiling(quotient) * unit, up)],
            _ => [(Nearest(quotient, round.Ties) * unit, 1)],
        };
    }

    private static decimal Nearest(decimal quotient, RoundingTies ties) => ties switch
    {
        RoundingTies.Away => Math.Round(quotient, MidpointRounding.AwayFromZero),
        RoundingTies.Even => Math.Round(quotient, MidpointRounding.ToEven),
        _ => Math.Floor(quotient + 0.5m),
    };
}
