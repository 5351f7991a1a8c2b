using System.Runtime.InteropServices;

namespace ReleaseKit.Pages;

/// <summary>Puts one folder in the place of another: in one step where the system can exchange two names, else in two renames.</summary>
internal static partial class FolderSwap
{
    // From linux/fcntl.h and linux/fs.h.
    private const int FromCurrentFolder = -100;
    private const uint Exchange = 2;

    public static void Swap(SwapPaths paths)
    {
        if (!Directory.Exists(paths.Target))
            Directory.Move(paths.New, paths.Target);
        else if (TryExchange(paths.New, paths.Target))
            FolderOwnership.Remove(paths.New);
        else
            RenameTwice(paths);
    }

    /// <summary>Cut off between its renames, it leaves the old site beside the target, from where the next run puts it back.</summary>
    internal static void RenameTwice(SwapPaths paths)
    {
        Directory.Move(paths.Target, paths.Old);
        Directory.Move(paths.New, paths.Target);
        FolderOwnership.Remove(paths.Old);
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
