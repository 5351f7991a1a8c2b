using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Wording;
using Xunit;

namespace ReleaseKit.Tests.Appraisal;

public sealed class ReliabilityTests
{
    // Uniform noise on −w … w has the margin w at every coverage above (2w − 1)/(2w + 1): whole numbers, so that ties are met exactly.
    private static Reliability Of(MeasureKind kind, double margin, string value) => new SmallRelease()
        .Figures(kind, SmallRelease.Mechanism("m", LawName.DiscreteUniform, ("halfWidth", margin)), value).Figure().Reliability;

    [Theory]
    [InlineData("100", Reliability.Close)]
    [InlineData("99", Reliability.Rough)]
    [InlineData("20", Reliability.Rough)]
    [InlineData("19", Reliability.Weak)]
    [InlineData("10", Reliability.Weak)]
    [InlineData("1", Reliability.Weak)]
    [InlineData("0", Reliability.Weak)]
    [InlineData("-7", Reliability.Weak)]
    [InlineData("-100", Reliability.Weak)]
    public void Count_with_margin_ten(string value, Reliability expected) => Assert.Equal(expected, Of(MeasureKind.Count, 10, value));

    [Theory]
    [InlineData("-100", Reliability.Close)]
    [InlineData("-99", Reliability.Rough)]
    [InlineData("-20", Reliability.Rough)]
    [InlineData("-19", Reliability.Weak)]
    [InlineData("0", Reliability.Weak)]
    public void Amount_that_can_be_negative_is_judged_by_its_size(string value, Reliability expected) => Assert.Equal(expected, Of(MeasureKind.Amount, 10, value));

    [Fact]
    public void Tie_that_doubles_would_miss_belongs_to_the_better_word()
    {
        // 0.1 × 3 is 0.30000000000000004 in doubles and 0.1 × 30 is 3: decimals decide both alike.
        Assert.Equal(Reliability.Close, Of(MeasureKind.Count, 3, "30"));
        Assert.Equal(Reliability.Rough, Of(MeasureKind.Count, 7, "69"));
        Assert.Equal(Reliability.Close, Of(MeasureKind.Count, 7, "70"));
    }

    [Fact]
    public void Every_tie_of_the_first_threshold_is_close()
    {
        for (var margin = 1; margin <= 19; margin++)
            Assert.Equal(Reliability.Close, Of(MeasureKind.Count, margin, $"{10 * margin}"));
    }

    [Fact]
    public void Measure_with_a_lowest_value_of_zero_cannot_be_negative()
    {
        var measure = SmallRelease.Measure(MeasureKind.Mean) with { Lowest = 0 };
        var figure = new SmallRelease().Figures(measure, SmallRelease.Mechanism("m", LawName.DiscreteUniform, ("halfWidth", 10)), "-100").Figure();
        Assert.Equal((Reliability.Weak, null), (figure.Reliability, figure.MarginToFigure));
    }

    [Fact]
    public void Weak_figure_is_sent_to_the_smallest_whole_that_is_not_weak()
    {
        var release = TwoLevels("19", "40", "900");
        Assert.Equal(2, release.Figure(new FigureRef(0, 0, 3)).UseInstead!.Value.Row);
        Assert.Equal(2, release.Figure(new FigureRef(0, 0, 1)).UseInstead?.Row ?? 2);
    }

    [Fact]
    public void Weak_figure_passes_by_a_whole_that_is_weak_too()
    {
        var release = TwoLevels("19", "18", "900");
        Assert.Equal(0, release.Figure(new FigureRef(0, 0, 3)).UseInstead!.Value.Row);
    }

    [Fact]
    public void Weak_figure_without_a_better_whole_stands_alone()
    {
        var release = TwoLevels("19", "18", "17");
        Assert.Null(release.Figure(new FigureRef(0, 0, 3)).UseInstead);
    }

    [Fact]
    public void Close_figure_is_sent_nowhere()
    {
        var release = TwoLevels("500", "600", "900");
        Assert.Null(release.Figure(new FigureRef(0, 0, 3)).UseInstead);
    }

    [Theory]
    [InlineData("200", "100", 1)]
    [InlineData("100", "200", 2)]
    [InlineData("19", "100", 2)]
    [InlineData("100", "19", 1)]
    [InlineData("19", "19", 0)]
    public void Of_the_totals_as_near_the_one_with_the_smallest_margin_for_its_size_is_named(string ofAge, string ofTenure, int row)
    {
        var figure = Crossed("900", ofAge, ofTenure, "19").Figure(new FigureRef(0, 0, 3));

        Assert.Equal(row, figure.UseInstead!.Value.Row);
    }

    [Fact]
    public void Total_of_everything_is_named_by_all_its_headings_and_another_by_its_own()
    {
        string Advice(string ofAge) => English.Language.ReadingOf(Crossed("900", ofAge, "19", "19").Figure(new FigureRef(0, 0, 3))).Text;

        Assert.Contains("Use the published total “All, All” instead.", Advice("19"), StringComparison.Ordinal);
        Assert.Contains("Use the published total “All, 60 to 74” instead.", Advice("100"), StringComparison.Ordinal);
    }

    /// <summary>A table of two ways, each figure with a margin of 10: everything, the total of an age band, that of a tenure, and their cell.</summary>
    private static IAppraisedRelease Crossed(string all, string ofAge, string ofTenure, string cell) => new SmallRelease()
        .Stub("tenure", "All", "All", "All", "Rented", "Rented")
        .Stub("age", "All", "All", "60 to 74", "All", "60 to 74")
        .Figures(MeasureKind.Count, SmallRelease.Mechanism("m", LawName.DiscreteUniform, ("halfWidth", 10)), all, ofAge, ofTenure, cell)
        .Appraise();

    /// <summary>All of all, a ward and its district, each with a margin of 10.</summary>
    private static IAppraisedRelease TwoLevels(string ward, string district, string all) => new SmallRelease()
        .Stub("district", "All", "All", "Cindry", "Aldermoor", "Aldermoor")
        .Stub("ward", "All", "All", "All", "All", "Harrow Lane")
        .Figures(MeasureKind.Count, SmallRelease.Mechanism("m", LawName.DiscreteUniform, ("halfWidth", 10)), all, "100", district, ward)
        .Appraise();
}
