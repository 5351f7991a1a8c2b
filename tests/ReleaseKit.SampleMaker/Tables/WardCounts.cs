using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Counts for every ward, in the order of the map, with their sums by district and in all.</summary>
internal sealed record WardCounts(long[] Wards)
{
    private static readonly (int District, int Ward)[] Places =
        [.. Norrvale.Districts.SelectMany((district, d) => district.Wards.Select((_, w) => (d, w)))];

    public long[] Districts { get; } = [.. Norrvale.Districts.Select((_, d) => Wards.Where((_, ward) => Places[ward].District == d).Sum())];
    public long Total => Wards.Sum();

    public static WardCounts Of(IEnumerable<Household> households)
    {
        var counts = households.CountBy(household => (household.District, household.Ward)).ToDictionary();
        return new WardCounts([.. Places.Select(place => (long)counts.GetValueOrDefault(place))]);
    }
}

/// <summary>What is published of such counts: every level as it was noised.</summary>
internal sealed record NoisedWards(WardCounts Before, long[] Wards, long[] Districts, long Total)
{
    public SampleCell TotalCell => SampleCell.Count(Total, Before.Total);

    public SampleCell DistrictCell(int district) => SampleCell.Count(Districts[district], Before.Districts[district]);

    public SampleCell WardCell(int ward) => SampleCell.Count(Wards[ward], Before.Wards[ward]);
}
