using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>What is read from a sound folder: rules, covers, statuses, labels, laws.</summary>
public sealed class TableReadingTests
{
    private const string Csv = "tables/lamps.csv";
    private const string Release = "release.json";
    private const string Mechanisms = "mechanisms.json";
    private const string BrokenLaw = "\"law\": \"discrete-laplace\", \"scale\": 3.0";

    [Fact]
    public void Covers_gives_rows_their_mechanism()
    {
        using var folder = new TestFolder().Edit(Release, ", \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "")
            .Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": 3.0, \"covers\": [\"lamps/broken\", \"lamps/broken?street=All\"]");
        var broken = Table(folder).Measures[1];
        Assert.All(Enumerable.Range(0, 4), row => Assert.Equal("lamps-broken", ((NoiseRule.FromMechanism)broken.RuleAt(row)).Mechanism.Id));
    }

    [Fact]
    public void Covers_leaves_out_totals_that_it_does_not_name()
    {
        using var folder = new TestFolder().Edit(Release, ", \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "")
            .Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": 3.0, \"covers\": [\"lamps/broken\"]");
        Assert.Equal("tables/lamps.csv:2:8", folder.OnlyStop("no-rule").At.ToString());
    }

    [Fact]
    public void Figure_covered_twice_is_a_stop()
    {
        using var folder = new TestFolder().Edit(Release, ", \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "")
            .Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": 3.0, \"covers\": [\"lamps/broken\", \"lamps/broken?street=All\", \"lamps/broken?street=Quay\"]");
        Assert.Equal("lamps/broken?street=Quay", folder.OnlyStop("covered-twice").Address);
    }

    [Fact]
    public void Figures_covered_twice_by_the_same_two_are_one_stop_with_their_number()
    {
        using var folder = new TestFolder().Edit(Release, ", \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "")
            .Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": 3.0, \"covers\": [\"lamps/broken\", \"lamps/broken?street=All\", \"lamps/broken\"]");
        var stop = folder.OnlyStop("covered-twice");
        Assert.StartsWith("lamps/broken?street=Kiln%20Row is covered by", stop.Found, StringComparison.Ordinal);
        Assert.EndsWith(", and so are 2 more figures.", stop.Found, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("{ \"where\": { \"street\": \"All\" }, \"mechanism\": \"lamps-broken\" }", "tables/lamps.csv:3:13", ", nor have 2 more figures of \"broken\".")]
    [InlineData("{ \"where\": { \"street\": \"All\" }, \"mechanism\": \"lamps-broken\" }, { \"where\": { \"street\": \"Quay\" }, \"mechanism\": \"lamps-broken\" }", "tables/lamps.csv:3:13", ", nor has one more figure of \"broken\".")]
    public void Figures_without_a_rule_are_one_stop_with_their_number(string rules, string at, string more)
    {
        using var folder = new TestFolder().Edit(Release, "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", $"\"noise\": [ {rules} ]");
        var stop = folder.OnlyStop("no-rule");
        Assert.Equal(at, stop.At.ToString());
        Assert.EndsWith(more, stop.Found, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("{ \"mechanism\": \"lamps-broken\" }, { \"where\": { \"street\": \"Quay\" }, \"exact\": \"audited\" }", "the rules before it take its rows, or none is like it")]
    [InlineData("{ \"mechanism\": \"lamps-broken\" }, { \"exact\": \"audited\" }", "the rules before it take all rows")]
    public void Rule_that_no_row_comes_to_is_a_caution(string rules, string why)
    {
        using var folder = new TestFolder().Edit(Release, "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", $"\"noise\": [ {rules} ]");
        var found = Assert.Single(folder.Read().Findings);
        Assert.Equal(("rule-unused", FindingLevel.Caution), (found.Slug, found.Level));
        Assert.Contains(why, found.Found, StringComparison.Ordinal);
    }

    [Fact]
    public void Column_of_row_headings_is_not_proposed_as_a_scale()
    {
        using var folder = new TestFolder().Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": { \"column\": \"streets\" }");
        Assert.StartsWith("add the column", folder.OnlyStop("missing-column").Do, StringComparison.Ordinal);
    }

    [Fact]
    public void Marks_stand_for_statuses_in_either_place()
    {
        using var folder = new TestFolder().With(Csv, "street,lit,broken,broken_status\nAll,60,9,\nKiln Row,31,,[c]\nQuay,20,..,\nWeir Lane,9,,\n")
            .Edit(Release, "\"figures\": [\n", "\"statuses\": { \"column\": \"*_status\", \"marks\": { \"[c]\": \"Q\", \"..\": \"M\" } }, \"figures\": [\n");
        var broken = Table(folder).Measures[1];
        Assert.Equal("AQMO", string.Concat(Enumerable.Range(0, 4).Select(broken.StatusAt)));
    }

    [Fact]
    public void Hidden_part_that_the_total_counts_is_not_compared()
    {
        using var folder = new TestFolder().Edit(Csv, "Quay,20,", "Quay,[c],")
            .Edit(Release, "\"figures\": [\n", "\"statuses\": { \"marks\": { \"[c]\": \"Q\" } }, \"hidden\": { \"by\": \"public-rule\", \"inTotals\": true }, \"figures\": [\n");
        Assert.Empty(folder.Read().Findings);
    }

    [Fact]
    public void Hidden_part_that_nobody_says_is_counted_shows_how_to_say_so()
    {
        using var folder = new TestFolder().Edit(Csv, "Quay,20,", "Quay,[c],").Edit(Release, "\"figures\": [\n", "\"statuses\": { \"marks\": { \"[c]\": \"Q\" } }, \"figures\": [\n");
        Assert.Contains("\"inTotals\": true", folder.OnlyStop("sum-differs").Do, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("[c]", "All,0,", true)]
    [InlineData("[c]", "All,[c],", false)]
    [InlineData("[c]", "All,,", false)]
    [InlineData("[x]", "All,0,", false)]
    public void Total_of_parts_without_a_number_is_a_stop_until_it_has_none_itself(string part, string total, bool stops)
    {
        using var folder = new TestFolder().With(Csv, $"street,lit,broken\n{total}9\nKiln Row,{part},4\nQuay,{part},5\n")
            .Edit(Release, "\"figures\": [\n", "\"statuses\": { \"marks\": { \"[c]\": \"Q\", \"[x]\": \"M\" } }, \"figures\": [\n");
        var found = folder.Read().Findings.Where(finding => finding.Level == FindingLevel.Stop).Select(finding => (finding.Slug, finding.Found));
        Assert.Equal(stops ? [("sum-of-nothing", "lamps/lit?street=All is 0, but none of its 2 parts over \"street\" has a number.")] : [], found);
    }

    [Fact]
    public void Labels_are_put_in_order_and_named()
    {
        using var folder = new TestFolder().With("labels.csv", "column,value,order,parent,name_en\nstreet,Weir Lane,1,,The Lane by the Weir\nstreet,Quay,2,Weir Lane,\n")
            .Edit(Csv, "All,60,", "All,40,");
        var stub = Table(folder).Stub[0];
        Assert.Equal(["The Lane by the Weir", "Quay", "All", "Kiln Row"], stub.Labels.Select(label => label.In("en")));
        Assert.Equal(["All", "Kiln Row", "Quay", "Weir Lane"], Enumerable.Range(0, 4).Select(row => stub.LabelOf(row).Value));
        Assert.Equal((2, "Weir Lane"), (stub.AllCode, stub.Labels[1].Parent));
    }

    [Fact]
    public void Misspelt_column_of_labels_is_told_the_nearest()
    {
        using var folder = new TestFolder().With("labels.csv", "column,value,ordr\nstreet,Quay,1\n");
        Assert.Contains("\"order\"", folder.OnlyStop("unknown-key").Do, StringComparison.Ordinal);
    }

    [Fact]
    public void Label_that_no_table_has_is_a_caution() => Broken.Cautions("label-unused", "labels.csv", "street,Quai", "write \"Quay\"",
        folder => folder.With("labels.csv", "column,value,order\nstreet,Quai,1\n"));

    [Fact]
    public void Count_written_with_a_zero_after_the_point_is_whole()
    {
        using var folder = new TestFolder().Edit(Csv, "31,4", "31.0,4.00");
        Assert.Equal((new PublishedValue(31, 0), new PublishedValue(4, 0)), (Table(folder).Measures[0].ValueAt(1), Table(folder).Measures[1].ValueAt(1)));
    }

    [Fact]
    public void Quoted_fields_hold_commas_and_quotes()
    {
        using var folder = new TestFolder().Edit(Csv, "Quay", "\"Quay, the \"\"old\"\" one\"");
        Assert.Equal("Quay, the \"old\" one", Table(folder).Stub[0].Labels[2].Value);
    }

    [Fact]
    public void Parameter_of_each_row_is_read_from_its_column()
    {
        using var folder = new TestFolder().With(Csv, "street,lit,broken,noise_scale\nAll,60,9,3\nKiln Row,31,4,2.5\nQuay,20,5,3\nWeir Lane,9,-1,3e0\n")
            .Edit(Release, "\"figures\": [\n", "\"columns\": { \"noise_scale\": { \"from\": \"public\" } }, \"figures\": [\n")
            .Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": { \"column\": \"noise_scale\" }");
        Assert.Equal([3, 2.5, 3, 3], Table(folder).SideColumns[0].Numbers);
    }

    [Fact]
    public void Steps_are_read_in_order_with_their_defaults()
    {
        using var folder = new TestFolder().Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": 3.0, \"afterwards\": [ { \"roundTo\": 5 }, { \"roundTo\": 10, \"how\": \"at-random\" }, { \"notBelow\": 0 }, { \"zeroBelow\": 10 } ]");
        AfterStep[] steps = [new AfterStep.RoundTo(5), new AfterStep.RoundTo(10, RoundingHow.AtRandom), new AfterStep.NotBelow(0), new AfterStep.ZeroBelow(10)];
        Assert.Equal(steps, folder.Read().Noise!.Mechanisms[1].Afterwards);
    }

    [Fact]
    public void Bound_before_a_rounding_must_be_its_multiple() => Broken.Stops("bound-off-rounding", Mechanisms, "{ \"notBelow\": 3 }", "multiple",
        folder => folder.Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": 3.0, \"afterwards\": [ { \"notBelow\": 3 }, { \"roundTo\": 5 } ]"));

    [Fact]
    public void Tabulated_law_is_read_in_decimal()
    {
        using var folder = new TestFolder().With("tables/law.csv", "noise,probability\n-0.5,0.1\n0,0.8\n0.5,0.1\n")
            .Edit(Mechanisms, BrokenLaw, "\"law\": \"tabulated\", \"grid\": 0.5, \"file\": \"tables/law.csv\"");
        Assert.Equal([(-1, 0.1m), (0, 0.8m), (1, 0.1m)], folder.Read().Noise!.Mechanisms[1].Tabulated!);
    }

    [Theory]
    [InlineData("noise,probability\n0.25,1\n", "no multiple of the grid")]
    [InlineData("noise,probability\n0,0.7\n1,0.4\n", "add up to 1.1")]
    [InlineData("noise,probability\n0,0.5\n0,0.5\n", "twice")]
    [InlineData("noise,probability\n0,-0.5\n", "not between 0 and 1")]
    [InlineData("noise,p\n0,1\n", "The columns are")]
    public void Tabulated_law_that_is_none_is_a_stop(string table, string found)
    {
        using var folder = new TestFolder().With("tables/law.csv", table).Edit(Mechanisms, BrokenLaw, "\"law\": \"tabulated\", \"file\": \"tables/law.csv\"");
        Assert.Contains(found, folder.OnlyStop("law-table").Found, StringComparison.Ordinal);
    }

    [Fact]
    public void Staircase_takes_its_step_from_the_sensitivity()
    {
        using var folder = new TestFolder().Edit(Mechanisms, BrokenLaw + ", \"sensitivity\": { \"cellsPerUnit\": 2, \"perCell\": 1 }", "\"law\": \"staircase\", \"epsilon\": 0.5, \"gamma\": 0.4, \"sensitivity\": { \"cellsPerUnit\": 2, \"perCell\": 3 }");
        Assert.Equal(NumberOrColumn.Of(3), folder.Read().Noise!.Mechanisms[1].Parameters["sensitivity"]);
    }

    [Fact]
    public void Cutoff_off_the_grid_is_a_stop() => Broken.Stops("parameter-off-grid", Mechanisms, "10.5", "multiple of the grid",
        folder => folder.Edit(Mechanisms, BrokenLaw, "\"law\": \"truncated-discrete-laplace\", \"scale\": 3.0, \"cutoff\": 10.5"));

    [Fact]
    public void Parameter_of_another_law_is_a_stop() => Broken.Stops("parameter-of-other-law", Mechanisms, "2.0", "takes scale, grid",
        folder => folder.Edit(Mechanisms, "\"scale\": 3.0", "\"scale\": 3.0, \"sigma\": 2.0"));

    [Fact]
    public void Unit_of_privacy_may_be_a_unit_of_the_release()
    {
        using var folder = new TestFolder().Edit(Mechanisms, "{ \"one\": \"keeper\", \"other\": \"keepers\" }", "\"lamp\"");
        Assert.Equal("lamps", folder.Read().Noise!.Who.Forms["en"].Other);
    }

    [Fact]
    public void Periods_must_be_iso_8601() => Broken.Stops("bad-date", Csv, "Kiln Row", "2031-Q1",
        folder => folder.Edit(Release, "\"all\": \"All\" }", "\"all\": \"All\", \"period\": true }").Edit(Csv, "Quay", "2031-Q1").Edit(Csv, "Weir Lane", "2031-02")
            .Edit(Mechanisms, "\"cellsPerUnit\": 1", "\"cellsPerUnit\": 4").Edit(Mechanisms, "\"cellsPerUnit\": 2", "\"cellsPerUnit\": 4"));

    private static Table Table(TestFolder folder)
    {
        var read = folder.Read();
        Assert.Empty(read.Findings.Select(finding => $"{finding.Slug} {finding.At} {finding.Found}"));
        return read.Release!.Tables[0];
    }
}
