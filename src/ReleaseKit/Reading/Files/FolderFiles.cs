using ReleaseKit.Reading.Keys;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Files;

/// <summary>The files of one release folder. A path is relative, written with /, in the letters' case on disk, and leads to a file in the folder even through links.</summary>
public sealed class FolderFiles
{
    private const int MostLinks = 16;

    private readonly string root;

    public FolderFiles(string root) => this.root = Path.TrimEndingDirectorySeparator(Path.GetFullPath(root));

    /// <summary>Whether something stands at a path, link or not.</summary>
    public bool Exists(string relative) => Path.Exists(Path.Combine(root, relative)) || new FileInfo(Path.Combine(root, relative)).LinkTarget is not null;

    /// <summary>The names in a sub-folder, in ordinal order; none if there is no such folder.</summary>
    public IReadOnlyList<string> NamesIn(string folder) => [.. Entries(Path.Combine(root, folder)).Select(entry => entry.Name).Order(StringComparer.Ordinal)];

    /// <summary>The file a path means, or null with a stop at the place that names it.</summary>
    public FileInfo? Find(string relative, Place namedAt, ReadContext context)
    {
        if (PathRules.Problem(relative) is { } problem)
        {
            context.Add(FileProblems.BadPath(namedAt, relative, problem, context.Owner));
            return null;
        }
        return Follow(relative, relative, namedAt, context, 0);
    }

    /// <summary>The bytes of a file, or null with a stop: it must exist and have at most so many.</summary>
    public byte[]? Bytes(string relative, long most, Place namedAt, ReadContext context)
    {
        if (Find(relative, namedAt, context) is not { } file)
            return null;
        if (file.Length <= most)
            return file.Length == 0 ? [] : File.ReadAllBytes(file.FullName);
        context.Add(FileProblems.TooLarge(new Place(relative), file.Length, most, context.Owner));
        return null;
    }

    /// <summary>Walks a path name by name; a link is followed only if its target lies in the folder, and is walked again from the top.</summary>
    private FileInfo? Follow(string relative, string asWritten, Place namedAt, ReadContext context, int links)
    {
        var names = relative.Split('/');
        var directory = root;
        for (var index = 0; index < names.Length; index++)
        {
            var entry = EntryNamed(directory, names[index]);
            if (entry is null)
                return Refuse(FileProblems.Missing(namedAt, asWritten, OtherCase(directory, names[index]), context.Owner), context);
            if (entry.LinkTarget is not null)
                return FollowLink(entry, names[(index + 1)..], asWritten, namedAt, context, links);
            directory = entry.FullName;
        }
        return Directory.Exists(directory) ? Refuse(FileProblems.IsDirectory(namedAt, asWritten, context.Owner), context) : new FileInfo(directory);
    }

    private FileInfo? FollowLink(FileSystemInfo link, string[] rest, string asWritten, Place namedAt, ReadContext context, int links)
    {
        var target = Path.GetFullPath(link.LinkTarget!, Path.GetDirectoryName(link.FullName)!);
        if (!target.StartsWith(root + Path.DirectorySeparatorChar, StringComparison.Ordinal) || links == MostLinks)
            return Refuse(FileProblems.LeavesFolder(namedAt, asWritten, context.Owner), context);
        var relative = Path.GetRelativePath(root, target).Replace(Path.DirectorySeparatorChar, '/');
        return Follow(string.Join('/', [relative, .. rest]), asWritten, namedAt, context, links + 1);
    }

    private static FileInfo? Refuse(Finding finding, ReadContext context)
    {
        context.Add(finding);
        return null;
    }

    private static FileSystemInfo? EntryNamed(string directory, string name) =>
        Entries(directory).FirstOrDefault(entry => string.Equals(entry.Name, name, StringComparison.Ordinal));

    private static string? OtherCase(string directory, string name) =>
        Entries(directory).FirstOrDefault(entry => string.Equals(entry.Name, name, StringComparison.OrdinalIgnoreCase))?.Name;

    private static IEnumerable<FileSystemInfo> Entries(string directory) =>
        Directory.Exists(directory) ? new DirectoryInfo(directory).EnumerateFileSystemInfos() : [];
}
