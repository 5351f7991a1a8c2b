using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Tables;

/// <summary>A note under the table with its mark; a note for the whole table has none.</summary>
internal sealed record MarkedNote(string Mark, ReaderText Text);

/// <summary>The notes of a table: each that is for some rows or figures has a letter, which stands beside them.</summary>
internal sealed class NoteMarks
{
    private const string Letters = "abcdefghijklmnopqrstuvwxyz";
    private readonly Dictionary<int, string> ofRow = [];
    private readonly Dictionary<(int Measure, int Row), string> ofFigure = [];
    private readonly Dictionary<string, HashSet<int>> rowsOf = [];

    private NoteMarks(IReadOnlyList<MarkedNote> notes) => Notes = notes;

    public IReadOnlyList<MarkedNote> Notes { get; }

    public string OfRow(int row) => ofRow.GetValueOrDefault(row) ?? "";

    public string OfFigure(int measure, int row) => ofFigure.GetValueOrDefault((measure, row)) ?? "";

    public bool AreOn(IEnumerable<int> rows, string mark) => rowsOf.TryGetValue(mark, out var marked) && rows.Any(marked.Contains);

    public static NoteMarks Of(Table table)
    {
        var number = 0;
        var marks = table.Notes.Select(note => note.At is null ? "" : MarkOf(number++)).ToList();
        var result = new NoteMarks([.. table.Notes.Zip(marks, (note, mark) => new MarkedNote(mark, note.Text))]);
        foreach (var (note, mark) in table.Notes.Zip(marks).Where(pair => pair.First.At is not null))
            result.Place(table, note.At!, mark);
        return result;
    }

    private static string MarkOf(int index) => index < Letters.Length ? Letters[index..(index + 1)] : MarkOf((index / Letters.Length) - 1) + Letters[index % Letters.Length];

    // "?ward=Skerry%20End" is for rows, "in_arrears?ward=Skerry%20End" for figures; the table before a slash is this one.
    private void Place(Table table, string at, string mark)
    {
        var query = at.IndexOf('?', StringComparison.Ordinal);
        var path = (query < 0 ? at : at[..query])[(at.LastIndexOf('/', query < 0 ? at.Length - 1 : Math.Max(query - 1, 0)) + 1)..];
        var wanted = FigureAddress.ParseQuery(query < 0 ? "" : at[(query + 1)..], at);
        var measure = path.Length == 0 ? -1 : table.Measures.ToList().FindIndex(one => one.Column == path);
        var rows = Enumerable.Range(0, table.RowCount).Where(row => Matches(table, row, wanted)).ToHashSet();
        rowsOf[mark] = rows;
        foreach (var row in rows)
            if (measure < 0)
                ofRow[row] = Joined(ofRow.GetValueOrDefault(row), mark);
            else
                ofFigure[(measure, row)] = Joined(ofFigure.GetValueOrDefault((measure, row)), mark);
    }

    private static string Joined(string? before, string mark) => before is null ? mark : $"{before}, {mark}";

    private static bool Matches(Table table, int row, IReadOnlyList<StubValue> wanted) =>
        wanted.All(value => table.Stub.Any(column => column.Column == value.Column && column.LabelOf(row).Value == value.Value));
}
