namespace ReleaseKit.Pages;

/// <summary>The target of a composition cannot be used; the message is one line that says what is there and what to do.</summary>
public sealed class SiteFolderException : Exception
{
    public SiteFolderException(string message) : base(message)
    {
    }

    public SiteFolderException(string message, Exception inner) : base(message, inner)
    {
    }

    internal static SiteFolderException IsRoot(string target) =>
        new($"{target} is the root of a file system; give a folder of its own, such as {Path.Combine(target, "site")}.");

    internal static SiteFolderException IsInRelease(string target, string release) =>
        new($"{target} lies in the release folder {release}, which would then hold its own publication; nothing was changed. Give a folder outside it, such as {Path.Combine(Path.GetDirectoryName(release) ?? release, "site")}.");

    internal static SiteFolderException IsFile(string target) => new($"{target} is a file; give a folder that is missing, empty or was composed before.");

    internal static SiteFolderException IsLink(string target) => new($"{target} is a link; give the folder it points to.");

    internal static SiteFolderException NotOurs(string target) =>
        new($"{target} holds files that were not composed here; nothing was changed. Give a folder that is missing, empty or was composed before.");

    internal static SiteFolderException HoldsOthers(string site, IReadOnlyList<string> others) =>
        new($"{site} holds {(others.Count == 1 ? "a file" : $"{others.Count} files")} that compose did not write: {SiteChanges.Named(others)}. Composing would lose {(others.Count == 1 ? "it" : "them")}, so nothing was changed. "
            + "Move what is named out of there and compose again; what the web server needs beside the pages can be put back after, or kept where the web server's copy is.");

    internal static SiteFolderException BeforeIsNotOurs(string before) =>
        new($"{before} was not composed here, and the site that is replaced is to be kept there; nothing was changed. Move it away, or compose to another folder.");

    internal static SiteFolderException InUse(string target) => new($"{target} is being composed by another run; wait for it to end.");

    internal static SiteFolderException CannotWrite(string target, Exception inner) => new($"{target} cannot be written: {inner.Message}", inner);
}
