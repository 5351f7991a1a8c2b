using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>
/// Gives findings about cells their line and column. Where each cell of a table stands is not kept while it is read; a table with findings is read once
/// more, as far as the last of them.
/// </summary>
internal static class CellPlaces
{
    public static IReadOnlyList<Finding> Fill(IReadOnlyList<Finding> findings, FolderFiles files)
    {
        var places = findings.Select(finding => finding.At).Where(at => at.Cell is not null).Distinct().GroupBy(at => at.File)
            .SelectMany(cells => PlacesIn(cells.Key, cells, files)).ToDictionary();
        return [.. findings.Select(finding => places.TryGetValue(finding.At, out var at) ? finding with { At = at } : finding)];
    }

    private static IEnumerable<KeyValuePair<Place, Place>> PlacesIn(string path, IEnumerable<Place> cells, FolderFiles files)
    {
        var silent = new ReadContext(new FindingLog(), FindingOwner.Noise, "");
        using var rows = files.Find(path, new Place(path), silent) is { } file ? CsvFile.Open(file, path, silent) : null;
        var byRow = cells.ToLookup(at => at.Cell!.Value.Row);
        var left = byRow.Count;
        for (var row = 0; left > 0 && rows?.Read() == true; row++)
        {
            foreach (var at in byRow[row])
                yield return new(at, rows.PlaceOf(Math.Max(0, rows.Headers.ToList().IndexOf(at.Cell!.Value.Column))));
            left -= byRow.Contains(row) ? 1 : 0;
        }
    }
}
