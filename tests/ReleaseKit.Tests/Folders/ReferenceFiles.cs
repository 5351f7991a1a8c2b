namespace ReleaseKit.Tests.Folders;

/// <summary>Finds tests/reference from wherever the tests run.</summary>
public static class ReferenceFiles
{
    public static string Example => Path.Combine(Root, "tests", "reference", "example");

    public static string Sample => Path.Combine(Root, "sample-release");

    public static string Root { get; } = Find();

    private static string Find()
    {
        for (var at = new DirectoryInfo(AppContext.BaseDirectory); at is not null; at = at.Parent)
            if (File.Exists(Path.Combine(at.FullName, "ReleaseKit.sln")))
                return at.FullName;
        throw new DirectoryNotFoundException("ReleaseKit.sln is in no folder above the tests.");
    }
}
