using System.Runtime.InteropServices;

namespace ReleaseKit.Pages;

/// <summary>
/// Puts the new site in the place of what stood, which is kept beside it: in one step where the system can exchange two names, else in two renames.
/// </summary>
internal static partial class FolderSwap
{
    // From linux/fcntl.h and linux/fs.h.
    private const int FromCurrentFolder = -100;
    private const uint Exchange = 2;

    public static void Swap(SwapPaths paths)
    {
        File.WriteAllText(SwapPaths.ArrivedIn(paths.New), "");
        if (!Directory.Exists(paths.Target))
            Directory.Move(paths.New, paths.Target);
        else if (!TryExchange(paths.New, paths.Target))
            RenameTwice(paths);
        Settle(paths);
    }

    /// <summary>Whether a run was cut off, or failed, between its swap and the keeping of what it replaced.</summary>
    public static bool HasReplaced(SwapPaths paths) =>
        Directory.Exists(paths.Old) || File.Exists(SwapPaths.ArrivedIn(paths.Target)) && Directory.Exists(paths.New);

    /// <summary>
    /// What the swap leaves to do. While the new site bears the sign that it has arrived, what lies where it was written is the site that it replaced, and
    /// no longer one that a run was cut off while writing. Cut off, it can be taken up again.
    /// </summary>
    public static void Settle(SwapPaths paths)
    {
        var arrived = File.Exists(SwapPaths.ArrivedIn(paths.Target));
        if (arrived && Directory.Exists(paths.New))
            Directory.Move(paths.New, paths.Old);
        if (arrived)
            File.Delete(SwapPaths.ArrivedIn(paths.Target));
        if (Directory.Exists(paths.Old))
            Keep(paths);
    }

    /// <summary>
    /// What was replaced takes the place of what was kept before; an empty folder is not worth keeping. What is no longer kept leaves its place whole and
    /// is removed out of sight, so that nobody goes back to half a site. Cut off, it can be taken up again.
    /// </summary>
    public static void Keep(SwapPaths paths)
    {
        if (!FolderOwnership.IsComposed(paths.Old))
        {
            FolderOwnership.Remove(paths.Old);
            return;
        }
        FolderOwnership.Remove(paths.Gone);
        if (Directory.Exists(paths.Before))
            Directory.Move(paths.Before, paths.Gone);
        Directory.Move(paths.Old, paths.Before);
        FolderOwnership.Remove(paths.Gone);
    }

    /// <summary>Cut off between its renames, it leaves the old site beside the target, from where the next run puts it back.</summary>
    internal static void RenameTwice(SwapPaths paths)
    {
        Directory.Move(paths.Target, paths.Old);
        Directory.Move(paths.New, paths.Target);
    }

    internal static bool TryExchange(string one, string other)
    {
        if (!OperatingSystem.IsLinux())
            return false;
        try
        {
            return RenameAt(FromCurrentFolder, one, FromCurrentFolder, other, Exchange) == 0;
        }
        catch (EntryPointNotFoundException)
        {
            return false;
        }
    }

    [LibraryImport("libc", EntryPoint = "renameat2", StringMarshalling = StringMarshalling.Utf8)]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static partial int RenameAt(int oldFolder, string oldPath, int newFolder, string newPath, uint flags);
}
