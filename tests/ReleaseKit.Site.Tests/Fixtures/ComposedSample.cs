using ReleaseKit.Site.Tests.Fixtures;

[assembly: AssemblyFixture(typeof(ComposedSample))]

namespace ReleaseKit.Site.Tests.Fixtures;

/// <summary>The sample, composed once for all tests by the program itself.</summary>
public sealed class ComposedSample : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public ComposedSample()
        : this(Repository.Sample)
    {
    }

    private ComposedSample(string release)
    {
        var answer = ReleaseKitProgram.Run(["compose", release, "--to", Site, "--quiet"]);
        if (answer.ExitCode != 0)
            throw new InvalidOperationException($"compose answered {answer.ExitCode}:\n{answer.Error}");
    }

    /// <summary>Another release than the sample, composed in the same way.</summary>
    public static ComposedSample Of(string release) => new(release);

    public string Site => folder.In("site");

    /// <summary>Every page, relative to the site, with forward slashes.</summary>
    public IReadOnlyList<string> Pages => Directory.EnumerateFiles(Site, "*.html", SearchOption.AllDirectories)
        .Select(file => Path.GetRelativePath(Site, file).Replace('\\', '/')).Order(StringComparer.Ordinal).ToList();

    public string File(string relative) => Path.Combine(Site, relative);

    /// <summary>The file, relative to the site, that the path of an address names: from the top, or below the path of the sample's own address.</summary>
    public static string FileAt(string path)
    {
        const string own = "/ehr-2031/1/";
        var file = Uri.UnescapeDataString(path);
        return (file.StartsWith(own, StringComparison.Ordinal) ? file[own.Length..] : file).TrimStart('/');
    }

    public void Dispose() => folder.Dispose();
}
