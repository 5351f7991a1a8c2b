namespace ReleaseKit.Pages;

/// <summary>How one composing of a site differs from the last.</summary>
/// <param name="Figures">The figures that differ, by table; tables without a difference are left out.</param>
/// <param name="Pages">The HTML pages.</param>
/// <param name="Others">All other files.</param>
/// <param name="Unlisted">Files that go from a site that does not say what was composed: among them may be somebody's own.</param>
public sealed record SiteChanges(IReadOnlyList<FigureChanges> Figures, FileChanges Pages, FileChanges Others, IReadOnlyList<string> Unlisted)
{
    private const int MostNamed = 12;

    public bool IsNone => Pages.IsNone && Others.IsNone;

    /// <summary>Compares two composed folders byte by byte, and figures by their addresses in the long files.</summary>
    internal static SiteChanges Between(string oldFolder, string newFolder)
    {
        var (before, after) = (FilesOf(oldFolder), FilesOf(newFolder));
        var changed = before.Intersect(after).Where(path => !FileBytes.AreSame(Path.Combine(oldFolder, path), Path.Combine(newFolder, path))).ToList();
        var (added, gone) = (after.Except(before).ToList(), before.Except(after).ToList());
        var figures = FigureChanges.Between(oldFolder, newFolder, [.. changed, .. added, .. gone]);
        IReadOnlyList<string> unlisted = WrittenList.IsIn(oldFolder) ? [] : [.. gone.OrderBy(path => path.Count(letter => letter == '/')).ThenBy(path => path, StringComparer.Ordinal)];
        return new(figures, FileChanges.Of(added, changed, gone, IsPage), FileChanges.Of(added, changed, gone, path => !IsPage(path)), unlisted);
    }

    /// <summary>The first names of a list, and how many more there are.</summary>
    public static string Named(IReadOnlyList<string> files) =>
        string.Join(", ", files.Take(MostNamed)) + (files.Count > MostNamed ? $" and {files.Count - MostNamed} more" : "");

    private static bool IsPage(string path) => path.EndsWith(".html", StringComparison.Ordinal);

    private static HashSet<string> FilesOf(string folder) =>
        [.. Directory.EnumerateFiles(folder, "*", SearchOption.AllDirectories).Select(file => Path.GetRelativePath(folder, file).Replace('\\', '/')).Where(path => !WrittenList.IsLeftOver(path))];
}

/// <summary>How many files are new, changed and gone.</summary>
public sealed record FileChanges(int New, int Changed, int Gone)
{
    public bool IsNone => New + Changed + Gone == 0;

    internal static FileChanges Of(List<string> added, List<string> changed, List<string> gone, Func<string, bool> isMeant) =>
        new(added.Count(isMeant), changed.Count(isMeant), gone.Count(isMeant));
}
