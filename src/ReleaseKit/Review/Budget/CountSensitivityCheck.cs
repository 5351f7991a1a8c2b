using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// The declared sensitivity of a count of units of privacy: one unit changes such a count by 1, whatever is declared. An estimate it changes by its
/// weight, which can be below 1.
/// </summary>
internal sealed class CountSensitivityCheck : IReviewCheck
{
    // Numbers that are equal but for the last digits of the arithmetic.
    private const double Slack = 1e-9;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Noise: { } account }
        ? subject.Spendings.Select(spending => CheckMechanism(spending, release, account)).OfType<Finding>()
        : [];

    /// <summary>Whether each unit that a measure counts is thought to be less than 1 of it.</summary>
    public static bool IsBelowOne(Mechanism mechanism, Table table, Measure measure, NoiseAccount account) => Short(mechanism, table, measure, account) is not null;

    private static Finding? CheckMechanism(MechanismSpending spending, Release release, NoiseAccount account) => spending.Cells.Measures
        .Select(at => (Table: release.Tables[at.Table], Measure: release.Tables[at.Table].Measures[at.Measure]))
        .Where(pair => pair.Measure.Kind == MeasureKind.Count || (pair.Measure.Kind == MeasureKind.Estimate && spending.Mechanism is { Clipped: null, Law: not LawName.Declared }))
        .Select(pair => CheckMeasure(spending.Mechanism, pair.Table, pair.Measure, account)).FirstOrDefault(finding => finding is not null);

    private static Finding? CheckMeasure(Mechanism mechanism, Table table, Measure measure, NoiseAccount account) => Short(mechanism, table, measure, account) is { } needed
        ? measure.Kind == MeasureKind.Count ? TooSmall(mechanism, table, measure, needed, account) : BelowOne(mechanism, table, measure, needed, account)
        : null;

    /// <summary>The norm that is too small; null where none is.</summary>
    private static Norm? Short(Mechanism mechanism, Table table, Measure measure, NoiseAccount account) =>
        BudgetText.IsUnitOfPrivacy(measure.Unit, account) && MovesOf(table, measure, mechanism, account.Neighbouring) is { } moves
            ? Needed(mechanism.Sensitivity, moves).FirstOrDefault(needed => needed.Declared < needed.Least * (1 - Slack))
            : null;

    // What one unit moves in all is not asked of every row of a long table where only a bound in each cell is declared.
    private static CountMoves? MovesOf(Table table, Measure measure, Mechanism mechanism, Neighbouring neighbouring) => mechanism.Sensitivity is { PerCell: not null, PerUnit: null, L1: null, L2: null }
        ? new CountMoves(1, 1)
        : CountMoves.Of(table, measure, mechanism, neighbouring);

    private static IEnumerable<Norm> Needed(Sensitivity sensitivity, CountMoves moves)
    {
        if (sensitivity is { CellsPerUnit: not null, PerCell: { } most })
            yield return new("perCell", most, 1, moves.Moved);
        if (sensitivity is { PerCell: not null, PerUnit: { } bound })
            yield return new("perUnit", bound, moves.Counted, moves.Moved);
        if (sensitivity.L1 is { } sum)
            yield return new("l1", sum, moves.Moved, moves.Moved);
        if (sensitivity.L2 is { } length)
            yield return new("l2", length, Math.Sqrt(moves.Moved), moves.Moved);
    }

    private static Finding TooSmall(Mechanism mechanism, Table table, Measure measure, Norm norm, NoiseAccount account) => new(
        FindingLevel.Stop, "sensitivity-too-small", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" declares \"{norm.Key}\": {BudgetText.Plain(norm.Declared)}, but column \"{measure.Column}\" of table \"{table.Id}\" counts {BudgetText.Other(account)}: {BudgetText.Relation(account.Neighbouring, account)} moves {Cells(norm.Moved)} by 1.",
        "the budget page would promise more protection than there is.",
        $"write \"{norm.Key}\": {BudgetText.Paste(norm.Least)} or more{(account.Neighbouring == Neighbouring.Replace && norm.Moved > 1 ? "; or \"moves\": false in \"sensitivity\" if no unit can change cells" : "")}; or, if the column counts something else, give its figures the \"unit\" that they count in release.json.");

    private static Finding BelowOne(Mechanism mechanism, Table table, Measure measure, Norm norm, NoiseAccount account) => new(
        FindingLevel.Caution, "sensitivity-below-one", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" declares \"{norm.Key}\": {BudgetText.Plain(norm.Declared)}, but column \"{measure.Column}\" of table \"{table.Id}\" estimates {BudgetText.Other(account)}: {BudgetText.Relation(account.Neighbouring, account)} moves {Cells(norm.Moved)} by the weight of the {BudgetText.One(account)}, which is seldom below 1.",
        "with a larger weight the loss is larger than the budget page says.",
        $"write as \"{norm.Key}\" {(norm.Least > 1 ? $"{BudgetText.Paste(norm.Least)} times " : "")}the largest weight; or, if no weight is above {BudgetText.Plain(norm.Declared / norm.Least)}, say so: \"clipped\": {{ \"from\": 0, \"to\": {BudgetText.Plain(norm.Declared / norm.Least)} }}; or, if the column estimates something else, give its figures the \"unit\" that they have in release.json.");

    private static string Cells(int moved) => moved == 1 ? "a cell of it" : $"{moved} cells of it";

    private sealed record Norm(string Key, double Declared, double Least, int Moved);
}
