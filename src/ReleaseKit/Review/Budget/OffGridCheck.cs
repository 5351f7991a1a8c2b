using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Published values that are no multiples of the grid of their noise, or of the unit they are said to be rounded to.</summary>
internal sealed class OffGridCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        subject.Release?.Tables.SelectMany(table => table.Measures.SelectMany(measure => CheckMeasure(table, measure))) ?? [];

    private static IEnumerable<Finding> CheckMeasure(Table table, Measure measure)
    {
        for (var rule = 0; rule < measure.Rules.Count; rule++)
        {
            if (measure.Rules[rule] is not NoiseRule.FromMechanism { Mechanism: { Adjusted: false } mechanism } || GridOf(mechanism) is not { } grid)
                continue;
            var index = rule;
            var rows = Enumerable.Range(0, measure.RuleOf.Length).Where(row => measure.RuleOf[row] == index && IsOff(measure, row, mechanism, grid)).ToList();
            if (rows.Count > 0)
                yield return OffGrid(table, measure, mechanism, grid, rows);
        }
    }

    // The last rounding decides; without one the grid of the law; a continuous law without rounding has none.
    private static decimal? GridOf(Mechanism mechanism) => mechanism.Afterwards.OfType<AfterStep.RoundTo>().LastOrDefault() is { } rounding
        ? StepGrid.Exactly(rounding.Unit)
        : StepGrid.OfLaw(mechanism);

    private static bool IsOff(Measure measure, int row, Mechanism mechanism, decimal grid)
    {
        if (!measure.HasNumber(row))
            return false;
        var value = StepGrid.InUnits(measure, measure.ValueAt(row));
        return value % grid != 0 && !mechanism.Afterwards.Any(step => step switch
        {
            AfterStep.NotBelow { Bound: var bound } => value == StepGrid.Exactly(bound),
            AfterStep.NotAbove { Bound: var bound } => value == StepGrid.Exactly(bound),
            _ => false,
        });
    }

    private static Finding OffGrid(Table table, Measure measure, Mechanism mechanism, decimal grid, List<int> rows)
    {
        var address = FigureAddress.Canonical(table, measure, rows[0]);
        var isRounded = mechanism.Afterwards.OfType<AfterStep.RoundTo>().Any();
        return new Finding(
            FindingLevel.Stop, "off-grid", FindingOwner.Noise, Place.OfCell(table.File, rows[0], measure.Column),
            FormattableString.Invariant($"{address} is {measure.ValueAt(rows[0])}, which is no multiple of {grid}{BudgetText.More(rows.Count, ", as is one more figure", ", as are {0} more figures", $" of \"{mechanism.Id}\"")}."),
            isRounded
                ? $"\"{mechanism.Id}\" says that its figures are rounded to {BudgetText.Plain((double)grid)}; if they are not, their margins are wrong."
                : $"the noise of \"{mechanism.Id}\" moves in steps of {BudgetText.Plain((double)grid)}, so what stands between two steps passed through it unprotected.",
            isRounded
                ? "publish the rounded values, or correct \"afterwards\" in mechanisms.json."
                : "round the values to the grid before the noise is added, or give the \"grid\" that the sampler used.")
        {
            Address = address,
        };
    }
}
