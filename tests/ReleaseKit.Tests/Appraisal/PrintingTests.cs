using ReleaseKit.Appraisal;
using ReleaseKit.Downloads;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Appraisal;

public sealed class PrintingTests
{
    private static readonly Random Chance = new(20310316);

    /// <summary>Eight hundred figures of any size beside margins of any size; Laplace noise whose scale stands in a column.</summary>
    private static IReadOnlyList<AppraisedFigure> Many(MeasureKind kind, int? decimals)
    {
        const int Count = 800;
        var values = Enumerable.Range(0, Count).Select(_ => RandomValue()).ToArray();
        var mechanism = SmallRelease.Mechanism("m", LawName.Laplace) with
        {
            Parameters = new Dictionary<string, NumberOrColumn> { ["scale"] = NumberOrColumn.From("scale") },
        };
        var release = new SmallRelease()
            .Side("scale", [.. Enumerable.Range(0, Count).Select(_ => Math.Pow(10, Chance.NextDouble() * 9 - 3))])
            .Figures(SmallRelease.Measure(kind) with { Decimals = decimals }, mechanism, values)
            .Appraise();
        return [.. Enumerable.Range(0, Count).Select(row => release.Figure(new FigureRef(0, 0, row)))];
    }

    private static string RandomValue() => new PublishedValue(
        Chance.NextInt64(-999, 1000) * (long)Math.Pow(10, Chance.Next(0, 7)) + Chance.NextInt64(0, 1000), (byte)Chance.Next(0, 5)).ToString();

    [Theory]
    [InlineData(MeasureKind.Mean, null)]
    [InlineData(MeasureKind.Mean, 2)]
    [InlineData(MeasureKind.Amount, 0)]
    [InlineData(MeasureKind.Count, null)]
    public void Printed_range_loses_nothing_of_the_range(MeasureKind kind, int? decimals)
    {
        foreach (var figure in Many(kind, decimals))
            foreach (var range in figure.Ranges)
            {
                var (value, margin) = (range.Printed.Value.ToDecimal(), range.Printed.Margin.ToDecimal());
                var (exact, width) = (figure.Value.ToDecimal(), PrintUnit.Rounded(range.Margin));
                Assert.True(value - margin <= exact - width && exact + width <= value + margin, figure.Value.ToString());
                var doubt = 1e-11 * Math.Max(Math.Abs(range.Low), Math.Abs(range.High));
                Assert.True((double)range.Printed.Low.ToDecimal() <= range.Low + doubt && range.High - doubt <= (double)range.Printed.High.ToDecimal(), figure.Value.ToString());
            }
    }

    [Fact]
    public void Printed_margin_is_the_smallest_multiple_of_the_unit()
    {
        foreach (var figure in Many(MeasureKind.Mean, null))
        {
            var range = figure.Main!;
            var unit = Unit(range.Printed);
            var (value, margin) = (range.Printed.Value.ToDecimal(), range.Printed.Margin.ToDecimal() - unit);
            var (exact, width) = (figure.Value.ToDecimal(), PrintUnit.Rounded(range.Margin));
            Assert.False(value - margin <= exact - width && exact + width <= value + margin, figure.Value.ToString());
        }
    }

    [Fact]
    public void Margin_has_two_digits_or_three_where_it_was_rounded_up()
    {
        foreach (var figure in Many(MeasureKind.Mean, null))
            Assert.InRange(figure.Main!.Printed.Margin.ToDecimal() / Unit(figure.Main.Printed), 10, 101);
    }

    [Fact]
    public void Decimals_of_the_measure_are_the_finest_in_print()
    {
        foreach (var figure in Many(MeasureKind.Mean, 2))
            Assert.InRange(figure.Main!.Printed.Value.Decimals, 0, 2);
    }

    [Fact]
    public void Count_prints_whole_numbers()
    {
        foreach (var figure in Many(MeasureKind.Count, null))
            Assert.All(Numbers(figure.Main!.Printed), number => Assert.Equal(0, number.Decimals));
    }

    [Theory]
    [InlineData(MeasureKind.Mean)]
    [InlineData(MeasureKind.Count)]
    public void Numbers_of_one_range_have_the_same_digits_after_the_point(MeasureKind kind)
    {
        foreach (var figure in Many(kind, null))
            foreach (var range in figure.Ranges)
                Assert.Single(Numbers(range.Printed).Select(number => number.Decimals).Distinct());
    }

    [Fact]
    public void Uncut_ends_are_the_value_less_and_plus_the_margin()
    {
        foreach (var printed in Many(MeasureKind.Count, null).SelectMany(figure => figure.Ranges).Select(range => range.Printed))
        {
            if (!printed.LowIsCut)
                Assert.Equal(printed.Value.ToDecimal() - printed.Margin.ToDecimal(), printed.Low.ToDecimal());
            if (!printed.HighIsCut)
                Assert.Equal(printed.Value.ToDecimal() + printed.Margin.ToDecimal(), printed.High.ToDecimal());
        }
    }

    [Fact]
    public void All_coverages_print_the_same_value()
    {
        foreach (var figure in Many(MeasureKind.Mean, null))
            Assert.Single(figure.Ranges.Select(range => range.Printed.Value).Distinct());
    }

    [Fact]
    public void Lattice_amount_on_a_grid_of_one_prints_whole_numbers()
    {
        // a = e^(−1/5000): 1 − 2a^(w + 1)/(1 + a) ≥ 0.95 from w = 14979 on; two digits would give 15000.
        var printed = new SmallRelease().Figures(MeasureKind.Amount, SmallRelease.Mechanism("m", LawName.DiscreteLaplace, ("scale", 5000)), "1234567").Figure().Main!.Printed;
        Assert.Equal(("1234567", "14979"), (printed.Value.ToString(), printed.Margin.ToString()));
    }

    [Fact]
    public void Share_that_the_file_holds_in_ones_prints_in_hundred()
    {
        var measure = SmallRelease.Measure(MeasureKind.Share) with { InOnes = true };
        var figure = new SmallRelease().Figures(measure, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.01)), "0.9876").Figure();
        // 0.01 ln 20 = 0.029957 and half of the last decimal, 0.00005.
        Assert.Equal(0.0300073, figure.Main!.Margin, 1e-7);
        Assert.Equal(("98.8", "3.1", "95.7", "100.0"), Printed(figure));
        Assert.Equal(1, figure.Main.High);
    }

    [Theory]
    [InlineData("1234567890123", "1234567890106", "1234567890140")]
    [InlineData("999999999999999", "999999999999982", "1000000000000016")]
    public void Ends_of_a_large_count_have_all_their_digits_and_are_not_cut(string value, string low, string high)
    {
        // Discrete Gaussian, sigma 8.5: half-width 17 at 95 in 100.
        var range = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(8.5), value).Figure().Main!;
        Assert.Equal((value, "17", low, high), (range.Printed.Value.ToString(), range.Printed.Margin.ToString(), range.Printed.Low.ToString(), range.Printed.High.ToString()));
        Assert.False(range.Printed.LowIsCut || range.Printed.HighIsCut);
        Assert.Equal((low, high), (PlainNumber.Of(range.Low), PlainNumber.Of(range.High)));
    }

    [Fact]
    public void Figure_so_large_that_a_double_does_not_hold_the_unit_of_its_margin_prints_in_a_coarser_one()
    {
        // Half-width ln 20 · 0.001 = 0.003 and half of the last decimal of the file, 0.5.
        var figure = new SmallRelease().Figures(MeasureKind.Amount, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.001)), "123456789012345").Figure();
        Assert.Equal(("123456789012345", "1", "123456789012344", "123456789012346"), Printed(figure));
    }

    [Fact]
    public void File_that_counts_in_thousands_is_read_in_the_unit_of_the_figure()
    {
        var measure = SmallRelease.Measure(MeasureKind.Count) with { Multiplier = 1000 };
        var figure = new SmallRelease().Figures(measure, SmallRelease.DiscreteGaussian(9.5), "1.234").Figure();
        Assert.Equal(("1234", "19", "1215", "1253"), Printed(figure));
    }

    private static (string Value, string Margin, string Low, string High) Printed(AppraisedFigure figure)
    {
        var printed = figure.Main!.Printed;
        return (printed.Value.ToString(), printed.Margin.ToString(), printed.Low.ToString(), printed.High.ToString());
    }

    private static IEnumerable<PublishedValue> Numbers(PrintedRange printed) => [printed.Value, printed.MarginDown, printed.MarginUp, printed.Low, printed.High];

    /// <summary>The place of the last digit that is not only zeros behind a margin of two digits.</summary>
    private static decimal Unit(PrintedRange printed)
    {
        var (digits, unit) = (printed.Margin.Unscaled, 1m);
        for (; digits >= 110 || (digits > 101 && digits % 10 == 0); digits /= 10)
            unit *= 10;
        for (var place = 0; place < printed.Margin.Decimals; place++)
            unit /= 10;
        return unit;
    }
}
