namespace ReleaseKit.Cli.Tests;

public sealed class ComposeTests
{
    [Theory]
    [InlineData("example")]
    [InlineData("harbour")]
    public void A_sound_folder_composes_without_a_stop(string release)
    {
        using var folder = new TemporaryFolder();
        var call = Call.Of("compose", Repository.Release(release), "--to", folder.In("site"));
        Assert.True(call.ExitCode == ExitCode.Done, call.Error);
        Assert.DoesNotContain("STOP", call.Error);
        Assert.True(File.Exists(folder.In("site/index.html")));
    }

    [Fact]
    public void A_second_composing_takes_the_place_of_the_first()
    {
        using var folder = new TemporaryFolder();
        Assert.Equal(0, Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet").ExitCode);
        File.WriteAllText(folder.In("site/stray.html"), "left over");
        Assert.Equal(0, Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet").ExitCode);
        Assert.False(File.Exists(folder.In("site/stray.html")));
        Assert.Equal(["site"], Directory.EnumerateFileSystemEntries(folder.Path).Select(Path.GetFileName));
    }

    [Fact]
    public void A_stop_writes_nothing_and_leaves_what_stood()
    {
        using var folder = new TemporaryFolder();
        Assert.Equal(0, Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet").ExitCode);
        var before = Directory.EnumerateFiles(folder.In("site"), "*", SearchOption.AllDirectories).Order().ToList();
        var broken = CopyOfExample(folder, text => text.Replace("\"spent\": { \"rho\": 0.005540167 }", "\"spent\": { \"rho\": 0.0054 }"));
        var call = Call.Of("compose", broken, "--to", folder.In("site"));
        Assert.Equal(ExitCode.Stopped, call.ExitCode);
        Assert.Contains("spent-too-low", call.Error);
        Assert.Contains("write 0.005540167", call.Error);
        Assert.Equal(before, Directory.EnumerateFiles(folder.In("site"), "*", SearchOption.AllDirectories).Order());
    }

    [Fact]
    public void Review_of_a_stop_answers_1_and_names_the_next_call()
    {
        using var folder = new TemporaryFolder();
        var broken = CopyOfExample(folder, text => text.Replace("\"sigma\": 9.5", "\"sigma\": 0"));
        var call = Call.Of("review", broken);
        Assert.Equal(ExitCode.Stopped, call.ExitCode);
        Assert.Contains("STOP", call.Output);
        Assert.Contains("mechanisms.json:", call.Output);
        Assert.Contains("releasekit review", call.Output.TrimEnd().Split('\n')[^1]);
    }

    [Fact]
    public void Review_of_a_sound_folder_answers_0_and_names_compose()
    {
        var call = Call.Of("review", Repository.Release("example"));
        Assert.True(call.ExitCode == ExitCode.Done, call.Output);
        Assert.Contains("releasekit compose", call.Output.TrimEnd().Split('\n')[^1]);
    }

    private static string CopyOfExample(TemporaryFolder folder, Func<string, string> editMechanisms)
    {
        var from = Repository.Release("example");
        foreach (var file in Directory.EnumerateFiles(from, "*", SearchOption.AllDirectories))
        {
            var name = Path.GetRelativePath(from, file);
            var text = File.ReadAllText(file);
            folder.Write(Path.Combine("release", name), name == "mechanisms.json" ? editMechanisms(text) : text);
        }

        return folder.In("release");
    }
}
