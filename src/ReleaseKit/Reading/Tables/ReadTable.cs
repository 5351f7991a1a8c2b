using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>A table with what later checks need: its draft, the line of each row, and whether its CSV could be read whole.</summary>
internal sealed record ReadTable(Table Table, TableDraft Draft, IReadOnlyList<int> Lines, bool IsWhole)
{
    public Place PlaceOf(int row, string column) => Place.OfCell(Table.File, row, column);

    /// <summary>Where a figure of a row stands.</summary>
    public Place PlaceOf(int row, int measure) => PlaceOf(row, Table.Measures[measure].Column);

    public string Address(int measure, int row) => FigureAddress.Canonical(Table, Table.Measures[measure], row);
}
