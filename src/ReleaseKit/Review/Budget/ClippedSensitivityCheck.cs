using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// The declared sensitivity of sums and means against what the folder itself says: a contribution that is clipped moves a sum by a known distance,
/// and a mean by that over a denominator that is public. A norm for means without a public denominator is not bounded by anything that was said.
/// </summary>
internal sealed class ClippedSensitivityCheck : IReviewCheck
{
    // Numbers that are equal but for the last digits of the arithmetic.
    private const double Slack = 1e-9;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Noise: { } account }
        ? subject.Spendings.Select(spending => CheckMechanism(spending, release, account)).OfType<Finding>()
        : [];

    private static Finding? CheckMechanism(MechanismSpending spending, Release release, NoiseAccount account)
    {
        var measures = spending.Cells.Measures.Select(at => (Table: release.Tables[at.Table], Measure: release.Tables[at.Table].Measures[at.Measure])).ToList();
        if (LacksDenominator(spending.Mechanism) && measures.Find(pair => pair.Measure.Kind == MeasureKind.Mean && !IsBounded(spending.Mechanism, pair.Measure)) is { Table: { } table, Measure: { } mean })
            return NoDenominator(spending.Mechanism, table, mean);
        return measures.Select(pair => CheckMeasure(spending.Mechanism, pair.Table, pair.Measure, account)).FirstOrDefault(finding => finding is not null);
    }

    // A denominator that is there and wrong has been reported.
    private static bool LacksDenominator(Mechanism mechanism) => mechanism is { DenominatorColumn: null, Law: not LawName.Declared } && !mechanism.KeyPlaces.ContainsKey("denominator");

    /// <summary>Whether a cell is said to move as far as a mean of such contributions can, whatever the denominator is.</summary>
    private static bool IsBounded(Mechanism mechanism, Measure mean) => mechanism.Sensitivity is { CellsPerUnit: not null, PerCell: { } most }
        && (mechanism.Clipped is { } clipped ? Math.Max(clipped.Outermost, clipped.To - clipped.From) : mean.Highest - mean.Lowest) * (1 - Slack) <= most;

    private static Finding? CheckMeasure(Mechanism mechanism, Table table, Measure measure, NoiseAccount account)
    {
        if (ClippedMoves.Of(table, measure, mechanism, account.Neighbouring) is not { } moves)
            return null;
        var needed = Needed(mechanism.Sensitivity, moves).FirstOrDefault(norm => norm.Declared < norm.Least * (1 - Slack));
        return needed is null ? null : TooSmall(mechanism, measure, moves, needed, account);
    }

    private static IEnumerable<Norm> Needed(Sensitivity sensitivity, ClippedMoves moves)
    {
        if (sensitivity is { CellsPerUnit: not null, PerCell: { } most })
            yield return new("perCell", most, sensitivity.Signed ? moves.SignedPerCell : moves.One, moves.One, false);
        if (sensitivity.L1 is { } sum)
            yield return new("l1", sum, moves.Sum, moves.Sum, moves.IsApart);
        if (sensitivity.L2 is { } length)
            yield return new("l2", length, moves.Length, moves.Length, moves.IsApart);
    }

    private static Finding TooSmall(Mechanism mechanism, Measure measure, ClippedMoves moves, Norm norm, NoiseAccount account) => new(
        FindingLevel.Stop, "sensitivity-too-small", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" declares \"{norm.Key}\": {BudgetText.Plain(norm.Declared)}, but {BudgetText.Relation(account.Neighbouring, account)} can move the {(measure.Kind == MeasureKind.Mean ? "means" : "sums")} of column \"{measure.Column}\" by {BudgetText.Paste(norm.Move)}{(norm.IsApart ? " in all, where the two are in different cells" : "")}.\nThat follows from \"clipped\" {BudgetText.Plain(mechanism.Clipped!.From)} to {BudgetText.Plain(mechanism.Clipped.To)}{Denominators(measure, mechanism, moves)}.",
        "the budget page would promise more protection than there is.",
        $"write \"{norm.Key}\": {BudgetText.Paste(norm.Least)} or more{(norm.IsApart ? ", or \"moves\": false in \"sensitivity\" if no unit can change cells" : "")}, or correct \"clipped\"{(measure.Kind == MeasureKind.Mean ? " or the denominators if they are not those that were" : " if it is not what was")} used.");

    private static string Denominators(Measure measure, Mechanism mechanism, ClippedMoves moves) => measure.Kind == MeasureKind.Mean
        ? $" and \"{mechanism.DenominatorColumn}\", at the smallest {BudgetText.Plain(moves.SmallestDenominator)}"
        : "";

    private static Finding NoDenominator(Mechanism mechanism, Table table, Measure mean)
    {
        var column = table.SideColumns.FirstOrDefault(side => side.From == SideColumnOrigin.Public && mechanism.Parameters.Values.All(parameter => parameter.Column != side.Column))?.Column;
        var isOpen = mechanism is { Clipped: null, Sensitivity: { CellsPerUnit: not null, PerCell: not null } };
        return new(
            isOpen ? FindingLevel.Caution : FindingLevel.Stop, "denominator-missing", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
            $"\"{mechanism.Id}\" gives {Given(mechanism.Sensitivity)} for the means of column \"{mean.Column}\" in table \"{table.Id}\" and does not say where their denominator is known from.",
            "without a public denominator a mean is a noised sum over a noised count: both spend, and no number bounds what one unit moves.",
            $"if the denominators are public, add \"denominator\": {{ \"public\": \"{column ?? "COLUMN"}\" }}{(column is null ? $" and declare the column in table \"{table.Id}\": \"columns\": {{ \"COLUMN\": {{ \"from\": \"public\" }} }}" : "")}; {(isOpen ? $"if no contribution is above {BudgetText.Plain(mechanism.Sensitivity.PerCell!.Value)}, add \"clipped\": {{ \"from\": 0, \"to\": {BudgetText.Plain(mechanism.Sensitivity.PerCell.Value)} }}; " : "")}else publish the sum and the count, each with a mechanism of its own.");
    }

    private static string Given(Sensitivity sensitivity) => sensitivity switch
    {
        { CellsPerUnit: not null, PerCell: not null } => "a \"perCell\"",
        { L1: not null } => "an l1",
        _ => "an l2",
    };

    private sealed record Norm(string Key, double Declared, double Least, double Move, bool IsApart);
}
