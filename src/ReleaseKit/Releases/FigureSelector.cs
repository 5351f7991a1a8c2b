namespace ReleaseKit.Releases;

/// <summary>Which rows an address means. A selection leaves out the "all" rows of a column that it does not name, so that parts and totals are never counted together.</summary>
internal static class FigureSelector
{
    public static FigureSelection Select(FigureAddress address, IReadOnlyList<Table> tables)
    {
        var table = IndexOf(tables, one => one.Id == address.Table);
        if (table < 0)
            throw AddressProblems.UnknownTable(address, tables);
        var measure = IndexOf(tables[table].Measures, one => one.Column == address.Figure);
        if (measure < 0)
            throw AddressProblems.UnknownFigure(address, tables[table]);
        var rows = Rows(tables[table], address.Query, address);
        return rows.Count > 0 ? new FigureSelection(table, measure, rows) : throw AddressProblems.NothingMatches(address, tables[table]);
    }

    /// <summary>The rows of a table that a query means; empty if none fits.</summary>
    public static IReadOnlyList<int> Rows(Table table, IReadOnlyList<StubValue> query, FigureAddress address)
    {
        var wanted = Wanted(table, query, address);
        return [.. Enumerable.Range(0, table.RowCount).Where(row => Fits(table, wanted, row))];
    }

    /// <summary>For each stub column the code that is asked for, or −1 where the column is not named.</summary>
    private static int[] Wanted(Table table, IReadOnlyList<StubValue> query, FigureAddress address)
    {
        var wanted = new int[table.Stub.Count];
        Array.Fill(wanted, -1);
        foreach (var (column, value) in query)
        {
            var index = IndexOf(table.Stub, stub => stub.Column == column);
            if (index < 0)
                throw AddressProblems.UnknownColumn(address, column, table);
            if (wanted[index] >= 0)
                throw AddressProblems.NamedTwice(address, column);
            wanted[index] = CodeOf(table.Stub[index], value, address);
        }
        return wanted;
    }

    private static int CodeOf(StubColumn column, string value, FigureAddress address)
    {
        var code = IndexOf(column.Labels, label => label.Value == value);
        return code >= 0 ? code : throw AddressProblems.UnknownValue(address, column, value);
    }

    private static bool Fits(Table table, int[] wanted, int row)
    {
        for (var index = 0; index < wanted.Length; index++)
            if (wanted[index] < 0 ? table.Stub[index].IsAll(row) : table.Stub[index].Codes[row] != wanted[index])
                return false;
        return true;
    }

    private static int IndexOf<T>(IReadOnlyList<T> list, Func<T, bool> fits)
    {
        for (var index = 0; index < list.Count; index++)
            if (fits(list[index]))
                return index;
        return -1;
    }
}
