using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>The rows of one measure whose figures carry the noise of a mechanism.</summary>
internal sealed record MechanismRows(Table Table, Measure Measure, IReadOnlyList<int> Rows)
{
    public static IEnumerable<MechanismRows> Of(Release release, Mechanism mechanism) =>
        from table in release.Tables
        from measure in table.Measures
        where measure.Rules.Any(rule => IsOf(rule, mechanism))
        let rows = Enumerable.Range(0, table.RowCount).Where(row => IsOf(measure.RuleAt(row), mechanism)).ToList()
        where rows.Count > 0
        select new MechanismRows(table, measure, rows);

    private static bool IsOf(NoiseRule rule, Mechanism mechanism) => rule is NoiseRule.FromMechanism from && from.Mechanism.Id == mechanism.Id;
}
