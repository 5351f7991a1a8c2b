using ReleaseKit.Reading;
using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Folders that reach outside, or of which a half or all is missing.</summary>
public sealed class HostileFolderTests
{
    private const string Release = "release.json";

    [Theory]
    [InlineData("../secret.csv", "leaves the folder")]
    [InlineData("tables/../../secret.csv", "leaves the folder")]
    [InlineData("/etc/passwd", "is not relative")]
    [InlineData("C:/secret.csv", "is not relative")]
    [InlineData("tables\\\\lamps.csv", "written with")]
    [InlineData("tables/con.csv", "device on Windows")]
    [InlineData("tables//lamps.csv", "empty part")]
    [InlineData("tables/lamps.csv.", "ends in a point")]
    public void Path_that_leaves_the_folder_is_refused(string path, string found)
    {
        using var broken = new Broken(folder => folder.Edit(Release, "tables/lamps.csv", path));
        var finding = Assert.Single(broken.Review(), finding => finding.Level == FindingLevel.Stop);
        Assert.Equal(("bad-path", "release.json:13:30"), (finding.Slug, finding.At.ToString()));
        Assert.Contains(found, finding.Found, StringComparison.Ordinal);
    }

    [Fact]
    public void Link_out_of_the_folder_is_refused() => Broken.Stops("path-leaves-folder", Release, "\"tables/lamps.csv\"", "copy the file itself",
        folder => folder.Without("tables/lamps.csv").Link("tables/lamps.csv", "/etc/hostname"));

    [Fact]
    public void Linked_sub_folder_that_leads_out_is_refused()
    {
        using var elsewhere = new TestFolder();
        Broken.Stops("path-leaves-folder", Release, "\"more/lamps.csv\"", "copy the file itself",
            folder => folder.Link("more", Path.Combine(elsewhere.Root, "tables")).Edit(Release, "tables/lamps.csv", "more/lamps.csv"));
    }

    [Fact]
    public void Links_in_a_circle_are_refused() => Broken.Stops("path-leaves-folder", Release, "\"tables/lamps.csv\"", "copy the file itself",
        folder => folder.Without("tables/lamps.csv").Link("tables/lamps.csv", "other.csv").Link("tables/other.csv", "lamps.csv"));

    [Fact]
    public void Link_within_the_folder_is_followed()
    {
        using var folder = new TestFolder().With("tables/kept.csv", TestFolder.Table).Without("tables/lamps.csv").Link("tables/lamps.csv", "kept.csv");
        Assert.Empty(folder.Read().Findings);
    }

    [Fact]
    public void Prose_outside_the_folder_is_refused() => Broken.Stops("bad-path", Release, "\"../../etc/passwd\"", "put the file into the folder",
        folder => folder.Edit(Release, "narrative/summary.md", "../../etc/passwd"));

    [Fact]
    public void Folder_that_does_not_exist_cannot_be_used()
    {
        var unusable = Assert.Throws<FolderUnusableException>(() => ReleaseFolder.Read(Path.Combine(Path.GetTempPath(), "releasekit-no-such-folder")));
        Assert.DoesNotContain('\n', unusable.Message);
    }

    [Fact]
    public void Folder_with_neither_file_cannot_be_used()
    {
        using var folder = new TestFolder().Without(Release).Without("mechanisms.json");
        Assert.Contains("neither release.json nor mechanisms.json", Assert.Throws<FolderUnusableException>(() => folder.Read()).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Noise_half_alone_is_reviewed()
    {
        using var folder = new TestFolder().Without(Release).Edit("mechanisms.json", "\"sigma\": 4.0, ", "");
        Assert.Equal(["missing-file", "parameter-missing"], folder.Read().Findings.Select(finding => finding.Slug).Order());
    }

    [Fact]
    public void Noise_half_alone_gives_its_account()
    {
        using var folder = new TestFolder().Without(Release);
        Assert.Equal(["lamps-lit", "lamps-broken"], folder.Read().Noise!.Mechanisms.Select(mechanism => mechanism.Id));
    }

    [Fact]
    public void Tables_beside_a_lone_noise_half_are_looked_at()
    {
        using var folder = new TestFolder().Without(Release).With("tables/lamps.csv", TestFolder.Table.Replace(',', ';'));
        Assert.Contains(folder.Read().Findings, finding => finding.Slug == "csv-separator");
    }

    [Fact]
    public void Writers_half_alone_is_reviewed()
    {
        using var folder = new TestFolder().Without("mechanisms.json").Edit(Release, "\"headlines\"", "\"headlinse\"");
        Assert.Equal(["missing-file", "unknown-key"], folder.Read().Findings.Select(finding => finding.Slug).Order());
    }

    [Fact]
    public void Broken_half_leaves_the_other_reviewed()
    {
        using var folder = new TestFolder().With("mechanisms.json", "{").Edit("tables/lamps.csv", "31,4", "31,4.5");
        Assert.Equal(["count-not-whole", "json-broken"], folder.Read().Findings.Select(finding => finding.Slug).Order());
    }

    [Fact]
    public void Many_faults_of_a_kind_are_all_found()
    {
        using var folder = new TestFolder().With("tables/lamps.csv", "street,lit,broken\n" + string.Concat(Enumerable.Range(0, 40).Select(row => $"Street {row},x,1\n")))
            .Edit(Release, ", \"all\": \"All\"", "").Edit(Release, "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ", "");
        Assert.Equal(40, folder.Read().Findings.Count(finding => finding.Slug == "csv-number"));
    }
}
