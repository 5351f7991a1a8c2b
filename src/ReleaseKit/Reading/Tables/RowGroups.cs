using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>Rows sorted by their keys, so that doubles and the parts of totals are found in time n log n.</summary>
internal sealed class RowGroups(Table table)
{
    private readonly RowKeys keys = new(table);

    /// <summary>Rows whose headings all stood in an earlier row, with the first such row.</summary>
    public IEnumerable<(int First, int Again)> Doubled()
    {
        var (sorted, rows) = Sorted(keys.Of);
        for (var index = 1; index < sorted.Length; index++)
            if (sorted[index] == sorted[index - 1])
                yield return (Math.Min(rows[index - 1], rows[index]), Math.Max(rows[index - 1], rows[index]));
    }

    /// <summary>Rows that have the same headings but for one stub column, as runs.</summary>
    public IEnumerable<ArraySegment<int>> GroupsOver(int column)
    {
        var (sorted, rows) = Sorted(row => keys.Without(row, column));
        for (var (start, index) = (0, 1); index <= sorted.Length; index++)
            if (index == sorted.Length || sorted[index] != sorted[start])
            {
                yield return new ArraySegment<int>(rows, start, index - start);
                start = index;
            }
    }

    private (UInt128[] Keys, int[] Rows) Sorted(Func<int, UInt128> keyOf)
    {
        var rows = Enumerable.Range(0, table.RowCount).ToArray();
        var sorted = Array.ConvertAll(rows, row => keyOf(row));
        Array.Sort(sorted, rows);
        return (sorted, rows);
    }
}
