namespace ReleaseKit.Releases;

/// <summary>Which rows of its table a note is for: "?ward=Skerry%20End", or with a figure before the question mark. Columns that are not named leave out their totals.</summary>
public static class NoteQuery
{
    /// <summary>The rows, in order; all rows if the note says nothing.</summary>
    /// <exception cref="AddressException">It names a figure, column or value that the table does not have.</exception>
    public static IReadOnlyList<int> Rows(Table table, string? at)
    {
        if (at is null)
            return [.. Enumerable.Range(0, table.RowCount)];
        var address = Address(table, at);
        return FigureSelector.Rows(table, address.Query, address);
    }

    /// <summary>The measure that a note is for, or null if it is for all of them.</summary>
    public static int? Measure(Table table, string? at)
    {
        if (at is null || at.StartsWith('?'))
            return null;
        var figure = Address(table, at).Figure;
        var index = table.Measures.ToList().FindIndex(measure => measure.Column == figure);
        return index >= 0 ? index : throw AddressProblems.UnknownFigure(Address(table, at), table);
    }

    private static FigureAddress Address(Table table, string at)
    {
        if (at.StartsWith('?'))
            return new FigureAddress(table.Id, "", FigureAddress.ParseQuery(at[1..], at)) { Written = at };
        return FigureAddress.Parse(at.Contains('/', StringComparison.Ordinal) ? at : $"{Uri.EscapeDataString(table.Id)}/{at}") with { Written = at };
    }
}
