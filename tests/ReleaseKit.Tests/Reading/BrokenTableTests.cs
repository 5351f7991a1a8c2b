using System.Text;
using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Folders whose tables are exported wrong, do not fit what is said of them, or are hostile.</summary>
public sealed class BrokenTableTests
{
    private const string Csv = "tables/lamps.csv";
    private const string Release = "release.json";

    [Fact]
    public void Semicolons_are_recognised() => Broken.Stops("csv-separator", Csv, "street", "comma delimited",
        folder => folder.With(Csv, TestFolder.Table.Replace(',', ';')));

    [Fact]
    public void Tabs_are_recognised() => Broken.Stops("csv-separator", Csv, "street", "comma delimited",
        folder => folder.With(Csv, TestFolder.Table.Replace(',', '\t')));

    [Fact]
    public void Decimal_commas_are_recognised() => Broken.Stops("csv-decimal-comma", Csv, "\"31,5\"", "a point as decimal sign",
        folder => folder.Edit(Csv, "Kiln Row,31,", "Kiln Row,\"31,5\",").Edit(Csv, "All,60,", "All,29,"));

    [Theory]
    [InlineData("\"1,031\"")]
    [InlineData("1 031")]
    [InlineData("1'031")]
    [InlineData("1\u202F031")]
    public void Thousands_marks_are_recognised(string digits) => Broken.Stops("csv-thousands", Csv, digits, "export bare digits",
        folder => folder.Edit(Csv, "Kiln Row,31,", $"Kiln Row,{digits},").Edit(Csv, "All,60,", "All,29,"));

    [Theory]
    [InlineData("3.1e1", "all digits")]
    [InlineData("+31", "without it")]
    [InlineData("\u221231", "hyphen")]
    [InlineData("31%", "share")]
    [InlineData("NaN", "\"statuses\": { \"marks\": { \"NaN\": \"O\" } }")]
    [InlineData("many", "declare the mark: \"statuses\": { \"marks\": { \"many\": \"O\" } }")]
    [InlineData("#REF!", "mend the formula")]
    [InlineData("#N/A", "mend the formula")]
    [InlineData("a\\b", "leave the cell empty if there is none.")]
    public void Other_ways_to_write_a_number_are_named(string text, string remedy) => Broken.Stops("csv-number", Csv, text, remedy,
        folder => folder.Edit(Csv, "Kiln Row,31,", $"Kiln Row,{text},").Edit(Csv, "All,60,", "All,29,"));

    [Theory]
    [InlineData("NaN", "NaN")]
    [InlineData("n/a", "n/a")]
    [InlineData("many", "many")]
    [InlineData("#REF!", "")]
    public void Remedy_of_a_mark_settles_it(string text, string settled)
    {
        using var broken = new Broken(folder => folder.Edit(Csv, "Quay,20,5", $"Quay,20,{text}"));
        var remedy = Assert.Single(broken.Review(), finding => finding.Slug == "csv-number").Do;
        var marks = settled.Length == 0 ? "" : remedy[remedy.IndexOf("\"statuses\"", StringComparison.Ordinal)..(remedy.IndexOf("} }", StringComparison.Ordinal) + 3)] + ", ";
        using var mended = new Broken(folder => folder.Edit(Csv, "Quay,20,5", $"Quay,20,{settled}").Edit(Release, "\"figures\": [\n", marks + "\"figures\": [\n"));
        Assert.DoesNotContain(mended.Review(), finding => finding.Level == FindingLevel.Stop);
    }

    [Theory]
    [InlineData("\"1,100\"", "bare digits: 1100.")]
    [InlineData("1 031 500", "bare digits: 1031500.")]
    [InlineData("\"1.240,5\"", "decimal sign: 1240.5.")]
    [InlineData("\"1,5\"", "decimal sign: 1.5.")]
    [InlineData("1e3", "all digits: 1000.")]
    [InlineData("1.25e1", "all digits: 12.5.")]
    [InlineData("+31", "without it: 31.")]
    [InlineData("\u22123", "keyboard: -3.")]
    public void Remedy_shows_the_number_of_that_cell(string text, string remedy)
    {
        using var folder = new TestFolder().Edit(Csv, "Kiln Row,31,", $"Kiln Row,{text},");
        Assert.Contains(folder.Read().Findings, finding => finding.Slug.StartsWith("csv-", StringComparison.Ordinal) && finding.Do.Contains(remedy, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("\"stub\": [ { \"column\": \"street\", \"title\": \"Street\", \"all\": \"All\" } ]", "\"stub\": []", "stub")]
    [InlineData("\"figures\": [\n", "\"figures\": [], \"notes\": [\n", "figures")]
    public void Table_without_rows_or_figures_is_a_stop(string from, string to, string key)
    {
        using var folder = new TestFolder().Edit(Release, from, to);
        var finding = Assert.Single(folder.Read().Findings, finding => finding.Slug == "empty-list");
        Assert.Equal(FindingLevel.Stop, finding.Level);
        Assert.Contains($"name at least one: \"{key}\": [", finding.Do, StringComparison.Ordinal);
    }

    [Fact]
    public void Too_many_digits_are_a_stop() => Broken.Stops("csv-overflow", Csv, "1234567890123456789", "larger unit",
        folder => folder.Edit(Csv, "Kiln Row,31,4", "Kiln Row,31,1234567890123456789"));

    [Fact]
    public void More_digits_than_a_margin_is_worked_out_for_are_a_stop() => Broken.StopsAt("csv-overflow", Csv, 3, 13, "larger unit",
        folder => folder.Edit(Csv, "Kiln Row,31,4", "Kiln Row,31,1000000000000000"));

    [Fact]
    public void More_digits_after_the_multiplier_are_a_stop()
    {
        using var folder = new TestFolder().Edit(Csv, "Kiln Row,31,4", "Kiln Row,31,1000000000000")
            .Edit(Release, "\"title\": \"Lamps broken\",", "\"title\": \"Lamps broken\", \"multiplier\": 1000,");
        var finding = Assert.Single(folder.Read().Findings, finding => finding.Slug == "csv-overflow");
        Assert.Equal((FindingLevel.Stop, 3), (finding.Level, finding.At.Line));
    }

    [Fact]
    public void Fifteen_digits_are_no_fault()
    {
        using var folder = new TestFolder().Edit(Csv, "Kiln Row,31,4", "Kiln Row,31,999999999999999");
        Assert.DoesNotContain(folder.Read().Findings, finding => finding.Slug == "csv-overflow");
    }

    [Fact]
    public void Utf16_is_recognised() => Broken.Stops("csv-encoding", Csv, null, "iconv -f UTF-16",
        folder => folder.With(Csv, [.. Encoding.Unicode.GetPreamble(), .. Encoding.Unicode.GetBytes(TestFolder.Table)]));

    [Fact]
    public void Utf16_without_a_mark_is_recognised() => Broken.Stops("csv-encoding", Csv, null, "iconv -f UTF-16",
        folder => folder.With(Csv, Encoding.Unicode.GetBytes(TestFolder.Table)));

    [Fact]
    public void Windows_1252_is_recognised_at_its_line() => Broken.StopsAt("csv-encoding", Csv, 3, 2, "WINDOWS-1252",
        folder => folder.With(Csv, Encoding.Latin1.GetBytes(TestFolder.Table.Replace("Kiln", "K\u00EDln", StringComparison.Ordinal))));

    [Fact]
    public void Zero_byte_is_found_at_its_line() => Broken.StopsAt("csv-nul", Csv, 4, 3, "export it again",
        folder => folder.Edit(Csv, "Quay", "Qu\0y"));

    [Fact]
    public void Byte_order_mark_is_allowed()
    {
        using var folder = new TestFolder().With(Csv, [0xEF, 0xBB, 0xBF, .. Encoding.UTF8.GetBytes(TestFolder.Table)]);
        Assert.Empty(folder.Read().Findings);
    }

    [Fact]
    public void Windows_line_ends_are_allowed()
    {
        using var folder = new TestFolder().With(Csv, Encoding.UTF8.GetBytes(TestFolder.Table.ReplaceLineEndings("\r\n")));
        Assert.Empty(folder.Read().Findings);
    }

    [Fact]
    public void Ragged_row_is_found_at_its_line() => Broken.StopsAt("csv-ragged", Csv, 3, 1, "between double quotes",
        folder => folder.Edit(Csv, "Kiln Row,31,4", "Kiln Row, Upper,31,4"));

    [Theory]
    [InlineData("Kiln \"Old\" Row,31,4", 3, 6)]
    [InlineData("\"Kiln\" Row,31,4", 3, 8)]
    [InlineData("\"Kiln\nRow\"s,31,4", 4, 5)]
    [InlineData("\"Kiln \"\"Old\"\"\nRow\", 3\"1,4", 4, 8)]
    public void Quote_is_found_where_it_goes_wrong(string row, int line, int column)
    {
        using var folder = new TestFolder().Edit(Csv, "Kiln Row,31,4", row);
        Assert.Equal(new ReleaseKit.Review.Place(Csv, line, column), Assert.Single(folder.Read().Findings, finding => finding.Slug == "csv-quotes").At);
    }

    [Fact]
    public void Quote_that_never_closes_is_found() => Broken.StopsAt("csv-quotes", Csv, 5, 1, "twice",
        folder => folder.Edit(Csv, "Weir Lane,9,-1", "\"Weir Lane,9,-1"));

    [Fact]
    public void Empty_file_is_a_stop() => Broken.Stops("csv-empty", Csv, null, "a header row", folder => folder.With(Csv, ""));

    [Fact]
    public void Header_alone_is_a_stop() => Broken.StopsAt("csv-empty", Csv, 1, 1, "one row a line", folder => folder.With(Csv, "street,lit,broken\n"));

    [Fact]
    public void Missing_file_is_a_stop() => Broken.Stops("missing-file", Release, "\"tables/lamps.csv\"", "put it there", folder => folder.Without(Csv));

    [Fact]
    public void Other_capitals_are_told() => Broken.Stops("missing-file", Release, "\"Tables/lamps.csv\"", "\"tables\"",
        folder => folder.Edit(Release, "tables/lamps.csv", "Tables/lamps.csv"));

    [Fact]
    public void Missing_column_is_told_the_nearest() => Broken.Stops("missing-column", Release, "\"broken\"", "write \"brokn\"",
        folder => folder.Edit(Csv, "street,lit,broken", "street,lit,brokn").Edit(Release, "\"figures\": [\n", "\"columns\": { \"brokn\": { \"from\": \"public\" } }, \"figures\": [\n"));

    [Fact]
    public void Undeclared_column_is_a_stop() => Broken.Stops("undeclared-column", Csv, "raw", "remove it from the CSV",
        folder => folder.With(Csv, "street,lit,broken,raw\nAll,60,9,61\nKiln Row,31,4,30\nQuay,20,5,21\nWeir Lane,9,-1,10\n"));

    [Theory]
    [InlineData("\"street\",lit,broken,raw", 1, 21)]
    [InlineData("street,lit,broken,\"in, out\",raw", 1, 29)]
    [InlineData("street,lit,broken,\"\u00E5 \"\"in\"\"\",raw", 1, 30)]
    public void Undeclared_column_after_quoted_names_is_found_where_it_stands(string names, int line, int column)
    {
        using var folder = new TestFolder().With(Csv, names + "\nAll,60,9,6,6\n");
        Assert.Equal(new ReleaseKit.Review.Place(Csv, line, column), folder.Read().Findings.Last(finding => finding.Slug == "undeclared-column").At);
    }

    [Fact]
    public void Twin_columns_are_a_stop() => Broken.StopsAt("csv-header", Csv, 1, 12, "rename or remove",
        folder => folder.Edit(Csv, "street,lit,broken", "street,lit,lit"));

    [Fact]
    public void All_that_is_wrong_with_names_of_columns_is_found_at_once()
    {
        using var folder = new TestFolder().Edit(Csv, "street,lit,broken", "street,,broken,,broken");
        Assert.Equal([8, 16, 17], folder.Read().Findings.Where(finding => finding.Slug == "csv-header").Select(finding => finding.At.Column));
    }

    [Fact]
    public void Doubled_row_is_found_at_the_second() => Broken.StopsAt("doubled-row", Csv, 6, 1, "remove one of them",
        folder => folder.With(Csv, TestFolder.Table + "Kiln Row,0,4\n"));

    [Fact]
    public void Broken_count_is_a_stop() => Broken.Stops("count-not-whole", Csv, "4.5", "estimate", folder => folder.Edit(Csv, "31,4", "31,4.5"));

    [Fact]
    public void Hidden_value_that_is_there_is_a_stop() => Broken.Stops("hidden-has-value", Csv, "4,Q", "empty the cell",
        folder => folder.With(Csv, "street,lit,broken,broken_status\nAll,60,9,\nKiln Row,31,4,Q\nQuay,20,5,\nWeir Lane,9,-1,\n")
            .Edit(Release, "\"figures\": [\n", "\"statuses\": { \"column\": \"*_status\" }, \"figures\": [\n"));

    [Fact]
    public void Unknown_status_is_a_stop() => Broken.Stops("unknown-status", Csv, "??", "\"marks\"",
        folder => folder.With(Csv, "street,lit,broken,broken_status\nAll,60,9,\nKiln Row,31,4,??\nQuay,20,5,\nWeir Lane,9,-1,\n")
            .Edit(Release, "\"figures\": [\n", "\"statuses\": { \"column\": \"*_status\" }, \"figures\": [\n"));

    [Fact]
    public void Total_that_is_not_the_sum_names_the_gap()
    {
        using var broken = new Broken(folder => folder.Edit(Csv, "All,60,", "All,63,"));
        var finding = Assert.Single(broken.Review(), finding => finding.Slug == "sum-differs");
        Assert.Equal(("tables/lamps.csv:2:5", "lamps/lit?street=All is 63, but its parts over \"street\" add up to 60: a gap of 3."), (finding.At.ToString(), finding.Found));
    }

    [Fact]
    public void Total_heading_that_is_not_there_is_a_stop() => Broken.Stops("total-missing", Release, "\"street\", \"title\": \"Street\"", "\"all\": \"All\"",
        folder => folder.Edit(Release, "\"all\": \"All\"", "\"all\": \"all\"").Edit(Release, "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ", ""));

    [Fact]
    public void Figure_without_a_rule_is_a_stop() => Broken.StopsAt("no-rule", Csv, 2, 8, "\"mechanism\"",
        folder => folder.Edit(Release, "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "\"noise\": [ { \"where\": { \"street\": \"Quay\" }, \"mechanism\": \"lamps-broken\" }, { \"where\": { \"street\": \"Kiln Row\" }, \"mechanism\": \"lamps-broken\" }, { \"where\": { \"street\": \"Weir Lane\" }, \"mechanism\": \"lamps-broken\" } ]"));

    [Fact]
    public void Measure_without_noise_is_a_stop() => Broken.Stops("no-rule", Release, "\"broken\"", "under \"covers\"",
        folder => folder.Edit(Release, ", \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", ""));

    [Fact]
    public void Condition_that_nothing_meets_is_a_stop() => Broken.Stops("unknown-label", Release, "{ \"street\": \"Quai\" }", "write \"Quay\"",
        folder => folder.Edit(Release, "[ { \"mechanism\": \"lamps-broken\" } ]", "[ { \"where\": { \"street\": \"Quai\" }, \"mechanism\": \"lamps-broken\" }, { \"mechanism\": \"lamps-broken\" } ]"));

    [Fact]
    public void Rule_with_two_ends_is_a_stop() => Broken.Stops("rule-unclear", Release, "{ \"mechanism\": \"lamps-broken\", \"public\"", "exactly one of",
        folder => folder.Edit(Release, "{ \"mechanism\": \"lamps-broken\" }", "{ \"mechanism\": \"lamps-broken\", \"public\": \"list\" }"));

    [Fact]
    public void Unknown_mechanism_is_told_the_nearest() => Broken.Stops("unknown-mechanism", Release, "\"lamp-broken\"", "write \"lamps-broken\"",
        folder => folder.Edit(Release, "{ \"mechanism\": \"lamps-broken\" }", "{ \"mechanism\": \"lamp-broken\" }"));

    [Fact]
    public void Scale_that_is_not_positive_is_found_at_its_line() => Broken.StopsAt("scale-not-positive", Csv, 4, 11, "drawn with",
        folder => folder.With(Csv, "street,lit,broken,scale\nAll,60,9,3\nKiln Row,31,4,3\nQuay,20,5,0\nWeir Lane,9,-1,3\n")
            .Edit(Release, "\"figures\": [\n", "\"columns\": { \"scale\": { \"from\": \"public\" } }, \"figures\": [\n")
            .Edit("mechanisms.json", "\"scale\": 3.0", "\"scale\": { \"column\": \"scale\" }"));

    [Fact]
    public void Scale_column_that_is_not_there_is_a_stop()
    {
        using var folder = new TestFolder().Edit("mechanisms.json", "\"scale\": 3.0", "\"scale\": { \"column\": \"noise_scale\" }");
        var finding = folder.OnlyStop("missing-column");
        Assert.Equal(("mechanisms.json:8:65", true), (finding.At.ToString(), finding.Do.StartsWith("add the column", StringComparison.Ordinal)));
    }

    [Fact]
    public void Rules_beside_covers_are_a_stop() => Broken.Stops("rules-and-covers", "mechanisms.json", "\"lamps/broken\"", "keep one of them",
        folder => folder.Edit("mechanisms.json", "\"scale\": 3.0", "\"scale\": 3.0, \"covers\": [\"lamps/broken\"]"));

    [Fact]
    public void Long_label_is_a_stop() => Broken.Stops("text-too-long", Csv, "xxxxxxxxxx", "shorten it",
        folder => folder.Edit(Csv, "Kiln Row", new string('x', 10_000)));

    [Fact]
    public void Direction_override_in_a_label_is_found() => Broken.Stops("hidden-character", Csv, "Kiln \u202EwoR", "take the character out",
        folder => folder.Edit(Csv, "Kiln Row", "Kiln \u202EwoR"));

    [Theory]
    [InlineData("=HYPERLINK(0)")]
    [InlineData("@SUM(A1)")]
    [InlineData("-2+3 Row")]
    public void Formula_cell_is_a_caution(string label) => Broken.Cautions("formula-cell", Csv, label, "begin with a letter or digit",
        folder => folder.Edit(Csv, "Kiln Row", label));

    [Fact]
    public void Script_in_a_label_is_text_and_no_more()
    {
        using var folder = new TestFolder().Edit(Csv, "Kiln Row", "<script>alert(1)</script>");
        var read = folder.Read();
        Assert.Equal(("<script>alert(1)</script>", "script-alert-1-script"), (read.Release!.Tables[0].Stub[0].Labels[1].Value, read.Release.Tables[0].Stub[0].Labels[1].Slug));
        Assert.Empty(read.Findings);
    }

    [Fact]
    public void Twin_names_ask_for_an_id() => Broken.Stops("slug-twins", Csv, "Kiln-Row", "street,Kiln-Row,kiln-row-2",
        folder => folder.Edit(Csv, "Quay", "Kiln-Row"));

    [Fact]
    public void Twin_names_with_an_id_are_told_apart()
    {
        using var folder = new TestFolder().Edit(Csv, "Quay", "Kiln-Row").With("labels.csv", "column,value,id\nstreet,Kiln-Row,kiln-row-2\n");
        Assert.Equal(["all", "kiln-row", "kiln-row-2", "weir-lane"], folder.Read().Release!.Tables[0].Stub[0].Labels.Select(label => label.Slug));
    }

    [Fact]
    public void Name_without_latin_letters_asks_for_an_id() => Broken.Stops("slug-empty", Csv, "\u8857\u9053", "labels.csv",
        folder => folder.Edit(Csv, "Quay", "\u8857\u9053"));
}
