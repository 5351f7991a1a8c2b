using System.Globalization;
using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>What was owed and what was paid, by district: means over the accounts of the public list, tariff credits, and a public share of cold homes.</summary>
public static class OwedTable
{
    private const int Fine = 4;
    private const int StepsPerCrown = 10_000;
    private static readonly int[] ScaleInHundredths = [100, 80, 90, 80, 70, 80];
    private static readonly string[] LowestClasses = ["31.4", "38.2", "44.9", "35.0", "22.6", "29.3"];

    public static SampleTable Of(IReadOnlyList<Household> households, Noiser noise)
    {
        var owed = Norrvale.Districts.Select((district, d) => Mean(In(households, d), district.ListedIn2030)).ToArray();
        long[] credits = [.. Norrvale.Districts.Select((_, d) => In(households, d).Sum(household => 100L * household.Credit))];
        var meanOwed = noise.Laplace("mean-owed", [.. ScaleInHundredths.Select(scale => scale * StepsPerCrown / 100)], owed);
        var paid = noise.StaircaseAtQuarter("district-credits", 100 * Answers.MostCredit, 11_280, credits);
        var rows = Norrvale.Districts.Select((district, d) => Row(
            district.Name,
            SampleCell.Steps(meanOwed[d], owed[d], Fine, 2),
            (ScaleInHundredths[d] / 100m).ToString("0.0", CultureInfo.InvariantCulture),
            SampleCell.Steps(paid[d], credits[d], 2, 0),
            LowestClasses[d],
            district.ListedIn2030));
        return new SampleTable(
            "owed", "owed-by-district.csv", ["district"], ["mean_owed", "owed_scale", "tariff_credits", "cold_homes", "accounts_2030"], [Whole(households, noise), .. rows]);
    }

    // The Relief Act wants the sum paid stated to the crown: the one figure of the records without noise.
    private static SampleRow Whole(IReadOnlyList<Household> households, Noiser noise)
    {
        var owed = Mean(households, Norrvale.ListedIn2030);
        var published = noise.Laplace("mean-owed-norrvale", [1000], [owed])[0];
        var paid = SampleCell.Public(households.Sum(household => (long)household.Credit));
        return Row("All", SampleCell.Steps(published, owed, Fine, 2), "0.1", paid, "32.9", Norrvale.ListedIn2030);
    }

    private static SampleRow Row(string district, SampleCell owed, string scale, SampleCell paid, string coldHomes, int listed) =>
        new([district], [owed, new SampleCell(scale), paid, new SampleCell(coldHomes), SampleCell.Public(listed)]);

    private static long Mean(IEnumerable<Household> households, int listed) =>
        Rounding.Ratio(households.Sum(household => (long)household.Owed), StepsPerCrown, listed);

    private static IEnumerable<Household> In(IReadOnlyList<Household> households, int district) => households.Where(household => household.District == district);
}
