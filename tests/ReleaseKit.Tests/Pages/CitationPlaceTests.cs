using ReleaseKit.Noise.Errors;
using ReleaseKit.Pages;
using ReleaseKit.Pages.Home;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Pages;

/// <summary>
/// "About" means rounded and nothing else: it stands before every number in sentences that was rounded for print, and before no other. A share says
/// that it counts in each 100, unless the writer does.
/// </summary>
public sealed class CitationPlaceTests
{
    private static readonly SiteContext Context = PagesRelease.ContextOf(new SmallRelease()
        .Figures(
            SmallRelease.Measure(MeasureKind.Share) with { InOnes = true, Decimals = 1 },
            [new NoiseRule.FromMechanism(SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.01))), new NoiseRule.Exact(SmallRelease.Words("law"))],
            [0, 0, 1, 1], "0.5163", "0.516", "0.51341", "0.5")
        .Build());

    [Theory]
    [InlineData("It was [value](figure:A?row=r1) of 100.", "It was <a>about <data>51.6</data></a> of 100.")]
    [InlineData("It was [value and margin](figure:A?row=r1) of 100.", "It was <a>about <data>51.6</data>&#160;\u00b1\u00a03.1</a> of 100.")]
    [InlineData("It was [value](figure:A?row=r2) of 100.", "It was <a><data>51.6</data></a> of 100.")]
    [InlineData("It was [value](figure:A?row=r3) of 100.", "It was <a>about <data>51.3</data></a> of 100.")]
    [InlineData("It was [value](figure:A?row=r4) of 100.", "It was <a><data>50.0</data></a> of 100.")]
    [InlineData("It was **[value](figure:A?row=r1)** of 100.", "It was <strong><a>about <data>51.6</data></a></strong> of 100.")]
    [InlineData("It was about [value](figure:A?row=r1) of 100.", "It was about <a><data>51.6</data></a> of 100.")]
    [InlineData("So it was. [value](figure:A?row=r1) of 100.", "So it was. <a>About <data>51.6</data></a> of 100.")]
    [InlineData("[value](figure:A?row=r1) of 100.", "<a>About <data>51.6</data></a> of 100.")]
    public void Citation_of_a_number_rounded_for_print_says_about(string markdown, string expected) => Assert.Equal($"<p>{expected}</p>\n", Bare(markdown));

    [Theory]
    [InlineData("It was [value](figure:A?row=r2) here.", "It was <a><data>51.6</data> in each 100</a> here.")]
    [InlineData("It was [value and margin](figure:A?row=r2) here.", "It was <a><data>51.6</data>&#160;\u00b1\u00a03.1 in each 100</a> here.")]
    [InlineData("It was [range](figure:A?row=r2) here.", "It was <a>48.5 to 54.7 in each 100</a> here.")]
    [InlineData("It is [margin](figure:A?row=r2) here.", "It is <a>\u00b1\u00a03.1</a> here.")]
    [InlineData("Of 2,100 homes it was [value](figure:A?row=r2).", "Of 2,100 homes it was <a><data>51.6</data> in each 100</a>.")]
    [InlineData("It was [value](figure:A?row=r2) per cent.", "It was <a><data>51.6</data></a> per cent.")]
    [InlineData("It was [a good half](figure:A?row=r2) here.", "It was <a>a good half</a> <span class=\"cite-margin\">(<data>51.6</data>&#160;\u00b1\u00a03.1 in each 100)</span> here.")]
    [InlineData("It was [over 40%](figure:A?row=r2) here.", "It was <a>over 40%</a> <span class=\"cite-margin\">(<data>51.6</data>&#160;\u00b1\u00a03.1)</span> here.")]
    [InlineData("In each hundred it was [value](figure:A?row=r2).", "In each hundred it was <a><data>51.6</data></a>.")]
    public void Citation_of_a_share_says_in_each_100_unless_the_writer_does(string markdown, string expected) => Assert.Equal($"<p>{expected}</p>\n", Bare(markdown));

    [Theory]
    [InlineData("It was [value](figure:A?row=r1) here.", "It was <a><data>12.3</data> per 1,000</a> here.")]
    [InlineData("Of 1,000 it was [value](figure:A?row=r1).", "Of 1,000 it was <a><data>12.3</data></a>.")]
    [InlineData("It is [margin](figure:A?row=r1) here.", "It is <a>\u00b1\u00a03.1</a> here.")]
    public void Citation_of_a_rate_says_what_it_is_for_unless_the_writer_does(string markdown, string expected)
    {
        var rate = SmallRelease.Measure(MeasureKind.Rate) with { Per = 1000, Decimals = 1 };
        Assert.Equal($"<p>{expected}</p>\n", Bare(markdown, new SmallRelease().Figures(rate, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 1)), "12.3")));
    }

    [Theory]
    [InlineData("It was [value and margin](figure:A?row=r1) here.", "It was <a><data>30</data> (0 to 40)</a> here.")]
    [InlineData("It was [so many](figure:A?row=r1) here.", "It was <a>so many</a> <span class=\"cite-margin\">(<data>30</data>, 0 to 40)</span> here.")]
    [InlineData("It was [30 homes](figure:A?row=r1) here.", "It was <a>30 homes</a> <span class=\"cite-margin\">(0 to 40)</span> here.")]
    public void Citation_with_an_uneven_margin_gives_the_range(string markdown, string expected) => Assert.Equal(
        $"<p>{expected}</p>\n",
        Bare(markdown, new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count), SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "30")));

    [Fact]
    public void Citation_in_a_table_is_the_number_alone() =>
        Assert.Contains("<a><data>51.6</data></a>", Bare("| a | b |\n|---|---|\n| c | [value](figure:A?row=r1) |\n"), StringComparison.Ordinal);

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

    private static string Bare(string markdown, SmallRelease release) => Bare(markdown, PagesRelease.ContextOf(release.Build()));

    private static string Bare(string markdown) => Bare(markdown, Context);

    private static string Bare(string markdown, SiteContext context) => System.Text.RegularExpressions.Regex.Replace(
        new ProseComposer(context, "more.html", 0).Compose(new ProsePage("narrative/more.md", "en", Address(markdown))).Html, "<(a|data) [^>]*>", "<$1>");
}
