namespace ReleaseKit.Tests.Pages;

/// <summary>A folder of its own for one test, removed at the end.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("releasekit-test-");

    public string Path => folder.FullName;

    public string this[string name] => System.IO.Path.Combine(folder.FullName, name);

    public void Dispose() => folder.Delete(recursive: true);
}
