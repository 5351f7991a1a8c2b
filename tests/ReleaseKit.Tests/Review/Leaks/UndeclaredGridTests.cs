using System.Globalization;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Review;
using ReleaseKit.Review.Leaks;
using ReleaseKit.Tests.Folders;
using ReleaseKit.Tests.Review.Budget;
using Xunit;

namespace ReleaseKit.Tests.Review.Leaks;

/// <summary>Lamps broken in so many streets, all multiples of a number, with discrete Laplace noise of scale 3 unless said otherwise.</summary>
public sealed class UndeclaredGridTests
{
    private const string Law = "\"law\": \"discrete-laplace\", \"scale\": 3.0";

    private static string Table(int streets, Func<int, string> broken) => "street,lit,broken\n"
        + string.Concat(Enumerable.Range(0, streets).Select(street => string.Create(CultureInfo.InvariantCulture, $"Row {street},{(street * 7) + 11},{broken(street)}\n")));

    private static string Times(int street, int number) => ((street % 9 * number) + number).ToString(CultureInfo.InvariantCulture);

    private static TestFolder Folder(int streets, Func<int, string> broken, string law = Law) => new TestFolder()
        .With("tables/lamps.csv", Table(streets, broken))
        .Edit("release.json", "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ", "")
        .Edit("mechanisms.json", Law, law);

    private static FindingLevel? LevelOf(TestFolder folder) => folder.Review().Where(finding => finding.Slug == "undeclared-rounding").Select(finding => (FindingLevel?)finding.Level).SingleOrDefault();

    // P(N ≡ 0 mod 5) is tanh(1/6) ÷ tanh(5/6) = 0.2418; to the 12th 4.0e-8, times (5π)²/6 = 41.1 it is 1.7e-6; to the 13th 4e-7. Of 2: 0.5136, to the 20th 1.6e-6.
    [Theory]
    [InlineData(13, 5, FindingLevel.Stop)]
    [InlineData(12, 5, FindingLevel.Caution)]
    [InlineData(7, 10, null)]
    [InlineData(8, 10, FindingLevel.Caution)]
    [InlineData(20, 2, FindingLevel.Caution)]
    [InlineData(30, 2, FindingLevel.Stop)]
    [InlineData(10, 2, null)]
    [InlineData(40, 1, null)]
    public void Multiples_of_a_coarser_number_are_found_by_their_chance(int streets, int number, FindingLevel? level)
    {
        using var folder = Folder(streets, street => Times(street, number));
        Assert.Equal(level, LevelOf(folder));
    }

    [Fact]
    public void Finding_says_how_many_and_what_to_write()
    {
        using var folder = Folder(20, street => Times(street, 5));
        var text = folder.Text("undeclared-rounding");
        Assert.StartsWith("Stop tables/lamps.csv:2:", text, StringComparison.Ordinal);
        Assert.Contains("All 20 figures of lamps/broken with noise of \"lamps-broken\" are multiples of 5, but that noise moves in steps of 1 and \"afterwards\" names no rounding.", text, StringComparison.Ordinal);
        Assert.Contains("write \"afterwards\": [ { \"roundTo\": 5 } ] in \"lamps-broken\", or the smaller unit that was used; if the noise itself moves in such steps, write \"grid\": 5.", text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"law\": \"discrete-laplace\", \"scale\": 3.0, \"afterwards\": [ { \"roundTo\": 5 } ]")]
    [InlineData("\"law\": \"discrete-laplace\", \"scale\": 15.0, \"grid\": 5")]
    [InlineData("\"law\": \"discrete-laplace\", \"scale\": 0.2")]
    public void Rounding_that_is_declared_a_grid_as_coarse_and_noise_that_leaves_values_alone_pass(string law)
    {
        using var folder = Folder(40, street => Times(street, 5), law);
        Assert.Null(LevelOf(folder));
    }

    [Fact]
    public void One_figure_that_is_no_multiple_shows_the_grid()
    {
        using var folder = Folder(40, street => street == 39 ? "51" : Times(street, 5));
        Assert.Null(LevelOf(folder));
    }

    // Of 60 figures 40 are at the floor: any 20 of 60 could be the others, which is too many choices for 0.2418 to the 20th; of 24 any 20 are not.
    [Theory]
    [InlineData(60, null)]
    [InlineData(24, FindingLevel.Stop)]
    public void Zeros_at_a_floor_are_left_aside(int streets, FindingLevel? level)
    {
        using var folder = Folder(streets, street => street < 20 ? Times(street, 5) : "0", Law + ", \"afterwards\": [ { \"notBelow\": 0 } ]");
        Assert.Equal(level, LevelOf(folder));
    }

    // Continuous noise in a file of two decimals, all of them multiples of 0.25.
    [Theory]
    [InlineData(0.25, FindingLevel.Stop)]
    [InlineData(0.07, FindingLevel.Stop)]
    [InlineData(0.01, null)]
    public void Continuous_noise_has_the_last_digit_of_the_file_for_a_step(double number, FindingLevel? level)
    {
        using var folder = Folder(40, street => (((street % 9) + 1) * number).ToString("0.00", CultureInfo.InvariantCulture), "\"law\": \"laplace\", \"scale\": 3.0")
            .Edit("release.json", "\"title\": \"Lamps broken\", \"unit\": \"lamp\", \"kind\": \"count\"", "\"title\": \"Lamps broken\", \"unit\": \"lamp\", \"kind\": \"amount\"");
        Assert.Equal(level, LevelOf(folder));
    }

    /// <summary>The chance of every remainder, added up far out in the tails.</summary>
    [Theory]
    [InlineData(0.4, 5)]
    [InlineData(3, 2)]
    [InlineData(20, 7)]
    [InlineData(900, 10)]
    public void Largest_chance_of_a_remainder_is_not_below_the_sums(double scale, int number)
    {
        var law = DiscreteLaplaceLaw.Of(scale);
        var far = (int)(40 * scale) + 40;
        var most = Enumerable.Range(0, number).Max(remainder => Enumerable.Range(-far, 2 * far).Where(step => ((step % number) + number) % number == remainder).Sum(step => law.Probability(step)));
        Assert.InRange(ResidueChance.Most(law, 1, number), most, most + 0.002);
    }

    [Fact]
    public void Largest_chance_of_a_remainder_of_a_table_is_that_of_its_rows()
    {
        var law = TabulatedLaw.Of([(-2, 0.3m), (0, 0.25m), (2, 0.25m), (3, 0.1m)]);
        Assert.Equal(0.9, ResidueChance.Most(law, 1, 2), 1e-12);
        Assert.Equal(0.5, ResidueChance.Most(law, 1, 5), 1e-12);
    }
}
