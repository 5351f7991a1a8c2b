using System.Text;
using ReleaseKit.Pages;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class SiteFolderTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    private string Target => folder.In("site");

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Target_missing_is_made_with_the_marker()
    {
        Compose("one");
        Assert.Equal("one", File.ReadAllText(folder.In("site/index.html")));
        Assert.True(File.Exists(folder.In("site/.releasekit")));
        Assert.Equal(["site"], Neighbours());
    }

    [Fact]
    public void Target_empty_is_filled()
    {
        Directory.CreateDirectory(Target);
        Compose("one");
        Assert.Equal("one", File.ReadAllText(folder.In("site/index.html")));
    }

    [Fact]
    public void Target_composed_before_is_replaced_whole()
    {
        Compose("one", "old.html");
        Compose("two");
        Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
        Assert.False(File.Exists(folder.In("site/old.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void Site_replaced_is_kept_beside_and_only_the_last_one()
    {
        Compose("one", "old.html");
        Compose("two");
        Compose("three");
        Assert.Equal("three", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal("two", File.ReadAllText(folder.In("site.before/index.html")));
        Assert.False(File.Exists(folder.In("site.before/old.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void Composing_the_same_again_leaves_all_as_it_was()
    {
        Compose("one");
        Compose("two");
        var stood = Directory.GetCreationTimeUtc(Target);
        Assert.True(Compose("two")!.IsNone);
        Assert.Equal(stood, Directory.GetCreationTimeUtc(Target));
        Assert.Equal("one", File.ReadAllText(folder.In("site.before/index.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void First_composing_has_nothing_to_compare_with() => Assert.Null(Compose("one"));

    [Fact]
    public void Changes_count_pages_and_other_files()
    {
        Compose("one", "same.html", "gone.html", "gone.css");
        var changes = Compose("two", "same.html", "new.html", "new.svg", "new.css");
        Assert.Equal(new FileChanges(New: 1, Changed: 1, Gone: 1), changes!.Pages);
        Assert.Equal(new FileChanges(New: 2, Changed: 0, Gone: 1), changes.Others);
        Assert.Empty(changes.Figures);
    }

    [Fact]
    public void Changed_figures_are_found_by_address_wherever_their_row_stands()
    {
        ComposeTable("t/n?a=1,5\nt/n?a=2,6\nt/n?a=3,7\nt/n?a=4,8\n");
        var changes = ComposeTable("t/n?a=3,7\nt/n?a=1,5\nt/n?a=2,66\nt/n?a=5,9\nt/n?a=6,9\n");
        Assert.Equal([new FigureChanges("t", New: 2, Changed: 1, Gone: 1)], changes!.Figures);
    }

    [Fact]
    public void Folder_of_others_where_the_replaced_site_is_to_be_kept_is_refused_and_untouched()
    {
        Compose("one");
        Directory.CreateDirectory(folder.In("site.before"));
        File.WriteAllText(folder.In("site.before/letter.txt"), "mine");
        var fault = Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target));
        Assert.Contains("site.before was not composed here", fault.Message, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', fault.Message);
        Assert.Equal("mine", File.ReadAllText(folder.In("site.before/letter.txt")));
        Assert.Equal("one", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void Target_with_files_of_others_is_refused_and_untouched()
    {
        Directory.CreateDirectory(Target);
        File.WriteAllText(folder.In("site/letter.txt"), "mine");
        var fault = Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target));
        Assert.Contains("holds files that were not composed here", fault.Message, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', fault.Message);
        Assert.Equal("mine", File.ReadAllText(folder.In("site/letter.txt")));
        Assert.Equal(["site"], Neighbours());
    }

    [Fact]
    public void Target_that_is_a_file_is_refused()
    {
        File.WriteAllText(Target, "mine");
        Assert.Contains("is a file", Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target)).Message, StringComparison.Ordinal);
        Assert.Equal("mine", File.ReadAllText(Target));
    }

    [Fact]
    public void Target_that_is_a_link_is_refused()
    {
        Directory.CreateDirectory(folder.In("elsewhere"));
        File.CreateSymbolicLink(Target, folder.In("elsewhere"));
        Assert.Contains("is a link", Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Target_that_is_a_root_is_refused() =>
        Assert.Contains("root", Assert.Throws<SiteFolderException>(() => SiteFolder.Open("/")).Message, StringComparison.Ordinal);

    [Fact]
    public void Target_held_by_another_run_is_refused()
    {
        using var first = SiteFolder.Open(Target);
        Assert.Contains("another run", Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target)).Message, StringComparison.Ordinal);
        first.Write("index.html", "one"u8);
        first.Finish();
        Assert.Equal("one", File.ReadAllText(folder.In("site/index.html")));
    }

    [Fact]
    public void Composition_not_finished_leaves_what_stood()
    {
        Compose("one");
        using (var site = SiteFolder.Open(Target))
            site.Write("index.html", "half"u8);
        Assert.Equal("one", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal(["site"], Neighbours());
    }

    [Fact]
    public void Run_cut_off_while_writing_is_cleared_away()
    {
        Compose("one");
        LeaveBehind(".site.releasekit-new", "half");
        Compose("two");
        Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void Run_cut_off_between_two_renames_is_put_back_at_the_next_start()
    {
        LeaveBehind(".site.releasekit-old", "one");
        LeaveBehind(".site.releasekit-new", "two");
        using var site = SiteFolder.Open(Target);
        Assert.Equal("one", File.ReadAllText(folder.In("site/index.html")));
        Assert.False(Directory.Exists(folder.In(".site.releasekit-old")));
    }

    [Fact]
    public void Run_cut_off_after_the_swap_is_taken_up_again()
    {
        Compose("two");
        LeaveBehind(".site.releasekit-old", "one");
        using (SiteFolder.Open(Target))
            Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal("one", File.ReadAllText(folder.In("site.before/index.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void Run_cut_off_just_after_the_swap_keeps_the_replaced_site_even_if_nothing_changes_after()
    {
        Compose("zero");
        Compose("two");
        Arrive();
        LeaveBehind(".site.releasekit-new", "one");
        Assert.True(Compose("two")!.IsNone);
        Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal("one", File.ReadAllText(folder.In("site.before/index.html")));
        AssertSettled("site", "site.before");
    }

    [Fact]
    public void Run_cut_off_just_before_the_swap_is_cleared_away_and_the_kept_site_stays()
    {
        Compose("zero");
        Compose("one");
        LeaveBehind(".site.releasekit-new", "two");
        File.WriteAllText(folder.In(".site.releasekit-new/.releasekit-arrived"), "");
        using (SiteFolder.Open(Target))
            Assert.Equal("one", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal("zero", File.ReadAllText(folder.In("site.before/index.html")));
        AssertSettled("site", "site.before");
    }

    [Fact]
    public void Run_cut_off_when_the_replaced_site_has_left_the_place_of_the_new_one_is_taken_up_again()
    {
        Compose("two");
        Arrive();
        LeaveBehind(".site.releasekit-old", "one");
        using (SiteFolder.Open(Target))
            Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal("one", File.ReadAllText(folder.In("site.before/index.html")));
        AssertSettled("site", "site.before");
    }

    [Fact]
    public void First_run_cut_off_just_after_its_rename_leaves_the_site_alone()
    {
        Compose("one");
        Arrive();
        Assert.True(Compose("one")!.IsNone);
        AssertSettled("site");
    }

    [Fact]
    public void Run_cut_off_just_after_the_swap_with_an_empty_folder_keeps_nothing()
    {
        Compose("one");
        Arrive();
        Directory.CreateDirectory(folder.In(".site.releasekit-new"));
        using (SiteFolder.Open(Target))
            Assert.Equal("one", File.ReadAllText(folder.In("site/index.html")));
        AssertSettled("site");
    }

    [Fact]
    public void Replaced_site_that_cannot_be_kept_is_not_removed()
    {
        Compose("one");
        using (var site = SiteFolder.Open(Target))
        {
            site.Write("index.html", "two"u8);
            File.WriteAllText(folder.In(".site.releasekit-old"), "in the way");
            Assert.Throws<SiteFolderException>(site.Finish);
        }
        Assert.Equal("one", File.ReadAllText(folder.In(".site.releasekit-new/index.html")));
        File.Delete(folder.In(".site.releasekit-old"));
        using (SiteFolder.Open(Target))
            Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal("one", File.ReadAllText(folder.In("site.before/index.html")));
    }

    [Fact]
    public void Run_cut_off_while_it_removes_what_is_no_longer_kept_leaves_the_kept_site_whole()
    {
        Compose("one");
        Compose("two");
        LeaveBehind(".site.releasekit-gone", "half");
        using (SiteFolder.Open(Target))
            Assert.Equal("one", File.ReadAllText(folder.In("site.before/index.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void Run_cut_off_with_both_earlier_sites_beside_keeps_the_later_one()
    {
        Compose("three");
        LeaveBehind(".site.releasekit-gone", "one");
        LeaveBehind(".site.releasekit-old", "two");
        using (SiteFolder.Open(Target))
            Assert.Equal("two", File.ReadAllText(folder.In("site.before/index.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void Swap_by_two_renames_replaces_whole()
    {
        Compose("one");
        LeaveBehind(".site.releasekit-new", "two");
        var paths = SwapPaths.Beside(Target);
        FolderSwap.RenameTwice(paths);
        FolderSwap.Keep(paths);
        Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
        Assert.Equal("one", File.ReadAllText(folder.In("site.before/index.html")));
        Assert.Equal(["site", "site.before"], Neighbours());
    }

    [Fact]
    public void Exchange_swaps_two_folders_in_one_step_on_Linux()
    {
        LeaveBehind("a", "one");
        LeaveBehind("b", "two");
        Assert.Equal(OperatingSystem.IsLinux(), FolderSwap.TryExchange(folder.In("a"), folder.In("b")));
        Assert.Equal(OperatingSystem.IsLinux() ? "two" : "one", File.ReadAllText(folder.In("a/index.html")));
    }

    [Theory]
    [InlineData("robots.txt")]
    [InlineData(".htaccess")]
    [InlineData("tables/notes.html")]
    [InlineData(".well-known/security.txt")]
    public void File_of_others_put_into_a_composed_site_is_named_and_never_lost(string own)
    {
        Compose("one", "tables/a.html");
        Put($"site/{own}");
        var fault = Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target));
        Assert.Contains($"site holds a file that compose did not write: {own}. Composing would lose it", fault.Message, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', fault.Message);
        Assert.Equal("mine", File.ReadAllText(folder.In($"site/{own}")));
        Assert.Equal(["site"], Neighbours());
        File.Delete(folder.In($"site/{own}"));
        Compose("two");
        Put($"site/{own}");
        Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
    }

    [Fact]
    public void File_of_others_in_the_kept_site_is_named_and_never_lost()
    {
        Compose("one");
        Compose("two");
        Put("site.before/robots.txt");
        var fault = Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target));
        Assert.Contains("site.before holds a file that compose did not write: robots.txt", fault.Message, StringComparison.Ordinal);
        Assert.Equal("one", File.ReadAllText(folder.In("site.before/index.html")));
    }

    [Fact]
    public void Many_files_of_others_are_counted_and_the_first_named()
    {
        Compose("one");
        foreach (var number in Enumerable.Range(10, 14))
            Put($"site/own-{number}.txt");
        var fault = Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target));
        Assert.Contains("holds 14 files that compose did not write: own-10.txt, own-11.txt", fault.Message, StringComparison.Ordinal);
        Assert.Contains("own-21.txt and 2 more. Composing would lose them", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Link_in_a_composed_site_is_a_file_of_others_and_is_not_followed()
    {
        Compose("one");
        Put("elsewhere/letter.txt");
        File.CreateSymbolicLink(folder.In("site/link"), folder.In("elsewhere"));
        Assert.Contains("did not write: link.", Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target)).Message, StringComparison.Ordinal);
        Assert.Equal("mine", File.ReadAllText(folder.In("elsewhere/letter.txt")));
    }

    [Fact]
    public void File_that_a_file_browser_leaves_is_no_hindrance()
    {
        Compose("one");
        Put("site/.DS_Store");
        Assert.True(Compose("one")!.IsNone);
        Assert.Equal(0, Compose("two")!.Others.Gone);
        Assert.Equal("two", File.ReadAllText(folder.In("site/index.html")));
    }

    [Fact]
    public void Site_without_a_list_is_replaced_as_ever_and_the_files_that_go_are_named()
    {
        LeaveBehind("site", "one");
        Put("site/robots.txt");
        Put("site/a/page.html");
        Assert.Equal(["robots.txt", "a/page.html"], Compose("two")!.Unlisted);
        Assert.Equal("mine", File.ReadAllText(folder.In("site.before/robots.txt")));
        Assert.Empty(Compose("three", "b.html")!.Unlisted);
        Assert.Empty(Compose("four")!.Unlisted);
    }

    [Fact]
    public void Site_without_a_list_gets_one_though_nothing_changed()
    {
        LeaveBehind("site", "one");
        Assert.True(Compose("one")!.IsNone);
        Put("site/robots.txt");
        Assert.Throws<SiteFolderException>(() => SiteFolder.Open(Target));
        Assert.Equal(["site"], Neighbours());
    }

    [Fact]
    public void List_is_the_same_whatever_the_order_of_writing()
    {
        Compose("one", "b.html", "a/c.html");
        var list = File.ReadAllText(folder.In("site/.releasekit"));
        Compose("two", "a/c.html", "b.html");
        Assert.Equal(list, File.ReadAllText(folder.In("site/.releasekit")));
        Assert.EndsWith("a/c.html\nb.html\nindex.html\n", list, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("../escape.html")]
    [InlineData("/etc/escape.html")]
    [InlineData("tables/../../escape.html")]
    [InlineData("tables//a.html")]
    [InlineData("a\\b.html")]
    [InlineData(".hidden")]
    [InlineData("a b.html")]
    [InlineData("é.html")]
    [InlineData("a\0.html")]
    [InlineData("name.")]
    [InlineData("")]
    public void Path_that_could_leave_or_mislead_is_refused(string path)
    {
        using var site = SiteFolder.Open(Target);
        Assert.Throws<ArgumentException>(() => site.Write(path, "x"u8));
    }

    [Fact]
    public void Path_written_twice_is_refused_whatever_its_case()
    {
        using var site = SiteFolder.Open(Target);
        site.Write("a.html", "x"u8);
        Assert.Throws<ArgumentException>(() => site.Write("A.html", "y"u8));
    }

    private SiteChanges? Compose(string home, params string[] others)
    {
        using var site = SiteFolder.Open(Target);
        site.Write("index.html", Encoding.UTF8.GetBytes(home));
        foreach (var other in others)
            site.Write(other, "x"u8);
        return site.Finish();
    }

    private SiteChanges? ComposeTable(string rows)
    {
        using var site = SiteFolder.Open(Target);
        site.Write("downloads/t-long.csv", Encoding.UTF8.GetBytes("address,value\n" + rows));
        return site.Finish();
    }

    private void LeaveBehind(string name, string home)
    {
        Directory.CreateDirectory(folder.In(name));
        File.WriteAllText(folder.In($"{name}/{SiteFolder.Marker}"), "");
        File.WriteAllText(folder.In($"{name}/index.html"), home);
    }

    private void Put(string path)
    {
        Directory.CreateDirectory(Path.GetDirectoryName(folder.In(path))!);
        File.WriteAllText(folder.In(path), "mine");
    }

    private void Arrive() => File.WriteAllText(folder.In("site/.releasekit-arrived"), "");

    private void AssertSettled(params string[] neighbours)
    {
        Assert.Equal(neighbours, Neighbours());
        Assert.Empty(Directory.EnumerateFiles(folder.Path, "*arrived", SearchOption.AllDirectories));
    }

    private string[] Neighbours() =>
        [.. Directory.EnumerateFileSystemEntries(folder.Path).Select(Path.GetFileName).Order(StringComparer.Ordinal).Select(name => name!)];
}
