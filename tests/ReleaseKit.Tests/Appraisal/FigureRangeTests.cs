using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Appraisal;

public sealed class FigureRangeTests
{
    private static AppraisedFigure Figure(MeasureKind kind, Mechanism mechanism, string value) => new SmallRelease().Figures(kind, mechanism, value).Figure();

    // Ranges below what is possible, discrete Gaussian 9.5, likelihood-ratio range of Feldman & Cousins 1998, Phys. Rev. D 57, 3873;
    // worked out once by hand when the rule was set.
    [Theory]
    [InlineData("-40", 3)]
    [InlineData("-25", 4)]
    [InlineData("-19", 5)]
    [InlineData("-15", 7)]
    [InlineData("-10", 10)]
    public void Count_below_zero_reads_from_zero_to_a_small_number(string value, double high)
    {
        var main = Figure(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), value).Main!;
        Assert.Equal((0, high), (main.Low, main.High));
        Assert.Equal((0, (long)high), (main.Printed.Low.Unscaled, main.Printed.High.Unscaled));
    }

    [Fact]
    public void Figure_at_a_threshold_is_answered_by_the_law_given_that_it_passed()
    {
        var main = Figure(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "30").Main!;
        Assert.Equal((0, 40), (main.Low, main.High));
        Assert.True(main.Printed.IsUneven);
    }

    [Fact]
    public void Margin_of_zero_is_raised_to_one_grid_step()
    {
        // Discrete Gaussian with sigma 0.2: P(N = 0) = 1 / (1 + 2 e^(−1/0.08) + …) = 0.9999925.
        var figure = Figure(MeasureKind.Count, SmallRelease.DiscreteGaussian(0.2), "1240");
        Assert.All(figure.Ranges, range => Assert.Equal((1, 1239, 1241), (range.Margin, range.Low, range.High)));
        Assert.Equal(1 / (1 + 2 * Math.Exp(-12.5)), figure.LeftAsItWas!.Value, 1e-9);
        Assert.True(figure.Main!.Attained > figure.LeftAsItWas);
        Assert.Equal(SpecialCase.MostlyUnchanged, figure.Case.First);
    }

    [Fact]
    public void Margin_of_zero_on_a_grid_is_raised_to_that_grid()
    {
        var mechanism = SmallRelease.DiscreteGaussian(0.02) with { Grid = 0.1 };
        var figure = Figure(MeasureKind.Amount, mechanism, "12.3");
        Assert.Equal(0.1, figure.Main!.Margin, 1e-12);
    }

    [Fact]
    public void Decimals_of_the_file_are_a_rounding_of_continuous_noise()
    {
        // Laplace: b ln 20 (Kotz, Kozubowski & Podgórski 2001, 2.1; from memory), and half of 0.01.
        var figure = Figure(MeasureKind.Mean, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.4)), "412.34");
        Assert.Equal(0.4 * Math.Log(20) + 0.005, figure.Main!.Margin, 1e-9);
        // The step is part of the margin, so the reading says noise and rounding together.
        Assert.True(figure.Case.Rounded);
    }

    // A program that drops zeros at the end writes 0 for 0.00.
    [Theory]
    [InlineData("0.00", "412.34", "0.00")]
    [InlineData("0", "412.34", "12.5")]
    [InlineData("0", "0.00", "12 D")]
    public void Decimals_of_the_file_are_the_finest_of_the_rule(string one, string other, string third)
    {
        var release = new SmallRelease().Figures(MeasureKind.Mean, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.4)), one, other, third);
        Assert.All(Enumerable.Range(0, 3), row => Assert.Equal(0.4 * Math.Log(20) + 0.005, release.Figure(row).Main!.Margin, 1e-9));
    }

    [Fact]
    public void Decimals_of_the_file_are_those_of_each_rule()
    {
        NoiseRule[] rules = [new NoiseRule.FromMechanism(SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.4))), new NoiseRule.Public(SmallRelease.Words("survey"))];
        var release = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Mean), rules, [0, 0, 1], "0", "12.5", "7.125");
        Assert.All(Enumerable.Range(0, 2), row => Assert.Equal(0.4 * Math.Log(20) + 0.05, release.Figure(row).Main!.Margin, 1e-9));
    }

    [Fact]
    public void Decimals_of_the_file_add_nothing_to_rounding_by_the_mechanism()
    {
        var mechanism = SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 4)) with { Afterwards = [new AfterStep.RoundTo(5)] };
        var figure = Figure(MeasureKind.Mean, mechanism, "415");
        Assert.Equal(4 * Math.Log(20) + 2.5, figure.Main!.Margin, 1e-9);
        Assert.True(figure.Case.Rounded);
    }

    [Fact]
    public void Whole_numbers_of_a_lattice_law_get_no_rounding()
    {
        var figure = Figure(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "1240");
        Assert.Equal((19, 1221, 1259), (figure.Main!.Margin, figure.Main.Low, figure.Main.High));
    }

    [Fact]
    public void Share_is_cut_at_a_hundred()
    {
        var figure = Figure(MeasureKind.Share, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 1.4)), "99.2");
        Assert.Equal(100, figure.Main!.High);
        Assert.True(figure.Main.Printed.HighIsCut);
        Assert.Equal(99.2 + figure.Main.Margin, figure.Main.UncutHigh, 1e-9);
    }

    [Fact]
    public void Declared_bounds_cut_the_range()
    {
        var measure = SmallRelease.Measure(MeasureKind.Mean) with { Lowest = 10, Highest = 14 };
        var figure = new SmallRelease().Figures(measure, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 2)), "12.00").Figure();
        Assert.Equal((10, 14), (figure.Main!.Low, figure.Main.High));
    }

    [Fact]
    public void Law_known_by_its_spending_only_has_no_margin()
    {
        var figure = Figure(MeasureKind.Count, SmallRelease.Mechanism("m", LawName.Declared), "12");
        Assert.Equal((SpecialCase.NoMargin, Reliability.NotStated, 0), (figure.Case.First, figure.Reliability, figure.Ranges.Count));
    }

    [Fact]
    public void Figure_made_consistent_has_no_margin()
    {
        var figure = Figure(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5) with { Adjusted = true }, "12");
        Assert.Equal(SpecialCase.NoMargin, figure.Case.First);
    }

    [Fact]
    public void Steps_that_do_not_go_together_give_no_margin()
    {
        var figure = Figure(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, new AfterStep.NotBelow(20), new AfterStep.NotAbove(10)), "15");
        Assert.Equal(SpecialCase.NoMargin, figure.Case.First);
    }

    [Fact]
    public void Table_of_noise_that_lacks_mass_has_no_margin()
    {
        var mechanism = SmallRelease.Mechanism("m", LawName.Tabulated) with { Tabulated = [(-1, 0.2m), (0, 0.5m), (1, 0.2m)] };
        Assert.Equal(SpecialCase.NoMargin, Figure(MeasureKind.Count, mechanism, "45").Case.First);
    }

    [Fact]
    public void Table_of_noise_that_lacks_mass_has_the_ranges_that_the_mass_reaches()
    {
        // 0.4 + 0.2 + 0.2 = 0.8 within 1, and 0.98 within 2.
        var mechanism = SmallRelease.Mechanism("m", LawName.Tabulated) with { Tabulated = [(-2, 0.1m), (-1, 0.2m), (0, 0.4m), (1, 0.2m), (2, 0.08m)] };
        var figure = Figure(MeasureKind.Count, mechanism, "20");
        Assert.Equal([(1.0, 19.0, 21.0), (2.0, 18.0, 22.0)], figure.Ranges.Select(range => (range.Margin, range.Low, range.High)));
        Assert.Equal(0.98, figure.Main!.Attained);
    }

    [Fact]
    public void Figure_at_its_cap_under_a_threshold_has_a_margin_down_to_its_lower_end_alone()
    {
        var mechanism = SmallRelease.DiscreteGaussian(4, new AfterStep.ZeroBelow(6), new AfterStep.NotAbove(40));
        var main = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count) with { Highest = 40 }, mechanism, "40").Figure().Main!;
        Assert.Equal((8, 0, 32, 40), (main.MarginDown, main.MarginUp, main.Low, main.High));
        Assert.True(main.Printed.HighIsCut);
    }

    [Theory]
    [InlineData(-50, "12.0", "12", "-50", "20")]
    [InlineData(0, "12.0", "12", "0", "20")]
    [InlineData(0, "3.3", "3.3", "0.0", "4.0")]
    public void Range_without_an_end_of_its_own_is_printed_to_the_digits_of_what_is_possible(double lowest, string value, string printed, string low, string high)
    {
        // Laplace noise of scale 2.5 has no lower end so near a threshold; the true upper ends are 19.466 and 3.937.
        var mechanism = SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 2.5)) with { Afterwards = [new AfterStep.ZeroBelow(3.25)] };
        var main = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Mean) with { Lowest = lowest }, mechanism, value).Figure().Main!;
        Assert.Equal((printed, low, high), (main.Printed.Value.ToString(), main.Printed.Low.ToString(), main.Printed.High.ToString()));
        Assert.True(main.Printed.LowIsCut);
        Assert.Equal(double.NegativeInfinity, main.UncutLow);
    }

    [Fact]
    public void Figure_whose_range_has_no_end_at_the_main_coverage_has_no_main_range()
    {
        var mechanism = SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 2.5)) with { Afterwards = [new AfterStep.ZeroBelow(3.25)] };
        var figure = Figure(MeasureKind.Mean, mechanism, "12.0");
        Assert.Equal((SpecialCase.NoMargin, Reliability.NotStated, 1), (figure.Case.First, figure.Reliability, figure.Ranges.Count));
        Assert.Null(figure.Main);
    }

    [Fact]
    public void Zero_that_stands_for_every_small_amount_has_no_margin()
    {
        // Without a least value the range would be without end.
        Assert.Equal(SpecialCase.NoMargin, Figure(MeasureKind.Amount, SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "0").Case.First);
    }

    [Fact]
    public void Figures_alike_share_one_error()
    {
        var release = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "12", "1240").Appraise();
        Assert.Same(release.Figure(new FigureRef(0, 0, 0)).Error, release.Figure(new FigureRef(0, 0, 1)).Error);
    }

    [Fact]
    public void Mechanisms_of_the_same_law_and_steps_share_one_error()
    {
        var release = new SmallRelease()
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "12")
            .Figures(SmallRelease.Measure(MeasureKind.Count, "other"), SmallRelease.DiscreteGaussian(9.5) with { Id = "other" }, "13")
            .Appraise();
        Assert.Same(release.Figure(new FigureRef(0, 0, 0)).Error, release.Figure(new FigureRef(0, 1, 0)).Error);
    }

    [Fact]
    public void Exact_figure_prints_the_decimals_of_its_measure()
    {
        var measure = SmallRelease.Measure(MeasureKind.Amount) with { Decimals = 2 };
        var figure = new SmallRelease().Figures(measure, [new NoiseRule.Exact(SmallRelease.Words("law"))], [0], "1234.5").Figure();
        Assert.Equal((SpecialCase.Exact, Reliability.Exact, "1234.50"), (figure.Case.First, figure.Reliability, figure.Printed.ToString()));
    }

    [Fact]
    public void Public_figure_has_no_range()
    {
        var figure = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count), [new NoiseRule.Public(SmallRelease.Words("list"))], [0], "12").Figure();
        Assert.Equal((SpecialCase.Public, Reliability.Public, 0), (figure.Case.First, figure.Reliability, figure.Ranges.Count));
    }

    [Theory]
    [InlineData("Q")]
    [InlineData("L")]
    [InlineData("M")]
    [InlineData("O")]
    public void Cell_without_a_number_has_no_range(string status)
    {
        var figure = Figure(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), status);
        Assert.Equal((SpecialCase.NoNumber, false, 0, Reliability.NotStated), (figure.Case.First, figure.HasNumber, figure.Ranges.Count, figure.Reliability));
    }

    [Fact]
    public void Address_and_id_name_every_stub_value()
    {
        var release = new SmallRelease()
            .Stub("district", "All", "Cindry", "Cindry")
            .Stub("ward", "All", "All", "Skerry End")
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "271", "15")
            .Appraise();
        var figure = release.Figure(new FigureRef(0, 0, 1));
        Assert.Equal("table/figure?district=Cindry&ward=Skerry%20End", figure.Address);
        Assert.Equal("figure.cindry.skerry-end", figure.Id);
        Assert.Equal(figure.Ref, release.FigureAt(figure.Address).Ref);
        Assert.Equal([new FigureRef(0, 0, 1)], release.Select("table/figure?district=Cindry"));
    }
}
