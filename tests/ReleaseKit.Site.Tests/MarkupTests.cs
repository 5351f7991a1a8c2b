using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>Every page by the W3C Nu HTML checker (vnu-jar from the npm registry).</summary>
public sealed class MarkupTests(ComposedSample sample)
{
    [Fact]
    public void Every_page_is_valid()
    {
        var jar = Path.Combine(Repository.Root, "tests", "checkers", "node_modules", "vnu-jar", "build", "dist", "vnu.jar");
        var answer = ReleaseKitProgram.Start("java", ["-Xss8m", "-jar", jar, "--skip-non-html", "--errors-only", "--format", "gnu", sample.Site]);
        Assert.Equal("", answer.Error.Replace(sample.Site, ""));
        Assert.Equal(0, answer.ExitCode);
    }
}
