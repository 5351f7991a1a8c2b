using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>A total row and the rows that it is the total of, over one stub column.</summary>
internal readonly record struct TotalAndParts(int Total, IReadOnlyList<int> Parts);

/// <summary>
/// The totals of a table over one stub column: under the heading of totals, and under every value that labels.csv gives as the parent of others.
/// </summary>
/// <param name="Table">The table.</param>
/// <param name="Column">Index of the stub column.</param>
/// <param name="Total">The heading of totals, if there is one.</param>
/// <param name="Measures">The measures that add up so: by "adds", by a rule "sumOver", or because counts and amounts do.</param>
/// <param name="Declared">Those of which "adds" says so.</param>
internal sealed record AddedRows(Table Table, int Column, string? Total, IReadOnlyList<Measure> Measures, IReadOnlySet<string> Declared)
{
    public StubColumn Stub => Table.Stub[Column];

    /// <summary>Every column that has totals, each kind of total once.</summary>
    public static IEnumerable<AddedRows> Of(Table table)
    {
        for (var column = 0; column < table.Stub.Count; column++)
        {
            var stub = table.Stub[column];
            var hasTotals = StubParents.Of(stub).Any(parent => parent >= 0);
            var additions = table.Adds.Where(addition => addition.Over == stub.Column).ToList();
            foreach (var total in additions.Select(addition => addition.Total).Concat(hasTotals ? [stub.All] : Array.Empty<string?>()).Distinct())
            {
                var declared = additions.Where(addition => addition.Total == total).Select(addition => addition.Measure).ToHashSet();
                var index = column;
                var measures = table.Measures.Where(measure => declared.Contains(measure.Column) || (total == stub.All && AddsUp(measure, index))).ToList();
                yield return new AddedRows(table, column, total, measures, declared);
            }
        }
    }

    public IEnumerable<TotalAndParts> Rows()
    {
        var wholeOf = WholeOf();
        foreach (var group in new RowGroups(Table).GroupsOver(Column))
        {
            var rows = group.DistinctBy(row => Stub.Codes[row]).ToDictionary(row => Stub.Codes[row]);
            foreach (var parts in rows.Values.GroupBy(wholeOf))
                if (rows.TryGetValue(parts.Key, out var total))
                    yield return new TotalAndParts(total, [.. parts.Order()]);
        }
    }

    private static bool AddsUp(Measure measure, int column) => measure.Kind is MeasureKind.Count or MeasureKind.Estimate or MeasureKind.Amount
        || measure.Rules.OfType<NoiseRule.SumOver>().Any(rule => rule.StubColumn == column);

    /// <summary>For each row the heading that it is a part of: by the parents of labels.csv; under a total of another heading, that one for all others.</summary>
    private Func<int, int> WholeOf()
    {
        var parents = StubParents.Of(Stub);
        var code = Stub.Labels.ToList().FindIndex(label => label.Value == Total);
        return code < 0 || parents.Contains(code)
            ? row => parents[Stub.Codes[row]]
            : row => Stub.Codes[row] == code ? -1 : code;
    }
}
