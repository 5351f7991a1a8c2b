using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Tables;

/// <summary>How a row looks: a figure's own row, a total of some rows, or the total of all.</summary>
internal enum RowKind
{
    Item,
    Group,
    Total,
}

/// <summary>One row of a sheet: the table's row, its number for citing (counts from 1 over the whole table), and its headings as they stand in the stub.</summary>
internal sealed record SheetRow(int Row, int Number, RowKind Kind, IReadOnlyList<string> Headings, string Name);

/// <summary>
/// The stub of a table as pages show it. Two columns of which the second has a total for each value of the first stand in one: the totals as bands, their parts
/// inset below them. Any other stub keeps its columns.
/// </summary>
internal sealed class SheetStub
{
    private readonly Table table;
    private readonly ILanguage language;

    private SheetStub(Table table, ILanguage language, bool isHierarchy) => (this.table, this.language, IsHierarchy) = (table, language, isHierarchy);

    public bool IsHierarchy { get; }

    /// <summary>How many columns of headings the sheet has.</summary>
    public int Width => IsHierarchy ? 1 : table.Stub.Count;

    public IReadOnlyList<string> Heads => IsHierarchy
        ? [language.Text("tables.stub.two", ("outer", TitleOf(0)), ("inner", TitleOf(1)))]
        : [.. table.Stub.Select((_, index) => TitleOf(index))];

    public static SheetStub Of(Table table, ILanguage language) => new(table, language, HasGroupTotals(table));

    /// <summary>The rows of a page, numbered from the first number on.</summary>
    public IEnumerable<SheetRow> Rows(IEnumerable<int> rows, int firstNumber) =>
        rows.Select((row, index) => new SheetRow(row, firstNumber + index, KindOf(row), HeadingsOf(row), NameOf(row)));

    /// <summary>Whether a row begins a new group of the sheet: another value of the first column.</summary>
    public bool BeginsGroup(int row, int? before) =>
        before is not { } previous || (IsHierarchy && table.Stub[0].Codes[row] != table.Stub[0].Codes[previous]);

    /// <summary>The heading of the group that a row is a part of; null for a row that heads a group, or stands in none.</summary>
    public string? GroupOf(SheetRow row) => IsHierarchy && row.Kind == RowKind.Item ? LabelText.Of(table.Stub[0], row.Row, language) : null;

    /// <summary>A row's name in words: its innermost heading first.</summary>
    public string NameOf(int row)
    {
        var parts = table.Stub.Where(column => !column.IsAll(row)).Select(column => LabelText.Of(column, row, language)).ToList();
        if (IsHierarchy)
            parts.Reverse();
        return parts.Count == 0 ? LabelText.Of(table.Stub[0], row, language) : string.Join(", ", parts);
    }

    private static bool HasGroupTotals(Table table)
    {
        // Rows stand in the order of their labels: a total that is not the first of them would head the next group.
        if (table.Stub.Count != 2 || table.Stub[1].AllCode != 0)
            return false;
        var rows = Enumerable.Range(0, table.RowCount).ToList();
        var groups = rows.Select(row => table.Stub[0].Codes[row]).ToHashSet();
        return groups.SetEquals(rows.Where(row => table.Stub[1].IsAll(row)).Select(row => table.Stub[0].Codes[row]));
    }

    private RowKind KindOf(int row)
    {
        if (IsHierarchy && !table.Stub[1].IsAll(row))
            return RowKind.Item;
        var totals = table.Stub.Count(column => column.IsAll(row));
        return totals == 0 ? RowKind.Item : totals == table.Stub.Count ? RowKind.Total : RowKind.Group;
    }

    private IReadOnlyList<string> HeadingsOf(int row)
    {
        if (!IsHierarchy)
            return [.. table.Stub.Select(column => LabelText.Of(column, row, language))];
        var column = table.Stub[1].IsAll(row) ? table.Stub[0] : table.Stub[1];
        return [LabelText.Of(column, row, language)];
    }

    private string TitleOf(int column) => table.Stub[column].Title.In(language.Tag);
}
