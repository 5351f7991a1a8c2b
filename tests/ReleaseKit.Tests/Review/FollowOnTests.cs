using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>Where one thing is wrong, one finding says so, and what follows from it is no finding of its own.</summary>
public sealed class FollowOnTests
{
    private const string Mechanisms = "mechanisms.json";
    private const string Release = "release.json";

    [Theory]
    [InlineData("1", "is 1, but")]
    [InlineData("2", "is 2, but")]
    public void Delta_out_of_range_is_not_said_to_be_missing(string delta, string found) =>
        Assert.Contains(found, OnlyStop("out-of-range", folder => folder.Edit(Mechanisms, "\"delta\": 1e-9", $"\"delta\": {delta}")), StringComparison.Ordinal);

    [Fact]
    public void Sensitivity_of_nought_is_not_said_to_be_missing() => OnlyStop(
        "out-of-range", folder => folder.Edit(Mechanisms, "\"cellsPerUnit\": 1", "\"cellsPerUnit\": 0"));

    [Fact]
    public void Column_of_scales_that_nobody_declared_is_one_finding() => OnlyStop("undeclared-column", folder => folder
        .With("tables/lamps.csv", "street,lit,broken,noise_scale\nAll,60,9,3\nKiln Row,31,4,2.5\nQuay,20,5,3\nWeir Lane,9,-1,3\n")
        .Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": { \"column\": \"noise_scale\" }"));

    [Fact]
    public void Column_of_scales_that_is_missing_is_one_finding() => OnlyStop(
        "missing-column", folder => folder.Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": { \"column\": \"noise_scale\" }"));

    [Theory]
    [InlineData("{ \"street\": [ \"All\", \"Quay\" ] }", "wrong-type")]
    [InlineData("\"All\"", "wrong-type")]
    [InlineData("{ \"street\": \"Quai\" }", "unknown-label")]
    public void Rule_that_cannot_be_read_leaves_the_rules_after_it_unjudged(string where, string slug) => OnlyStop(slug, folder => folder
        .Edit(Release, "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", $"\"noise\": [ {{ \"where\": {where}, \"mechanism\": \"lamps-broken\" }}, {{ \"mechanism\": \"lamps-lit\" }} ]"));

    [Theory]
    [InlineData("\"column\": \"street\"", "\"column\": \"stret\"")]
    [InlineData("\"column\": \"lit\"", "\"column\": \"litt\"")]
    public void Column_mistyped_is_one_finding(string from, string to) => OnlyStop("missing-column", folder => folder.Edit(Release, from, to));

    [Fact]
    public void Declared_law_without_its_loss_is_one_finding_that_settles_it()
    {
        const string declared = "\"mechanisms\": [ { \"id\": \"rows\", \"law\": \"declared\", \"use\": \"choice-of-rows\" },";
        OnlyStop("spent-missing", folder => folder.Edit(Mechanisms, "\"mechanisms\": [", declared));
        Assert.Empty(StopsOf(folder => folder.Edit(Mechanisms, "\"mechanisms\": [", declared.Replace(" },", ", \"spent\": { \"epsilon\": 0.1 } },", StringComparison.Ordinal))));
    }

    [Theory]
    [InlineData("lamp-lit", "write \"lamps-lit\"")]
    [InlineData("nope", "take it out, or name one of: lamps-lit, lamps-broken.")]
    public void Unknown_mechanism_in_composition_is_about_its_loss(string id, string remedy)
    {
        using var folder = new TestFolder().Edit(Mechanisms, "\"practice\": {", $"\"composition\": {{ \"together\": [ \"lamps-broken\", \"{id}\" ] }}, \"practice\": {{");
        var found = folder.OnlyStop("unknown-mechanism");
        Assert.DoesNotContain("margin", found.Why, StringComparison.Ordinal);
        Assert.Contains(remedy, found.Do, StringComparison.Ordinal);
    }

    [Fact]
    public void Column_named_in_another_finding_does_not_hide_a_law_without_a_number() => Assert.Contains("loss-unknown", StopsOf(folder => folder
        .With("tables/lamps.csv", "street,lit,broken,lamps-broken\nAll,60,9,1\nKiln Row,31,4,1\nQuay,20,5,1\nWeir Lane,9,-1,1\n")
        .Edit(Release, "\"figures\": [\n", "\"columns\": { \"lamps-broken\": { \"from\": \"public\" } }, \"figures\": [\n")
        .Edit(Mechanisms, "\"mechanisms\": [", "\"mechanisms\": [ { \"id\": \"unused\", \"law\": \"laplace\", \"scale\": { \"column\": \"lamps-broken\" }, \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 1 } },")
        .Edit(Release, "\"title\": \"Lamps counted\"", "\"lamps-broken\": 1, \"title\": \"Lamps counted\"")));

    [Theory]
    [InlineData("\"practice\": {", "\"composition\": [ \"lamps-lit\" ], \"practice\": {", "write \"composition\": { \"together\": [")]
    [InlineData("\"sensitivity\": { \"cellsPerUnit\": 2, \"perCell\": 1 }", "\"sensitivity\": 1", "write \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 1 }")]
    public void Object_of_the_wrong_kind_is_told_what_to_paste(string from, string to, string paste)
    {
        using var folder = new TestFolder().Edit(Mechanisms, from, to);
        Assert.Contains(paste, folder.OnlyStop("wrong-type").Do, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("?street=Quai", "\"?street=Quai\": column \"street\" has no value \"Quai\".")]
    [InlineData("?strete=Quay", "\"?strete=Quay\" names a column \"strete\" that is no stub column of \"lamps\".")]
    [InlineData("?street", "\"street\" in \"?street\" is no column=value.")]
    [InlineData("lit?street=Weir%20Lain", "\"lit?street=Weir%20Lain\": column \"street\" has no value \"Weir Lain\".")]
    public void Selection_of_a_note_is_quoted_as_it_was_written(string at, string found)
    {
        using var folder = new TestFolder().Edit(Release, "\"figures\": [\n", $"\"notes\": [ {{ \"at\": \"{at}\", \"text\": \"New lamps.\" }} ], \"figures\": [\n");
        Assert.Equal(found, folder.OnlyStop("unknown-figure").Found);
    }

    [Theory]
    [InlineData("All,60,9\n")]
    [InlineData("Kiln Row,0,4\n")]
    [InlineData("Quay,21,5\nQuay,22,5\n", 2)]
    public void Row_that_stands_there_twice_is_no_second_figure_and_no_part_of_a_sum(string rows, int doubled = 1)
    {
        using var broken = new Broken(folder => folder.Edit("tables/lamps.csv", "Weir Lane,9,-1\n", "Weir Lane,9,-1\n" + rows)
            .With("narrative/summary.md", TestFolder.Prose + "\n[value](<figure:lamps/lit?street=Kiln Row>), [value](figure:lamps/lit?street=Quay)\n"));
        var stops = broken.Review().Where(finding => finding.Level == FindingLevel.Stop).Select(finding => finding.Slug).ToList();
        Assert.Equal(Enumerable.Repeat("doubled-row", doubled), stops);
    }

    // Without the row that could not be read, a total is far from its parts, and of two hidden parts one is left.
    [Theory]
    [InlineData("Quay,20\n", "csv-ragged")]
    [InlineData("\"Quay,20,5,\n", "csv-quotes")]
    public void Row_that_could_not_be_read_is_no_gap_between_a_total_and_its_parts(string row, string slug)
    {
        const string Rows = "street,lit,broken,lit_status\nAll,60,9000,\nKiln Row,31,4,\nWeir Lane,,-1,Q\n";
        using var broken = new Broken(folder => folder.With("tables/lamps.csv", Rows + row).With("narrative/summary.md", "# Summary\n")
            .Edit(Release, "\"figures\": [\n", "\"hidden\": { \"by\": \"public-rule\", \"inTotals\": true }, \"statuses\": { \"column\": \"*_status\" }, \"adds\": [ { \"figure\": \"broken\", \"over\": \"street\" } ], \"figures\": [\n"));
        var slugs = broken.Review().Select(finding => finding.Slug).ToList();
        Assert.Contains(slug, slugs);
        Assert.DoesNotContain("total-far-from-parts", slugs);
        Assert.DoesNotContain("hidden-given-back", slugs);
    }

    [Fact]
    public void Address_of_several_figures_is_still_told_where_a_row_stands_there_twice()
    {
        using var broken = new Broken(folder => folder.Edit("tables/lamps.csv", "Weir Lane,9,-1\n", "Weir Lane,9,-1\nQuay,20,5\n")
            .With("narrative/summary.md", TestFolder.Prose + "\n[value](figure:lamps/lit)\n"));
        Assert.Equal(["prose-citation", "doubled-row"], broken.Review().Where(finding => finding.Level == FindingLevel.Stop).Select(finding => finding.Slug));
    }

    [Fact]
    public void Headline_that_stands_there_already_is_a_caution() => Broken.Cautions(
        "headline-twice", Release, "\"total\", \"title\"", "name another figure",
        folder => folder.Edit(Release, "\"headlines\": [ \"lamps/lit?street=All\" ]",
            "\"short\": { \"total\": \"lamps/lit?street=All\" }, \"headlines\": [ \"lamps/lit?street=All\", { \"figure\": \"total\", \"title\": \"Lamps lit\" } ]"));

    [Fact]
    public void Chart_that_stands_on_the_page_already_is_a_stop() => Broken.Stops(
        "prose-chart", "narrative/summary.md", "![Again]", "take one of the two out",
        folder => folder.With("narrative/summary.md", TestFolder.Prose + "\n![Again](chart:by-street)\n"));

    private static IReadOnlyList<string> StopsOf(Action<TestFolder> damage)
    {
        using var broken = new Broken(damage);
        return [.. broken.Review().Where(finding => finding.Level == FindingLevel.Stop).Select(finding => finding.Slug)];
    }

    private static string OnlyStop(string slug, Action<TestFolder> damage)
    {
        using var broken = new Broken(damage);
        var stop = Assert.Single(broken.Review(), finding => finding.Level == FindingLevel.Stop);
        Assert.Equal(slug, stop.Slug);
        return stop.Found;
    }
}
