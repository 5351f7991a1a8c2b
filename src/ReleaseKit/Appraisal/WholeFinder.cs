using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>
/// Finds the published figure of a larger whole: the row like this one whose value in the finest column that has totals is "all", then in coarser ones too.
/// </summary>
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

    /// <summary>The rows of the wholes that a row belongs to, the smallest first.</summary>
    public IEnumerable<int> Of(int row)
    {
        var key = keys.Of(row);
        for (var column = table.Stub.Count - 1; column >= 0; column--)
        {
            var stub = table.Stub[column];
            if (stub.AllCode < 0 || stub.IsAll(row))
                continue;
            key = keys.With(key, row, column, stub.AllCode);
            if (wholes.TryGetValue(key, out var whole))
                yield return whole;
        }
    }
}
