using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>The publication is a pure function of the folder: the same bytes in any folder, time zone and locale.</summary>
public sealed class ReproducibilityTests(ComposedSample sample)
{
    [Theory]
    [InlineData("Pacific/Kiritimati", "tr_TR.UTF-8")]
    [InlineData("America/St_Johns", "de_DE.UTF-8")]
    public void Composing_elsewhere_gives_the_same_bytes(string zone, string locale)
    {
        using var folder = new TemporaryFolder();
        CopyFolder(Repository.Sample, folder.In("another place"));
        var environment = new Dictionary<string, string> { ["TZ"] = zone, ["LANG"] = locale, ["LC_ALL"] = locale, ["DOTNET_SYSTEM_GLOBALIZATION_INVARIANT"] = "0" };
        var answer = ReleaseKitProgram.Run(["compose", "another place", "--to", "out/site"], environment, folder.Path);
        Assert.True(answer.ExitCode == 0, answer.Error);
        Assert.Equal(Contents(sample.Site), Contents(folder.In("out/site")));
    }

    private static Dictionary<string, string> Contents(string folder) => Directory.EnumerateFiles(folder, "*", SearchOption.AllDirectories)
        .ToDictionary(file => Path.GetRelativePath(folder, file), file => Convert.ToHexString(System.Security.Cryptography.SHA256.HashData(File.ReadAllBytes(file))));

    private static void CopyFolder(string from, string to)
    {
        foreach (var file in Directory.EnumerateFiles(from, "*", SearchOption.AllDirectories))
        {
            var target = Path.Combine(to, Path.GetRelativePath(from, file));
            Directory.CreateDirectory(Path.GetDirectoryName(target)!);
            File.Copy(file, target);
        }
    }
}
