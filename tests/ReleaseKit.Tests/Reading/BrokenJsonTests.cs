using System.Text;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Folders whose JSON is broken, misspelt or hostile.</summary>
public sealed class BrokenJsonTests
{
    private const string Release = "release.json";
    private const string Mechanisms = "mechanisms.json";

    [Theory]
    [InlineData("\"epsilon\": 6.0, \"delta\": 1e-9, \"rho\": 5")]
    [InlineData("\"delta\": 1e-9, \"rho\": 5")]
    public void Limit_given_in_two_ways_is_a_stop(string limits) => Broken.Stops(
        "authorised-twice", "mechanisms.json", $"{{ {limits}", "keep the one that the office decided", folder => folder.Edit("mechanisms.json", "\"epsilon\": 6.0, \"delta\": 1e-9", limits));

    [Fact]
    public void Missing_comma_is_found_at_its_place() => Broken.Stops("json-broken", Release, "\"identifier\"", "a comma between two members",
        folder => folder.Edit(Release, "\"Lamps counted\",", "\"Lamps counted\""));

    [Fact]
    public void Text_after_the_end_is_found() => Broken.Stops("json-broken", Mechanisms, "extra", "a bracket for each bracket",
        folder => folder.With(Mechanisms, TestFolder.Mechanisms + "\nextra"));

    [Fact]
    public void Deep_nesting_is_refused_at_its_place()
    {
        using var folder = new TestFolder().With(Release, new string('[', 33) + new string(']', 33));
        Assert.Equal("release.json:1:33", folder.OnlyStop("json-broken").At.ToString());
    }

    [Fact]
    public void Deep_nesting_of_a_million_brackets_is_refused()
    {
        using var folder = new TestFolder().With(Release, new string('[', 1_000_000));
        Assert.Contains(folder.Read().Findings, finding => finding.Slug == "json-broken" && finding.At.Line == 1);
    }

    [Fact]
    public void Utf16_is_recognised() => Broken.Stops("json-encoding", Release, null, "UTF-8",
        folder => folder.With(Release, [.. Encoding.Unicode.GetPreamble(), .. Encoding.Unicode.GetBytes(TestFolder.Release)]).With("labels.csv", "column,value\n"));

    [Fact]
    public void Latin1_bytes_are_found_at_their_place()
    {
        using var folder = new TestFolder().With(Release, Encoding.Latin1.GetBytes(TestFolder.Release.Replace("Lamps counted", "L\u00E4mpchen", StringComparison.Ordinal)));
        Assert.Equal("release.json:2:14", folder.OnlyStop("json-encoding").At.ToString());
    }

    [Fact]
    public void Zero_byte_is_found() => Broken.Stops("json-broken", Release, "\0", "write the file again",
        folder => folder.Edit(Release, "Lamps counted", "Lamps\0counted"));

    [Fact]
    public void Half_a_surrogate_pair_is_found() => Broken.Stops("json-broken", Release, "\"\\ud800\"", "look at this place",
        folder => folder.Edit(Release, "\"Lamps counted\"", "\"\\ud800\""));

    [Fact]
    public void Comments_and_trailing_commas_are_allowed()
    {
        using var folder = new TestFolder().Edit(Release, "\"identifier\"", "// a comment\n /* and one */ \"identifier\"").Edit(Release, "\"figures\": \"lamps/lit\" } ]", "\"figures\": \"lamps/lit\", }, ],");
        Assert.Empty(folder.Read().Findings);
    }

    [Fact]
    public void Byte_order_mark_is_allowed()
    {
        using var folder = new TestFolder().With(Release, [0xEF, 0xBB, 0xBF, .. Encoding.UTF8.GetBytes(TestFolder.Release)]);
        Assert.Empty(folder.Read().Findings);
    }

    [Fact]
    public void Unknown_key_is_told_the_nearest() => Broken.Stops("unknown-key", Release, "\"headlinse\"", "write \"headlines\"",
        folder => folder.Edit(Release, "\"headlines\"", "\"headlinse\""));

    [Fact]
    public void Key_that_is_near_no_other_is_told_all() => Broken.Stops("unknown-key", Mechanisms, "\"colour\"", "Known here: unitOfPrivacy",
        folder => folder.Edit(Mechanisms, "\"accounting\"", "\"colour\": 1, \"accounting\""));

    [Fact]
    public void Doubled_key_is_found_at_the_second() => Broken.Stops("doubled-key", Release, "\"title\": \"Second\"", "keep one of them",
        folder => folder.Edit(Release, "\"identifier\"", "\"title\": \"Second\", \"identifier\""));

    [Fact]
    public void Missing_key_says_what_to_paste() => Broken.Stops("missing-key", Release, "{ \"name\": \"Office of Lamps\" }", "add \"contact\": \"figures@nopf.example\"",
        folder => folder.Edit(Release, ", \"contact\": \"lamps@office.example\"", ""));

    [Fact]
    public void Null_is_as_good_as_missing() => Broken.Stops("missing-key", Mechanisms, "{", "add \"neighbouring\": \"add-or-remove\"",
        folder => folder.Edit(Mechanisms, "\"neighbouring\": \"add-or-remove\"", "\"neighbouring\": null"));

    [Fact]
    public void Wrong_type_is_said_in_words() => Broken.Stops("wrong-type", Mechanisms, "\"4.0\"", "write \"sigma\": 4.0",
        folder => folder.Edit(Mechanisms, "\"sigma\": 4.0", "\"sigma\": \"4.0\""));

    [Theory]
    [InlineData("8,0", "write \"sigma\": 8.0")]
    [InlineData("1,240", "write a number without quotation marks, such as \"sigma\": 1")]
    [InlineData("eight", "write a number without quotation marks, such as \"sigma\": 1")]
    public void Text_in_the_place_of_a_number_is_told_the_number_only_if_it_is_sure(string text, string remedy) => Broken.Stops("wrong-type", Mechanisms, $"\"{text}\"", remedy,
        folder => folder.Edit(Mechanisms, "\"sigma\": 4.0", $"\"sigma\": \"{text}\""));

    [Fact]
    public void Unknown_value_is_told_the_nearest() => Broken.Stops("unknown-value", Mechanisms, "\"discrete-gausian\"", "write \"law\": \"discrete-gaussian\"",
        folder => folder.Edit(Mechanisms, "discrete-gaussian", "discrete-gausian"));

    [Fact]
    public void Huge_number_is_out_of_range() => Broken.Stops("parameter-out-of-range", Mechanisms, "1e999", "check the unit",
        folder => folder.Edit(Mechanisms, "\"sigma\": 4.0", "\"sigma\": 1e999"));

    [Fact]
    public void Bad_date_shows_the_form() => Broken.Stops("bad-date", Release, "\"16.3.2032\"", "\"2032-03-16T09:30:00+01:00\"",
        folder => folder.Edit(Release, "2032-03-16T09:30:00+01:00", "16.3.2032"));

    [Fact]
    public void Moment_without_its_distance_from_utc_is_a_stop() => Broken.Stops("bad-date", Release, "\"2032-03-16T09:30:00\"", "+01:00",
        folder => folder.Edit(Release, "2032-03-16T09:30:00+01:00", "2032-03-16T09:30:00"));

    [Fact]
    public void Script_link_is_refused() => Broken.Stops("bad-link", Release, "\"javascript:alert(1)\"", "https://",
        folder => folder.Edit(Release, "https://creativecommons.org/licenses/by/4.0/", "javascript:alert(1)"));

    [Fact]
    public void Direction_override_in_a_title_is_found() => Broken.Stops("hidden-character", Release, "\"Lamps \u202Edetnuoc\"", "take the character out",
        folder => folder.Edit(Release, "Lamps counted", "Lamps \u202Edetnuoc"));

    [Fact]
    public void Text_in_another_language_alone_is_missing() => Broken.Stops("text-missing", Release, "{ \"fr\": \"Lampes\" }", "add \"en\"",
        folder => folder.Edit(Release, "\"Lamps counted\"", "{ \"fr\": \"Lampes\" }"));

    [Fact]
    public void Pale_accent_is_a_stop() => Broken.Stops("accent", Release, "\"#F0A6CB\"", "darker",
        folder => folder.Edit(Release, "\"units\"", "\"look\": { \"accent\": \"#F0A6CB\" }, \"units\""));

    [Fact]
    public void Coverages_on_one_side_are_a_stop() => Broken.Stops("coverage-also", Release, "[0.5, 0.9]", "\"also\": [0.5, 0.99]",
        folder => folder.Edit(Release, "\"units\"", "\"coverage\": { \"also\": [0.5, 0.9] }, \"units\""));

    [Fact]
    public void Waiver_of_a_missing_margin_is_a_stop() => Broken.Stops("cannot-be-waived", "signoff.json", "\"no-rule\"", "take the waiver out",
        folder => folder.With("signoff.json", """{ "waivers": [ { "finding": "no-rule", "reason": "r", "by": "b", "on": "2032-01-01" } ] }"""));
}
