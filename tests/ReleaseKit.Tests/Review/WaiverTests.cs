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

    private static Finding Single(string slug, string waiver)
    {
        using var broken = new Broken(folder => folder.Edit(Html, "lamps were lit", "lamps <b>were lit").With("signoff.json", $$"""{ "waivers": [ {{waiver}} ] }"""));
        return Assert.Single(broken.Review(), finding => finding.Slug == slug);
    }
}
