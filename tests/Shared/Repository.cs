namespace ReleaseKit.Testing;

/// <summary>Where the repository lies, found from the test program's own place.</summary>
public static class Repository
{
    public static string Root { get; } = FindRoot(AppContext.BaseDirectory);

    public static string Sample => Path.Combine(Root, "sample-release");

    public static string Example => Path.Combine(Root, "tests", "reference", "example");

    public static string Release(string name) => Path.Combine(Root, "tests", "releases", name);

    private static string FindRoot(string from) => File.Exists(Path.Combine(from, "ReleaseKit.sln"))
        ? from
        : FindRoot(Path.GetDirectoryName(from.TrimEnd(Path.DirectorySeparatorChar))
            ?? throw new DirectoryNotFoundException("ReleaseKit.sln stands in no folder above the tests."));
}
