using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Tables;

/// <summary>Where a note stands: the rows it is for and the measure whose figures it is for, or -1 for the rows' names.</summary>
internal sealed record NotePlace(int Measure, HashSet<int> Rows)
{
    public int FirstRow => Rows.Count > 0 ? Rows.Min() : int.MaxValue;

    // "?ward=Skerry%20End" is for rows, "in_arrears?ward=Skerry%20End" for figures; the table before a slash is this one.
    public static NotePlace Of(Table table, string at)
    {
        var query = at.IndexOf('?', StringComparison.Ordinal);
        var path = (query < 0 ? at : at[..query])[(at.LastIndexOf('/', query < 0 ? at.Length - 1 : Math.Max(query - 1, 0)) + 1)..];
        var wanted = FigureAddress.ParseQuery(query < 0 ? "" : at[(query + 1)..], at);
        return new(
            path.Length == 0 ? -1 : table.Measures.ToList().FindIndex(one => one.Column == path),
            [.. Enumerable.Range(0, table.RowCount).Where(row => Matches(table, row, wanted))]);
    }

    private static bool Matches(Table table, int row, IReadOnlyList<StubValue> wanted) =>
        wanted.All(value => table.Stub.Any(column => column.Column == value.Column && column.LabelOf(row).Value == value.Value));
}
