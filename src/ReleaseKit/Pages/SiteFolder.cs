using System.Collections.Concurrent;

namespace ReleaseKit.Pages;

/// <summary>
/// The folder of a publication while it is being composed. Everything is written beside the target and swapped in by
/// <see cref="Finish"/>: until then, and whatever happens, what stood before stands whole; afterwards it is kept as <see cref="Before"/>.
/// A target must be missing, empty, or bear the marker that <see cref="Finish"/> leaves, and hold no files but those that the marker lists.
/// </summary>
public sealed class SiteFolder : IDisposable
{
    /// <summary>Name of the file that says a folder was composed here and may be replaced.</summary>
    public const string Marker = ".releasekit";

    /// <summary>Name of the file that a site bears from its swap until what it replaced is kept.</summary>
    internal const string Arrived = Marker + "-arrived";

    private readonly SwapPaths paths;
    private readonly FileStream hold;
    private readonly ConcurrentDictionary<string, bool> written = new(StringComparer.OrdinalIgnoreCase);

    private SiteFolder(SwapPaths paths, FileStream hold)
    {
        this.paths = paths;
        this.hold = hold;
    }

    /// <summary>Full path of the folder that will be there at the end.</summary>
    public string Target => paths.Target;

    /// <summary>Full path of the folder where the site that was replaced is kept, beside the target.</summary>
    public string Before => paths.Before;

    /// <summary>Paths written so far, in the site's notation with slashes, sorted.</summary>
    public IReadOnlyList<string> Written => [.. written.Keys.Order(StringComparer.Ordinal)];

    /// <exception cref="SiteFolderException">The target is the release folder or lies in it.</exception>
    public static void DemandOutside(string releaseFolder, string target)
    {
        var (release, site) = (Path.TrimEndingDirectorySeparator(Path.GetFullPath(releaseFolder)), Path.GetFullPath(target));
        var way = Path.GetRelativePath(release, site);
        if (!Path.IsPathRooted(way) && way.Split(Path.DirectorySeparatorChar)[0] != "..")
            throw SiteFolderException.IsInRelease(site, release);
    }

    /// <summary>Makes ready to compose into the target, and mends what a run that was cut off left behind.</summary>
    /// <exception cref="SiteFolderException">The target is not a missing, empty or own folder, or is in use, or cannot be written.</exception>
    public static SiteFolder Open(string target)
    {
        var paths = SwapPaths.Beside(target);
        try
        {
            Directory.CreateDirectory(paths.Parent);
            var hold = Hold(paths);
            try
            {
                Recover(paths);
                FolderOwnership.Demand(paths.Target);
                if (FolderOwnership.IsComposed(paths.Target))
                    FolderOwnership.DemandBefore(paths.Before);
                Directory.CreateDirectory(paths.New);
                File.WriteAllText(MarkerIn(paths.New), WrittenList.Text([]));
                return new SiteFolder(paths, hold);
            }
            catch
            {
                hold.Dispose();
                throw;
            }
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw SiteFolderException.CannotWrite(paths.Target, fault);
        }
    }

    /// <summary>Opens a new file of the site for writing.</summary>
    /// <param name="path">Path in the site: segments of letters, digits, '-', '_' and '.', parted by '/'.</param>
    /// <exception cref="ArgumentException">The path is no such path, or was written before: a defect of ours.</exception>
    public Stream Create(string path)
    {
        SitePath.Demand(path);
        if (!written.TryAdd(path, true))
            throw new ArgumentException($"{path} is written twice.", nameof(path));
        var file = Path.Combine(paths.New, path);
        Directory.CreateDirectory(Path.GetDirectoryName(file)!);
        return new FileStream(file, FileMode.CreateNew, FileAccess.Write, FileShare.None, bufferSize: 0);
    }

    /// <summary>Writes a small file of the site.</summary>
    public void Write(string path, ReadOnlySpan<byte> bytes)
    {
        using var stream = Create(path);
        stream.Write(bytes);
    }

    /// <summary>Length in bytes of a file written and closed before.</summary>
    public long LengthOf(string path) => new FileInfo(Path.Combine(paths.New, path)).Length;

    /// <summary>Opens a file written and closed before, to read it again (checksums, the release's zip).</summary>
    public Stream Read(string path) => File.OpenRead(Path.Combine(paths.New, path));

    /// <summary>Swaps the new site in for what stood at the target, unless the two are the same: then all stays as it was.</summary>
    /// <returns>What changed since the last composing; null if there was none.</returns>
    public SiteChanges? Finish()
    {
        try
        {
            File.WriteAllText(MarkerIn(paths.New), WrittenList.Text(Written));
            var changes = FolderOwnership.IsComposed(paths.Target) ? SiteChanges.Between(paths.Target, paths.New) : null;
            if (changes is not { IsNone: true })
                FolderSwap.Swap(paths);
            else if (!WrittenList.IsIn(paths.Target))
                AddList();
            return changes;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw SiteFolderException.CannotWrite(paths.Target, fault);
        }
    }

    /// <summary>Removes what was not swapped in; a site that was replaced and could not be kept stays for the next start.</summary>
    public void Dispose()
    {
        if (!FolderSwap.HasReplaced(paths))
            FolderOwnership.Remove(paths.New);
        hold.Dispose();
    }

    /// <summary>In one step: half a list would say of our own files that they are somebody's.</summary>
    private void AddList()
    {
        var list = Path.Combine(paths.New, Marker + "-list");
        File.Copy(MarkerIn(paths.New), list);
        File.Move(list, MarkerIn(paths.Target), overwrite: true);
    }

    private static string MarkerIn(string site) => Path.Combine(site, Marker);

    private static FileStream Hold(SwapPaths paths)
    {
        try
        {
            return new FileStream(paths.Hold, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None, 1, FileOptions.DeleteOnClose);
        }
        catch (IOException fault) when (File.Exists(paths.Hold) && fault is not DirectoryNotFoundException)
        {
            throw SiteFolderException.InUse(paths.Target);
        }
    }

    private static void Recover(SwapPaths paths)
    {
        if (Directory.Exists(paths.Old) && !Path.Exists(paths.Target))
            Directory.Move(paths.Old, paths.Target);
        if (FolderSwap.HasReplaced(paths))
            FolderOwnership.DemandBefore(paths.Before);
        FolderSwap.Settle(paths);
        FolderOwnership.Remove(paths.Gone);
        FolderOwnership.Remove(paths.New);
    }
}
