namespace ReleaseKit.Testing;

/// <summary>A folder of the test's own, gone afterwards.</summary>
public sealed class TemporaryFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("releasekit-").FullName;

    public string In(string name) => System.IO.Path.Combine(Path, name);

    public string Write(string name, string text)
    {
        var file = In(name);
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(file)!);
        File.WriteAllText(file, text);
        return file;
    }

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
