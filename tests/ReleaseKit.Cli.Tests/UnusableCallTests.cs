namespace ReleaseKit.Cli.Tests;

/// <summary>Exit code 2: a call or folder that cannot be used at all, said in one line.</summary>
public sealed class UnusableCallTests
{
    [Theory]
    [InlineData("publish", "x")]
    [InlineData("compose")]
    [InlineData("compose", "folder")]
    [InlineData("review")]
    [InlineData("review", "a", "b")]
    [InlineData("compose", "folder", "--to")]
    [InlineData("review", "folder", "--colour")]
    public void A_call_that_cannot_be_read_is_refused_in_one_line(params string[] arguments)
    {
        AssertRefused(Call.Of(arguments));
    }

    [Fact]
    public void A_folder_that_is_missing_is_refused()
    {
        using var folder = new TemporaryFolder();
        var call = Call.Of("compose", folder.In("none"), "--to", folder.In("site"));
        AssertRefused(call);
        Assert.Contains("none", call.Error);
        Assert.False(Directory.Exists(folder.In("site")));
    }

    [Fact]
    public void A_folder_with_neither_file_is_refused()
    {
        using var folder = new TemporaryFolder();
        folder.Write("release/notes.txt", "nothing here");
        var call = Call.Of("review", folder.In("release"));
        AssertRefused(call);
        Assert.Contains("release.json", call.Error);
        Assert.Contains("mechanisms.json", call.Error);
    }

    [Fact]
    public void A_target_with_other_files_is_refused_and_left_alone()
    {
        using var folder = new TemporaryFolder();
        folder.Write("site/letter.txt", "mine");
        var call = Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet");
        AssertRefused(call);
        Assert.Equal(["letter.txt"], Directory.EnumerateFileSystemEntries(folder.In("site")).Select(Path.GetFileName));
    }

    [Fact]
    public void A_target_that_is_a_file_is_refused_and_left_alone()
    {
        using var folder = new TemporaryFolder();
        var file = folder.Write("site", "mine");
        AssertRefused(Call.Of("compose", Repository.Release("example"), "--to", file, "--quiet"));
        Assert.Equal("mine", File.ReadAllText(file));
    }

    private static void AssertRefused(Call call)
    {
        Assert.Equal(ExitCode.Unusable, call.ExitCode);
        Assert.Equal("", call.Output);
        var line = Assert.Single(call.Error.TrimEnd().Split('\n'), text => text.StartsWith("releasekit: ", StringComparison.Ordinal));
        Assert.DoesNotContain("   at ", line);
    }
}
