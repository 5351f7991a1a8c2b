using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A sensitivity of means, shares or rates without a public denominator: it is not bounded by anything that was said.</summary>
internal sealed class MissingDenominatorCheck : IReviewCheck
{
    // Numbers that are equal but for the last digits of the arithmetic.
    private const double Slack = 1e-9;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release is { } release
        ? subject.Spendings.Where(spending => LacksDenominator(spending.Mechanism)).Select(spending => CheckMechanism(spending, release)).OfType<Finding>()
        : [];

    // A denominator that is there and wrong has been reported.
    private static bool LacksDenominator(Mechanism mechanism) => mechanism is { DenominatorColumn: null, Law: not LawName.Declared } && !mechanism.KeyPlaces.ContainsKey("denominator");

    private static Finding? CheckMechanism(MechanismSpending spending, Release release) => spending.Cells.Measures
        .Select(at => (Table: release.Tables[at.Table], Measure: release.Tables[at.Table].Measures[at.Measure]))
        .Where(pair => pair.Measure.Kind is MeasureKind.Mean or MeasureKind.Share or MeasureKind.Rate && !IsBounded(spending.Mechanism, pair.Measure))
        .Select(pair => Missing(spending.Mechanism, pair.Table, pair.Measure)).FirstOrDefault();

    /// <summary>Whether a cell is said to move as far as a mean of such contributions can, whatever the denominator is.</summary>
    private static bool IsBounded(Mechanism mechanism, Measure measure) => mechanism.Sensitivity is { CellsPerUnit: not null, PerCell: { } most }
        && (mechanism.Clipped is { } clipped && measure.Kind == MeasureKind.Mean ? Math.Max(clipped.Outermost, clipped.To - clipped.From) : measure.Highest - measure.Lowest) * (1 - Slack) <= most;

    private static Finding Missing(Mechanism mechanism, Table table, Measure measure)
    {
        var (column, isOpen) = (PublicColumn(mechanism, table), IsOpen(mechanism, measure));
        return new(
            isOpen ? FindingLevel.Caution : FindingLevel.Stop, "denominator-missing", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
            $"\"{mechanism.Id}\" gives {Given(BudgetText.Declared(mechanism.Sensitivity).Key)} for the {BudgetText.Several(measure.Kind)} of column \"{measure.Column}\" in table \"{table.Id}\" and does not say where their denominator is known from.",
            $"without a public denominator a {BudgetText.Written(measure.Kind)} is a noised {Numerator(measure.Kind)} over a noised count: both spend, and no number bounds what one unit moves.",
            $"if the denominators are public, add \"denominator\": {{ \"public\": \"{column ?? "COLUMN"}\" }}{(column is null ? $" and declare the column in table \"{table.Id}\": \"columns\": {{ \"COLUMN\": {{ \"from\": \"public\" }} }}" : "")}; {(isOpen ? Clip(mechanism, measure) : "")}else publish {(measure.Kind == MeasureKind.Mean ? "the sum and the count" : "both counts")}, each with a mechanism of its own.");
    }

    private static string? PublicColumn(Mechanism mechanism, Table table) => table.SideColumns
        .FirstOrDefault(side => side.From == SideColumnOrigin.Public && mechanism.Parameters.Values.All(parameter => parameter.Column != side.Column))?.Column;

    // What is said of contributions to a share or rate does not settle by how much they move it.
    private static bool IsOpen(Mechanism mechanism, Measure measure) => mechanism.Sensitivity is { CellsPerUnit: not null, PerCell: not null } && (mechanism.Clipped is null || measure.Kind != MeasureKind.Mean);

    private static string Clip(Mechanism mechanism, Measure measure) => measure.Kind == MeasureKind.Mean
        ? $"if no contribution is above {BudgetText.Plain(mechanism.Sensitivity.PerCell!.Value)}, add \"clipped\": {{ \"from\": 0, \"to\": {BudgetText.Plain(mechanism.Sensitivity.PerCell.Value)} }}; "
        : "";

    private static string Numerator(MeasureKind kind) => kind == MeasureKind.Mean ? "sum" : "count";

    private static string Given(string key) => key == "perCell" ? "a \"perCell\"" : $"an {key}";
}
