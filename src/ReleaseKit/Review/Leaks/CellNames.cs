using ReleaseKit.Releases;

namespace ReleaseKit.Review.Leaks;

/// <summary>The rows of a table by what they are about: their row headings by column, "all" left out, so that rows of another table find them.</summary>
internal sealed class CellNames
{
    private readonly Dictionary<string, int> rows = [];

    public CellNames(Table table)
    {
        for (var row = 0; row < table.RowCount; row++)
            rows.TryAdd(NameOf(table, row), row);
    }

    /// <summary>The row about the same as a row of another table; −1 if there is none.</summary>
    public int RowLike(Table other, int row) => rows.GetValueOrDefault(NameOf(other, row), -1);

    private static string NameOf(Table table, int row) => string.Join('\n', table.Stub.Where(stub => !stub.IsAll(row))
        .Select(stub => $"{stub.Column}\t{stub.LabelOf(row).Value}").Order(StringComparer.Ordinal));
}
