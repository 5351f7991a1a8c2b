using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>An exact number of units where neighbours differ by one unit: no two neighbours agree on it, so nothing is protected.</summary>
internal sealed class ExactCountCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release is { Noise.Neighbouring: Neighbouring.AddOrRemove } release
        ? release.Tables.SelectMany(table => table.Measures.Select(measure => Found(release, table, measure))).OfType<Finding>()
        : [];

    private static Finding? Found(Release release, Table table, Measure measure)
    {
        var isNamed = measure.Unit.Key.Length > 0;
        var isOfUnits = measure.Kind is MeasureKind.Count or MeasureKind.Estimate or MeasureKind.Amount && isNamed && BudgetText.IsUnitOfPrivacy(measure.Unit, release.Noise);
        if (!isOfUnits && (measure.Kind != MeasureKind.Count || isNamed))
            return null;
        var rows = Enumerable.Range(0, measure.RuleOf.Length).Where(row => measure.RuleAt(row) is NoiseRule.Exact && IsNumberOfUnits(measure, row)).ToList();
        if (rows.Count == 0)
            return null;
        var address = FigureAddress.Canonical(table, measure, rows[0]);
        var at = ((NoiseRule.Exact)measure.RuleAt(rows[0])).At;
        return isOfUnits ? Exact(release, at, address, rows.Count) : WithoutUnit(release, at, measure, address);
    }

    // A count by another name: an amount of units that is a whole number of them.
    private static bool IsNumberOfUnits(Measure measure, int row) =>
        measure.HasNumber(row) && (measure.Kind != MeasureKind.Amount || measure.ValueAt(row).Times(measure.Multiplier).IsWhole);

    private static Finding WithoutUnit(Release release, Place at, Measure measure, string address) => new(
        FindingLevel.Caution, "exact-count-without-unit", FindingOwner.Noise, at,
        $"{address} is an exact count, and column \"{measure.Column}\" does not say of what.",
        $"an exact number of {BudgetText.Other(release.Noise)} would protect nobody: one {BudgetText.One(release.Noise)} more or less changes it.",
        $"give the figures \"{measure.Column}\" their \"unit\" in release.json; noise them if they count {BudgetText.Other(release.Noise)}.")
    {
        Address = address,
    };

    private static Finding Exact(Release release, Place at, string address, int count) => new(
        FindingLevel.Stop, "exact-unit-count", FindingOwner.Noise, at,
        $"{address} is an exact number of {BudgetText.Other(release.Noise)}{BudgetText.More(count, ", as is one more figure", ", as are {0} more figures", " of its column")}.",
        $"one {BudgetText.One(release.Noise)} more or less would change it, so no two neighbouring data sets agree on it and the guarantee protects nobody.",
        "write \"neighbouring\": \"replace\" in mechanisms.json, or noise the figure, or give it as \"public\" if it is known from elsewhere and not from the records.")
    {
        Address = address,
    };
}
