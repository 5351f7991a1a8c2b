using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Recognises by which slip a declared loss came about: another reading of the same numbers costs just what was declared.</summary>
internal static class LikelyMistake
{
    private static readonly string[] Scales = ["scale", "sigma"];

    /// <summary>A sentence that names the slip; null if none fits.</summary>
    public static string? Of(MechanismSpending spending, DeclaredNumber declared, NoiseAccount account) =>
        Readings(spending, account).FirstOrDefault(reading => reading.Loss is { } loss && Fits(spending.Mechanism.Spent!, loss, declared)).Words;

    private static bool Fits(DeclaredLoss spent, MechanismLoss loss, DeclaredNumber declared) =>
        DeclaredNumber.Of(spent, loss).Any(other => other.Name == declared.Name && declared.RoundsTo(other.Upper));

    private static IEnumerable<(MechanismLoss? Loss, string? Words)> Readings(MechanismSpending spending, NoiseAccount account)
    {
        var other = account.Neighbouring == Neighbouring.Replace ? Neighbouring.AddOrRemove : Neighbouring.Replace;
        yield return (
            spending.LossOf(spending.Mechanism, MechanismSpending.RelationOf(other)),
            $"It is what {BudgetText.Relation(other, account)} would cost, but \"neighbouring\" means {BudgetText.Relation(account.Neighbouring, account)}.");
        foreach (var key in Scales.Where(key => spending.Mechanism.Parameters.GetValueOrDefault(key).Number is not null))
        {
            var value = spending.Mechanism.Parameters[key].Number!.Value;
            yield return (With(spending, key, value * value), $"It is what {key} {BudgetText.Plain(value * value)}, the square of {BudgetText.Plain(value)}, would cost.");
            yield return (With(spending, key, Math.Sqrt(value)), $"It is what {key} {BudgetText.Plain(Math.Sqrt(value))}, the root of {BudgetText.Plain(value)}, would cost.");
            yield return (With(spending, key, 1 / value), $"It is what {key} {BudgetText.Plain(1 / value)}, 1 divided by {BudgetText.Plain(value)}, would cost.");
        }

        if (spending.Mechanism.Sensitivity is { CellsPerUnit: > 1 and var cells } sensitivity)
            yield return (WithSensitivity(spending, sensitivity with { CellsPerUnit = 1 }), $"It is what 1 cell would cost, but \"cellsPerUnit\" is {cells}.");
    }

    private static MechanismLoss? With(MechanismSpending spending, string key, double value) => spending.LossOf(
        spending.Mechanism with { Parameters = new Dictionary<string, NumberOrColumn>(spending.Mechanism.Parameters) { [key] = NumberOrColumn.Of(value) } },
        spending.Loss!.Relation);

    private static MechanismLoss? WithSensitivity(MechanismSpending spending, Sensitivity sensitivity) =>
        spending.LossOf(spending.Mechanism with { Sensitivity = sensitivity }, spending.Loss!.Relation);
}
