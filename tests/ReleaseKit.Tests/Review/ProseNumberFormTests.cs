using System.Text.RegularExpressions;
using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>
/// Numbers in the words of a citation as writers write them. In Ward 7 in 2031 there were 1,214 lamps lit (± 8) and −25 broken; in Ward 9 in 2032 there
/// were 1,234,567 lit and 40 broken (± 9); of the lit ones 7.04 in 100 were new.
/// </summary>
public sealed class ProseNumberFormTests
{
    private const string Prose = "narrative/summary.md";
    private const string Seven = "lamps/lit?ward=7";
    private const string Nine = "lamps/lit?ward=9";
    private const string BrokenInNine = "lamps/broken?ward=9";
    private const string New = "lamps/new?ward=7";

    [Theory]
    [InlineData(Nine, "1.2 million")]
    [InlineData(Nine, "about 1.23 million lamps")]
    [InlineData(Nine, "1.2m")]
    [InlineData(Nine, "1,235 thousand")]
    [InlineData(Nine, "1 234 567")]
    [InlineData(Nine, "one million two hundred thousand")]
    [InlineData(Seven, "1.2 thousand")]
    [InlineData(Seven, "1.2k")]
    [InlineData(Seven, "1 214 lamps")]
    [InlineData(Seven, "1\u2009214 lamps")]
    [InlineData(Seven, "1\u00A0214 lamps")]
    [InlineData(Seven, "1\u202F214 lamps")]
    [InlineData(Seven, "1,214 plus or minus 8")]
    [InlineData(Seven, "1,214, give or take 8")]
    [InlineData(Seven, "1,214 +/- 10")]
    [InlineData(Seven, "between 1,206 and 1,222")]
    [InlineData(Seven, "1,206–1,222")]
    [InlineData(Seven, "1,206-1,222")]
    [InlineData(Seven, "1,206 – 1,222")]
    [InlineData(Seven, "one thousand two hundred and fourteen")]
    [InlineData(Seven, "1,214 in one of two wards")]
    [InlineData(Seven, "nearly 1,220")]
    [InlineData(Seven, "between 1,100 and 1,300 lamps")]
    [InlineData(Seven, "somewhere between $1,205 and $1,225")]
    [InlineData(Nine, "between 1.1 and 1.3 million")]
    [InlineData(Seven, "almost 1,215")]
    [InlineData(Seven, "just over 1,210 lamps")]
    [InlineData(Seven, "over $1,200")]
    [InlineData(Nine, "more than 1.2 million")]
    [InlineData(Nine, "up to two million lamps")]
    [InlineData("lamps/broken?ward=7", "fewer than 10")]
    [InlineData(Seven, "a few hundred, several hundred, a third, two-thirds, half a million, the twenty-first, a five-year plan")]
    [InlineData(Seven, "1,214 on the 2nd floor")]
    [InlineData(BrokenInNine, "a share of one")]
    [InlineData(BrokenInNine, "forty")]
    public void Number_is_read_as_writers_write_it(string figure, string words) => Assert.Empty(Found(figure, words));

    [Theory]
    [InlineData("7 in each 100")]
    [InlineData("7 in 100")]
    [InlineData("7 of every 100 lamps")]
    [InlineData("seven in a hundred")]
    [InlineData("7%")]
    [InlineData("7 ± 0.6 in 100")]
    [InlineData("1 in 14")]
    [InlineData("7 lamps in every 100")]
    [InlineData("one in fourteen")]
    [InlineData("more than 6 in 100")]
    [InlineData("under 10%")]
    [InlineData("1 in 20 or more")]
    public void Hundred_of_a_share_belongs_to_its_form(string words) => Assert.Empty(Found(New, words));

    [Theory]
    [InlineData(Seven, "Ward 7")]
    [InlineData(Seven, "the 1,214 lamps of Ward 7 in 2031")]
    [InlineData(Seven, "1,214 (Table 1)")]
    [InlineData(Seven, "1,214 on 30 June, and so on 31 December 2030")]
    [InlineData(Seven, "1,214 ± 8, in 95 of 100 cases")]
    [InlineData(Seven, "1,214 in 12 streets")]
    [InlineData(Seven, "1,214 of 16–24 watts")]
    [InlineData(Seven, "1,214 of 16 to 24 watts")]
    public void Number_that_the_table_has_there_is_no_claim(string figure, string words) => Assert.Empty(Found(figure, words));

    [Theory]
    [InlineData(Nine, "1,234,567 million")]
    [InlineData(Nine, "1.3 million")]
    [InlineData(Nine, "1.2")]
    [InlineData(Nine, "1.2 billion")]
    [InlineData(Nine, "999,999,999,999,999,999,999,999 billion billion")]
    [InlineData(Seven, "1 215 lamps")]
    [InlineData(Seven, "13 may be lit")]
    [InlineData(New, "95 of 100")]
    [InlineData(Seven, "1,214k")]
    [InlineData(Seven, "1,214 plus or minus 7")]
    [InlineData(Seven, "1.214,5")]
    [InlineData(Seven, "between 1,100 and 1,200")]
    [InlineData(Seven, "1,100 to 1,300")]
    [InlineData(Nine, "between 1.3 and 1.4 million")]
    [InlineData(Nine, "between 1,300 and 1,400 thousand")]
    [InlineData(Seven, "7 lamps")]
    [InlineData(Seven, "7")]
    [InlineData(Seven, "Ward 6")]
    [InlineData(Seven, "2031 lamps")]
    [InlineData(Seven, "14 lamps below zero")]
    [InlineData(BrokenInNine, "0")]
    [InlineData(BrokenInNine, "–40")]
    [InlineData(BrokenInNine, "40 of 200")]
    [InlineData(New, "700 in 100")]
    [InlineData(New, "1 in 3")]
    [InlineData(New, "1 in 15")]
    [InlineData(New, "7 in 1,200")]
    public void Another_number_in_any_form_is_a_stop(string figure, string words) => Assert.Equal("prose-disagrees Stop", Said(figure, words));

    [Theory]
    [InlineData(Nine, "two million")]
    [InlineData(BrokenInNine, "fifty lamps")]
    [InlineData(BrokenInNine, "a hundred")]
    [InlineData(BrokenInNine, "thirteen")]
    [InlineData(BrokenInNine, "twenty-five thousand")]
    [InlineData(BrokenInNine, "one billion billion billion billion billion")]
    [InlineData(Seven, "the size of 7")]
    [InlineData(BrokenInNine, "31 lamps")]
    [InlineData(Seven, "between 1,100 and 1,220")]
    [InlineData(BrokenInNine, "with watts 16 or fewer")]
    [InlineData(BrokenInNine, "9 lamps")]
    public void Number_that_may_mean_something_else_is_a_caution(string figure, string words) => Assert.Equal("prose-may-disagree Caution", Said(figure, words));

    [Theory]
    [InlineData(Nine, "1 million")]
    [InlineData(Nine, "a million")]
    [InlineData(Seven, "about 1,000")]
    [InlineData(Seven, "1000")]
    public void Rounding_that_moves_the_figure_far_is_a_caution(string figure, string words) => Assert.Equal("prose-rounded-far Caution", Said(figure, words));

    [Theory]
    [InlineData("1.214,5 lamps", "1,214")]
    [InlineData("about 1,000", "1,214")]
    [InlineData("two thousand", "1,214")]
    public void Number_that_the_remedy_gives_settles_it(string words, string number)
    {
        Assert.Contains($"or {number} in the words", Assert.Single(Found(Seven, words)).Do, StringComparison.Ordinal);
        Assert.Empty(Found(Seven, number));
    }

    [Theory]
    [InlineData("million crowns", "12.3 million crowns")]
    [InlineData("million crowns", "12.3 million")]
    [InlineData("million crowns", "12,345 thousand crowns")]
    [InlineData("million crowns", "12.345")]
    [InlineData("metres", "12.3m")]
    [InlineData("million crowns", "over 10 million crowns")]
    [InlineData("million crowns", "fewer than 20,000 thousand crowns")]
    public void Scale_of_the_unit_is_understood(string unit, string words) => Assert.Empty(Found("lamps/new?ward=9", words, folder => Amount(folder, unit)));

    [Theory]
    [InlineData("million crowns", "12.3 billion crowns")]
    [InlineData("million crowns", "12.3 thousand crowns")]
    [InlineData("crowns", "12.3m")]
    public void Another_scale_than_that_of_the_unit_is_a_stop(string unit, string words) =>
        Assert.Equal("prose-disagrees", Assert.Single(Found("lamps/new?ward=9", words, folder => Amount(folder, unit))).Slug);

    [Theory]
    [InlineData("a loss of more than 10 crowns", "")]
    [InlineData("a loss of nearly 12.5 crowns", "")]
    [InlineData("fewer than 5 crowns", "prose-may-disagree")]
    [InlineData("more than 10 crowns", "prose-may-disagree")]
    [InlineData("a loss of more than 20 crowns", "prose-disagrees")]
    public void Bound_of_a_figure_below_zero_is_one_of_its_size(string words, string slug) => Assert.Equal(slug, string.Join(' ', Found("lamps/new?ward=9", words, folder =>
    {
        Amount(folder, "crowns");
        folder.Edit("tables/lamps.csv", "12.345", "-12.345").Edit("release.json", "\"lowest\": 0", "\"lowest\": -100");
    }).Select(finding => finding.Slug)));

    [Theory]
    [InlineData("more than 11,000 crowns")]
    [InlineData("under 13,000 crowns")]
    [InlineData("under 20")]
    public void Bound_in_an_unsaid_scale_is_a_caution(string words) => Assert.Equal(
        "prose-may-disagree", Assert.Single(Found("lamps/new?ward=9", words, folder => Amount(folder, "million crowns"))).Slug);

    [Theory]
    [InlineData("two million")]
    [InlineData("about 1,000")]
    [InlineData("more than 1,210")]
    public void Waiver_is_offered_once(string words) => Assert.Equal(1, Regex.Count(Assert.Single(Found(Seven, words)).Do, "signoff.json"));

    private static void Amount(TestFolder folder, string unit) => folder
        .Edit("release.json", "\"unit\": \"lamp\", \"kind\": \"share\"", $"\"unit\": \"{unit}\", \"kind\": \"amount\", \"lowest\": 0");

    private static string Said(string figure, string words) => string.Join(", ", Found(figure, words).Select(finding => $"{finding.Slug} {finding.Level}"));

    private static IReadOnlyList<Finding> Found(string figure, string words, Action<TestFolder>? change = null)
    {
        using var broken = new Broken(folder =>
        {
            Wards(folder);
            folder.With(Prose, $"# Summary\n\n[{words}](figure:{figure})\n");
            change?.Invoke(folder);
        });
        return [.. broken.Review().Where(finding => finding.Slug.StartsWith("prose-", StringComparison.Ordinal))];
    }

    private static void Wards(TestFolder folder) => folder
        .With("tables/lamps.csv", "ward,year,lit,broken,new\n7,2031,1214,-25,7.04\n9,2032,1234567,40,12.345\n")
        .Edit("release.json", "\"charts\": [ { \"id\": \"by-street\", \"title\": \"Lamps lit, by street\", \"figures\": \"lamps/lit\" } ]", "\"charts\": []")
        .Edit("release.json", "\"headlines\": [ \"lamps/lit?street=All\" ],", "")
        .Edit("release.json", "\"title\": \"Lamps, by street\",", "\"title\": \"Lamps in 12 streets\", \"universe\": \"Lamps of 16 to 24 watts\",")
        .Edit("release.json", "{ \"column\": \"street\", \"title\": \"Street\", \"all\": \"All\" }", "{ \"column\": \"ward\", \"title\": \"Ward\" }, { \"column\": \"year\", \"title\": \"Year\", \"period\": true }")
        .Edit("release.json", "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ", "")
        .Edit("release.json", "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ] }", "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ] },\n{ \"column\": \"new\", \"title\": \"New\", \"unit\": \"lamp\", \"kind\": \"share\", \"noise\": [ { \"mechanism\": \"lamps-new\" } ] }")
        .Edit("mechanisms.json", "\"mechanisms\": [", "\"mechanisms\": [ { \"id\": \"lamps-new\", \"law\": \"laplace\", \"scale\": 0.2, \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 0.1 } },");
}
