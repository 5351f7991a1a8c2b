using System.Text.RegularExpressions;
using ReleaseKit.Downloads;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Downloads;

/// <summary>A file to download.</summary>
/// <param name="Path">Path in the site.</param>
/// <param name="Table">Index of the table it holds; null for a file of the whole release.</param>
/// <param name="Kind">Last part of the key that says what it is for.</param>
internal sealed partial record DownloadFile(string Path, int? Table, string Kind)
{
    // The order in which a table's files are offered.
    private static readonly string[] Order = ["wide", "long", "coverage", "lines", "columns"];

    public int Place => Array.IndexOf(Order, Kind);

    /// <summary>What it holds, in words.</summary>
    public string What(ILanguage language) => Kind switch
    {
        "coverage" => language.Text("downloads-page.what.coverage", ("number", OtherCoverage().Match(Path).Groups["number"].Value)),
        "law" => language.Text("downloads-page.what.law", ("name", Law!)),
        _ => language.Text("downloads-page.what." + Kind),
    };

    /// <summary>For a list of chances, the mechanism whose law it is.</summary>
    public string? Law { get; private init; }

    public static DownloadFile Of(SiteContext context, string path)
    {
        var name = System.IO.Path.GetFileName(path);
        var tables = context.Release.Tables;
        // The table with the longest id that fits: "arrears-2" is not "arrears" at a coverage of 2.
        var table = Enumerable.Range(0, tables.Count).Where(index => KindOf(name, tables[index].Id) is not null)
            .OrderByDescending(index => tables[index].Id.Length).Cast<int?>().FirstOrDefault();
        if (table is { } found)
            return new DownloadFile(path, table, KindOf(name, tables[found].Id)!);
        return context.Release.Noise.Mechanisms.FirstOrDefault(mechanism => mechanism.Law == LawName.Tabulated && DownloadNames.Law(mechanism) == path) is { } drawn
            ? new DownloadFile(path, null, "law") { Law = drawn.Id }
            : new DownloadFile(path, null, KindOfRelease(name));
    }

    private static string? KindOf(string name, string table) => !name.StartsWith(table, StringComparison.Ordinal) ? null : name[table.Length..] switch
    {
        ".csv" => "wide",
        "-long.csv" => "long",
        ".jsonl" => "lines",
        ".csv-metadata.json" => "columns",
        "-long.csv-metadata.json" => "columns",
        var rest when OtherCoverage().Match(rest) is { Success: true, Index: 0 } => "coverage",
        _ => null,
    };

    private static string KindOfRelease(string name) => name switch
    {
        "budget.json" => "budget",
        "derived.csv" => "derived",
        "checksums.txt" => "checksums",
        "release.zip" => "whole",
        _ when name.StartsWith("headline.", StringComparison.Ordinal) => "headline",
        _ when name.EndsWith(".svg", StringComparison.Ordinal) => "picture-drawn",
        _ when name.EndsWith(".png", StringComparison.Ordinal) => "picture",
        _ => "other",
    };

    [GeneratedRegex(@"-(?<number>[0-9.]+)\.csv$")]
    private static partial Regex OtherCoverage();
}
