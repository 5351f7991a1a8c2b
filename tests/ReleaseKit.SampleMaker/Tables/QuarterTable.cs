using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Quarter by district: households cut off (totals are sums of the districts) and the mean energy used an account of the public list.</summary>
public static class QuarterTable
{
    private const int Fine = 3;

    // Floods stopped the meter returns of Fennick in the first quarter: it has no mean then, and Norrvale's mean leaves it out.
    private static readonly (int Quarter, int District) NotCollected = (0, 5);
    private static readonly (int Quarter, int District)[] Cells =
        [.. from quarter in Enumerable.Range(0, Answers.Quarters.Count) from district in Enumerable.Range(0, Norrvale.Districts.Count) select (quarter, district)];

    public static SampleTable Of(IReadOnlyList<Household> households, Noiser noise)
    {
        var cutOff = CutOff(households, noise);
        var use = Use(households, noise);
        var rows = from quarter in Enumerable.Range(0, Answers.Quarters.Count)
                   from district in Enumerable.Range(-1, Norrvale.Districts.Count + 1)
                   let name = district < 0 ? "All" : Norrvale.Districts[district].Name
                   let collected = (quarter, district) != NotCollected
                   select new SampleRow(
                       [Answers.Quarters[quarter], name],
                       [
                           cutOff[(quarter, district)], SampleCell.Mark("A"),
                           collected ? use[(quarter, district)] : SampleCell.Mark(""), SampleCell.Mark(collected ? "A" : "L"),
                           SampleCell.Public(district < 0 ? Listed(quarter) : Norrvale.Districts[district].ListedIn2030),
                       ]);
        return new SampleTable(
            "quarters", "by-quarter.csv", ["quarter", "district"], ["cut_off", "cut_off_status", "mean_use", "mean_use_status", "accounts_2030"], [.. rows]);
    }

    private static Dictionary<(int Quarter, int District), SampleCell> CutOff(IReadOnlyList<Household> households, Noiser noise)
    {
        long[] before = [.. Cells.Select(cell => (long)households.Count(household => household.District == cell.District && household.CutOff[cell.Quarter]))];
        var after = noise.DiscreteGaussian("quarter-cut-off", 8, before);
        var cells = Cells.Select((cell, i) => (cell, SampleCell.Count(after[i], before[i]))).ToDictionary();
        foreach (var quarter in Enumerable.Range(0, Answers.Quarters.Count))
            cells[(quarter, -1)] = SampleCell.Count(Sum(after, quarter), Sum(before, quarter));
        return cells;

        long Sum(long[] of, int quarter) => of.Where((_, i) => Cells[i].Quarter == quarter).Sum();
    }

    private static Dictionary<(int Quarter, int District), SampleCell> Use(IReadOnlyList<Household> households, Noiser noise)
    {
        long[] before = [.. Cells.Select(cell => Mean(
            households.Where(household => household.District == cell.District), cell.Quarter, Norrvale.Districts[cell.District].ListedIn2030))];
        var after = noise.DiscreteGaussian("quarter-use", 6000, before);
        long[] wholeBefore = [.. Answers.Quarters.Select((_, quarter) => Mean(
            households.Where(household => (quarter, household.District) != NotCollected), quarter, Listed(quarter)))];
        var whole = noise.DiscreteGaussian("quarter-use-norrvale", 1000, wholeBefore);
        var cells = Cells.Select((cell, i) => (cell, SampleCell.Steps(after[i], before[i], Fine, 1))).ToDictionary();
        foreach (var quarter in Enumerable.Range(0, Answers.Quarters.Count))
            cells[(quarter, -1)] = SampleCell.Steps(whole[quarter], wholeBefore[quarter], Fine, 1);
        return cells;
    }

    private static int Listed(int quarter) =>
        Norrvale.Districts.Where((_, d) => (quarter, d) != NotCollected).Sum(district => district.ListedIn2030);

    private static long Mean(IEnumerable<Household> households, int quarter, int listed) =>
        Rounding.Ratio(households.Sum(household => (long)household.Use[quarter]), 1000, listed);
}
