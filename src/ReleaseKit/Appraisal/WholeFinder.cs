using System.Numerics;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Finds the published figures of larger wholes: the rows like this one that have "all" in place of some of its values.</summary>
internal sealed class WholeFinder
{
    private readonly Table table;
    private readonly RowKeys keys;
    private readonly Dictionary<UInt128, int> wholes;

    public WholeFinder(Table table)
    {
        this.table = table;
        keys = new RowKeys(table);
        wholes = [];
        for (var row = 0; row < table.RowCount; row++)
            if (table.Stub.Any(column => column.IsAll(row)))
                wholes.TryAdd(keys.Of(row), row);
    }

    /// <summary>The rows of the wholes that a row belongs to, the nearest first: those that have "all" in one column more, then in two, and so on.</summary>
    public IEnumerable<IReadOnlyList<int>> Of(int row)
    {
        var open = Enumerable.Range(0, table.Stub.Count).Where(column => table.Stub[column].AllCode >= 0 && !table.Stub[column].IsAll(row)).ToList();
        return Enumerable.Range(1, (1 << open.Count) - 1).GroupBy(choice => BitOperations.PopCount((uint)choice)).OrderBy(group => group.Key)
            .Select(group => (IReadOnlyList<int>)[.. group.Select(choice => Whole(row, open.Where((_, at) => (choice >> at & 1) == 1))).OfType<int>()]);
    }

    private int? Whole(int row, IEnumerable<int> columns)
    {
        var key = columns.Aggregate(keys.Of(row), (key, column) => keys.With(key, row, column, table.Stub[column].AllCode));
        return wholes.TryGetValue(key, out var whole) ? whole : null;
    }
}
