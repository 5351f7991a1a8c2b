using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>While release.json is not there yet, the CSV files in tables/ are read for their form alone: encoding, separator, ragged rows.</summary>
internal static class LoneTableChecks
{
    private const string Folder = "tables";

    public static void Run(FolderFiles files, ReadContext context)
    {
        foreach (var name in files.NamesIn(Folder).Where(name => name.EndsWith(".csv", StringComparison.Ordinal)))
            ReadThrough($"{Folder}/{name}", files, context);
    }

    private static void ReadThrough(string path, FolderFiles files, ReadContext context)
    {
        if (files.Find(path, new Place(path), context) is not { } file)
            return;
        using var rows = CsvFile.Open(file, path, context);
        while (rows?.Read() == true)
            continue;
    }
}
