using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;

namespace ReleaseKit.Tests.Pages;

/// <summary>
/// A table of two districts and six wards in which everything that a table page must show happens once: close, rough and weak figures, one below zero, one hidden, totals that
/// are sums and totals with noise of their own, a scale by row, exact and public figures, notes with and without a place.
/// </summary>
internal static class WardTable
{
    public static readonly string[] Districts = ["All", "Aldermoor", "Aldermoor", "Aldermoor", "Aldermoor", "Cindry", "Cindry", "Cindry", "Cindry"];
    public static readonly string[] Wards = ["All", "All", "Harrow Lane", "Tithe Barn", "Upper Weir", "All", "Old Kiln", "Skerry End", "Bell & <Sons>"];

    public static Release Build(bool isCut = false)
    {
        var release = Rows().Build();
        var table = release.Tables[0] with
        {
            Universe = SmallRelease.Words("Households with an account on 31 December 2031"),
            Source = SmallRelease.Words("Register <of> hardship & heat"),
            Notes = [new(null, SmallRelease.Words("Wards as of 2030.")), new("?ward=Skerry%20End", SmallRelease.Words("New boundary.")), new("behind?ward=Old%20Kiln", SmallRelease.Words("Counted late."))],
            Hidden = new Hiding(HiddenBy.PublicRule, InTotals: true),
            CutBy = isCut ? 0 : null,
        };
        return release with { Tables = [table], Noise = release.Noise with { Mechanisms = Mechanisms } };
    }

    private static readonly Mechanism WardNoise = SmallRelease.Mechanism("ward", LawName.DiscreteLaplace, ("scale", 10));
    private static readonly Mechanism DistrictNoise = SmallRelease.DiscreteGaussian(6) with { Id = "district" };
    private static readonly Mechanism MeanNoise = SmallRelease.Mechanism("mean", LawName.Laplace) with
    {
        Parameters = new Dictionary<string, NumberOrColumn> { ["scale"] = NumberOrColumn.From("owed_scale") },
        Answers = SmallRelease.Words("Mean amount owed"),
    };

    private static readonly Mechanism RoundedNoise = SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(5), new AfterStep.NotBelow(0)) with { Id = "cold" };

    private static IReadOnlyList<Mechanism> Mechanisms => [WardNoise, DistrictNoise, MeanNoise, RoundedNoise];

    private static SmallRelease Rows() => new SmallRelease()
        .Stub("district", "All", Districts)
        .Stub("ward", "All", Wards)
        .Side("owed_scale", 1, 4, 9, 14, 6, 5, 9, 60, 20)
        .Figures(
            SmallRelease.Measure(MeasureKind.Count, "behind") with { Title = SmallRelease.Words("Households behind") },
            [new NoiseRule.FromMechanism(DistrictNoise), new NoiseRule.FromMechanism(WardNoise)], [0, 0, 1, 1, 1, 0, 1, 1, 1],
            "3418", "655", "214", "131", "297", "689", "243", "-7", "33")
        .Figures(
            SmallRelease.Measure(MeasureKind.Mean, "owed") with { Title = SmallRelease.Words("Mean owed"), Unit = SmallRelease.UnitOf("crown", "crowns"), Lowest = 0, Decimals = 1 },
            [new NoiseRule.FromMechanism(MeanNoise)], new byte[9], "412.3", "447.0", "431.2", "512.9", "418.0", "463.1", "488.7", "152.5", "356.0")
        .Figures(
            SmallRelease.Measure(MeasureKind.Count, "cold") with { Title = SmallRelease.Words("Heated no room") },
            [new NoiseRule.FromMechanism(RoundedNoise)], new byte[9], "1850", "330", "115", "60", "155", "360", "120", "0", "Q")
        .Figures(
            SmallRelease.Measure(MeasureKind.Amount, "credits") with { Title = SmallRelease.Words("Credits paid"), Unit = SmallRelease.UnitOf("crown", "crowns") },
            [new NoiseRule.Exact(SmallRelease.Words("The Relief Act asks for it."))], new byte[9], "255456", "32150", "10717", "10716", "10717", "36802", "12268", "12267", "12267");
}
