using System.Diagnostics;

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
        var first = File.ReadAllText(folder.In("site/downloads/arrears-long.csv"));
        var changed = CopyOfExample(folder, "tables/arrears-by-ward.csv", csv => csv.Replace("1599,230", "1599,235"));
        Assert.Equal(0, Call.Of("compose", changed, "--to", folder.In("site"), "--quiet").ExitCode);
        Assert.NotEqual(first, File.ReadAllText(folder.In("site/downloads/arrears-long.csv")));
        Assert.Equal(first, File.ReadAllText(folder.In("site.before/downloads/arrears-long.csv")));
        Assert.Equal(["release", "site", "site.before"], Directory.EnumerateFileSystemEntries(folder.Path).Select(Path.GetFileName).Order());
    }

    [Fact]
    public void A_file_of_somebody_in_a_composed_site_is_named_and_nothing_changes()
    {
        using var folder = new TemporaryFolder();
        Assert.Equal(0, Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet").ExitCode);
        folder.Write("site/robots.txt", "mine");
        var call = Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet");
        Assert.Equal(ExitCode.Unusable, call.ExitCode);
        Assert.Contains("site holds a file that compose did not write: robots.txt.", call.Error);
        Assert.Equal("", call.Output);
        Assert.Equal("mine", File.ReadAllText(folder.In("site/robots.txt")));
        Assert.Equal(["site"], Directory.EnumerateFileSystemEntries(folder.Path).Select(Path.GetFileName));
    }

    [Fact]
    public void A_site_without_a_list_of_its_files_is_replaced_and_what_goes_is_named()
    {
        using var folder = new TemporaryFolder();
        folder.Write("site/.releasekit", "Composed by releasekit. The next composition replaces this folder whole.\n");
        folder.Write("site/robots.txt", "mine");
        var call = Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet");
        Assert.Equal(0, call.ExitCode);
        Assert.Contains($"Gone, and kept in {folder.In("site.before")} only until the next composing: robots.txt.", call.Output);
    }

    [Fact]
    public void A_first_composing_says_how_to_switch_it_on_and_nothing_of_changes()
    {
        using var folder = new TemporaryFolder();
        var call = Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"));
        Assert.Contains($"To switch it on: copy what is in {folder.In("site")}", call.Output);
        Assert.DoesNotContain("hanged", call.Output);
        Assert.DoesNotContain("go back", call.Output);
    }

    [Fact]
    public void Composing_the_same_again_says_that_nothing_changed()
    {
        using var folder = new TemporaryFolder();
        Assert.Equal(0, Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet").ExitCode);
        var call = Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet");
        Assert.Contains("Nothing changed since the last composing", call.Output);
        Assert.DoesNotContain("go back", call.Output);
        Assert.Equal("", call.Error);
        Assert.Equal(["site"], Directory.EnumerateFileSystemEntries(folder.Path).Select(Path.GetFileName));
    }

    [Fact]
    public void A_changed_figure_is_counted_in_its_table_and_the_printed_lines_go_back()
    {
        using var folder = new TemporaryFolder();
        Assert.Equal(0, Call.Of("compose", Repository.Release("example"), "--to", folder.In("it's a site"), "--quiet").ExitCode);
        var first = File.ReadAllText(folder.In("it's a site/downloads/arrears-long.csv"));
        var call = Call.Of("compose", CopyOfExample(folder, "tables/arrears-by-ward.csv", csv => csv.Replace("1599,230", "1599,235")), "--to", folder.In("it's a site"), "--quiet");
        Assert.Contains("figures of arrears: 0 new, 1 changed, 0 gone", call.Output);
        Assert.Matches(@"  pages: 0 new, [1-9]\d* changed, 0 gone", call.Output);
        var second = File.ReadAllText(folder.In("it's a site/downloads/arrears-long.csv"));
        Assert.NotEqual(first, second);
        Paste(folder, call.Output.Split('\n').Where(line => line.StartsWith("  m", StringComparison.Ordinal)));
        Assert.Equal(first, File.ReadAllText(folder.In("it's a site/downloads/arrears-long.csv")));
        Assert.Equal(second, File.ReadAllText(folder.In("it's a site.before/downloads/arrears-long.csv")));
    }

    [Fact]
    public void A_folder_of_others_where_the_last_site_is_kept_is_refused_in_one_line()
    {
        using var folder = new TemporaryFolder();
        Assert.Equal(0, Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet").ExitCode);
        folder.Write("site.before/letter.txt", "mine");
        var call = Call.Of("compose", Repository.Release("example"), "--to", folder.In("site"), "--quiet");
        Assert.Equal(ExitCode.Unusable, call.ExitCode);
        Assert.Contains("site.before was not composed here", call.Error);
        Assert.Equal("", call.Output);
        Assert.Equal("mine", File.ReadAllText(folder.In("site.before/letter.txt")));
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
        Assert.Equal("", call.Output);
        Assert.False(Directory.Exists(folder.In("site.before")));
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

    private static string CopyOfExample(TemporaryFolder folder, Func<string, string> editMechanisms) =>
        CopyOfExample(folder, "mechanisms.json", editMechanisms);

    private static string CopyOfExample(TemporaryFolder folder, string edited, Func<string, string> edit)
    {
        var from = Repository.Release("example");
        foreach (var file in Directory.EnumerateFiles(from, "*", SearchOption.AllDirectories))
        {
            var name = Path.GetRelativePath(from, file);
            var text = File.ReadAllText(file);
            folder.Write(Path.Combine("release", name), name == Path.Combine(edited.Split('/')) ? edit(text) : text);
        }

        return folder.In("release");
    }

    private static void Paste(TemporaryFolder folder, IEnumerable<string> lines)
    {
        var (shell, name) = OperatingSystem.IsWindows() ? ("cmd.exe", "back.cmd") : ("sh", "back.sh");
        var script = folder.Write(name, string.Join('\n', lines));
        var start = new ProcessStartInfo(shell) { ArgumentList = { script } };
        if (OperatingSystem.IsWindows())
            start.ArgumentList.Insert(0, "/c");
        using var process = Process.Start(start)!;
        process.WaitForExit();
        Assert.Equal(0, process.ExitCode);
    }
}
