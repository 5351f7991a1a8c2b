using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>Rows by their row headings as one number each, so that doubles and the parts of totals are found by sorting, in time n log n.</summary>
internal sealed class RowKeys(Table table)
{
    /// <summary>Rows whose headings all stood in an earlier row, with the first such row.</summary>
    public IEnumerable<(int First, int Again)> Doubled()
    {
        var (keys, rows) = Sorted(-1);
        for (var index = 1; index < keys.Length; index++)
            if (keys[index] == keys[index - 1])
                yield return (Math.Min(rows[index - 1], rows[index]), Math.Max(rows[index - 1], rows[index]));
    }

    /// <summary>Rows that have the same headings but for one stub column, as runs.</summary>
    public IEnumerable<ArraySegment<int>> GroupsOver(int column)
    {
        var (keys, rows) = Sorted(column);
        for (var (start, index) = (0, 1); index <= keys.Length; index++)
            if (index == keys.Length || keys[index] != keys[start])
            {
                yield return new ArraySegment<int>(rows, start, index - start);
                start = index;
            }
    }

    private (UInt128[] Keys, int[] Rows) Sorted(int without)
    {
        var rows = Enumerable.Range(0, table.RowCount).ToArray();
        var keys = new UInt128[table.RowCount];
        for (var row = 0; row < keys.Length; row++)
            keys[row] = Key(row, without);
        Array.Sort(keys, rows);
        return (keys, rows);
    }

    private UInt128 Key(int row, int without)
    {
        UInt128 key = 0;
        for (var column = 0; column < table.Stub.Count; column++)
            if (column != without)
                key = key * (uint)(table.Stub[column].Labels.Count + 1) + (uint)table.Stub[column].Codes[row];
        return key;
    }
}
