using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Review.Budget;

namespace ReleaseKit.Review.Leaks;

/// <summary>Published values that are all multiples of a number coarser than the steps of their noise, though no rounding is declared: the margins leave it out.</summary>
internal sealed class UndeclaredGridCheck : IReviewCheck
{
    /// <summary>Fewer figures can be alike for other reasons.</summary>
    private const int LeastFigures = 8;

    // The chance that noise makes all of them multiples: below the smaller one it is taken for none, below the larger one somebody should look.
    private const double Doubtful = 1e-3;
    private const double Unlikely = 1e-6;

    private const decimal Farthest = 1e18m;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Origins: { } origins }
        ? NoisedColumn.Of(release).SelectMany(column => column.OwnNoise.Select(own => CheckRule(column, own.Rule, own.Mechanism, origins))).OfType<Finding>()
        : [];

    private static Finding? CheckRule(NoisedColumn column, int rule, Mechanism mechanism, FigureOrigins origins)
    {
        if (mechanism.Afterwards.Any(step => step is AfterStep.RoundTo) || FinestStep(column.Measure, rule, mechanism) is not { } step)
            return null;
        var (factor, rows) = (0m, new List<int>());
        foreach (var row in column.Rows(rule).Where(row => !IsHeaped(column.ValueAt(row), mechanism)))
        {
            factor = CommonFactor(factor, StepsOf(column.Measure.ValueAt(row), column.Measure, step));
            if (factor is 1 || factor != decimal.Floor(factor))
                return null;
            rows.Add(row);
        }

        return factor > 1 && rows.Count >= LeastFigures ? CheckChance(column, rule, mechanism, new(step, factor, rows), origins) : null;
    }

    /// <summary>The smallest step between published values that the noise makes; null for noise without a law.</summary>
    private static decimal? FinestStep(Measure measure, int rule, Mechanism mechanism)
    {
        if (FileRounding.DecimalsByRule(measure)[rule] is not { } decimals)
            return null;
        var digit = (decimal)measure.Multiplier / (decimal)PublishedValue.PowerOfTen(decimals);
        if (FileRounding.IsContinuous(mechanism.Law))
            return digit;
        // That the CSV counts in a coarser unit than the noise is a finding of its own.
        return StepGrid.OfLaw(mechanism) is { } grid ? (measure.Multiplier != 1 && digit % grid == 0 ? Math.Max(digit, grid) : grid) : null;
    }

    /// <summary>Whether a later step puts many noised values on this one.</summary>
    private static bool IsHeaped(double value, Mechanism mechanism) => mechanism.Afterwards.Any(step => step switch
    {
        AfterStep.NotBelow { Bound: var bound } => value == bound,
        AfterStep.NotAbove { Bound: var bound } => value == bound,
        AfterStep.ZeroBelow => value == 0,
        _ => false,
    });

    // A figure of more steps than decimal holds counts as off the grid: it shows nothing.
    private static decimal StepsOf(PublishedValue value, Measure measure, decimal step) =>
        Math.Abs(StepGrid.InUnits(measure, value)) is var size && size <= Farthest * step ? size / step : 0.5m;

    private static decimal CommonFactor(decimal one, decimal other)
    {
        while (other != 0)
            (one, other) = (other, one % other);
        return one;
    }

    private static Finding? CheckChance(NoisedColumn column, int rule, Mechanism mechanism, Multiples found, FigureOrigins origins)
    {
        var laws = found.Rows.Select(row => origins.Of(column.At(row)).Error?.Error.Law).ToList();
        var chances = laws.GroupBy(law => law).Select(law => (Chance: law.Key is null ? 1 : ResidueChance.Most(law.Key, found.Step, found.Factor), Count: law.Count())).ToList();
        var others = column.Measure.RuleOf.Count(of => of == rule) - found.Rows.Count;
        var chance = ResidueChance.Together(chances, others, found.Factor);
        return chance < Doubtful ? Coarser(column, mechanism, found, chance) : null;
    }

    private static Finding Coarser(NoisedColumn column, Mechanism mechanism, Multiples found, double chance)
    {
        var (unit, step) = (BudgetText.Plain((double)(found.Step * found.Factor)), BudgetText.Plain((double)found.Step));
        return new Finding(
            chance < Unlikely ? FindingLevel.Stop : FindingLevel.Caution, "undeclared-rounding", FindingOwner.Noise, Place.OfCell(column.Table.File, found.Rows[0], column.Measure.Column),
            $"All {found.Rows.Count} figures of {column.Table.Id}/{column.Measure.Column} with noise of \"{mechanism.Id}\"{(mechanism.Afterwards.Count > 0 ? " that no bound holds" : "")} are multiples of {unit}, but that noise moves in steps of {step} and \"afterwards\" names no rounding. The chance of that is {BudgetText.Chance(chance)}.",
            "a rounding that is not declared is not in the margins: they would be too small.",
            $"if the figures were rounded after the noise, write \"afterwards\": [ {{ \"roundTo\": {unit} }} ] in \"{mechanism.Id}\", or the smaller unit that was used{(FileRounding.IsContinuous(mechanism.Law) ? "" : $"; if the noise itself moves in such steps, write \"grid\": {unit}")}.")
        {
            Address = FigureAddress.Canonical(column.Table, column.Measure, found.Rows[0]),
        };
    }

    private sealed record Multiples(decimal Step, decimal Factor, List<int> Rows);
}
