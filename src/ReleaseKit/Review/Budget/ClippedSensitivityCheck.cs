using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// The declared sensitivity of sums, means, shares and rates against what the folder itself says: a contribution that is clipped moves a sum by a
/// known distance, and a mean by that over a denominator that is public; a unit of privacy is 1 in the numerator of a share or rate of such units.
/// </summary>
internal sealed class ClippedSensitivityCheck : IReviewCheck
{
    // Numbers that are equal but for the last digits of the arithmetic.
    private const double Slack = 1e-9;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Noise: { } account }
        ? subject.Spendings.Select(spending => CheckMechanism(spending, release, account)).OfType<Finding>()
        : [];

    private static Finding? CheckMechanism(MechanismSpending spending, Release release, NoiseAccount account) => spending.Cells.Measures
        .Select(at => (Table: release.Tables[at.Table], Measure: release.Tables[at.Table].Measures[at.Measure]))
        .Select(pair => CheckMeasure(spending.Mechanism, pair.Table, pair.Measure, account)).FirstOrDefault(finding => finding is not null);

    private static Finding? CheckMeasure(Mechanism mechanism, Table table, Measure measure, NoiseAccount account)
    {
        if (ClippedMoves.Of(table, measure, mechanism, account) is not { } moves)
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
        $"\"{mechanism.Id}\" declares \"{norm.Key}\": {BudgetText.Plain(norm.Declared)}, but {BudgetText.Relation(account.Neighbouring, account)} can move the {BudgetText.Several(measure.Kind)} of column \"{measure.Column}\" by {BudgetText.Paste(norm.Move)}{(norm.IsApart ? " in all, where the two are in different cells" : "")}.\nThat follows from {From(mechanism, measure, moves, account)}.",
        "the budget page would promise more protection than there is.",
        $"write \"{norm.Key}\": {BudgetText.Paste(norm.Least)} or more{(norm.IsApart ? ", or \"moves\": false in \"sensitivity\" if no unit can change cells" : "")}, or correct {Correct(measure.Kind)}.");

    private static string From(Mechanism mechanism, Measure measure, ClippedMoves moves, NoiseAccount account) => measure.Kind switch
    {
        MeasureKind.Share or MeasureKind.Rate => $"\"unit\": each {BudgetText.One(account)} is 1 of the numerator, and {BudgetText.Plain(measure.Whole!.Value)} divided by \"{mechanism.DenominatorColumn}\" is largest where that is {BudgetText.Plain(moves.SmallestDenominator)}",
        MeasureKind.Mean => $"{Clipped(mechanism)} and \"{mechanism.DenominatorColumn}\", at the smallest {BudgetText.Plain(moves.SmallestDenominator)}",
        _ => Clipped(mechanism),
    };

    private static string Clipped(Mechanism mechanism) => $"\"clipped\" {BudgetText.Plain(mechanism.Clipped!.From)} to {BudgetText.Plain(mechanism.Clipped.To)}";

    private static string Correct(MeasureKind kind) => kind switch
    {
        MeasureKind.Share or MeasureKind.Rate => "the denominators if they are not those that were used; or, if the numerator counts something else, give the figures the \"unit\" that it counts in release.json",
        MeasureKind.Mean => "\"clipped\" or the denominators if they are not those that were used",
        _ => "\"clipped\" if it is not what was used",
    };

    private sealed record Norm(string Key, double Declared, double Least, double Move, bool IsApart);
}
