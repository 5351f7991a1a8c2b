using ReleaseKit.Pages;
using ReleaseKit.Pages.Home;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Pages;

/// <summary>"About" means rounded and nothing else: it stands before every number in sentences that was rounded for print, and before no other.</summary>
public sealed class AboutTests
{
    private static readonly SiteContext Context = PagesRelease.ContextOf(new SmallRelease()
        .Figures(
            SmallRelease.Measure(MeasureKind.Share) with { InOnes = true, Decimals = 1 },
            [new NoiseRule.FromMechanism(SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.01))), new NoiseRule.Exact(SmallRelease.Words("law"))],
            [0, 0, 1, 1], "0.5163", "0.516", "0.51341", "0.5")
        .Build());

    [Theory]
    [InlineData("It was [value](figure:A?row=r1) here.", "It was <a>about <data>51.6</data></a> here.")]
    [InlineData("It was [value and margin](figure:A?row=r1) here.", "It was <a>about <data>51.6</data>&#160;\u00b1\u00a03.1</a> here.")]
    [InlineData("It was [value](figure:A?row=r2) here.", "It was <a><data>51.6</data></a> here.")]
    [InlineData("It was [value](figure:A?row=r3) here.", "It was <a>about <data>51.3</data></a> here.")]
    [InlineData("It was [value](figure:A?row=r4) here.", "It was <a><data>50.0</data></a> here.")]
    [InlineData("It was **[value](figure:A?row=r1)** here.", "It was <strong><a>about <data>51.6</data></a></strong> here.")]
    [InlineData("It was about [value](figure:A?row=r1) here.", "It was about <a><data>51.6</data></a> here.")]
    [InlineData("So it was. [value](figure:A?row=r1) is more.", "So it was. <a>About <data>51.6</data></a> is more.")]
    [InlineData("[value](figure:A?row=r1) is more.", "<a>About <data>51.6</data></a> is more.")]
    public void Citation_of_a_number_rounded_for_print_says_about(string markdown, string expected) => Assert.Equal($"<p>{expected}</p>\n", Bare(markdown));

    [Fact]
    public void Citation_in_a_table_says_no_about() =>
        Assert.DoesNotContain("bout", Bare("| a | b |\n|---|---|\n| c | [value](figure:A?row=r1) |\n"), StringComparison.Ordinal);

    [Theory]
    [InlineData("r1", true)]
    [InlineData("r2", false)]
    public void Headline_whose_number_was_rounded_says_its_value_in_words(string row, bool isSaid)
    {
        var model = HeadlineModel.Of(Context, new Headline(Address("A?row=" + row), null, null), isLeading: true);
        Assert.Equal(isSaid, model["sentences"]!.ToString()!.Contains("about 51.6\u00a0households in each 100", StringComparison.Ordinal));
        Assert.Equal("households in each 100", model["unit"]);
    }

    private static string Address(string text) => text.Replace("A?", $"{Context.Release.Tables[0].Id}/figure?", StringComparison.Ordinal);

    private static string Bare(string markdown) => System.Text.RegularExpressions.Regex.Replace(
        new ProseComposer(Context, "more.html", 0).Compose(new ProsePage("narrative/more.md", "en", Address(markdown))).Html, "<(a|data) [^>]*>", "<$1>");
}
