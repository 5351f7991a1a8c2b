using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// A bound in "afterwards" that lies inside what is possible: a value before noise beyond it would be moved any distance, so no margin holds.
/// </summary>
internal sealed class BoundCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        subject.Release?.Tables.SelectMany(table => table.Measures.SelectMany(measure => CheckMeasure(table, measure))) ?? [];

    private static IEnumerable<Finding> CheckMeasure(Table table, Measure measure)
    {
        var possible = PossibleOf.Measure(measure);
        var mechanisms = measure.Rules.OfType<NoiseRule.FromMechanism>().Select(rule => rule.Mechanism).Where(mechanism => !mechanism.Adjusted).Distinct();
        return mechanisms.SelectMany(mechanism => mechanism.Afterwards.Distinct().Select(step => step switch
        {
            AfterStep.NotBelow { Bound: var bound } when bound > possible.Lowest => Inside(table, measure, mechanism, new("notBelow", "lowest", "below", bound)),
            AfterStep.NotAbove { Bound: var bound } when bound < possible.Highest => Inside(table, measure, mechanism, new("notAbove", "highest", "above", bound)),
            _ => null,
        })).OfType<Finding>();
    }

    private static Finding Inside(Table table, Measure measure, Mechanism mechanism, Bound bound)
    {
        var number = BudgetText.Plain(bound.At);
        return new Finding(
            FindingLevel.Stop, "bound-not-respected", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "afterwards"),
            $"\"{mechanism.Id}\" publishes figures {bound.Side} {number} as {number}, but values before noise {bound.Side} {number} are possible in column \"{measure.Column}\" of table \"{table.Id}\".",
            $"such a value would be moved to {number} however far it lies from there, so the margin would be false.",
            $"if it is public that no value can be {bound.Side} {number}, write \"{bound.Key}\": {number} in the figures \"{measure.Column}\" of release.json; or else take {{ \"{bound.Step}\": {number} }} out and publish the values without it.");
    }

    private sealed record Bound(string Step, string Key, string Side, double At);
}
