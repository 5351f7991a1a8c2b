using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>Findings that only the whole review makes stand at the cell or the key that they are about.</summary>
public sealed class PlaceTests
{
    private const string Csv = "tables/lamps.csv";
    private const string Release = "release.json";
    private const string Mechanisms = "mechanisms.json";

    [Fact]
    public void Figure_off_its_grid_is_found_at_its_cell() => Broken.Stops("off-grid", Csv, "5\nWeir", "\"grid\"", folder => folder
        .Edit(Mechanisms, "\"scale\": 3.0,", "\"scale\": 6.0, \"grid\": 2,").Edit(Csv, "All,60,9", "All,60,8").Edit(Csv, "9,-1", "9,-2"));

    [Fact]
    public void Figure_past_a_bound_is_found_at_its_cell() => Broken.Stops("past-afterwards", Csv, "-1", "publish the values after that step", folder => folder
        .Edit(Mechanisms, "\"scale\": 3.0,", "\"scale\": 3.0, \"afterwards\": [ { \"notBelow\": 0 } ],"));

    [Fact]
    public void Exact_count_is_found_at_its_rule() => Broken.Stops("exact-unit-count", Release, "\"counted", "\"neighbouring\": \"replace\"", folder => folder
        .Edit(Mechanisms, "{ \"one\": \"keeper\", \"other\": \"keepers\" }", "\"lamp\"").Edit(Mechanisms, "\"cellsPerUnit\": 2, \"perCell\": 1 }", "\"cellsPerUnit\": 2, \"perCell\": 1 }, \"use\": \"not-published\"")
        .Edit(Release, "{ \"mechanism\": \"lamps-broken\" }", "{ \"exact\": \"counted by the town\" }"));

    [Fact]
    public void Confidential_column_is_found_at_its_key() => Broken.Cautions("confidential-column", Release, "\"weight\"", "leave the column out", folder => folder
        .With(Csv, "street,lit,broken,weight\nAll,60,9,1\nKiln Row,31,4,2\nQuay,20,5,3\nWeir Lane,9,-1,4\n")
        .Edit(Release, "\"figures\": [\n", "\"columns\": { \"weight\": { \"from\": \"confidential\" } }, \"figures\": [\n"));

    [Fact]
    public void Hiding_by_the_value_before_noise_is_found_at_its_key() => Broken.Cautions("hidden-by-value", Release, "\"value-before-noise\"", "noised-value", folder => folder
        .Edit(Csv, "20,5", "20,[c]")
        .Edit(Release, "\"figures\": [\n", "\"statuses\": { \"marks\": { \"[c]\": \"Q\" } }, \"hidden\": { \"by\": \"value-before-noise\" }, \"figures\": [\n"));

    [Fact]
    public void Waiver_without_effect_is_found_where_it_stands() => Broken.Cautions("waiver-without-effect", "signoff.json", "{ \"finding\"", "take it out", folder => folder
        .With("signoff.json", "{\n  \"waivers\": [ { \"finding\": \"no-licence\", \"reason\": \"asked\", \"by\": \"Registrar\", \"on\": \"2032-03-01\" } ]\n}"));

    [Theory]
    [InlineData("street,lit,broken\nAll,60,9\n\"Kiln Row, upper\",31,4\nQuay,20,5\nWeir Lane,9,-1\n", "tables/lamps.csv:5:13")]
    [InlineData("street,lit,broken\nAll,60,9\n\"Kiln\n Row\",31,4\nQuay,20,5\nWeir Lane,9,-1\n", "tables/lamps.csv:6:13")]
    [InlineData("street,lit,broken\n\nAll,60,9\nK\u00EDln \U0001D7D8 R\u00F3w,31,4\nQuay,20,5\n\nW\u00E9ir Lane,9,-1\n", "tables/lamps.csv:7:13")]
    [InlineData("street,lit,broken\r\nAll,60,9\r\nKiln Row,31,4\r\nQuay,20,5\r\nWeir Lane, 9 , -1\r\n", "tables/lamps.csv:5:15")]
    [InlineData("\uFEFFstreet,lit,broken\nAll,60,9\nKiln Row,31,4\nQuay,20,5\n\"W\u00E9ir, Lane\",9,-1\n", "tables/lamps.csv:5:16")]
    public void Place_of_a_cell_counts_lines_and_characters_of_the_file(string table, string place)
    {
        using var broken = new Broken(folder => folder.With(Csv, System.Text.Encoding.UTF8.GetBytes(table))
            .Edit(Mechanisms, "\"scale\": 3.0,", "\"scale\": 3.0, \"afterwards\": [ { \"notBelow\": 0 } ],"));
        Assert.Equal(place, Assert.Single(broken.Review(), finding => finding.Slug == "past-afterwards").At.ToString());
    }

    [Fact]
    public void No_finding_keeps_a_cell_that_was_not_looked_up()
    {
        using var broken = new Broken(folder => folder.Edit(Csv, "All,60,9", "All,61,9.5").Edit(Csv, "20,5", "20,5.5"));
        Assert.All(broken.Review(), finding => Assert.Null(finding.At.Cell));
    }
}
