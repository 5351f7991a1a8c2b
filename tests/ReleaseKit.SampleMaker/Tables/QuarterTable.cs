using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Quarter by district: households cut off (totals are sums of the districts) and the mean energy used an account of the public list.</summary>
public sealed class QuarterTable(IReadOnlyList<Household> households) : ISampleQuery
{
    private const int Fine = 3;
    private const int StepsPerKilowattHour = 1000;

    // Floods stopped the meter returns of Fennick in the first quarter: it has no mean then, and Norrvale's mean leaves it out.
    private static readonly QuarterCell NotCollected = new(0, 5);
    private static readonly QuarterCell[] Wholes = [.. Enumerable.Range(0, Answers.Quarters.Count).Select(quarter => new QuarterCell(quarter, null))];

    private static readonly QuarterCell[] Parts =
        [.. Wholes.SelectMany(whole => Enumerable.Range(0, Norrvale.Districts.Count).Select(district => whole with { District = district }))];

    private readonly long[] cutOff =
        [.. Parts.Select(cell => (long)households.Count(household => cell.Covers(household) && household.CutOff[cell.Quarter]))];

    private readonly long[] use = [.. Parts.Select(cell => MeanUse(cell, households))];
    private readonly long[] useInAll = [.. Wholes.Select(cell => MeanUse(cell, households))];

    public SampleTable Noised(Noiser noise)
    {
        var cutOffNoised = noise.DiscreteGaussian("quarter-cut-off", 8, cutOff);
        var useNoised = noise.DiscreteGaussian("quarter-use", 6 * StepsPerKilowattHour, use);
        var useInAllNoised = noise.DiscreteGaussian("quarter-use-norrvale", StepsPerKilowattHour, useInAll);
        var means = Cells(Parts, useNoised, use).Concat(Cells(Wholes, useInAllNoised, useInAll)).ToDictionary();
        means[NotCollected] = SampleCell.Mark("");
        var rows = Wholes.SelectMany(whole => Parts.Where(part => part.Quarter == whole.Quarter).Prepend(whole)).Select(cell => new SampleRow(
            cell.Keys,
            [
                SampleCell.Count(Sum(cutOffNoised, cell), Sum(cutOff, cell)), SampleCell.Mark("A"),
                means[cell], SampleCell.Mark(cell == NotCollected ? "L" : "A"), SampleCell.Public(Listed(cell)),
            ]));
        return new SampleTable(
            "quarters", "by-quarter.csv", ["quarter", "district"], ["cut_off", "cut_off_status", "mean_use", "mean_use_status", "accounts_2030"], [.. rows]);
    }

    private static IEnumerable<(QuarterCell Cell, SampleCell Mean)> Cells(QuarterCell[] cells, long[] noised, long[] before) =>
        cells.Select((cell, i) => (cell, SampleCell.Steps(noised[i], before[i], Fine, 1)));

    private static long Sum(long[] parts, QuarterCell whole) =>
        parts.Where((_, i) => Parts[i].Quarter == whole.Quarter && (whole.District ?? Parts[i].District) == Parts[i].District).Sum();

    private static int Listed(QuarterCell cell) =>
        Norrvale.Districts.Where((_, d) => (cell.District ?? d) == d && (cell.District == d || new QuarterCell(cell.Quarter, d) != NotCollected))
            .Sum(district => district.ListedIn2030);

    private static long MeanUse(QuarterCell cell, IEnumerable<Household> households)
    {
        var counted = households.Where(household => cell.Covers(household) && new QuarterCell(cell.Quarter, household.District) != NotCollected);
        return Rounding.Ratio(counted.Sum(household => (long)household.Use[cell.Quarter]), StepsPerKilowattHour, Listed(cell));
    }

    /// <summary>A cell of the table; no district stands for all.</summary>
    private readonly record struct QuarterCell(int Quarter, int? District)
    {
        public string[] Keys => [Answers.Quarters[Quarter], District is { } district ? Norrvale.Districts[district].Name : "All"];

        public bool Covers(Household household) => (District ?? household.District) == household.District;
    }
}
