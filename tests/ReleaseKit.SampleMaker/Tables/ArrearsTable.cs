using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Districts and wards. Accounts and, for Norrvale, households without heating are sums of noised parts; arrears have noise of their own at each level.</summary>
public sealed class ArrearsTable
{
    private const int FewestListed = 30;
    private readonly Measure accounts;
    private readonly Measure arrears;
    private readonly Measure cold;

    private ArrearsTable(IReadOnlyList<Household> households, Noiser noise)
    {
        accounts = new Measure(households, _ => true);
        accounts.Wards = noise.DiscreteLaplace("ward-accounts", 4, accounts.WardsBefore);
        accounts.Districts = accounts.SumOfWards();
        accounts.Total = accounts.Districts.Sum();
        arrears = new Measure(households, household => household.Behind);
        arrears.Wards = [.. noise.DiscreteGaussian("ward-arrears", 7, arrears.WardsBefore).Select(count => Math.Max(0, Rounding.ToNearest(count, 5)))];
        arrears.Districts = noise.DiscreteGaussian("district-arrears", 6, arrears.DistrictsBefore);
        arrears.Total = noise.DiscreteGaussian("total-arrears", 4, [arrears.TotalBefore])[0];
        cold = new Measure(households, household => household.WentCold);
        cold.Wards = noise.DiscreteLaplace("ward-cold", 5, cold.WardsBefore);
        cold.Districts = noise.DiscreteGaussian("district-cold", 8, cold.DistrictsBefore);
        cold.Total = cold.Districts.Sum();
    }

    public static SampleTable Of(IReadOnlyList<Household> households, Noiser noise)
    {
        var table = new ArrearsTable(households, noise);
        return new SampleTable("arrears", "arrears-by-ward.csv", ["district", "ward"], ["accounts_2030", "accounts", "in_arrears", "went_cold"], [.. table.Rows()]);
    }

    private IEnumerable<SampleRow> Rows()
    {
        yield return Row("All", "All", Norrvale.ListedIn2030, measure => measure.TotalCell);
        var ward = 0;
        for (var d = 0; d < Norrvale.Districts.Count; d++)
        {
            var (district, at) = (Norrvale.Districts[d], d);
            yield return Row(district.Name, "All", district.ListedIn2030, measure => measure.DistrictCell(at));
            foreach (var place in district.Wards)
            {
                var index = ward++;
                yield return Row(district.Name, place.Name, place.ListedIn2030, measure => measure.WardCell(index));
            }
        }
    }

    // The list of 2030 is public, so the rule that hides small wards tells nothing about the records.
    private SampleRow Row(string district, string ward, int listed, Func<Measure, SampleCell> cell)
    {
        SampleCell Shown(Measure measure) => listed < FewestListed ? SampleCell.Mark("[c]") : cell(measure);
        return new SampleRow([district, ward], [SampleCell.Public(listed), cell(accounts), Shown(arrears), Shown(cold)]);
    }

    private sealed class Measure
    {
        private static readonly (int District, int Ward)[] Places =
            [.. Norrvale.Districts.SelectMany((district, d) => district.Wards.Select((_, w) => (d, w)))];

        public Measure(IReadOnlyList<Household> households, Func<Household, bool> counted)
        {
            var counts = households.Where(counted).CountBy(household => (household.District, household.Ward)).ToDictionary();
            WardsBefore = [.. Places.Select(place => (long)counts.GetValueOrDefault(place))];
            DistrictsBefore = ByDistrict(WardsBefore);
        }

        public long[] WardsBefore { get; }
        public long[] DistrictsBefore { get; }
        public long TotalBefore => DistrictsBefore.Sum();
        public long[] Wards { get; set; } = [];
        public long[] Districts { get; set; } = [];
        public long Total { get; set; }

        public SampleCell TotalCell => SampleCell.Count(Total, TotalBefore);

        public long[] SumOfWards() => ByDistrict(Wards);

        public SampleCell DistrictCell(int district) => SampleCell.Count(Districts[district], DistrictsBefore[district]);

        public SampleCell WardCell(int ward) => SampleCell.Count(Wards[ward], WardsBefore[ward]);

        private static long[] ByDistrict(long[] wards) =>
            [.. Norrvale.Districts.Select((_, d) => wards.Where((_, ward) => Places[ward].District == d).Sum())];
    }
}
