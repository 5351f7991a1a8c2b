using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Published values that the declared "afterwards" would not have let through: below or above a bound, or under a threshold and not 0.</summary>
internal sealed class PastStepCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        subject.Release?.Tables.SelectMany(table => table.Measures.SelectMany(measure => CheckMeasure(table, measure))) ?? [];

    private static IEnumerable<Finding> CheckMeasure(Table table, Measure measure)
    {
        for (var rule = 0; rule < measure.Rules.Count; rule++)
        {
            if (measure.Rules[rule] is not NoiseRule.FromMechanism { Mechanism: { Adjusted: false, Afterwards: { Count: > 0 } steps } mechanism })
                continue;
            for (var step = 0; step < steps.Count; step++)
            {
                var rows = RowsPast(measure, rule, steps, step);
                if (rows.Count > 0)
                    yield return Past(table, measure, mechanism, steps[step], rows);
            }
        }
    }

    private static List<int> RowsPast(Measure measure, int rule, IReadOnlyList<AfterStep> steps, int step) =>
    [
        .. Enumerable.Range(0, measure.RuleOf.Length).Where(row => measure.RuleOf[row] == rule && measure.HasNumber(row)
            && IsPast(StepGrid.InUnits(measure, measure.ValueAt(row)), steps[step], [.. steps.Skip(step + 1)])),
    ];

    private static bool IsPast(decimal value, AfterStep step, IReadOnlyList<AfterStep> later) => !later.Any(next => Makes(next, value)) && step switch
    {
        AfterStep.NotBelow { Bound: var bound } => value < StepGrid.Exactly(bound) - Slack(bound, later),
        AfterStep.NotAbove { Bound: var bound } => value > StepGrid.Exactly(bound) + Slack(bound, later),
        AfterStep.ZeroBelow { Threshold: var threshold } => value != 0 && value < StepGrid.Exactly(threshold) - Slack(threshold, later),
        _ => false,
    };

    /// <summary>Whether a later step sets values to just this one.</summary>
    private static bool Makes(AfterStep step, decimal value) => step switch
    {
        AfterStep.NotBelow { Bound: var bound } => value == StepGrid.Exactly(bound),
        AfterStep.NotAbove { Bound: var bound } => value == StepGrid.Exactly(bound),
        AfterStep.ZeroBelow => value == 0,
        _ => false,
    };

    /// <summary>How far later roundings can move a value past a number that is no multiple of their unit.</summary>
    private static decimal Slack(double number, IReadOnlyList<AfterStep> later) => later.OfType<AfterStep.RoundTo>()
        .Select(rounding => StepGrid.Exactly(rounding.Unit)).Where(unit => StepGrid.Exactly(number) % unit != 0).Sum();

    private static Finding Past(Table table, Measure measure, Mechanism mechanism, AfterStep step, List<int> rows)
    {
        var address = FigureAddress.Canonical(table, measure, rows[0]);
        var (declared, says) = step switch
        {
            AfterStep.NotBelow { Bound: var bound } => ($"{{ \"notBelow\": {BudgetText.Plain(bound)} }}", $"no figure is below {BudgetText.Plain(bound)}"),
            AfterStep.NotAbove { Bound: var bound } => ($"{{ \"notAbove\": {BudgetText.Plain(bound)} }}", $"no figure is above {BudgetText.Plain(bound)}"),
            AfterStep.ZeroBelow { Threshold: var threshold } =>
                ($"{{ \"zeroBelow\": {BudgetText.Plain(threshold)} }}", $"every figure below {BudgetText.Plain(threshold)} is 0"),
            _ => throw new ArgumentException("A rounding has no bound.", nameof(step)),
        };
        return new Finding(
            FindingLevel.Stop, "past-afterwards", FindingOwner.Noise, Place.OfCell(table.File, rows[0], measure.Column),
            $"{address} is {measure.ValueAt(rows[0])}, but \"{mechanism.Id}\" says that {says}{BudgetText.More(rows.Count, "; one more figure is against it", "; {0} more figures are against it", $" in column \"{measure.Column}\"")}.",
            "the margins and the sentences are worked out for what \"afterwards\" says, and are wrong for values that were made otherwise.",
            $"publish the values after that step, or take {declared} out of \"afterwards\" in mechanisms.json.")
        {
            Address = address,
        };
    }
}
