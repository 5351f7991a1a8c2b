using System.Text.RegularExpressions;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class ProseComposerTests
{
    private const string Mill = "figure:late/late?district=South&ward=Mill";

    private const string HrefOfAll = "tables/late/index.html#late.all.all";

    [Theory]
    [InlineData("value", "1,240</data>")]
    [InlineData("margin", "±\u00A019")]
    [InlineData("value and margin", "1,240</data>&#160;±\u00A019")]
    [InlineData("Value and margin", "1,240</data>&#160;±\u00A019")]
    [InlineData("range", "1,221 to 1,259")]
    public void Citation_by_a_word_becomes_its_text_linked_to_the_figure(string word, string expected)
    {
        var html = Html($"[{word}](figure:all-late)");
        Assert.Contains(expected, html, StringComparison.Ordinal);
        Assert.Contains($"<a class=\"cite\" href=\"{HrefOfAll}\">", html, StringComparison.Ordinal);
    }

    [Fact]
    public void Citation_of_a_reading_gives_all_its_sentences()
    {
        var context = PagesRelease.ContextOf(PagesRelease.Make());
        var reading = context.Language.ReadingOf(context.Appraised.FigureAt("all-late"));
        var html = Html("[reading](figure:all-late)");
        Assert.All(reading.Sentences, sentence => Assert.Contains(sentence.Text, html, StringComparison.Ordinal));
    }

    [Fact]
    public void Citation_in_own_words_keeps_them_and_gives_the_figure_with_its_margin_at_the_first_mention_only() => Assert.Equal(
        $"<p><a href=\"{HrefOfAll}\" class=\"cite\">So many</a> <span class=\"cite-margin\">(<data value=\"1240\">1,240</data>&#160;±\u00A019)</span> and <a href=\"{HrefOfAll}\" class=\"cite\">again</a></p>\n",
        Html("[So many](figure:all-late) and [again](<figure:late/late?district=All&ward=All>)"));

    [Theory]
    [InlineData("1,240")]
    [InlineData("exactly 1,240 homes, more than 1,200")]
    public void Citation_that_says_the_figure_has_the_margin_alone_behind_it_at_the_first_mention(string words) => Assert.Equal(
        1, Regex.Count(Html($"[{words}](figure:all-late), [{words}](figure:all-late)"), "<span class=\"cite-margin\">\\(±\u00A019\\)</span>"));

    [Fact]
    public void Citation_that_says_the_figure_and_its_margin_has_nothing_behind_it() =>
        Assert.DoesNotContain("cite-margin", Html("[1,240 ± 19](figure:all-late)"), StringComparison.Ordinal);

    [Fact]
    public void Citation_without_a_number_of_an_exact_figure_has_nothing_behind_it() =>
        Assert.DoesNotContain("cite-margin", Html("[the cards](<figure:paid/paid?kind=Card>)"), StringComparison.Ordinal);

    [Fact]
    public void Citation_that_rounds_the_figure_has_the_figure_and_its_margin_behind_it() => Assert.Contains(
        "class=\"cite\">more than 1,200</a> <span class=\"cite-margin\">(<data value=\"1240\">1,240</data>&#160;±\u00A019)</span>",
        Html("[more than 1,200](figure:all-late)"), StringComparison.Ordinal);

    [Theory]
    [InlineData("1.2 thousand")]
    [InlineData("over a thousand")]
    [InlineData("about 1,000")]
    [InlineData("fewer than 2,000")]
    [InlineData("more than 1,230")]
    [InlineData("nearly 1,250")]
    public void Citation_that_rounds_the_figure_has_it_behind_at_every_mention(string words) => Assert.Equal(
        3, Regex.Count(Html($"[{words}](figure:all-late), [{words}](figure:all-late), [value](figure:all-late)"), "<data value=\"1240\">1,240</data>"));

    [Fact]
    public void Size_of_a_figure_below_zero_has_the_sign_behind_it() =>
        Assert.Contains("a lack of 4</a> <span class=\"cite-margin\">(<data value=\"-4\">minus\u00A04</data>", Html($"[a lack of 4](<{Mill}>)"), StringComparison.Ordinal);

    [Fact]
    public void Range_in_own_words_has_the_figure_behind_it() => Assert.Contains(
        "1,221 to 1,259</a> <span class=\"cite-margin\">(<data value=\"1240\">1,240</data>", Html("[1,221 to 1,259](figure:all-late)"), StringComparison.Ordinal);

    [Fact]
    public void Citation_in_own_words_after_a_generated_one_gives_no_margin_again() =>
        Assert.DoesNotContain("cite-margin", Html("[value and margin](figure:all-late), [so many](figure:all-late)"), StringComparison.Ordinal);

    [Fact]
    public void Citation_below_zero_says_minus() => Assert.Contains(">minus\u00A04</data>", Html($"[value](<{Mill}>)"), StringComparison.Ordinal);

    [Fact]
    public void Citation_of_an_exact_figure_says_so() =>
        Assert.Contains("777</data> (exact)", Html("[value and margin](<figure:paid/paid?kind=Card>)"), StringComparison.Ordinal);

    [Fact]
    public void Citation_of_a_hidden_figure_gives_its_status_in_words() =>
        Assert.Contains(PagesRelease.English.Text("figure.status.hidden"), Html("[value](<figure:paid/paid?kind=Other>)"), StringComparison.Ordinal);

    [Theory]
    [InlineData("javascript:alert(1)")]
    [InlineData("JavaScript:alert(1)")]
    [InlineData("java&#9;script:alert(1)")]
    [InlineData("&#1;javascript:alert(1)")]
    [InlineData("data:text/html,x")]
    [InlineData("vbscript:x")]
    [InlineData("file:///etc/passwd")]
    [InlineData("//elsewhere.example/")]
    [InlineData("/\\elsewhere.example/")]
    public void Link_that_leads_where_it_may_not_keeps_only_its_words(string destination) => Assert.Equal("<p>here</p>\n", Html($"[here](<{destination}>)"));

    [Theory]
    [InlineData("https://office.example/a", "https://office.example/a")]
    [InlineData("mailto:a@office.example", "mailto:a@office.example")]
    [InlineData("budget.html", "budget.html")]
    [InlineData("more.md", "more.html")]
    [InlineData("narrative/summary.md", "index.html")]
    public void Link_that_may_lead_there_does(string destination, string href) =>
        Assert.Equal($"<p><a href=\"{href}\">here</a></p>\n", Html($"[here]({destination})"));

    [Fact]
    public void Autolink_with_a_scheme_that_may_not_be_is_text() => Assert.Equal("<p>javascript:alert(1)</p>\n", Html("<javascript:alert(1)>"));

    [Fact]
    public void Raw_html_is_text() => Assert.Equal("<p>a &lt;b onclick=&quot;x()&quot;&gt;b&lt;/b&gt;</p>\n", Html("a <b onclick=\"x()\">b</b>"));

    [Fact]
    public void Image_from_elsewhere_is_its_words() => Assert.Equal("<p>A view</p>\n", Html("![A view](https://elsewhere.example/a.png)"));

    [Fact]
    public void Heading_first_is_the_title_and_the_others_get_slugs_no_two_alike()
    {
        var prose = Compose("# The *year*\n\n## Été & winter\n\n## Été & winter\n", deeper: 0);
        Assert.Equal("The year", prose.Title);
        Assert.Equal(["ete-and-winter", "ete-and-winter-2"], Ids(prose.Html));
    }

    [Fact]
    public void Heading_of_woven_prose_goes_down_one_level() =>
        Assert.StartsWith("<h3 id=\"a\">A</h3>", Compose("# T\n\n## A\n", deeper: 1).Html, StringComparison.Ordinal);

    [Fact]
    public void Table_has_a_region_of_its_own_heads_and_no_style()
    {
        var html = Html("| Quarter | Late |\n| --- | ---: |\n| First | [value](figure:all-late) |\n");
        Assert.Contains("<th scope=\"col\" class=\"r\">Late</th>", html, StringComparison.Ordinal);
        Assert.Contains("<th scope=\"row\">First</th><td class=\"r\"><a class=\"cite\"", html, StringComparison.Ordinal);
        Assert.Contains("role=\"region\" tabindex=\"0\"", html, StringComparison.Ordinal);
        Assert.DoesNotContain("style=", html, StringComparison.Ordinal);
    }

    private static string Html(string markdown) => Compose(markdown, deeper: 0).Html;

    private static ProseText Compose(string markdown, int deeper) =>
        new ProseComposer(PagesRelease.ContextOf(PagesRelease.Make()), "more.html", deeper).Compose(new ProsePage("narrative/more.md", "en", markdown));

    private static IEnumerable<string> Ids(string html) => html.Split("id=\"").Skip(1).Select(part => part[..part.IndexOf('"', StringComparison.Ordinal)]);
}
