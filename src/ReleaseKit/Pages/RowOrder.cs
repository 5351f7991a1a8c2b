using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>The rows of a table in the order of its stub: by the order of the first column's labels, within it by the second's, and so on.</summary>
internal static class RowOrder
{
    public static int[] Of(Table table)
    {
        var rows = Enumerable.Range(0, table.RowCount).ToArray();
        int Compare(int one, int other) => CompareStubs(table.Stub, one, other);
        // Most tables come in this order: then nothing is sorted.
        for (var row = 1; row < rows.Length; row++)
            if (Compare(row - 1, row) > 0)
            {
                Array.Sort(rows, Compare);
                break;
            }
        return rows;
    }

    private static int CompareStubs(IReadOnlyList<StubColumn> stub, int one, int other)
    {
        foreach (var column in stub)
        {
            var order = column.Codes[one].CompareTo(column.Codes[other]);
            if (order != 0)
                return order;
        }
        return one.CompareTo(other);
    }
}
