using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>Prose that cites what is not there, links where it may not, or was not understood.</summary>
public sealed class ProseCheckTests
{
    private const string Prose = "narrative/summary.md";
    private const string Citation = "[value and margin](figure:lamps/lit?street=All)";

    [Fact]
    public void Unknown_figure_is_told_the_nearest() => Broken.Stops("prose-citation", Prose, "[value and margin]", "write lit.",
        folder => folder.Edit(Prose, "lamps/lit", "lamps/litt"));

    [Fact]
    public void Citation_of_several_figures_lists_the_first() => Broken.Stops("prose-citation", Prose, "[value and margin]", "lamps/lit?street=Kiln%20Row",
        folder => folder.Edit(Prose, "?street=All", ""));

    [Fact]
    public void Link_with_a_space_shows_how_to_write_it() => Broken.Stops("prose-link", Prose, "](figure:", "<figure:",
        folder => folder.Edit(Prose, "street=All", "street=Kiln Row"));

    [Fact]
    public void Address_between_angle_brackets_may_hold_a_space()
    {
        using var broken = new Broken(folder => folder.Edit(Prose, "(figure:lamps/lit?street=All)", "(<figure:lamps/lit?street=Kiln Row>)"));
        Assert.Empty(broken.Review().Select(finding => $"{finding.Slug} {finding.At}"));
    }

    [Fact]
    public void Citation_in_code_is_left_alone()
    {
        using var broken = new Broken(folder => folder.Edit(Prose, Citation, "`[value](figure:no/such)`"));
        Assert.Empty(broken.Review());
    }

    [Fact]
    public void Unknown_chart_is_told_the_nearest() => Broken.Stops("prose-chart", Prose, "![Lamps lit", "write chart:by-street",
        folder => folder.Edit(Prose, "chart:by-street", "chart:by-stret"));

    [Fact]
    public void Chart_without_alternative_text_is_a_stop() => Broken.Stops("prose-alt", Prose, "![](chart", "what it shows",
        folder => folder.Edit(Prose, "![Lamps lit, by street]", "![]"));

    [Fact]
    public void Picture_from_elsewhere_is_a_stop() => Broken.Stops("prose-image", Prose, "![Lamps lit", "chart:ID",
        folder => folder.Edit(Prose, "chart:by-street", "https://example.org/lamps.png"));

    [Theory]
    [InlineData("javascript:alert(1)")]
    [InlineData("data:text/html,x")]
    [InlineData("//example.org/")]
    [InlineData("file:///etc/passwd")]
    public void Link_that_a_page_may_not_have_is_a_stop(string destination) => Broken.Stops("bad-link", Prose, "[here](", "https:",
        folder => folder.Edit(Prose, "lamps were lit.", $"lamps were lit, see [here]({destination})."));

    [Theory]
    [InlineData("https://example.org/")]
    [InlineData("mailto:lamps@office.example")]
    [InlineData("methods.html")]
    public void Link_that_a_page_may_have_passes(string destination)
    {
        using var broken = new Broken(folder => folder.Edit(Prose, "lamps were lit.", $"lamps were lit, see [here]({destination})."));
        Assert.Empty(broken.Review());
    }

    [Fact]
    public void Page_without_a_heading_is_a_stop() => Broken.StopsAt("prose-title", Prose, 1, 1, "# Summary", folder => folder.Edit(Prose, "# Summary", "Summary"));

    [Fact]
    public void Skipped_level_is_a_caution() => Broken.Cautions("prose-heading", Prose, "### Lamps", "begin it with ##",
        folder => folder.Edit(Prose, "In 2031", "### Lamps\n\nIn 2031"));

    [Fact]
    public void Html_is_a_caution() => Broken.Cautions("prose-html", Prose, "<b onclick=x>", "Markdown",
        folder => folder.Edit(Prose, "lamps were lit", "lamps <b onclick=x>were lit"));

    [Fact]
    public void Hidden_character_is_a_stop() => Broken.Stops("hidden-character", Prose, "\u202E", "take the character out",
        folder => folder.Edit(Prose, "lamps were lit", "lamps \u202Ewere lit"));

    [Theory]
    [InlineData("prose-html", "<b>")]
    [InlineData("prose-link", "[value](figure:lamps/lit?street=Kiln Row) ")]
    [InlineData("prose-citation", "[value](figure:lamps/unlit) ")]
    [InlineData("prose-disagrees", "[77 lamps](figure:lamps/lit?street=Quay) ")]
    [InlineData("hidden-character", "\u202E")]
    public void However_many_of_a_kind_stand_on_a_page_all_are_found(string slug, string written)
    {
        using var broken = new Broken(folder => folder.Edit(Prose, "lamps were lit", string.Concat(Enumerable.Repeat(written, 30))));
        Assert.Equal(30, broken.Review().Count(finding => finding.Slug == slug));
    }

    [Fact]
    public void Name_of_a_page_of_the_publication_is_taken() => Broken.Stops("prose-name", "release.json", "\"narrative/Budget.md\"", "rename the file",
        folder => folder.With("narrative/Budget.md", "# Budget\n").Edit("release.json", "{ \"file\": \"narrative/summary.md\" }", "{ \"file\": \"narrative/summary.md\" }, { \"file\": \"narrative/Budget.md\" }"));

    [Fact]
    public void Missing_prose_is_a_stop() => Broken.Stops("missing-file", "release.json", "\"narrative/summary.md\"", "put it there", folder => folder.Without(Prose));
}
