using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Tenure by age band. Totals of arrears are sums of the noised cells; payment plans have noise of their own in every cell and total.</summary>
public sealed class TenureTable(IReadOnlyList<Household> households) : ISampleQuery
{
    private static readonly TenureCell[] All =
        [.. from tenure in UpTo(Answers.Tenures.Count) from age in UpTo(Answers.AgeBands.Count) select new TenureCell(tenure, age)];

    private static readonly TenureCell[] Possible = [.. All.Where(cell => cell.IsPossible)];
    private static readonly TenureCell[] Parts = [.. Possible.Where(cell => cell is { Tenure: not null, Age: not null })];
    private readonly long[] behind = Counts(Parts, households.Where(household => household.Behind));
    private readonly long[] onPlan = Counts(Possible, households.Where(household => household.OnPlan));

    public SampleTable Noised(Noiser noise)
    {
        var behindNoised = noise.DiscreteGaussian("tenure-age-arrears", 6, behind);
        var onPlanNoised = noise.DiscreteLaplace("payment-plans", 12, onPlan);
        var plans = Possible.Select((cell, i) => (cell, SampleCell.Count(onPlanNoised[i], onPlan[i]))).ToDictionary();
        var rows = All.Select(cell => new SampleRow(
            cell.Keys,
            cell.IsPossible ? [SampleCell.Count(Sum(behindNoised, cell), Sum(behind, cell)), plans[cell]] : [SampleCell.Mark("[x]"), SampleCell.Mark("[x]")]));
        return new SampleTable("tenure-age", "tenure-and-age.csv", ["tenure", "age_band"], ["in_arrears", "on_plan"], [.. rows]);
    }

    private static long Sum(long[] parts, TenureCell whole) => parts.Where((_, i) => whole.Covers(Parts[i].Tenure!.Value, Parts[i].Age!.Value)).Sum();

    private static long[] Counts(TenureCell[] cells, IEnumerable<Household> counted)
    {
        var groups = counted.CountBy(household => (household.Tenure, household.AgeBand)).ToArray();
        return [.. cells.Select(cell => groups.Where(group => cell.Covers(group.Key.Tenure, group.Key.AgeBand)).Sum(group => (long)group.Value))];
    }

    private static IEnumerable<int?> UpTo(int count) => Enumerable.Range(0, count).Select(index => (int?)index).Prepend(null);

    /// <summary>A cell of the table; null stands for all.</summary>
    private readonly record struct TenureCell(int? Tenure, int? Age)
    {
        public bool IsPossible => Tenure != Answers.RetirementHome || Age is null or >= Answers.FirstRetirementAge;

        public string[] Keys => [Tenure is { } tenure ? Answers.Tenures[tenure] : "All", Age is { } age ? Answers.AgeBands[age] : "All"];

        public bool Covers(int tenure, int age) => (Tenure ?? tenure) == tenure && (Age ?? age) == age;
    }
}
