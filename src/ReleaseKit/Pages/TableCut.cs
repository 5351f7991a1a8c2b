using ReleaseKit.Releases;

namespace ReleaseKit.Pages;

/// <summary>How a table is cut into pages: by the values of its cutting column, else every 200 rows.</summary>
public sealed class TableCut
{
    /// <summary>Most rows on one page.</summary>
    public const int RowsPerPage = 200;

    private readonly int[] pageOfRow;

    private TableCut(IReadOnlyList<TablePage> pages, int rows)
    {
        Pages = pages;
        pageOfRow = new int[rows];
        for (var page = 0; page < pages.Count; page++)
            foreach (var row in pages[page].Rows)
                pageOfRow[row] = page;
    }

    /// <summary>The first is the table's index.html. Where a column cuts, it holds the rows of the column's "all" value, maybe none.</summary>
    public IReadOnlyList<TablePage> Pages { get; }

    public TablePage PageOf(int row) => Pages[pageOfRow[row]];

    public static TableCut Of(Table table)
    {
        var order = RowOrder.Of(table);
        var names = new PageNames(table.Id);
        var pages = table.CutBy is { } cut ? ByParts(table.Stub[cut], order, names) : InRuns(null, order, names);
        return new TableCut([.. pages], table.RowCount);
    }

    private static IEnumerable<TablePage> ByParts(StubColumn column, int[] order, PageNames names)
    {
        var rows = order.ToLookup(row => column.Codes[row]);
        var parts = Enumerable.Range(0, column.Labels.Count).Where(code => code != column.AllCode && rows.Contains(code));
        return InRuns(null, [.. rows[column.AllCode]], names)
            .Concat(parts.SelectMany(code => InRuns(column.Labels[code], [.. rows[code]], names)));
    }

    private static IEnumerable<TablePage> InRuns(StubLabel? part, int[] rows, PageNames names) => rows.Length == 0
        ? [new TablePage(names.Next(part, 1), part, 1, [])]
        : rows.Chunk(RowsPerPage).Select((run, index) => new TablePage(names.Next(part, index + 1), part, index + 1, run));
}
