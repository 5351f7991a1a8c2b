namespace ReleaseKit.Pages.Tables;

/// <summary>What is said once for a whole table: how rows are cited, how many ranges may miss, why parts may not add up, where hidden figures are counted.</summary>
internal static class TableSentences
{
    public static IEnumerable<string> Of(Sheet sheet) =>
    [
        sheet.Text("tables.rows"),
        .. sheet.Language.NotesOf(sheet.Facts, sheet.IsCut),
        .. sheet.Table.Hidden is { } hidden ? [sheet.Text(hidden.InTotals ? "tables.hidden.in-totals" : "tables.hidden.not-in-totals")] : Array.Empty<string>(),
    ];
}
