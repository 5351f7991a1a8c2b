using System.Globalization;
using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Leaks;

/// <summary>Broken lamps: "All" and its parts under one mechanism, discrete Laplace of scale 3, which is declared to be noise of its own in every row.</summary>
public sealed class TotalGapTests
{
    private const string Adds = "\"adds\": [ { \"figure\": \"broken\", \"over\": \"street\" } ], \"figures\": [\n";

    [Fact]
    public void Total_farther_from_its_parts_than_noise_reaches_is_a_caution() => Broken.Cautions(
        "total-far-from-parts", "tables/lamps.csv", "9000", "take \"adds\" out", folder => folder.Edit("tables/lamps.csv", "60,9\n", "60,9000\n").Edit("release.json", "\"figures\": [\n", Adds));

    [Fact]
    public void Without_adds_it_is_a_note()
    {
        using var broken = new Broken(folder => folder.Edit("tables/lamps.csv", "60,9\n", "60,9000\n"));
        Assert.Equal(FindingLevel.Note, Assert.Single(broken.Review(), finding => finding.Slug == "total-far-from-parts").Level);
    }

    // Four draws of scale 3, by convolution: P(|S| >= 81) = 1.2e-9, P(|S| >= 82) = 8.9e-10. The parts add up to 8.
    [Theory]
    [InlineData("89", false)]
    [InlineData("90", true)]
    [InlineData("-74", true)]
    public void Gap_is_held_against_the_law_of_all_draws_together(string total, bool isFound)
    {
        using var broken = new Broken(folder => folder.Edit("tables/lamps.csv", "60,9\n", $"60,{total}\n"));
        var found = broken.Review().Where(finding => finding.Slug == "total-far-from-parts").ToList();
        Assert.Equal(isFound ? 1 : 0, found.Count);
        Assert.All(found, finding => Assert.Contains("is at most 1 in 1100 million.", finding.Found, StringComparison.Ordinal));
    }

    // Four draws of scale 3 add up to just 0 with a chance near 1 / sqrt(2 pi 70) = 0.048 (variance 2q / (1 - q)^2 = 17.8 each): a little more, as
    // Laplace noise is more peaked. Squared 0.003, to the third 1.3e-4, to the fifth 3.5e-7.
    [Theory]
    [InlineData(2, null)]
    [InlineData(3, FindingLevel.Caution)]
    [InlineData(6, FindingLevel.Stop)]
    public void Totals_that_are_all_the_sum_are_found_where_chance_does_not_explain_it(int years, FindingLevel? level) =>
        Assert.Equal(level, LevelOf(years, year => 3 * year + 6));

    [Fact]
    public void One_total_with_a_gap_shows_that_there_is_noise() => Assert.Null(LevelOf(12, year => 3 * year + (year == 5 ? 7 : 6)));

    [Fact]
    public void Totals_of_which_nothing_is_published_but_a_floor_are_not_asked() => Assert.Null(LevelOf(12, _ => 0, _ => 0, "\"scale\": 3.0, \"afterwards\": [ { \"notBelow\": 0 } ]"));

    private static FindingLevel? LevelOf(int years, Func<int, int> total, Func<int, int>? part = null, string scale = "\"scale\": 3.0")
    {
        var rows = Enumerable.Range(0, years).SelectMany(year => Enumerable.Range(0, 4).Select(street => string.Create(
            CultureInfo.InvariantCulture, $"{(street == 0 ? "All" : $"Row {street}")},Quarter {year},{(street == 0 ? 60 : 20)},{(street == 0 ? total(year) : part?.Invoke(street) ?? year + street)}\n")));
        using var broken = new Broken(folder => folder.With("tables/lamps.csv", "street,quarter,lit,broken\n" + string.Concat(rows))
            .Edit("mechanisms.json", "\"scale\": 3.0", scale).Edit("mechanisms.json", "\"cellsPerUnit\": 2", "\"cellsPerUnit\": 20")
            .Edit("release.json", "lamps/lit?street=All", "lamps/lit?street=All&quarter=Quarter%200").Edit("narrative/summary.md", "street=All", "street=All&quarter=Quarter%200")
            .Edit("release.json", "\"all\": \"All\" } ]", "\"all\": \"All\" }, { \"column\": \"quarter\", \"title\": \"Quarter\" } ]"));
        return broken.Review().FirstOrDefault(finding => finding.Slug == "total-is-the-sum")?.Level;
    }
}
