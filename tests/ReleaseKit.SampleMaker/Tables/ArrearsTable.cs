using ReleaseKit.SampleMaker.Population;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>
/// Districts and wards. Accounts and, for Norrvale, households without heating are sums of noised parts; arrears have noise of their own at each level.
/// </summary>
public sealed class ArrearsTable(IReadOnlyList<Household> households) : ISampleQuery
{
    private const int FewestListed = 30;
    private readonly WardCounts accounts = WardCounts.Of(households);
    private readonly WardCounts arrears = WardCounts.Of(households.Where(household => household.Behind));
    private readonly WardCounts cold = WardCounts.Of(households.Where(household => household.WentCold));

    public SampleTable Noised(Noiser noise) => new(
        "arrears",
        "arrears-by-ward.csv",
        ["district", "ward"],
        ["accounts_2030", "accounts", "in_arrears", "went_cold"],
        [.. Rows(Accounts(noise), Arrears(noise), Cold(noise))]);

    private NoisedWards Accounts(Noiser noise)
    {
        var sums = new WardCounts(noise.DiscreteLaplace("ward-accounts", 4, accounts.Wards));
        return new NoisedWards(accounts, sums.Wards, sums.Districts, sums.Total);
    }

    private NoisedWards Arrears(Noiser noise)
    {
        var wards = noise.DiscreteGaussian("ward-arrears", 7, arrears.Wards).Select(count => Math.Max(0, Rounding.ToNearest(count, 5)));
        var districts = noise.DiscreteGaussian("district-arrears", 6, arrears.Districts);
        return new NoisedWards(arrears, [.. wards], districts, noise.DiscreteGaussian("total-arrears", 4, [arrears.Total])[0]);
    }

    private NoisedWards Cold(Noiser noise)
    {
        var districts = noise.DiscreteGaussian("district-cold", 8, cold.Districts);
        return new NoisedWards(cold, noise.DiscreteLaplace("ward-cold", 5, cold.Wards), districts, districts.Sum());
    }

    private static IEnumerable<SampleRow> Rows(params NoisedWards[] measures)
    {
        yield return Row("All", "All", Norrvale.ListedIn2030, measures.Select(measure => measure.TotalCell));
        var ward = 0;
        for (var d = 0; d < Norrvale.Districts.Count; d++)
        {
            var district = Norrvale.Districts[d];
            yield return Row(district.Name, "All", district.ListedIn2030, measures.Select(measure => measure.DistrictCell(d)));
            foreach (var place in district.Wards)
            {
                yield return Row(district.Name, place.Name, place.ListedIn2030, measures.Select(measure => measure.WardCell(ward)));
                ward++;
            }
        }
    }

    // The list of 2030 is public, so the rule that hides small wards tells nothing about the records.
    private static SampleRow Row(string district, string ward, int listed, IEnumerable<SampleCell> cells)
    {
        var (accounts, others) = (cells.First(), cells.Skip(1));
        return new SampleRow(
            [district, ward],
            [SampleCell.Public(listed), accounts, .. others.Select(cell => listed < FewestListed ? SampleCell.Mark("[c]") : cell)]);
    }
}
