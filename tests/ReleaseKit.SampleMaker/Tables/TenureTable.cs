using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Tenure by age band. Totals of arrears are sums of the noised cells; payment plans have noise of their own in every cell and total.</summary>
public static class TenureTable
{
    private const string Impossible = "[x]";
    private static readonly (int? Tenure, int? Age)[] Cells =
        [.. from tenure in UpTo(Answers.Tenures.Count) from age in UpTo(Answers.AgeBands.Count) select (tenure, age)];

    public static SampleTable Of(IReadOnlyList<Household> households, Noiser noise)
    {
        var arrears = Arrears(households, noise);
        var possible = Cells.Where(IsPossible).ToArray();
        long[] plansBefore = [.. possible.Select(cell => Count(households, cell, household => household.OnPlan))];
        var plans = noise.DiscreteLaplace("payment-plans", 12, plansBefore);
        var plan = possible.Select((cell, i) => (cell, SampleCell.Count(plans[i], plansBefore[i]))).ToDictionary();
        var rows = Cells.Select(cell => new SampleRow(
            [cell.Tenure is { } tenure ? Answers.Tenures[tenure] : "All", cell.Age is { } age ? Answers.AgeBands[age] : "All"],
            [arrears.GetValueOrDefault(cell, SampleCell.Mark(Impossible)), plan.GetValueOrDefault(cell, SampleCell.Mark(Impossible))]));
        return new SampleTable("tenure-age", "tenure-and-age.csv", ["tenure", "age_band"], ["in_arrears", "on_plan"], [.. rows]);
    }

    private static Dictionary<(int? Tenure, int? Age), SampleCell> Arrears(IReadOnlyList<Household> households, Noiser noise)
    {
        var parts = Cells.Where(cell => cell is { Tenure: not null, Age: not null } && IsPossible(cell)).ToArray();
        long[] before = [.. parts.Select(cell => Count(households, cell, household => household.Behind))];
        var after = noise.DiscreteGaussian("tenure-age-arrears", 6, before);
        return Cells.Where(IsPossible).ToDictionary(cell => cell, cell => SampleCell.Count(Sum(after, cell), Sum(before, cell)));

        long Sum(long[] of, (int? Tenure, int? Age) whole) => of.Where((_, i) => Covers(whole, parts[i].Tenure!.Value, parts[i].Age!.Value)).Sum();
    }

    private static long Count(IReadOnlyList<Household> households, (int? Tenure, int? Age) cell, Func<Household, bool> counted) =>
        households.Count(household => counted(household) && Covers(cell, household.Tenure, household.AgeBand));

    private static bool Covers((int? Tenure, int? Age) cell, int tenure, int age) =>
        (cell.Tenure ?? tenure) == tenure && (cell.Age ?? age) == age;

    private static bool IsPossible((int? Tenure, int? Age) cell) =>
        cell.Tenure != Answers.RetirementHome || cell.Age is null or >= Answers.FirstRetirementAge;

    private static IEnumerable<int?> UpTo(int count) => Enumerable.Range(0, count).Select(index => (int?)index).Prepend(null);
}
