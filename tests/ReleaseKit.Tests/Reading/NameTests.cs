using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Ids: one namespace for tables, short names and charts; letters that can stand in addresses.</summary>
public sealed class NameTests
{
    private const string Release = "release.json";

    [Fact]
    public void Chart_and_table_may_not_share_a_name()
    {
        using var folder = new TestFolder().Edit(Release, "\"id\": \"by-street\"", "\"id\": \"lamps\"").Edit("narrative/summary.md", "chart:by-street", "chart:lamps");
        Assert.Equal("\"lamps\" names a chart, and a table at release.json:13:13.", folder.OnlyStop("doubled-id").Found);
    }

    [Fact]
    public void Short_name_and_chart_may_not_share_a_name() => Broken.Stops("doubled-id", Release, "\"lamps/lit\"", "another name",
        folder => folder.Edit(Release, "\"headlines\": [ \"lamps/lit?street=All\" ]", "\"short\": { \"by-street\": \"lamps/lit?street=All\" }, \"headlines\": [ \"by-street\" ]"));

    [Fact]
    public void Mechanisms_may_not_share_an_id()
    {
        using var folder = new TestFolder().Edit("mechanisms.json", "\"id\": \"lamps-broken\"", "\"id\": \"lamps-lit\"").Edit(Release, "{ \"mechanism\": \"lamps-broken\" }", "{ \"mechanism\": \"lamps-lit\" }");
        Assert.Equal("mechanisms.json:8:5", folder.OnlyStop("doubled-id").At.ToString());
    }

    [Fact]
    public void Id_with_other_letters_is_told_its_slug() => Broken.Stops("bad-id", Release, "\"Str\u00E4\u00DFen 1\"", "write \"strassen-1\"",
        folder => folder.Edit(Release, "\"id\": \"by-street\"", "\"id\": \"Str\u00E4\u00DFen 1\"").Edit("narrative/summary.md", "(chart:by-street)", "(<chart:Str\u00E4\u00DFen 1>)"));

    [Theory]
    [InlineData("con", "con-1")]
    [InlineData("CON", "con-1")]
    [InlineData("con.a", "con-1.a")]
    [InlineData("_com1", "com1-1")]
    public void Id_that_is_proposed_can_be_one(string id, string proposed)
    {
        using var folder = new TestFolder().Edit(Release, "\"id\": \"lamps\"", $"\"id\": \"{id}\"");
        Assert.Equal($"write \"{proposed}\".", Assert.Single(folder.Read().Findings, finding => finding.Slug == "bad-id").Do);
        using var mended = new TestFolder().Edit(Release, "\"id\": \"lamps\"", $"\"id\": \"{proposed}\"");
        Assert.DoesNotContain(mended.Read().Findings, finding => finding.Slug == "bad-id");
    }

    [Fact]
    public void Headline_that_leads_nowhere_is_told_the_nearest() => Broken.Stops("unknown-figure", Release, "\"lamps/lit?street=Al\"", "write All.",
        folder => folder.Edit(Release, "\"lamps/lit?street=All\"", "\"lamps/lit?street=Al\""));

    [Fact]
    public void Note_for_rows_that_are_not_there_is_a_stop() => Broken.Stops("unknown-figure", Release, "\"?street=Quai\"", "write Quay.",
        folder => folder.Edit(Release, "\"figures\": [\n", "\"notes\": [ { \"at\": \"?street=Quai\", \"text\": \"New.\" } ], \"figures\": [\n"));

    [Fact]
    public void Column_that_cuts_pages_must_be_a_stub_column() => Broken.Stops("unknown-column", Release, "\"stret\"", "write \"street\"",
        folder => folder.Edit(Release, "\"figures\": [\n", "\"page\": { \"cutBy\": \"stret\" }, \"figures\": [\n"));

    [Fact]
    public void Value_named_index_cannot_be_a_page() => Broken.Stops("slug-taken", Release, "\"tables/lamps.csv\"", "labels.csv",
        folder => folder.Edit(Release, "\"figures\": [\n", "\"page\": { \"cutBy\": \"street\" }, \"figures\": [\n").Edit("tables/lamps.csv", "Quay", "Index"));
}
