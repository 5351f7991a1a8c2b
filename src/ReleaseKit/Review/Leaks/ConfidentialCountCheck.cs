using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Review.Budget;

namespace ReleaseKit.Review.Leaks;

/// <summary>
/// A column from the confidential records, without noise, whose numbers are those of a noised count of units but for its noise: an exact number of
/// units, where neighbours differ by one unit. No two neighbours agree on it, so nothing is protected.
/// </summary>
internal sealed class ConfidentialCountCheck : IReviewCheck
{
    /// <summary>Fewer rows can be alike for other reasons.</summary>
    private const int LeastRows = 8;

    // Of noise alone the mean square is seldom three times the variance; a column that is so near figures which vary far more goes with them.
    private const double LargestDistance = 3;
    private const double LeastSpread = 5;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject is { Release: { Noise: { Neighbouring: Neighbouring.AddOrRemove } account } release, Origins: { } origins }
        ? NoisedColumn.Of(release).Where(column => column.Measure.Kind == MeasureKind.Count && BudgetText.IsUnitOfPrivacy(column.Measure.Unit, account))
            .SelectMany(column => column.Table.SideColumns.Where(side => side is { From: SideColumnOrigin.Confidential, Mechanism: null } && GoesWith(side, column, origins))
                .Select(side => Exact(side, column, account))).DistinctBy(finding => finding.At)
        : [];

    private static bool GoesWith(SideColumn side, NoisedColumn column, FigureOrigins origins)
    {
        var cells = Enumerable.Range(0, column.Table.RowCount).Where(row => column.Measure.HasNumber(row) && column.Measure.RuleAt(row) is NoiseRule.FromMechanism)
            .Select(row => (Number: side.Numbers[row] * column.Measure.Multiplier, Value: column.ValueAt(row), origins.Of(column.At(row)).Error?.Error.Law.Variance)).ToList();
        if (cells.Count < LeastRows || !cells.TrueForAll(cell => double.IsInteger(cell.Number) && cell.Variance > 0))
            return false;
        var mean = cells.Average(cell => cell.Value);
        var distance = cells.Average(cell => Math.Pow(cell.Value - cell.Number, 2) / cell.Variance!.Value);
        return distance <= LargestDistance && cells.Average(cell => Math.Pow(cell.Value - mean, 2) / cell.Variance!.Value) >= LeastSpread * Math.Max(1, distance);
    }

    private static Finding Exact(SideColumn side, NoisedColumn column, NoiseAccount account) => new(
        FindingLevel.Stop, "exact-unit-count", FindingOwner.Noise, side.At,
        $"Column \"{side.Column}\" of table \"{column.Table.Id}\" is \"from\": \"confidential\" without a mechanism, and its numbers are those of \"{column.Measure.Column}\" but for the noise: exact numbers of {BudgetText.Other(account)}.",
        $"one {BudgetText.One(account)} more or less would change them, so no two neighbouring data sets agree on them and the guarantee protects nobody.",
        $"take the column out of the CSV, or name its \"mechanism\" if its numbers are noised; or, if they are known from elsewhere and not from the records, write \"{side.Column}\": {{ \"from\": \"public\" }}.");
}
