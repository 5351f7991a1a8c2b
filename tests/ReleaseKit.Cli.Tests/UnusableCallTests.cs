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

    [Theory]
    [InlineData("FOLDER", "review", "")]
    [InlineData("FOLDER", "review", " ")]
    [InlineData("FOLDER", "compose", "", "--to", "site")]
    [InlineData("SITE", "compose", "folder", "--to", "")]
    [InlineData("SITE", "compose", "folder", "--to", " ")]
    public void An_empty_name_is_refused_by_its_place(string place, params string[] arguments)
    {
        var call = Call.Of(arguments);
        AssertRefused(call);
        Assert.Contains($"{place} is empty; name the folder.", call.Error);
        Assert.DoesNotContain("Reading", call.Error);
    }

    [Theory]
    [InlineData("draft")]
    [InlineData("draft", "--help")]
    [InlineData("audit", "-h")]
    [InlineData("--help", "draft")]
    [InlineData("draft", "--version")]
    public void An_unknown_command_is_refused_whatever_follows_it(params string[] arguments)
    {
        var call = Call.Of(arguments);
        AssertRefused(call);
        Assert.Contains($"'{arguments.Single(word => word[0] != '-')}' is no command; the commands are review and compose.", call.Error);
    }

    [Theory]
    [InlineData("'--al' is no option of review.", "review", "--al", "rel")]
    [InlineData("'--al' is no option of review.", "review", "rel", "--al")]
    [InlineData("'-q' is no option of compose.", "compose", "-q", "rel", "--to", "site")]
    [InlineData("'--colour' is no option.", "--colour")]
    public void An_unknown_option_is_named_and_not_the_word_after_it(string said, params string[] arguments)
    {
        var call = Call.Of(arguments);
        AssertRefused(call);
        Assert.Contains(said, call.Error);
    }

    [Theory]
    [InlineData("release")]
    [InlineData("release/")]
    [InlineData("release/site")]
    [InlineData("release/tables/../deep/site")]
    public void A_target_in_the_release_folder_is_refused(string site)
    {
        using var folder = new TemporaryFolder();
        folder.Write("release/release.json", "{}");
        var call = Call.Of("compose", folder.In("release") + "/", "--to", Path.Combine(folder.Path, site));
        AssertRefused(call);
        Assert.Contains($"lies in the release folder {folder.In("release")}", call.Error);
        Assert.Equal(["release.json"], Directory.EnumerateFileSystemEntries(folder.In("release")).Select(Path.GetFileName));
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
