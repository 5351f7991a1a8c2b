using ReleaseKit.Reading.Keys;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Files;

/// <summary>What can be wrong with a file of the folder, one factory a failure.</summary>
internal static class FileProblems
{
    public static Finding BadPath(Place namedAt, string path, string problem, FindingOwner owner) => new(
        FindingLevel.Stop, "bad-path", owner, namedAt,
        $"The path \"{KeyProblems.Cut(path)}\" {problem}.",
        "only files of this folder are published, and under the same name on every system.",
        "put the file into the folder and write its path from there, such as tables/arrears.csv.");

    public static Finding LeavesFolder(Place namedAt, string path, FindingOwner owner) => new(
        FindingLevel.Stop, "path-leaves-folder", owner, namedAt,
        $"\"{KeyProblems.Cut(path)}\" is a link that leads out of the folder.",
        "something would be published that is no part of the release.",
        "copy the file itself into the folder.");

    public static Finding Missing(Place namedAt, string path, string? otherCase, FindingOwner owner) => new(
        FindingLevel.Stop, "missing-file", owner, namedAt,
        $"There is no file \"{KeyProblems.Cut(path)}\".",
        "what it should give cannot be published.",
        otherCase is null
            ? "put it there, or correct the path."
            : $"on disk it is \"{otherCase}\": write the path with the same capitals, or rename the file.");

    public static Finding IsDirectory(Place namedAt, string path, FindingOwner owner) => new(
        FindingLevel.Stop, "missing-file", owner, namedAt,
        $"\"{KeyProblems.Cut(path)}\" is a folder, no file.",
        "what it should give cannot be published.",
        "name the file in it.");

    public static Finding TooLarge(Place file, long bytes, long most, FindingOwner owner) => new(
        FindingLevel.Stop, "file-too-large", owner, file,
        $"The file has {bytes} bytes; at most {most} are read.",
        "a file of this size is not what its name says.",
        "check how it was made; split a table that is truly that large.");
}
