using System.IO.Enumeration;

namespace ReleaseKit.Pages;

/// <summary>The list of what a composition wrote, kept in the marker: whatever else lies in a site is somebody's own and must not be lost with it.</summary>
internal static class WrittenList
{
    private const string Head = "Composed by releasekit. The next composition replaces this folder whole. What it wrote:\n";

    private static readonly HashSet<string> LeftByFileBrowsers = new(StringComparer.OrdinalIgnoreCase) { ".DS_Store", "Thumbs.db", "desktop.ini" };

    public static string Text(IEnumerable<string> paths) => Head + string.Concat(paths.Select(path => path + "\n"));

    /// <summary>Whether the site says what was written; one composed before such lists were kept does not.</summary>
    public static bool IsIn(string site) => Of(site).Count > 0;

    /// <summary>The files of a site that no composition wrote, sorted; none can be told where there is no list.</summary>
    public static IReadOnlyList<string> OthersIn(string site)
    {
        var own = Of(site);
        return own.Count == 0 ? [] : [.. FilesOf(site).Where(path => !own.Contains(path) && !IsLeftOver(path)).Order(StringComparer.Ordinal)];
    }

    private static HashSet<string> Of(string site)
    {
        var marker = Path.Combine(site, SiteFolder.Marker);
        return File.Exists(marker) ? [.. File.ReadLines(marker).Skip(1).Where(line => line.Length > 0)] : [];
    }

    /// <summary>The marker and the signs of a run, whose names begin as it does and no page's does, and what file browsers leave.</summary>
    public static bool IsLeftOver(string path) =>
        path.StartsWith(SiteFolder.Marker, StringComparison.Ordinal) || LeftByFileBrowsers.Contains(Path.GetFileName(path));

    /// <summary>Links are files of their own here: nothing behind them lies in the site.</summary>
    private static FileSystemEnumerable<string> FilesOf(string site) =>
        new(site, (ref entry) => Path.GetRelativePath(site, entry.ToFullPath()).Replace('\\', '/'), new EnumerationOptions { RecurseSubdirectories = true, AttributesToSkip = 0, IgnoreInaccessible = false })
        {
            ShouldIncludePredicate = (ref entry) => !entry.IsDirectory || IsLink(entry.Attributes),
            ShouldRecursePredicate = (ref entry) => !IsLink(entry.Attributes),
        };

    private static bool IsLink(FileAttributes attributes) => (attributes & FileAttributes.ReparsePoint) != 0;
}
