using System.Globalization;
using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>What was owed and what was paid, by district: means over the accounts of the public list, tariff credits, and a public share of cold homes.</summary>
public sealed class OwedTable(IReadOnlyList<Household> households) : ISampleQuery
{
    private const int Fine = 4;
    private const int StepsPerCrown = 10_000;
    private static readonly int[] ScaleInHundredths = [100, 80, 90, 80, 70, 80];
    private static readonly string[] LowestClasses = ["31.4", "38.2", "44.9", "35.0", "22.6", "29.3"];
    private readonly long[] owed = [.. Norrvale.Districts.Select((district, d) => Mean(households.Where(household => household.District == d), district.ListedIn2030))];
    private readonly long owedInAll = Mean(households, Norrvale.ListedIn2030);
    private readonly long[] credits = [.. Norrvale.Districts.Select((_, d) => households.Where(household => household.District == d).Sum(household => 100L * household.Credit))];

    public SampleTable Noised(Noiser noise)
    {
        var mean = noise.Laplace("mean-owed", [.. ScaleInHundredths.Select(scale => scale * StepsPerCrown / 100)], owed);
        var paid = noise.StaircaseAtQuarter("district-credits", 100 * Answers.MostCredit, 11_280, credits);
        var rows = Norrvale.Districts.Select((district, d) => Row(
            district.Name,
            SampleCell.Steps(mean[d], owed[d], Fine, 2),
            (ScaleInHundredths[d] / 100m).ToString("0.0", CultureInfo.InvariantCulture),
            SampleCell.Steps(paid[d], credits[d], 2, 0),
            LowestClasses[d],
            district.ListedIn2030));
        return new SampleTable(
            "owed",
            "owed-by-district.csv",
            ["district"],
            ["mean_owed", "owed_scale", "tariff_credits", "cold_homes", "accounts_2030"],
            [Whole(noise), .. rows]);
    }

    // The Relief Act wants the sum paid stated to the crown: the one figure of the records without noise.
    private SampleRow Whole(Noiser noise)
    {
        var mean = noise.Laplace("mean-owed-norrvale", [StepsPerCrown / 10], [owedInAll])[0];
        return Row("All", SampleCell.Steps(mean, owedInAll, Fine, 2), "0.1", SampleCell.Public(credits.Sum() / 100), "32.9", Norrvale.ListedIn2030);
    }

    private static SampleRow Row(string district, SampleCell owed, string scale, SampleCell paid, string coldHomes, int listed) =>
        new([district], [owed, SampleCell.Mark(scale), paid, SampleCell.Mark(coldHomes), SampleCell.Public(listed)]);

    private static long Mean(IEnumerable<Household> households, int listed) =>
        Rounding.Ratio(households.Sum(household => (long)household.Owed), StepsPerCrown, listed);
}
