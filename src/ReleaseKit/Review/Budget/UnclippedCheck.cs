using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A sensitivity of sums, or of means with a public denominator, where nothing says how much one unit can put in.</summary>
internal sealed class UnclippedCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { } release, Noise: { } account }
        ? subject.Spendings.Where(spending => IsUnclipped(spending.Mechanism)).Select(spending => CheckMechanism(spending, release, account)).OfType<Finding>()
        : [];

    // A "clipped" that is there and wrong has been reported.
    private static bool IsUnclipped(Mechanism mechanism) => mechanism is { Clipped: null, Law: not LawName.Declared } && !mechanism.KeyPlaces.ContainsKey("clipped");

    private static Finding? CheckMechanism(MechanismSpending spending, Release release, NoiseAccount account) => spending.Cells.Measures
        .Select(at => (Table: release.Tables[at.Table], Measure: release.Tables[at.Table].Measures[at.Measure]))
        .Where(pair => IsOpen(pair.Measure, spending.Mechanism))
        .Select(pair => Open(spending.Mechanism, pair.Table, pair.Measure, account)).FirstOrDefault();

    // A mean without a denominator is told with it.
    private static bool IsOpen(Measure measure, Mechanism mechanism) =>
        (measure.Kind == MeasureKind.Amount || (measure.Kind == MeasureKind.Mean && mechanism.DenominatorColumn is not null)) && !IsBounded(measure, mechanism.Sensitivity);

    /// <summary>Whether a cell is said to move as far as the figure can.</summary>
    private static bool IsBounded(Measure measure, Sensitivity sensitivity) => sensitivity is { CellsPerUnit: not null, PerCell: { } most } && measure.Highest - measure.Lowest <= most;

    private static Finding Open(Mechanism mechanism, Table table, Measure measure, NoiseAccount account) => new(
        FindingLevel.Caution, "contribution-not-bounded", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "sensitivity"),
        $"\"{mechanism.Id}\" declares {Declared(mechanism.Sensitivity)} for the {BudgetText.Several(measure.Kind)} of column \"{measure.Column}\" in table \"{table.Id}\", and nothing in the folder says how much one {BudgetText.One(account)} can add to them.",
        $"a {BudgetText.One(account)} that adds more than was thought moves them farther, and the loss is larger than the budget page says.",
        $"if what a {BudgetText.One(account)} adds is held between limits before it is added up, say so: {Limits(measure, mechanism.Sensitivity)}; else hold it between limits and draw the noise again.");

    private static string Declared(Sensitivity sensitivity) => BudgetText.Declared(sensitivity) is var (key, value) ? $"\"{key}\": {BudgetText.Plain(value)}" : "";

    // What one contribution is of a norm, or of a mean, is not known.
    private static string Limits(Measure measure, Sensitivity sensitivity) => sensitivity is { CellsPerUnit: not null, PerCell: { } most } && measure.Kind == MeasureKind.Amount
        ? $"\"clipped\": {{ \"from\": {(sensitivity.Signed ? BudgetText.Plain(-most) : "0")}, \"to\": {BudgetText.Plain(most)} }} if these are the limits"
        : "\"clipped\": { \"from\": 0, \"to\": LIMIT }";
}
