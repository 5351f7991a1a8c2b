using ReleaseKit.SampleMaker.Tables;

namespace ReleaseKit.Tests.Sample;

/// <summary>The sample release in the repository, and copies of it whose noise is drawn anew.</summary>
internal static class SampleRelease
{
    /// <summary>The households are invented once for all tests.</summary>
    public static SampleMaker.Sample Maker { get; } = new();

    public static string Folder => Repository.Sample;

    public static IEnumerable<string> Files => Directory.EnumerateFiles(Folder, "*", SearchOption.AllDirectories).Order(StringComparer.Ordinal);

    /// <summary>Copies the folder to a place for tests, with these tables instead of the published ones.</summary>
    public static string CopyWith(IEnumerable<SampleTable> tables, string target)
    {
        foreach (var file in Files)
        {
            var copy = Path.Combine(target, Path.GetRelativePath(Folder, file));
            Directory.CreateDirectory(Path.GetDirectoryName(copy)!);
            File.Copy(file, copy, overwrite: true);
        }
        SampleMaker.Sample.Write(tables, target);
        return target;
    }
}
