using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>Numbers in the words of a citation: they are the figure, its margin or an end of its range, or rounded, or a stop. Lamps lit are 60 (± 14) in all; broken ones −1 in Weir Lane.</summary>
public sealed class ProseNumberTests
{
    private const string Prose = "narrative/summary.md";
    private const string Citation = "[value and margin](figure:lamps/lit?street=All)";

    [Theory]
    [InlineData("60 lamps")]
    [InlineData("all the lamps")]
    [InlineData("60")]
    [InlineData("60 ± 14")]
    [InlineData("**60**, with a margin of 14,")]
    [InlineData("46 to 74")]
    [InlineData("from 46&nbsp;lamps to 74.")]
    [InlineData("60.0")]
    public void Number_of_the_figure_passes(string words) => Passes($"[{words}](figure:lamps/lit?street=All)");

    [Theory]
    [InlineData("minus 1")]
    [InlineData("minus&nbsp;1 lamp")]
    [InlineData("−1")]
    [InlineData("-1")]
    [InlineData("–1")]
    [InlineData("1 below zero")]
    [InlineData("1 lamp below 0")]
    [InlineData("a lack of 1")]
    public void Figure_below_zero_is_written_with_its_sign(string words) => Passes($"[{words}](figure:lamps/broken?street=Weir%20Lane)");

    [Fact]
    public void Number_may_be_rounded_as_the_writer_rounds() => Passes("[about 30 lamps](figure:lamps/lit?street=Kiln%20Row)");

    [Theory]
    [InlineData("about 200 lamps", "200")]
    [InlineData("more than 74", "more than 74")]
    [InlineData("fewer than 46", "fewer than 46")]
    [InlineData("40 or fewer", "40 or fewer")]
    [InlineData("nearly 6,000", "nearly 6,000")]
    [InlineData("almost 45", "almost 45")]
    [InlineData("&gt; 74", "> 74")]
    [InlineData("≤40", "≤40")]
    [InlineData("no lamps", "no")]
    [InlineData("None", "None")]
    [InlineData("zero", "zero")]
    [InlineData("65 lamps", "65")]
    [InlineData("*6*5 lamps", "65")]
    [InlineData("6&#48;0 lamps", "600")]
    [InlineData("minus 60", "minus 60")]
    [InlineData("−60", "−60")]
    [InlineData("± 60", "± 60")]
    [InlineData("60,0", "60,0")]
    [InlineData("6,000", "6,000")]
    [InlineData("1.060,5", "1.060,5")]
    [InlineData("60 lamps in 2031", "2031")]
    [InlineData("60 ± 12", "± 12")]
    [InlineData("45-74", "45")]
    public void Another_number_is_a_stop_that_says_both(string words, string written)
    {
        using var broken = new Broken(folder => folder.Edit(Prose, Citation, $"[{words}](figure:lamps/lit?street=All)"));
        var stop = Assert.Single(broken.Review());
        Assert.Equal(("prose-disagrees", FindingLevel.Stop, FindingOwner.Writer, $"{Prose}:3:9"), (stop.Slug, stop.Level, stop.For, stop.At.ToString()));
        Assert.Contains($"say \"{written}\", but lamps/lit?street=All is 60 (± 14); its range is 46 to 74", stop.Found.Replace('\u00A0', ' '), StringComparison.Ordinal);
        Assert.StartsWith($"write {Citation}, or 60 in the words", stop.Do, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("more than 40 lamps")]
    [InlineData("at least 46")]
    [InlineData("no fewer than 46 lamps")]
    [InlineData("over forty")]
    [InlineData("45 lamps or more")]
    [InlineData("fewer than 75")]
    [InlineData("up to 74")]
    [InlineData("no more than 74")]
    [InlineData("74 or fewer")]
    [InlineData("nearly 65")]
    [InlineData("just over 50")]
    [InlineData("more than some 40")]
    [InlineData("at least about $40")]
    [InlineData("&gt; 40")]
    [InlineData("≤80 lamps")]
    [InlineData("60, up to 14 either way,")]
    [InlineData("no fewer lamps than 60")]
    public void Bound_that_the_whole_range_keeps_passes(string words) => Passes($"[{words}](figure:lamps/lit?street=All)");

    [Theory]
    [InlineData("more than 65")]
    [InlineData("more than 46")]
    [InlineData("at least 47")]
    [InlineData("under 74")]
    [InlineData("at most 73 lamps")]
    [InlineData("nearly 55")]
    [InlineData("just over 60")]
    public void Bound_within_the_range_is_a_caution_whose_remedy_settles_it(string words)
    {
        using var broken = new Broken(folder => folder.Edit(Prose, Citation, $"[{words}](figure:lamps/lit?street=All)"));
        var caution = Assert.Single(broken.Review());
        Assert.Equal(("prose-may-disagree", FindingLevel.Caution), (caution.Slug, caution.Level));
        Assert.StartsWith($"write at least 46 lamps or at most 74 lamps, or {Citation}", caution.Do, StringComparison.Ordinal);
        Passes("[at least 46 lamps](figure:lamps/lit?street=All), [at most 74 lamps](figure:lamps/lit?street=All)");
    }

    [Theory]
    [InlineData("nobody lit any")]
    [InlineData("no wonder")]
    public void Word_for_nothing_that_may_mean_something_else_is_a_caution(string words)
    {
        using var broken = new Broken(folder => folder.Edit(Prose, Citation, $"[{words}](figure:lamps/lit?street=All)"));
        Assert.Equal("prose-may-disagree Caution", string.Join(", ", broken.Review().Select(finding => $"{finding.Slug} {finding.Level}")));
    }

    [Theory]
    [InlineData("[1](figure:lamps/broken?street=Weir%20Lane) was broken. It fell.")]
    [InlineData("[1 lamp](figure:lamps/broken?street=Weir%20Lane) was broken.")]
    [InlineData("[up to 1](figure:lamps/broken?street=Weir%20Lane) was broken.")]
    public void Figure_below_zero_without_its_sign_is_a_caution_whose_remedy_settles_it(string text)
    {
        using var broken = new Broken(folder => folder.Edit(Prose, Citation, text));
        var caution = Assert.Single(broken.Review());
        Assert.Equal(("prose-may-disagree", FindingLevel.Caution), (caution.Slug, caution.Level));
        Passes("[minus 1](figure:lamps/broken?street=Weir%20Lane) was broken.");
    }

    [Theory]
    [InlineData("It fell by [1 lamp](figure:lamps/broken?street=Weir%20Lane).")]
    [InlineData("*[1](figure:lamps/broken?street=Weir%20Lane)* below zero.")]
    [InlineData("A [negative 1](figure:lamps/broken?street=Weir%20Lane).")]
    public void Sign_in_words_of_the_sentence_is_one(string text) => Passes(text);

    [Fact]
    public void Number_with_marks_of_another_language_is_told_those_of_its_own() => Broken.Stops("prose-disagrees", Prose, "[60,0", "or 60 in the words, with the marks of 1,234.5",
        folder => folder.Edit(Prose, Citation, "[60,0 lamps](figure:lamps/lit?street=All)"));

    [Fact]
    public void Every_number_that_disagrees_is_named() => Broken.Stops("prose-disagrees", Prose, "[65", "figure:total",
        folder => folder.Edit("release.json", "\"headlines\"", "\"short\": { \"total\": \"lamps/lit?street=All\" }, \"headlines\"")
            .Edit(Prose, Citation, "[65 of 2031 and 60](figure:total)"));

    [Theory]
    [InlineData("4")]
    [InlineData("12")]
    public void Sign_that_is_missing_is_a_stop(string words) => Broken.Stops("prose-disagrees", Prose, $"[{words}]", "or minus 1 in the words",
        folder => folder.Edit(Prose, Citation, $"[{words}](<figure:lamps/broken?street=Weir Lane>)"));

    [Fact]
    public void Address_with_a_space_is_pasted_between_brackets() => Broken.Stops("prose-disagrees", Prose, "[32", "[value and margin](<figure:lamps/lit?street=Kiln Row>)",
        folder => folder.Edit(Prose, Citation, "[32 lamps](<figure:lamps/lit?street=Kiln Row>)"));

    [Fact]
    public void Number_for_a_hidden_figure_is_a_stop() => Broken.Stops("prose-disagrees", Prose, "[20 lamps]", "write [value and margin](figure:lamps/lit?street=Quay); a number",
        folder => Hide(folder, "20 lamps"));

    [Fact]
    public void Number_for_a_hidden_figure_is_not_told_of_a_margin()
    {
        using var broken = new Broken(folder => Hide(folder, "20 lamps"));
        Assert.Equal("the words would be printed as they stand, with a number that is not published.", broken.Review().Single(finding => finding.Slug == "prose-disagrees").Why);
    }

    [Fact]
    public void No_number_can_be_said_of_a_hidden_figure()
    {
        using var broken = new Broken(folder => Hide(folder, "no number"));
        Assert.DoesNotContain(broken.Review(), finding => finding.Slug.StartsWith("prose-", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("In 2031, after 12 years, [so many](figure:lamps/lit?street=All)")]
    [InlineData("See [table 3](https://office.example/3)")]
    [InlineData("`[65](figure:lamps/lit?street=All)`")]
    public void Number_outside_a_citation_is_not_compared(string text) => Passes(text);

    private static void Hide(TestFolder folder, string words) => folder
        .With("tables/lamps.csv", "street,lit,broken,lit_status\nAll,40,9,\nKiln Row,31,4,\nQuay,,5,Q\nWeir Lane,9,-1,\n")
        .Edit("release.json", "\"figures\": [\n", "\"hidden\": { \"by\": \"public-rule\", \"inTotals\": false }, \"statuses\": { \"column\": \"*_status\" }, \"figures\": [\n")
        .Edit(Prose, Citation, $"[{words}](figure:lamps/lit?street=Quay)");

    private static void Passes(string text)
    {
        using var broken = new Broken(folder => folder.Edit(Prose, Citation, text));
        Assert.Empty(broken.Review().Select(finding => $"{finding.Slug} {finding.Found}"));
    }
}
