using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// How often one unit is counted by one mechanism in one measure, at least: once on every level (a total and its parts are levels of their own),
/// and there once in every period.
/// </summary>
internal static class Levels
{
    public static int Of(Release release, MeasureRef at, string mechanism)
    {
        var (table, measure) = (release.Tables[at.Table], release.Tables[at.Table].Measures[at.Measure]);
        var levelOf = LevelOf(table);
        var isOurs = measure.Rules.Select(rule => rule is NoiseRule.FromMechanism from && from.Mechanism.Id == mechanism).ToArray();
        var seen = new HashSet<UInt128>();
        for (var row = 0; row < measure.RuleOf.Length; row++)
        {
            if (isOurs[measure.RuleOf[row]])
                seen.Add(levelOf(row));
        }

        return seen.Count;
    }

    /// <summary>For each row the level, and the period there, that it stands on: alike for rows of which one unit is counted in one at most.</summary>
    public static Func<int, UInt128> LevelOf(Table table)
    {
        var columns = table.Stub.Select(stub => (stub.Codes, Parts: PartOf(stub), Base: (UInt128)(uint)(stub.Labels.Count + 2))).ToList();
        return row => columns.Aggregate(UInt128.Zero, (key, column) => (key * column.Base) + column.Parts[column.Codes[row]]);
    }

    // A period is a place of its own; any other label stands for its level: the total's, or its depth below other labels of the column.
    private static uint[] PartOf(StubColumn stub) =>
        [.. Enumerable.Range(0, stub.Labels.Count).Select(code => code == stub.AllCode ? 0 : stub.Period ? (uint)code + 1 : Depth(stub, code) + 1)];

    private static uint Depth(StubColumn stub, int code)
    {
        var (depth, label) = (0u, stub.Labels[code]);
        while (label.Parent is { } parent && stub.Labels.FirstOrDefault(other => other.Value == parent) is { } above && depth < stub.Labels.Count)
            (depth, label) = (depth + 1, above);
        return depth;
    }
}
