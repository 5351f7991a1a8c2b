using System.Globalization;
using ReleaseKit.Noise;
using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>The files of SITE/downloads, by their paths in the site.</summary>
public static class DownloadNames
{
    public const string Folder = "downloads/";
    private const string LongEnd = "-long.csv";

    public const string Budget = Folder + "budget.json";
    public const string Checksums = Folder + "checksums.txt";

    /// <summary>One row a row of the table: each measure with margin, range, reliability, status and reading at the main coverage.</summary>
    public static string Wide(Table table) => $"{Folder}{table.Id}.csv";

    /// <summary>The same at another coverage, without readings: "downloads/arrears-99.csv".</summary>
    public static string WideAt(Table table, Coverage coverage) => $"{Folder}{table.Id}-{Percent(coverage)}.csv";

    /// <summary>One row a figure.</summary>
    public static string Long(Table table) => $"{Folder}{table.Id}{LongEnd}";

    /// <summary>The id of the table whose long file this is; null for any other path.</summary>
    public static string? TableOfLong(string path) =>
        path.StartsWith(Folder, StringComparison.Ordinal) && path.EndsWith(LongEnd, StringComparison.Ordinal) ? path[Folder.Length..^LongEnd.Length] : null;

    /// <summary>One JSON object a figure, with its noise law and draws.</summary>
    public static string JsonLines(Table table) => $"{Folder}{table.Id}.jsonl";

    /// <summary>What each column of the CSV files of a table means (CSVW).</summary>
    public static string Columns(Table table) => Wide(table) + "-metadata.json";

    /// <summary>The steps and chances of a tabulated law.</summary>
    public static string Law(Mechanism mechanism) => $"{Folder}law-{Slug.Of(mechanism.Id)}.csv";

    private static string Percent(Coverage coverage) => ((decimal)coverage.Share * 100).ToString("0.######", CultureInfo.InvariantCulture);
}
