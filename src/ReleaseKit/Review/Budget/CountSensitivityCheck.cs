using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>The declared sensitivity of a count of units of privacy: one unit changes such a count by 1, whatever is declared.</summary>
internal sealed class CountSensitivityCheck : IReviewCheck
{
    // Numbers that are equal but for the last digits of the arithmetic.
    private const double Slack = 1e-9;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Noise: { } account }
        ? subject.Spendings.Select(spending => CheckMechanism(spending, release, account)).OfType<Finding>()
        : [];

    private static Finding? CheckMechanism(MechanismSpending spending, Release release, NoiseAccount account) => spending.Cells.Measures
        .Select(at => (Table: release.Tables[at.Table], Measure: release.Tables[at.Table].Measures[at.Measure]))
        .Where(pair => pair.Measure.Kind == MeasureKind.Count && BudgetText.IsUnitOfPrivacy(pair.Measure.Unit, account))
        .Select(pair => CheckMeasure(spending.Mechanism, pair.Table, pair.Measure, account)).FirstOrDefault(finding => finding is not null);

    private static Finding? CheckMeasure(Mechanism mechanism, Table table, Measure measure, NoiseAccount account)
    {
        if (MovesOf(table, measure, mechanism, account.Neighbouring) is not { } moves)
            return null;
        var (key, declared, least) = Needed(mechanism.Sensitivity, moves).FirstOrDefault(needed => needed.Declared < needed.Least * (1 - Slack));
        return key is null ? null : TooSmall(mechanism, table, measure, $"\"{key}\": ", declared, least, moves.Moved, account);
    }

    // What one unit moves in all is not asked of every row of a long table where only a bound in each cell is declared.
    private static CountMoves? MovesOf(Table table, Measure measure, Mechanism mechanism, Neighbouring neighbouring) => mechanism.Sensitivity is { PerCell: not null, PerUnit: null, L1: null, L2: null }
        ? new CountMoves(1, 1)
        : CountMoves.Of(table, measure, mechanism, neighbouring);

    private static IEnumerable<(string Key, double Declared, double Least)> Needed(Sensitivity sensitivity, CountMoves moves)
    {
        if (sensitivity is { CellsPerUnit: not null, PerCell: { } most })
            yield return ("perCell", most, 1);
        if (sensitivity is { PerCell: not null, PerUnit: { } bound })
            yield return ("perUnit", bound, moves.Counted);
        if (sensitivity.L1 is { } sum)
            yield return ("l1", sum, moves.Moved);
        if (sensitivity.L2 is { } length)
            yield return ("l2", length, Math.Sqrt(moves.Moved));
    }

    private static Finding TooSmall(Mechanism mechanism, Table table, Measure measure, string key, double declared, double least, int moved, NoiseAccount account) => new(
        FindingLevel.Stop, "sensitivity-too-small", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" declares {key}{BudgetText.Plain(declared)}, but column \"{measure.Column}\" of table \"{table.Id}\" counts {BudgetText.Other(account)}: {BudgetText.Relation(account.Neighbouring, account)} moves {(moved == 1 ? "a cell of it" : $"{moved} cells of it")} by 1.",
        "the budget page would promise more protection than there is.",
        $"write {key}{BudgetText.Paste(least)} or more{(account.Neighbouring == Neighbouring.Replace && moved > 1 ? "; or \"moves\": false in \"sensitivity\" if no unit can change cells" : "")}; or, if the column counts something else, give its figures the \"unit\" that they count in release.json.");
}
