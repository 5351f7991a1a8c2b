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
        if (measure.Kind != MeasureKind.Count || measure.Unit.Key != release.Noise.Who.Key)
            return null;
        var rows = Enumerable.Range(0, measure.RuleOf.Length).Where(row => measure.RuleAt(row) is NoiseRule.Exact && measure.HasNumber(row)).ToList();
        return rows.Count == 0 ? null : Exact(release, FigureAddress.Canonical(table, measure, rows[0]), rows.Count);
    }

    private static Finding Exact(Release release, string address, int count) => new(
        FindingLevel.Stop, "exact-unit-count", FindingOwner.Noise, new Place("release.json"),
        $"{address} is an exact number of {BudgetText.Other(release.Noise)}{(count > 1 ? $", as are {count - 1} more figures of its column" : "")}.",
        $"one {BudgetText.One(release.Noise)} more or less would change it, so no two neighbouring data sets agree on it and the guarantee protects nobody.",
        "write \"neighbouring\": \"replace\" in mechanisms.json, or noise the figure, or give it as \"public\" if it is known from elsewhere and not from the records.")
    {
        Address = address,
    };
}
