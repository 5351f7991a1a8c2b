namespace ReleaseKit.Pages;

/// <summary>Which folders may be replaced, and how they are removed.</summary>
internal static class FolderOwnership
{
    /// <exception cref="SiteFolderException">The target is there and is not an empty folder or one of ours, or holds files that were not composed.</exception>
    public static void Demand(string target)
    {
        if (File.Exists(target))
            throw SiteFolderException.IsFile(target);
        if (new DirectoryInfo(target).LinkTarget is not null)
            throw SiteFolderException.IsLink(target);
        if (Directory.Exists(target) && !IsOurs(target))
            throw SiteFolderException.NotOurs(target);
        DemandNoOthers(target);
    }

    /// <exception cref="SiteFolderException">The place where the replaced site is kept holds something that is not ours.</exception>
    public static void DemandBefore(string before)
    {
        if (File.Exists(before) || new DirectoryInfo(before).LinkTarget is not null || Directory.Exists(before) && !IsOurs(before))
            throw SiteFolderException.BeforeIsNotOurs(before);
        DemandNoOthers(before);
    }

    /// <summary>Whether the folder bears the marker of a composition.</summary>
    public static bool IsComposed(string folder) => File.Exists(Path.Combine(folder, SiteFolder.Marker));

    /// <summary>Removes a folder of ours, the marker last, so that a removal cut off half-way can be taken up again.</summary>
    /// <exception cref="SiteFolderException">The folder is there and is not ours.</exception>
    public static void Remove(string folder)
    {
        if (!Directory.Exists(folder))
            return;
        Demand(folder);
        foreach (var inner in Directory.EnumerateDirectories(folder))
            Directory.Delete(inner, recursive: true);
        foreach (var file in Directory.EnumerateFiles(folder).Where(file => Path.GetFileName(file) != SiteFolder.Marker))
            File.Delete(file);
        Directory.Delete(folder, recursive: true);
    }

    private static void DemandNoOthers(string site)
    {
        if (WrittenList.OthersIn(site) is { Count: > 0 } others)
            throw SiteFolderException.HoldsOthers(site, others);
    }

    private static bool IsOurs(string folder) =>
        IsComposed(folder) || !Directory.EnumerateFileSystemEntries(folder).Any();
}
