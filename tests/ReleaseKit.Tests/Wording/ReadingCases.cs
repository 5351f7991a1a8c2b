using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;

namespace ReleaseKit.Tests.Wording;

/// <summary>A figure for every branch of the readings, by name.</summary>
internal static class ReadingCases
{
    private static readonly Mechanism Gauss = SmallRelease.DiscreteGaussian(9.5);
    private static readonly Mechanism Laplace = SmallRelease.Mechanism("laplace", LawName.Laplace, ("scale", 1.4));
    private static readonly Unit Crowns = SmallRelease.UnitOf("crown", "crowns");

    public static IReadOnlyList<(string Name, AppraisedFigure Figure)> All { get; } =
    [
        ("A count far above its margin", Count(Gauss, "1240")),
        ("A count of one", Count(SmallRelease.DiscreteGaussian(0.2), "1")),
        ("A count that is rough", Count(Gauss, "40")),
        ("A count that is weak", Count(Gauss, "30")),
        ("A count as small as its margin", Count(Gauss, "19")),
        ("A count smaller than its margin", Count(Gauss, "15")),
        ("A weak count with a better total", Wards("15", "230", "900")),
        ("A weak count whose only better total is that of all", Wards("15", "16", "900")),
        ("A weak mean with a better figure for the whole", Wards("1.5", "30.0", "40.0", MeasureKind.Mean)),
        ("A weak mean whose only better figure is that of all", Wards("1.5", "1.6", "40.0", MeasureKind.Mean)),
        ("A weak count of a quarter", Quarter()),
        ("A weak count whose better total crosses its first heading", Tenures()),
        ("An amount that is rounded for print", Amount(SmallRelease.Mechanism("m", LawName.DiscreteGaussian, ("sigma", 500)) with { Grid = 0.5 }, "321502.5")),
        ("A count whose margin is a tenth of it", Count(SmallRelease.Mechanism("m", LawName.DiscreteUniform, ("halfWidth", 10)), "100")),
        ("A count whose margin is half of it", Count(SmallRelease.Mechanism("m", LawName.DiscreteUniform, ("halfWidth", 10)), "20")),
        ("A count whose margin is four fifths of it", Count(SmallRelease.Mechanism("m", LawName.DiscreteUniform, ("halfWidth", 16)), "20")),
        ("A large count", Count(Gauss, "1234567")),
        ("A rough figure in a release with small thresholds", Strict("12000")),
        ("A weak figure in a release with small thresholds", Strict("8000")),
        ("A count of zero", Count(Gauss, "0")),
        ("A count below zero", Count(Gauss, "-5")),
        ("A count below zero by more than the margin", Count(Gauss, "-25")),
        ("A count that noise leaves as it was", Count(SmallRelease.DiscreteGaussian(0.3), "412")),
        ("A count rounded to fives", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(5)), "1240")),
        ("A count of zero that noise mostly leaves as it was", Count(SmallRelease.DiscreteGaussian(0.3), "0")),
        ("A count not below zero and rounded, published as zero", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.NotBelow(0), new AfterStep.RoundTo(5)), "0")),
        ("A count rounded up", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(10, RoundingHow.Up)), "1240")),
        ("A count rounded down", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(10, RoundingHow.Down)), "1240")),
        ("A count rounded and not below zero, published as zero", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(5), new AfterStep.NotBelow(0)), "0")),
        ("A count not above a bound, published as the bound", Bounded(new AfterStep.NotAbove(1200), "1200")),
        ("An amount not below a bound, published as the bound", Amount(SmallRelease.DiscreteGaussian(9.5, new AfterStep.NotBelow(-50)), "-50")),
        ("A count at a threshold", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "30")),
        ("A count near a threshold", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "45")),
        ("A count near the level for publication", PublishedFrom("45")),
        ("A zero that stands for small counts", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "0")),
        ("A count far above a threshold", Count(SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "1240")),
        ("A count at a threshold, published as a bound", Bounded(new AfterStep.ZeroBelow(30), "1200", new AfterStep.NotAbove(1200))),
        ("A mean whose range under a threshold has no end", Of(MeasureKind.Mean, Laplace with { Afterwards = [new AfterStep.ZeroBelow(3)] }, "4.25", Crowns)),
        ("A mean whose range under a threshold has an end at the lower coverage alone", Of(MeasureKind.Mean, Laplace with { Afterwards = [new AfterStep.ZeroBelow(3)] }, "7.25", Crowns)),
        ("A count of whose noise a tenth is not known", Count(SmallRelease.Mechanism("m", LawName.Tabulated) with { Tabulated = [(-1, 0.2m), (0, 0.5m), (1, 0.2m)] }, "45")),
        ("A mean that print leaves nothing of", Of(MeasureKind.Mean, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 400)), "3.38", Crowns)),
        ("A sum of twelve counts", SumOf(12, Gauss)),
        ("A share", Of(MeasureKind.Share, Laplace, "51.63")),
        ("A share without a unit", Of(MeasureKind.Share, Laplace, "51.63", SmallRelease.UnitOf("", ""))),
        ("A share of homes", Of(MeasureKind.Share, Laplace, "51.63", SmallRelease.UnitOf("home", "homes"))),
        ("A sum that leaves out one of its parts", SumOf(Gauss, "1840", "1840", "O")),
        ("A sum that holds a hidden part", SumOf(new Hiding(HiddenBy.PublicRule, true), Gauss, "1840", "1830", "Q")),
        ("A sum that holds two hidden parts", SumOf(new Hiding(HiddenBy.PublicRule, true), Gauss, "Q", "1830", "Q")),
        ("A sum that leaves out two of its parts", SumOf(Gauss, "1840", "O", "1840", "L", "M")),
        ("A share near a hundred", Of(MeasureKind.Share, Laplace, "99.21")),
        ("A share above a hundred", Of(MeasureKind.Share, Laplace, "101.24")),
        ("A share above a hundred by more than the margin", Of(MeasureKind.Share, Laplace, "120.55")),
        ("A share of which nothing is known", Of(MeasureKind.Share, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 40)), "48.00")),
        ("A mean of capped amounts", Of(MeasureKind.Mean, Laplace with { Clipped = new ClippedTo(0, 400) }, "212.34", Crowns)),
        ("A mean of amounts capped at both ends", Of(MeasureKind.Mean, Laplace with { Clipped = new ClippedTo(10, 400) }, "212.34", Crowns)),
        ("A mean below the least it can be", Lowest(10, "8.10")),
        ("A negative amount", Amount(Gauss, "-340")),
        ("A median", Of(MeasureKind.Median, SmallRelease.Mechanism("m", LawName.Gaussian, ("sigma", 3)), "184.2", Crowns)),
        ("An estimate", Of(MeasureKind.Estimate, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 120)), "18340.6")),
        ("An index", Of(MeasureKind.Index, SmallRelease.Mechanism("m", LawName.Uniform, ("halfWidth", 2)), "104.3", SmallRelease.UnitOf("point", "points"))),
        ("A rate", Rate("4.12")),
        ("A rate that is rounded for print", Rate("4.1234")),
        ("A provisional count", Count(Gauss, "1240 P")),
        ("A hidden count", Count(Gauss, "Q")),
        ("A count not collected", Count(Gauss, "L")),
        ("A count that cannot exist", Count(Gauss, "M")),
        ("A count not available", Count(Gauss, "O")),
        ("A count below the level for publication", PublishedFrom("Q")),
        ("An exact amount", Fixed(new NoiseRule.Exact(SmallRelease.Words("law")), "48210.00")),
        ("A public count", Fixed(new NoiseRule.Public(SmallRelease.Words("public list")), "9872")),
        ("A count without a valid margin", Count(Gauss with { Adjusted = true }, "1240")),
        ("A figure whose range can be one number only", Narrow()),
        ("A figure below a range of one number", Narrow("2.000")),
        ("A figure whose noise reaches further up than down", Uneven(false)),
        ("A rounded figure whose noise reaches further up than down", Uneven(true)),
        ("A sum of floored parts", Count(Gauss, "1240") with { Case = new FigureCase(SpecialCase.FlooredSum, false, false, false, false) }),
    ];

    private static AppraisedFigure Count(Mechanism mechanism, string value) => Of(MeasureKind.Count, mechanism, value);

    private static AppraisedFigure Amount(Mechanism mechanism, string value) => Of(MeasureKind.Amount, mechanism, value, Crowns);

    private static AppraisedFigure Of(MeasureKind kind, Mechanism mechanism, string value, Unit? unit = null) => new SmallRelease()
        .Figures(SmallRelease.Measure(kind) with { Unit = unit ?? (kind == MeasureKind.Share ? SmallRelease.UnitOf("in 100", "in 100") : SmallRelease.Households) }, mechanism, value)
        .Figure();

    private static AppraisedFigure Wards(string ward, string district, string all, MeasureKind kind = MeasureKind.Count) => new SmallRelease()
        .Stub("district", "Norrvale", "Norrvale", "Aldermoor", "Aldermoor")
        .Stub("ward", "All", "All", "All", "Tithe Barn")
        .Figures(kind, kind == MeasureKind.Count ? Gauss : Laplace, all, district, ward)
        .Figure(2);

    private static AppraisedFigure Tenures() => new SmallRelease()
        .Stub("tenure", "All tenures", "All tenures", "Owned outright")
        .Stub("age", null, "60 to 74", "60 to 74")
        .Figures(MeasureKind.Count, Gauss, "500", "15")
        .Figure(1);

    private static AppraisedFigure Quarter()
    {
        var release = new SmallRelease().Stub("quarter", null, "2031-Q3", "2031-Q3").Stub("district", "All", "All", "Cindry").Figures(MeasureKind.Count, Gauss, "900", "12").Build();
        var table = release.Tables[0];
        var periods = table with { Stub = [table.Stub[0] with { Period = true }, table.Stub[1]] };
        return AppraisedRelease.Of(release with { Tables = [periods] }).Figure(new FigureRef(0, 0, 1));
    }

    private static AppraisedFigure Strict(string value) =>
        new SmallRelease { Thresholds = new(0.001, 0.002) }.Figures(MeasureKind.Count, Gauss, value).Figure();

    private static AppraisedFigure SumOf(int parts, Mechanism mechanism) => new SmallRelease()
        .Stub("ward", "All", [.. Enumerable.Range(0, parts + 1).Select(part => part == 0 ? "All" : $"w{part}")])
        .Figures(
            SmallRelease.Measure(MeasureKind.Count), [new NoiseRule.SumOver(0), new NoiseRule.FromMechanism(mechanism)],
            [0, .. Enumerable.Repeat((byte)1, parts)], [.. Enumerable.Repeat("1840", parts + 1)])
        .Figure();

    /// <summary>A total of 3,680 over parts, some of which have no number.</summary>
    private static AppraisedFigure SumOf(Mechanism mechanism, params string[] parts) => SumOf(null, mechanism, parts);

    private static AppraisedFigure SumOf(Hiding? hidden, Mechanism mechanism, params string[] parts) => new SmallRelease { Hidden = hidden }
        .Stub("ward", "All", ["All", .. parts.Select((_, part) => $"w{part}")])
        .Figures(
            SmallRelease.Measure(MeasureKind.Count), [new NoiseRule.SumOver(0), new NoiseRule.FromMechanism(mechanism)],
            [0, .. Enumerable.Repeat((byte)1, parts.Length)], ["3680", .. parts])
        .Figure();

    private static AppraisedFigure Bounded(AfterStep step, string value, params AfterStep[] more) => new SmallRelease()
        .Figures(SmallRelease.Measure(MeasureKind.Count) with { Highest = 1200 }, SmallRelease.DiscreteGaussian(9.5, [step, .. more]), value).Figure();

    private static AppraisedFigure Lowest(double lowest, string value) => new SmallRelease()
        .Figures(SmallRelease.Measure(MeasureKind.Mean) with { Lowest = lowest, Unit = Crowns }, Laplace, value).Figure();

    private static AppraisedFigure Rate(string value) => new SmallRelease()
        .Figures(SmallRelease.Measure(MeasureKind.Rate) with { Per = 1000, Lowest = 0, Unit = SmallRelease.UnitOf("fire", "fires") }, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.2)), value)
        .Figure();

    private static AppraisedFigure PublishedFrom(string value) => new SmallRelease()
        .Figures(SmallRelease.Measure(MeasureKind.Count) with { PublishedFrom = 30 }, Gauss, value).Figure();

    private static AppraisedFigure Fixed(NoiseRule rule, string value) => new SmallRelease()
        .Figures(SmallRelease.Measure(rule is NoiseRule.Exact ? MeasureKind.Amount : MeasureKind.Count) with { Unit = rule is NoiseRule.Exact ? Crowns : SmallRelease.Households }, [rule], [0], value)
        .Figure();

    /// <summary>The office says that the index lies at 100 whatever the data are: a range of one number.</summary>
    private static AppraisedFigure Narrow(string value = "100.000") => new SmallRelease()
        .Figures(SmallRelease.Measure(MeasureKind.Index) with { Lowest = 100, Highest = 100, Unit = SmallRelease.UnitOf("point", "points") }, Laplace, value)
        .Figure();

    /// <summary>Uneven ranges come with the derived figures; their words are ready.</summary>
    private static AppraisedFigure Uneven(bool rounded)
    {
        var figure = Count(rounded ? SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(5)) : Gauss, "1240");
        var printed = new PrintedRange(new(1240, 0), new(12, 0), new(17, 0), new(1228, 0), new(1257, 0), false, false);
        return figure with { Ranges = [.. figure.Ranges.Select(range => range with { MarginDown = 12, MarginUp = 17, Low = 1228, High = 1257, Printed = printed })] };
    }
}
