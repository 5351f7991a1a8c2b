using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>Waivers let a few cautions stand and nothing else.</summary>
public sealed class WaiverTests
{
    private const string Html = "narrative/summary.md";

    [Fact]
    public void Waived_caution_is_a_note_that_says_by_whom_and_why()
    {
        var finding = Single("prose-html", """{ "finding": "prose-html", "reason": "It is a quotation.", "by": "Registrar", "on": "2032-03-01" }""");
        Assert.Equal((FindingLevel.Note, "Waived by Registrar on 2032-03-01: It is a quotation."), (finding.Level, finding.Found.Split('\n')[^1]));
    }

    [Theory]
    [InlineData("\"at\": \"narrative/summary.md\"", FindingLevel.Note)]
    [InlineData("\"at\": \"narrative/summary.md:3:63\"", FindingLevel.Note)]
    [InlineData("\"at\": \"narrative/other.md\"", FindingLevel.Caution)]
    [InlineData("\"until\": \"2032-03-16\"", FindingLevel.Note)]
    [InlineData("\"until\": \"2032-03-15\"", FindingLevel.Caution)]
    public void Waiver_holds_where_and_as_long_as_it_says(string part, FindingLevel level) =>
        Assert.Equal(level, Single("prose-html", $$"""{ "finding": "prose-html", "reason": "r", "by": "b", "on": "2032-03-01", {{part}} }""").Level);

    [Theory]
    [InlineData("\"until\": \"2032-03-15\"")]
    [InlineData("\"at\": \"narrative/other.md\"")]
    public void Waiver_without_effect_is_a_caution(string part) =>
        Assert.Equal(FindingLevel.Caution, Single("waiver-without-effect", $$"""{ "finding": "prose-html", "reason": "r", "by": "b", "on": "2032-03-01", {{part}} }""").Level);

    [Theory]
    [InlineData("spent-too-low")]
    [InlineData("authorised-exceeded")]
    [InlineData("no-rule")]
    [InlineData("undeclared-column")]
    [InlineData("off-grid")]
    [InlineData("hidden-has-value")]
    [InlineData("not-yet")]
    [InlineData("of no check")]
    public void Budget_margin_and_leak_findings_cannot_be_waived(string slug) => Broken.Stops("cannot-be-waived", "signoff.json", $"\"{slug}\"", "mend what the finding names",
        folder => folder.With("signoff.json", $$"""{ "waivers": [ { "finding": "{{slug}}", "reason": "r", "by": "b", "on": "2032-01-01" } ] }"""));

    [Fact]
    public void Finding_that_there_is_not_is_not_said_to_be_about_the_budget_and_what_can_be_waived_is_listed()
    {
        var found = Single("cannot-be-waived", """{ "finding": "nope", "reason": "r", "by": "b", "on": "2032-03-01" }""");
        Assert.Equal("\"nope\" is none of the findings that can be waived.", found.Found);
        Assert.Contains("these can: formula-cell, kind-not-given,", found.Why, StringComparison.Ordinal);
        Assert.Contains("write \"prose-html\"", Single("cannot-be-waived", """{ "finding": "prose-htm", "reason": "r", "by": "b", "on": "2032-03-01" }""").Do, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("reason", "\u2026", "Registrar", "write why")]
    [InlineData("by", "It is a quotation.", "...", "write the name")]
    [InlineData("by", "It is a quotation.", " \u2026 ", "write the name")]
    public void Waiver_with_the_dots_of_its_pattern_is_a_stop_and_has_no_effect(string key, string reason, string by, string remedy)
    {
        var waiver = $$"""{ "finding": "prose-html", "reason": "{{reason}}", "by": "{{by}}", "on": "2032-03-01" }""";
        var found = Single("waiver-not-filled-in", waiver);
        Assert.Equal((FindingLevel.Stop, "signoff.json"), (found.Level, found.At.File));
        Assert.Contains($"\"{key}\" of this waiver", found.Found, StringComparison.Ordinal);
        Assert.Contains(remedy, found.Do, StringComparison.Ordinal);
        Assert.Equal(16 + waiver.IndexOf($"\"{key}\": \"", StringComparison.Ordinal) + key.Length + 4, found.At.Column);
        Assert.Equal(FindingLevel.Caution, Single("prose-html", waiver).Level);
    }

    public static TheoryData<string, string, string, string> Waivable => new()
    {
        { "prose-html", Html, "lamps were lit", "lamps <b>were lit" },
        { "prose-heading", Html, "In 2031", "### Lamps\n\nIn 2031" },
        { "prose-heading", Html, "In 2031", "# Lamps\n\nIn 2031" },
        { "label-unused", "labels.csv", "", "column,value,en\nstreet,Moon Street,Moon Street\n" },
        { "formula-cell", "tables/lamps.csv", "Quay", "-Quay" },
        { "looks-like-total", "release.json", ", \"all\": \"All\" }", " }" },
        { "looks-like-period", "tables/lamps.csv", "Kiln Row,31,4\nQuay,20,5\nWeir Lane", "2029,31,4\n2030,20,5\n2031" },
        { "total-far-from-parts", "release.json", "\"figures\": [\n", "\"adds\": [ { \"figure\": \"broken\", \"over\": \"street\" } ], \"figures\": [\n" },
    };

    [Theory]
    [MemberData(nameof(Waivable))]
    public void Waiver_pasted_from_the_remedy_settles_it(string slug, string file, string from, string to)
    {
        void Damage(TestFolder folder)
        {
            _ = from.Length == 0 ? folder.With(file, to) : folder.Edit(file, from, to);
            if (slug == "total-far-from-parts")
                folder.Edit("tables/lamps.csv", "60,9\n", "60,900\n");
            if (slug == "looks-like-total")
                folder.Edit("release.json", "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ", "");
        }

        using var broken = new Broken(Damage);
        var found = Assert.Single(broken.Review(), finding => finding.Slug == slug);
        Assert.Equal(FindingLevel.Caution, found.Level);
        foreach (var at in new[] { found.At.ToString(), found.At.File, found.Address }.OfType<string>())
        {
            var pasted = found.Do[found.Do.IndexOf("{ \"waivers\"", StringComparison.Ordinal)..].Replace(found.Address ?? found.At.ToString(), at, StringComparison.Ordinal);
            pasted = pasted.Replace("\"\u2026\"", "\"Registrar\"", StringComparison.Ordinal);
            using var settled = new Broken(folder => { Damage(folder); folder.With("signoff.json", pasted); });
            Assert.DoesNotContain(settled.Review(), finding => finding.Slug == "waiver-without-effect" || finding is { For: FindingOwner.SignOff, Level: FindingLevel.Stop });
            Assert.Equal(FindingLevel.Note, Assert.Single(settled.Review(), finding => finding.Slug == slug).Level);
        }
    }

    private static Finding Single(string slug, string waiver)
    {
        using var broken = new Broken(folder => folder.Edit(Html, "lamps were lit", "lamps <b>were lit").With("signoff.json", $$"""{ "waivers": [ {{waiver}} ] }"""));
        return Assert.Single(broken.Review(), finding => finding.Slug == slug);
    }
}
