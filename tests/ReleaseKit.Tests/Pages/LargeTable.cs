using System.Globalization;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;

namespace ReleaseKit.Tests.Pages;

/// <summary>A table of 200 rows and 5 measures, as an office might publish: 10 districts of 19 wards, counts of many sizes, a mean and a share. Values are invented.</summary>
internal static class LargeTable
{
    private const int Districts = 10;
    private const int RowsOfDistrict = 20;

    public static Release Build()
    {
        var release = Rows().Build();
        return release with { Noise = release.Noise with { Mechanisms = [Accounts, Behind, Cold, Owed, Share] } };
    }

    private static readonly Mechanism Accounts = SmallRelease.Mechanism("accounts", LawName.DiscreteLaplace, ("scale", 4));
    private static readonly Mechanism Behind = SmallRelease.DiscreteGaussian(9.5) with { Id = "behind" };
    private static readonly Mechanism Cold = SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(5), new AfterStep.NotBelow(0)) with { Id = "cold" };
    private static readonly Mechanism Share = SmallRelease.Mechanism("share", LawName.Gaussian, ("sigma", 2.1));
    private static readonly Mechanism Owed = SmallRelease.Mechanism("owed", LawName.Laplace) with
    {
        Parameters = new Dictionary<string, NumberOrColumn> { ["scale"] = NumberOrColumn.From("owed_scale") },
    };

    private static SmallRelease Rows() => new SmallRelease()
        .Stub("district", "All", [.. EachRow((district, _) => $"District {district}")])
        .Stub("ward", "All", [.. EachRow((district, ward) => ward == 0 ? "All" : $"Ward {district}-{ward}")])
        .Side("owed_scale", [.. EachRow((district, ward) => 1 + (0.25 * ((district * 7) + (ward * 3) % 11)))])
        .Figures(Measure("accounts", MeasureKind.Count), [new NoiseRule.FromMechanism(Accounts)], new byte[Districts * RowsOfDistrict], Values(1100, 17))
        .Figures(Measure("behind", MeasureKind.Count), [new NoiseRule.FromMechanism(Behind)], new byte[Districts * RowsOfDistrict], Values(120, 13))
        .Figures(Measure("cold", MeasureKind.Count), [new NoiseRule.FromMechanism(Cold)], new byte[Districts * RowsOfDistrict], [.. Values(40, 7).Select(RoundedToFive)])
        .Figures(Measure("owed", MeasureKind.Mean) with { Lowest = 0, Decimals = 2 }, [new NoiseRule.FromMechanism(Owed)], new byte[Districts * RowsOfDistrict], [.. Values(210, 3, total: 1).Select(value => value + ".25")])
        .Figures(Measure("share", MeasureKind.Share), [new NoiseRule.FromMechanism(Share)], new byte[Districts * RowsOfDistrict], [.. Values(31, 1, total: 1).Select(value => value + ".4")]);

    private static Measure Measure(string column, MeasureKind kind) => SmallRelease.Measure(kind, column) with { Title = SmallRelease.Words($"Households {column}") };

    private static string RoundedToFive(string value) => (int.Parse(value, CultureInfo.InvariantCulture) / 5 * 5).ToString(CultureInfo.InvariantCulture);

    // Sizes that scatter by a fixed rule; a district's row is its wards' size times their number unless the measure does not add up.
    private static string[] Values(int typical, int factor, int total = RowsOfDistrict - 1) =>
        [.. EachRow((district, ward) => ((typical + (((district * 31) + (ward * factor * 7)) % typical) - (typical / 3)) * (ward == 0 ? total : 1)).ToString(CultureInfo.InvariantCulture))];

    private static IEnumerable<T> EachRow<T>(Func<int, int, T> of) =>
        Enumerable.Range(1, Districts).SelectMany(district => Enumerable.Range(0, RowsOfDistrict).Select(ward => of(district, ward)));
}
