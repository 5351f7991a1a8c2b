using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// Noise that moves in steps smaller than the unit in which the CSV counts, where no rounding is declared: either the law is given in another unit
/// than the figure's, or a rounding is not told. The margin would be too small in both cases.
/// </summary>
internal sealed class MultiplierCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        subject.Release?.Tables.SelectMany(table => table.Measures.Where(measure => measure.Multiplier != 1).SelectMany(measure => CheckMeasure(table, measure))) ?? [];

    private static IEnumerable<Finding> CheckMeasure(Table table, Measure measure)
    {
        var decimals = FileRounding.DecimalsByRule(measure);
        for (var rule = 0; rule < measure.Rules.Count; rule++)
        {
            if (measure.Rules[rule] is NoiseRule.FromMechanism { Mechanism: { Adjusted: false } mechanism } && UnitOf(measure, decimals[rule]) is { } unit && IsFiner(mechanism, unit))
                yield return Finer(table, measure, mechanism, unit);
        }
    }

    /// <summary>The finest step that the CSV's digits of a rule's figures can show, in the figure's unit; null if it has none.</summary>
    private static decimal? UnitOf(Measure measure, byte? decimals) => decimals is { } most ? (decimal)measure.Multiplier / (decimal)PublishedValue.PowerOfTen(most) : null;

    private static bool IsFiner(Mechanism mechanism, decimal unit) => StepGrid.OfLaw(mechanism) is { } grid && grid < unit
        && !mechanism.Afterwards.OfType<AfterStep.RoundTo>().Any(rounding => StepGrid.Exactly(rounding.Unit) % unit == 0);

    private static Finding Finer(Table table, Measure measure, Mechanism mechanism, decimal unit)
    {
        var (grid, step) = (BudgetText.Plain(mechanism.Grid), BudgetText.Plain((double)unit));
        return new Finding(
            FindingLevel.Stop, "noise-finer-than-unit", FindingOwner.Noise, mechanism.At,
            $"The noise of \"{mechanism.Id}\" moves in steps of {grid}, but column \"{measure.Column}\" of table \"{table.Id}\" has \"multiplier\": {BudgetText.Plain(measure.Multiplier)} and its digits move in steps of {step}.",
            "either the law is given in the CSV's unit and the margins are too small by that factor, or the values were rounded and the margins leave the rounding out.",
            $"a law is given in the figure's unit, after the multiplier: if the noise was added to the CSV's numbers, write \"grid\": {step} and the law's other parameters and \"sensitivity\" in that unit too; if the values were rounded after the noise, write \"afterwards\": [ {{ \"roundTo\": {step} }} ].");
    }
}
