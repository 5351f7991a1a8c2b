using System.Text.RegularExpressions;

namespace ReleaseKit.Cli.Tests;

/// <summary>The README's guide is run as it stands: a stale example fails here.</summary>
public sealed partial class ReadmeTests
{
    [Fact]
    public void The_guide_to_a_first_release_composes()
    {
        var blocks = Block().Matches(File.ReadAllText(Path.Combine(Repository.Root, "README.md"))).Select(match => match.Groups[1].Value).ToList();
        using var folder = new TemporaryFolder();
        folder.Write("my-release/tables/visits.csv", Assert.Single(blocks, block => block.StartsWith("region,visits", StringComparison.Ordinal)));
        folder.Write("my-release/release.json", Assert.Single(blocks, block => block.Contains("\"publisher\"")));
        folder.Write("my-release/mechanisms.json", Assert.Single(blocks, block => block.Contains("\"unitOfPrivacy\"")));
        var call = Call.Of("compose", folder.In("my-release"), "--to", folder.In("my-site"));
        Assert.True(call.ExitCode == ExitCode.Done, call.Error);
        Assert.DoesNotContain("STOP", call.Error);
        Assert.Contains("1,214\u00a0visitors", File.ReadAllText(folder.In("my-site/tables/visits/index.html")));
        Assert.Contains("about the visitors behind it", File.ReadAllText(folder.In("my-site/budget.html")));
    }

    [Fact]
    public void The_guide_with_its_prose_composes_and_writes_the_cited_figure()
    {
        var blocks = Block().Matches(File.ReadAllText(Path.Combine(Repository.Root, "README.md"))).Select(match => match.Groups[1].Value).ToList();
        using var folder = new TemporaryFolder();
        folder.Write("my-release/tables/visits.csv", blocks.Single(block => block.StartsWith("region,visits", StringComparison.Ordinal)));
        var release = blocks.Single(block => block.Contains("\"publisher\""));
        folder.Write("my-release/release.json", release.Replace("\"tables\":", "\"narrative\": [ { \"file\": \"narrative/summary.md\", \"language\": \"en\" } ],\n  \"tables\":"));
        folder.Write("my-release/mechanisms.json", blocks.Single(block => block.Contains("\"unitOfPrivacy\"")));
        folder.Write("my-release/narrative/summary.md", "# Visits\n\n" + blocks.Single(block => block.Contains("(figure:visits")));
        var call = Call.Of("compose", folder.In("my-release"), "--to", folder.In("my-site"));
        Assert.True(call.ExitCode == ExitCode.Done, call.Error);
        Assert.Contains("people visited a library in the north", File.ReadAllText(folder.In("my-site/index.html")));
        Assert.Contains("641", File.ReadAllText(folder.In("my-site/index.html")));
    }

    [GeneratedRegex("```[a-z]*\n(.*?)```", RegexOptions.Singleline)]
    private static partial Regex Block();
}
