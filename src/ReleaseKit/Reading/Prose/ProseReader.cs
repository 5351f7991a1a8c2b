using System.Text;
using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Prose;

/// <summary>Reads the prose files of a release as UTF-8 text.</summary>
internal static class ProseReader
{
    public static IReadOnlyList<ProsePage> Read(IReadOnlyList<Named<(string File, string Language)>> narrative, FolderFiles files, ReadContext context) =>
        [.. narrative.Select(entry => ReadPage(entry, files, context)).OfType<ProsePage>()];

    private static ProsePage? ReadPage(Named<(string File, string Language)> entry, FolderFiles files, ReadContext context)
    {
        var (file, language) = entry.Value;
        if (files.Bytes(file, FolderLimits.ProseBytes, entry.At, context) is not { } bytes)
            return null;
        var invalid = Utf8Text.FirstInvalid(bytes);
        if (invalid < 0 && !bytes.AsSpan().Contains((byte)0))
            return new ProsePage(file, language, Encoding.UTF8.GetString(bytes is [0xEF, 0xBB, 0xBF, ..] ? bytes.AsSpan(3) : bytes)) { At = entry.At };
        context.Add(NoUtf8(new LineMap(file, bytes).At(invalid < 0 ? bytes.AsSpan().IndexOf((byte)0) : invalid), context.Owner));
        return null;
    }

    private static Finding NoUtf8(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "prose-encoding", owner, at,
        "This is no UTF-8 text.",
        "letters beyond a to z would be read wrong.",
        "save the file as UTF-8.");
}
