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

    /// <summary>Letters in the order in which a reader meets them: row by row, and in a row from the stub to the right.</summary>
    public static NoteMarks Of(Table table)
    {
        var met = table.Notes.Where(note => note.At is not null).Select(note => (note.Text, Place: NotePlace.Of(table, note.At!)))
            .OrderBy(note => note.Place.FirstRow).ThenBy(note => note.Place.Measure).ToList();
        var result = new NoteMarks([
            .. table.Notes.Where(note => note.At is null).Select(note => new MarkedNote("", note.Text)),
            .. met.Select((note, index) => new MarkedNote(MarkOf(index), note.Text))]);
        for (var index = 0; index < met.Count; index++)
            result.Mark(met[index].Place, MarkOf(index));
        return result;
    }

    private static string MarkOf(int index) => index < Letters.Length ? Letters[index..(index + 1)] : MarkOf((index / Letters.Length) - 1) + Letters[index % Letters.Length];

    private void Mark(NotePlace place, string mark)
    {
        rowsOf[mark] = place.Rows;
        foreach (var row in place.Rows)
            if (place.Measure < 0)
                ofRow[row] = Joined(ofRow.GetValueOrDefault(row), mark);
            else
                ofFigure[(place.Measure, row)] = Joined(ofFigure.GetValueOrDefault((place.Measure, row)), mark);
    }

    private static string Joined(string? before, string mark) => before is null ? mark : $"{before}, {mark}";
}
