using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Among some rows of a table, each row with the totals that hold it.</summary>
internal sealed class Wholes
{
    private readonly Table table;
    private readonly RowKeys keys;
    private readonly List<int[]> parents;
    private readonly Dictionary<UInt128, int> rowOf = [];

    public Wholes(Table table, IEnumerable<int> rows)
    {
        (this.table, keys, parents) = (table, new RowKeys(table), [.. table.Stub.Select(StubParents.Of)]);
        foreach (var row in rows)
            rowOf[keys.Of(row)] = row;
    }

    /// <summary>The row itself and every total of it, by "all" and by parents of labels.</summary>
    public IEnumerable<int> Of(int row)
    {
        IEnumerable<UInt128> found = [keys.Of(row)];
        for (var column = 0; column < parents.Count; column++)
        {
            var (at, above) = (column, StubParents.Upwards(parents[column], table.Stub[column].Codes[row]).ToList());
            found = found.SelectMany(key => above.Select(code => keys.With(key, row, at, code)));
        }

        return found.Where(rowOf.ContainsKey).Select(key => rowOf[key]);
    }
}
