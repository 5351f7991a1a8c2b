using System.Text;
using CsvHelper;
using ReleaseKit.Downloads;

namespace ReleaseKit.Pages;

/// <summary>How many figures of a table are new, changed (value, margin, range, coverage, reliability or status) and gone.</summary>
/// <param name="Table">The table's id.</param>
/// <param name="New">Addresses that only the new files have.</param>
/// <param name="Changed">Addresses that both have, with other content.</param>
/// <param name="Gone">Addresses that only the old files have.</param>
public sealed record FigureChanges(string Table, int New, int Changed, int Gone)
{
    /// <summary>Compares the long files among the files that differ; a figure is known by its address, wherever its row stands.</summary>
    internal static IReadOnlyList<FigureChanges> Between(string oldFolder, string newFolder, IEnumerable<string> files) =>
    [
        .. files.Where(path => DownloadNames.TableOfLong(path) is not null).Order(StringComparer.Ordinal)
            .Select(path => Of(DownloadNames.TableOfLong(path)!, Path.Combine(oldFolder, path), Path.Combine(newFolder, path)))
            .Where(table => table.New + table.Changed + table.Gone > 0),
    ];

    private static FigureChanges Of(string table, string oldFile, string newFile)
    {
        var (before, after) = DifferingRows(oldFile, newFile);
        var both = before.Keys.Where(after.ContainsKey).ToList();
        var changed = both.Count(address => before[address] != after[address]);
        return new(table, after.Count - both.Count, changed, before.Count - both.Count);
    }

    /// <summary>Rows by address, without those that stand alike at the same place in both: of a large table only the difference is held.</summary>
    private static (Dictionary<string, string> Before, Dictionary<string, string> After) DifferingRows(string oldFile, string newFile)
    {
        var (before, after) = (new Dictionary<string, string>(StringComparer.Ordinal), new Dictionary<string, string>(StringComparer.Ordinal));
        using var oldRows = Rows(oldFile).GetEnumerator();
        using var newRows = Rows(newFile).GetEnumerator();
        for (var (isOld, isNew) = (oldRows.MoveNext(), newRows.MoveNext()); isOld || isNew; (isOld, isNew) = (isOld && oldRows.MoveNext(), isNew && newRows.MoveNext()))
        {
            if (isOld && isNew && oldRows.Current == newRows.Current)
                continue;
            if (isOld)
                before[oldRows.Current.Address] = oldRows.Current.Row;
            if (isNew)
                after[newRows.Current.Address] = newRows.Current.Row;
        }
        return (before, after);
    }

    private static IEnumerable<(string Address, string Row)> Rows(string file)
    {
        if (!File.Exists(file))
            yield break;
        using var reader = CsvReader.FromFile(file, new CsvReaderOptions { Separator = ',', OnMalformedRecord = static _ => { } });
        while (Read(reader) && reader.Headers[0] == LongColumn.Address)
            yield return (reader.GetString(0), Encoding.UTF8.GetString(reader.RawRecord));
    }

    /// <summary>False at the end, and where somebody's hand has made the file unreadable.</summary>
    private static bool Read(CsvReader reader)
    {
        try
        {
            return reader.Read();
        }
        catch (CsvFormatException)
        {
            return false;
        }
    }
}
