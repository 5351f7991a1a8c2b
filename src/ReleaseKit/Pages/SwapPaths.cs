namespace ReleaseKit.Pages;

/// <summary>
/// The target of a composition and its neighbours: the site that it replaces, kept for going back; hidden, the site being written, the one being
/// replaced, the one no longer kept, and the file that holds others off.
/// </summary>
internal sealed record SwapPaths(string Parent, string Target, string Before, string New, string Old, string Gone, string Hold)
{
    /// <summary>The sign of a new site that is put in its place and whose replaced one may not have been kept yet.</summary>
    public static string ArrivedIn(string site) => Path.Combine(site, SiteFolder.Arrived);

    public static SwapPaths Beside(string target)
    {
        var full = Path.TrimEndingDirectorySeparator(Path.GetFullPath(target));
        var parent = Path.GetDirectoryName(full) ?? throw SiteFolderException.IsRoot(full);
        var hidden = Path.Combine(parent, "." + Path.GetFileName(full) + SiteFolder.Marker);
        return new SwapPaths(parent, full, full + ".before", hidden + "-new", hidden + "-old", hidden + "-gone", hidden + "-hold");
    }
}
