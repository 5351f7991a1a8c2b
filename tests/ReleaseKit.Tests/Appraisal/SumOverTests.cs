using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Appraisal;

public sealed class SumOverTests
{
    private static readonly Measure Counts = SmallRelease.Measure(MeasureKind.Count);

    private static NoiseRule.FromMechanism Draw(Mechanism mechanism) => new(mechanism);

    /// <summary>One total over so many wards.</summary>
    private static AppraisedFigure TotalOf(int wards, Mechanism mechanism) => new SmallRelease()
        .Stub("ward", "All", [.. Enumerable.Range(0, wards + 1).Select(ward => ward == 0 ? "All" : $"w{ward}")])
        .Figures(Counts, [new NoiseRule.SumOver(0), Draw(mechanism)], [0, .. Enumerable.Repeat((byte)1, wards)], [.. Enumerable.Repeat("500", wards + 1)])
        .Figure();

    // tests/reference/sums.csv, cases 1, 2, 3, 10, 11, 12 at coverage 0.95.
    [Theory]
    [InlineData(LawName.DiscreteLaplace, "scale", 2, 2, 8, 0.95696442067075079)]
    [InlineData(LawName.DiscreteLaplace, "scale", 2, 5, 13, 0.96314696900159767)]
    [InlineData(LawName.DiscreteLaplace, "scale", 2, 37, 33, 0.95021312647296911)]
    [InlineData(LawName.DiscreteGaussian, "sigma", 8, 2, 22, 0.95334132820210391)]
    [InlineData(LawName.DiscreteGaussian, "sigma", 8, 5, 35, 0.95282979686137702)]
    [InlineData(LawName.DiscreteGaussian, "sigma", 8, 37, 95, 0.95030121730560383)]
    public void Sum_has_the_exact_margin_of_its_draws(LawName law, string key, double parameter, int wards, double margin, double attained)
    {
        var total = TotalOf(wards, SmallRelease.Mechanism("m", law, (key, parameter)));
        Assert.Equal((margin, wards), (total.Main!.Margin, total.Draws));
        Assert.Equal(attained, total.Main.Attained, 1e-12);
    }

    /// <summary>All of all; two districts that are sums; two wards and one ward. The total is a sum of the districts.</summary>
    private static SmallRelease Nested(Mechanism mechanism, Hiding? hidden, params string[] values) => new SmallRelease { Hidden = hidden }
        .Stub("district", "All", "All", "Aldermoor", "Aldermoor", "Aldermoor", "Cindry", "Cindry")
        .Stub("ward", "All", "All", "All", "Harrow Lane", "Tithe Barn", "All", "Old Kiln")
        .Figures(Counts, [new NoiseRule.SumOver(0), new NoiseRule.SumOver(1), Draw(mechanism)], [0, 1, 2, 2, 1, 2], values);

    [Fact]
    public void Sum_of_sums_goes_down_to_the_draws()
    {
        var release = Nested(SmallRelease.DiscreteGaussian(8), null, "30", "20", "12", "8", "10", "10").Appraise();
        Assert.Equal([3, 2, 1, 1, 1, 1], Enumerable.Range(0, 6).Select(row => release.Figure(new FigureRef(0, 0, row)).Draws));
        Assert.Equal("gauss", release.Figure(new FigureRef(0, 0, 0)).Mechanism!.Id);
    }

    [Fact]
    public void Sum_of_one_part_has_the_margin_of_the_part()
    {
        var release = Nested(SmallRelease.DiscreteGaussian(8), null, "30", "20", "12", "8", "10", "10").Appraise();
        Assert.Same(release.Figure(new FigureRef(0, 0, 5)).Error, release.Figure(new FigureRef(0, 0, 4)).Error);
    }

    [Theory]
    [InlineData("20", "10", "O", "10", "10", "10", 3, 1)]
    [InlineData("10", "10", "O", "10", "O", "10", 3, 2)]
    [InlineData("20", "10", "M", "10", "10", "10", 2, 0)]
    [InlineData("30", "20", "12", "8", "10", "10", 3, 0)]
    public void Sum_knows_how_many_of_its_parts_have_no_number(
        string all, string aldermoor, string harrow, string tithe, string cindry, string kiln, int parts, int leftOut)
    {
        var total = Nested(SmallRelease.DiscreteGaussian(8), null, all, aldermoor, harrow, tithe, cindry, kiln).Appraise().Figure(new FigureRef(0, 0, 0));
        Assert.Equal((parts, leftOut), (total.Parts, total.PartsLeftOut));
    }

    [Fact]
    public void Hidden_part_that_the_total_holds_is_not_left_out()
    {
        var release = Nested(SmallRelease.DiscreteGaussian(8), new Hiding(HiddenBy.PublicRule, true), "30", "20", "Q", "10", "10", "10").Appraise();
        var total = release.Figure(new FigureRef(0, 0, 0));
        Assert.Equal((0, 1), (total.PartsLeftOut, total.PartsHidden));
    }

    [Fact]
    public void Hidden_part_is_no_draw_of_a_total_that_leaves_it_out()
    {
        var release = Nested(SmallRelease.DiscreteGaussian(8), new Hiding(HiddenBy.PublicRule, false), "20", "10", "Q", "10", "10", "10").Appraise();
        var total = release.Figure(new FigureRef(0, 0, 0));
        Assert.Equal((2, 0), (total.Draws, total.PartsHidden));
    }

    [Fact]
    public void Hidden_part_is_a_draw_of_a_total_that_holds_it()
    {
        var release = Nested(SmallRelease.DiscreteGaussian(8), new Hiding(HiddenBy.NoisedValue, true), "30", "20", "Q", "8", "10", "10").Appraise();
        Assert.Equal(3, release.Figure(new FigureRef(0, 0, 0)).Draws);
    }

    [Fact]
    public void Part_that_is_missing_is_no_draw()
    {
        var release = Nested(SmallRelease.DiscreteGaussian(8), new Hiding(HiddenBy.NoisedValue, true), "20", "8", "O", "8", "10", "10").Appraise();
        Assert.Equal(2, release.Figure(new FigureRef(0, 0, 0)).Draws);
    }

    [Fact]
    public void Sum_of_parts_with_steps_after_the_noise_has_no_margin_here() =>
        Assert.Equal(SpecialCase.NoMargin, TotalOf(3, SmallRelease.DiscreteGaussian(8, new AfterStep.RoundTo(5))).Case.First);

    [Fact]
    public void Sum_of_parts_with_continuous_noise_has_no_margin_here() =>
        Assert.Equal(SpecialCase.NoMargin, TotalOf(3, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 2))).Case.First);

    [Fact]
    public void Sum_of_exact_parts_is_exact()
    {
        var total = new SmallRelease()
            .Stub("ward", "All", "All", "w1", "w2")
            .Figures(Counts, [new NoiseRule.SumOver(0), new NoiseRule.Exact(SmallRelease.Words("law"))], [0, 1, 1], "3", "1", "2")
            .Figure();
        Assert.Equal((SpecialCase.Exact, Reliability.Exact), (total.Case.First, total.Reliability));
    }

    [Fact]
    public void Exact_part_adds_no_noise_to_a_sum()
    {
        var rules = new NoiseRule[] { new NoiseRule.SumOver(0), new NoiseRule.Exact(SmallRelease.Words("law")), Draw(SmallRelease.DiscreteGaussian(8)) };
        var total = new SmallRelease().Stub("ward", "All", "All", "w1", "w2").Figures(Counts, rules, [0, 1, 2], "3", "1", "2").Figure();
        Assert.Equal((1, 16), (total.Draws, total.Main!.Margin));
    }

    [Fact]
    public void Parts_of_two_mechanisms_share_none()
    {
        var rules = new NoiseRule[] { new NoiseRule.SumOver(0), Draw(SmallRelease.DiscreteGaussian(8)), Draw(SmallRelease.DiscreteGaussian(6) with { Id = "six" }) };
        var total = new SmallRelease().Stub("ward", "All", "All", "w1", "w2").Figures(Counts, rules, [0, 1, 2], "3", "1", "2").Figure();
        Assert.Equal((2, null), (total.Draws, total.Mechanism));
        Assert.NotNull(total.Main);
    }

    [Fact]
    public void Parts_on_different_grids_have_no_margin_here()
    {
        var rules = new NoiseRule[] { new NoiseRule.SumOver(0), Draw(SmallRelease.DiscreteGaussian(8)), Draw(SmallRelease.DiscreteGaussian(6) with { Grid = 0.5 }) };
        var total = new SmallRelease().Stub("ward", "All", "All", "w1", "w2").Figures(Counts, rules, [0, 1, 2], "3", "1", "2").Figure();
        Assert.Equal(SpecialCase.NoMargin, total.Case.First);
    }

    [Fact]
    public void Scale_that_varies_by_row_gives_the_sum_of_different_laws()
    {
        var mechanism = SmallRelease.Mechanism("m", LawName.DiscreteLaplace) with
        {
            Parameters = new Dictionary<string, NumberOrColumn> { ["scale"] = NumberOrColumn.From("scale") },
        };
        var total = new SmallRelease()
            .Stub("ward", "All", "All", "w1", "w2")
            .Side("scale", double.NaN, 2, 5)
            .Figures(Counts, [new NoiseRule.SumOver(0), Draw(mechanism)], [0, 1, 1], "300", "100", "200")
            .Figure();
        Assert.Equal(BruteForceMargin(2, 5), total.Main!.Margin);
    }

    /// <summary>The smallest w with P(|N₁ + N₂| ≤ w) ≥ 0.95 for two-sided geometric noise, by adding every pair of steps.</summary>
    private static double BruteForceMargin(double first, double second)
    {
        const int Reach = 400;
        var within = new double[4 * Reach];
        for (var one = -Reach; one <= Reach; one++)
            for (var two = -Reach; two <= Reach; two++)
                within[Math.Abs(one + two)] += Geometric(first, one) * Geometric(second, two);
        var sum = 0.0;
        for (var width = 0; ; width++)
            if ((sum += within[width]) >= 0.95)
                return width;
    }

    private static double Geometric(double scale, int step) => Math.Tanh(1 / (2 * scale)) * Math.Exp(-Math.Abs(step) / scale);
}
