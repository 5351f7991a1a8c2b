using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using ReleaseKit.Wording;
using Xunit;

namespace ReleaseKit.Tests.Wording;

public sealed class LanguageTests
{
    private static readonly ILanguage En = English.Language;

    // Unicode CLDR 44, common/main/en.xml: group ",", decimal ".", from memory; the minus in tables is U+2212 by choice of the design.
    [Theory]
    [InlineData(0, 0, "0")]
    [InlineData(999, 0, "999")]
    [InlineData(1000, 0, "1,000")]
    [InlineData(1234567, 0, "1,234,567")]
    [InlineData(123456, 2, "1,234.56")]
    [InlineData(5, 1, "0.5")]
    [InlineData(-5, 2, "\u22120.05")]
    [InlineData(-1842, 0, "\u22121,842")]
    [InlineData(100, 2, "1.00")]
    [InlineData(long.MinValue, 0, "\u22129,223,372,036,854,775,808")]
    public void Number_stands_as_english_writes_it(long unscaled, byte decimals, string expected) => Assert.Equal(expected, En.Number(new(unscaled, decimals)));

    [Theory]
    [InlineData(-3, 0, "minus\u00a03")]
    [InlineData(-1234, 1, "minus\u00a0123.4")]
    [InlineData(1234, 0, "1,234")]
    public void Number_in_prose_says_minus(long unscaled, byte decimals, string expected) => Assert.Equal(expected, En.NumberInProse(new(unscaled, decimals)));

    // CLDR plural rules for English: one for i = 1 and v = 0, else other.
    [Theory]
    [InlineData(1, 0, "1\u00a0household")]
    [InlineData(-1, 0, "minus\u00a01\u00a0household")]
    [InlineData(0, 0, "0\u00a0households")]
    [InlineData(2, 0, "2\u00a0households")]
    [InlineData(10, 1, "1.0\u00a0households")]
    [InlineData(1001, 0, "1,001\u00a0households")]
    public void Unit_agrees_in_number(long unscaled, byte decimals, string expected) => Assert.Equal(expected, En.WithUnit(new(unscaled, decimals), SmallRelease.Measure(MeasureKind.Count)));

    [Fact]
    public void Unit_that_is_not_declared_is_used_as_written() =>
        Assert.Equal("5\u00a0kWh", En.WithUnit(new(5, 0), SmallRelease.Measure(MeasureKind.Mean) with { Unit = new Unit("kWh", new Dictionary<string, UnitForms>()) }));

    [Theory]
    [InlineData("", "51.3\u00a0in each 100")]
    [InlineData("homes", "51.3\u00a0homes in each 100")]
    [InlineData("homes in each 100", "51.3\u00a0homes in each 100")]
    [InlineData("in 100", "51.3\u00a0in 100")]
    [InlineData("per cent", "51.3\u00a0per cent")]
    public void Share_says_once_that_it_counts_in_each_100(string unit, string expected) =>
        Assert.Equal(expected, En.WithUnit(new(513, 1), SmallRelease.Measure(MeasureKind.Share) with { Unit = SmallRelease.UnitOf(unit, unit) }));

    [Fact]
    public void Even_margin_has_one_number() =>
        Assert.Equal("\u00b1\u00a019", En.Margin(new PrintedRange(new(1240, 0), new(19, 0), new(19, 0), new(1221, 0), new(1259, 0), false, false)));

    [Fact]
    public void Uneven_margin_has_both_sides() =>
        Assert.Equal("\u221212\u00a0+17", En.Margin(new PrintedRange(new(1240, 0), new(12, 0), new(17, 0), new(1228, 0), new(1257, 0), false, false)));

    [Theory]
    [InlineData(0.95, "95 in 100")]
    [InlineData(0.5, "50 in 100")]
    [InlineData(0.999, "999 in 1,000")]
    [InlineData(0.975, "975 in 1,000")]
    public void Coverage_is_a_natural_frequency(double share, string expected) => Assert.Equal(expected, En.Share(Coverage.OfShare(share)));

    [Fact]
    public void Date_is_day_month_year_and_its_day_stays_with_the_month() => Assert.Equal("16\u00A0March 2032", En.Date(new DateOnly(2032, 3, 16)));

    [Fact]
    public void Every_month_has_its_name()
    {
        // The invariant culture's month names are the English ones.
        for (var month = 1; month <= 12; month++)
            Assert.Equal(new DateOnly(2032, month, 1).ToString("d\u00A0MMMM yyyy", CultureInfo.InvariantCulture), En.Date(new DateOnly(2032, month, 1)));
    }

    [Theory]
    [InlineData("", new string[0])]
    [InlineData("wards", new[] { "wards" })]
    [InlineData("wards and districts", new[] { "wards", "districts" })]
    [InlineData("wards, districts and Norrvale", new[] { "wards", "districts", "Norrvale" })]
    [InlineData("a, b, c and d", new[] { "a", "b", "c", "d" })]
    public void List_joins_with_and(string expected, string[] items) => Assert.Equal(expected, En.List(items));

    [Theory]
    [InlineData(0.98765, 98, 100)]
    [InlineData(0.95, 95, 100)]
    [InlineData(0.9999, 9999, 10000)]
    [InlineData(0.99999999, 999999, 1000000)]
    [InlineData(0.004, 4, 1000)]
    public void Chance_worked_out_is_rounded_down_and_never_looks_certain(double chance, long cases, long all) =>
        Assert.Equal(new NaturalFrequency(cases, all), NaturalFrequency.About(chance));

    [Theory]
    [InlineData(0.025, 3, 100)]
    [InlineData(0.05, 5, 100)]
    [InlineData(0.0005, 1, 1000)]
    public void Chance_that_is_a_bound_is_rounded_up(double chance, long cases, long all) => Assert.Equal(new NaturalFrequency(cases, all), NaturalFrequency.UpTo(chance, all));

    [Fact]
    public void Table_says_how_many_ranges_may_miss()
    {
        // 200 ranges of uniform noise on −20 … 20, each missing in 2 of 41 cases: 9.76.
        var values = Enumerable.Repeat("1000", 200).ToArray();
        var facts = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.Mechanism("m", LawName.DiscreteUniform, ("halfWidth", 20)), values).Appraise().FactsOf(0);
        Assert.Equal(
            ["Of the 200 ranges in this table, at most about 10 are expected to miss.", "From outside it cannot be told with certainty which ones miss."],
            En.NotesOf(facts));
    }

    [Fact]
    public void Table_in_which_less_than_one_range_may_miss_says_less_than_one()
    {
        var facts = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "12", "13", "14").Appraise().FactsOf(0);
        Assert.Equal("Of the 3 ranges in this table, the number expected to miss is less than 1.", En.NotesOf(facts)[0]);
    }

    [Theory]
    [InlineData(0.29, "Of the 6 ranges in this table, the number expected to miss is less than 1.")]
    [InlineData(1, "Of the 6 ranges in this table, at most about 1 is expected to miss.")]
    [InlineData(1.2, "Of the 6 ranges in this table, at most about 2 are expected to miss.")]
    public void Expected_misses_are_never_said_to_be_more_than_they_round_up_to(double expected, string sentence)
    {
        var facts = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "12", "13").Appraise().FactsOf(0);
        Assert.Equal(sentence, En.NotesOf(facts with { Ranges = 6, ExpectedMisses = expected })[0]);
    }

    [Fact]
    public void Table_cut_into_pages_counts_the_ranges_of_all_pages()
    {
        var facts = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "12", "13", "14").Appraise().FactsOf(0);
        Assert.Equal("Of the 3 ranges in this table, on all its pages, the number expected to miss is less than 1.", En.NotesOf(facts, onSeveralPages: true)[0]);
    }

    [Fact]
    public void Totals_that_differ_between_measures_are_told_by_measure_and_means_have_none()
    {
        var draw = new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(9.5));
        string[] values = ["31", "10", "21"];
        var facts = new SmallRelease().Stub("ward", "All", "All", "w1", "w2")
            .Figures(SmallRelease.Measure(MeasureKind.Count, "cut off"), [new NoiseRule.SumOver(0), draw], [0, 1, 1], values)
            .Figures(SmallRelease.Measure(MeasureKind.Count, "cold"), [draw], [0, 0, 0], values)
            .Figures(SmallRelease.Measure(MeasureKind.Count, "helped"), [draw], [0, 0, 0], values)
            .Figures(SmallRelease.Measure(MeasureKind.Mean, "mean use"), [draw], [0, 0, 0], values)
            .Appraise().FactsOf(0);
        Assert.Equal(
            ["The totals of “cut off” are sums of the published parts.", "Each figure of “cold” and “helped” got noise of its own, so parts may not add up to their total."],
            En.NotesOf(facts).TakeLast(2));
    }

    [Fact]
    public void Totals_of_two_kinds_in_one_measure_are_named_beside_a_mean()
    {
        var draw = new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(9.5));
        var facts = new SmallRelease().Stub("district", "All", "All", "A", "A", "A").Stub("ward", "All", "All", "All", "w1", "w2")
            .Figures(SmallRelease.Measure(MeasureKind.Count, "cut off"), [draw, new NoiseRule.SumOver(1)], [0, 1, 0, 0], "31", "31", "10", "21")
            .Figures(SmallRelease.Measure(MeasureKind.Mean, "mean use"), [draw], [0, 0, 0, 0], "31", "31", "10", "21")
            .Appraise().FactsOf(0);
        Assert.Equal(
            ["For “cut off”, noise was added to the total of all, so parts may not add up there.", "For “cut off”, published parts were added up to get the totals by “district”."],
            En.NotesOf(facts).TakeLast(2));
    }

    [Fact]
    public void Totals_of_two_kinds_at_one_level_are_called_some_and_others()
    {
        var draw = new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(9.5));
        var facts = new SmallRelease().Stub("district", null, "A", "A", "B", "B").Stub("ward", "All", "All", "w1", "All", "w2")
            .Figures(SmallRelease.Measure(MeasureKind.Count, "cut off"), [draw, new NoiseRule.SumOver(1)], [0, 0, 1, 0], "31", "30", "10", "10")
            .Appraise().FactsOf(0);
        Assert.Equal(
            ["Some totals of “cut off” got noise of their own, so parts may not add up to them.", "Other totals of “cut off” are sums of the published parts."],
            En.NotesOf(facts).TakeLast(2));
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Total_without_noise_over_parts_with_noise_is_said_where_parts_are_said_to_add_up(bool adds)
    {
        var rules = new NoiseRule[] { new NoiseRule.Exact(SmallRelease.Words("the law")), new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(9.5)) };
        var table = new SmallRelease().Stub("district", "All", "All", "A", "B").Figures(SmallRelease.Measure(MeasureKind.Amount, "credits"), rules, [0, 1, 1], "31", "10", "20");
        var facts = (adds ? table.Adds("credits", "district", "All") : table).Appraise().FactsOf(0);

        const string Words = "Totals of “credits” are published without noise and their parts with noise, so parts may not add up to them.";
        Assert.Equal(adds, En.NotesOf(facts).Contains(Words));
    }

    [Fact]
    public void Exact_total_over_exact_parts_needs_no_word()
    {
        var facts = new SmallRelease().Stub("district", "All", "All", "A", "B").Adds("credits", "district", "All")
            .Figures(SmallRelease.Measure(MeasureKind.Amount, "credits"), [new NoiseRule.Exact(SmallRelease.Words("the law"))], [0, 0, 0], "30", "10", "20")
            .Appraise().FactsOf(0);

        Assert.Empty(En.NotesOf(facts));
    }

    [Theory]
    [InlineData(true, "For “cut off”, numbers below 0 are in some rows published as 0, so sums of such figures tend to be too high.")]
    [InlineData(false, "For “cut off”, numbers below 0 are published as 0, so sums of such figures tend to be too high.")]
    public void Numbers_lifted_to_a_bound_are_said_to_make_sums_too_high(bool onlyParts, string words)
    {
        var lifted = new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(9.5, new AfterStep.NotBelow(0)));
        var plain = new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(4));
        var facts = new SmallRelease().Stub("ward", "All", "All", "w1", "w2")
            .Figures(SmallRelease.Measure(MeasureKind.Count, "cut off"), [onlyParts ? plain : lifted, lifted], [0, 1, 1], "31", "0", "21").Appraise().FactsOf(0);

        Assert.Equal(words, En.NotesOf(facts)[^1]);
    }

    [Fact]
    public void Numbers_lowered_to_a_bound_are_said_to_make_sums_too_low()
    {
        var mechanism = SmallRelease.DiscreteGaussian(9.5, new AfterStep.NotAbove(500));
        var facts = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count, "cut off"), mechanism, "31", "500").Appraise().FactsOf(0);

        Assert.Equal("For “cut off”, numbers above 500 are published as 500, so sums of such figures tend to be too low.", En.NotesOf(facts)[^1]);
    }

    [Theory]
    [InlineData(RoundingHow.Up, "For “cut off”, figures are rounded up to a multiple of 10, so sums of them tend to be too high.")]
    [InlineData(RoundingHow.Down, "For “cut off”, figures are rounded down to a multiple of 10, so sums of them tend to be too low.")]
    public void Rounding_to_one_side_is_said_to_lean(RoundingHow how, string words)
    {
        var mechanism = SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(10, how));
        Assert.Equal(words, En.NotesOf(new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count, "cut off"), mechanism, "30", "500").Appraise().FactsOf(0))[^1]);
    }

    [Fact]
    public void Small_figures_set_to_0_are_said_to_put_sums_off()
    {
        var mechanism = SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30));
        Assert.Equal(
            "For “cut off”, figures below 30 are set to 0, so sums of small figures can be far off.",
            En.NotesOf(new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count, "cut off"), mechanism, "0", "500").Appraise().FactsOf(0))[^1]);
    }

    [Fact]
    public void Rate_says_what_it_is_for_wherever_its_unit_stands()
    {
        var measure = SmallRelease.Measure(MeasureKind.Rate) with { Per = 1000, Unit = SmallRelease.UnitOf("birth", "births") };
        Assert.Equal("births per 1,000", En.UnitOf(measure, new PublishedValue(2, 0)));
        Assert.Equal("12.3\u00a0births per 1,000", En.WithUnit(new PublishedValue(123, 1), measure));
        Assert.Equal("per 1,000", En.UnitOf(measure with { Unit = SmallRelease.UnitOf("", "") }, new PublishedValue(2, 0)));
    }

    [Theory]
    [InlineData(0, 48, "+48")]
    [InlineData(31, 0, "\u221231")]
    [InlineData(31, 14, "\u221231\u00a0+14")]
    [InlineData(19, 19, "\u00b1\u00a019")]
    public void Margin_of_one_side_has_no_other(int down, int up, string text)
    {
        PublishedValue Whole(int number) => new(number, 0);
        Assert.Equal(text, En.Margin(new PrintedRange(Whole(31), Whole(down), Whole(up), Whole(31 - down), Whole(31 + up), false, false)));
    }

    [Fact]
    public void Column_of_a_table_on_several_pages_speaks_of_all_its_pages()
    {
        var rules = new NoiseRule[] { new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(9.5)), new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(4)) };
        var column = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count), rules, [0, 1], "100", "200").Appraise().FactsOf(0).Measures[0];
        Assert.Equal(
            [
                "The margins of this column, on all its pages, run from 8 to 19\u00a0households.",
                "In at least 999 of 1,000 cases the noise reaches no further than 31\u00a0households on all pages.",
            ],
            En.NotesOf(column, onSeveralPages: true).Skip(1));
    }

    [Fact]
    public void Table_of_totals_with_noise_says_why_parts_may_not_add_up()
    {
        var facts = new SmallRelease().Stub("ward", "All", "All", "w1", "w2").Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "30", "10", "21").Appraise().FactsOf(0);
        Assert.Contains("Each figure got noise of its own, so parts may not add up to their total.", En.NotesOf(facts));
    }

    [Fact]
    public void Table_of_sums_says_that_totals_are_sums_and_misses_can_come_together()
    {
        var rules = new NoiseRule[] { new NoiseRule.SumOver(0), new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(9.5)) };
        var facts = new SmallRelease().Stub("ward", "All", "All", "w1", "w2").Figures(SmallRelease.Measure(MeasureKind.Count), rules, [0, 1, 1], "31", "10", "21").Appraise().FactsOf(0);
        Assert.Contains("The totals are sums of the published parts.", En.NotesOf(facts));
        Assert.Contains("Some figures rest on the same noise, so misses can come together.", En.NotesOf(facts));
    }

    [Fact]
    public void Column_has_one_sentence_and_the_distance_of_999()
    {
        var column = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), "12", "1300").Appraise().FactsOf(0).Measures[0];
        Assert.Equal(
            ["In at least 95 of 100 cases the count before noise lies within 19\u00a0households of the figure.", "In at least 999 of 1,000 cases the noise reaches no further than 31\u00a0households."],
            En.NotesOf(column));
    }

    [Fact]
    public void Column_that_was_rounded_says_so()
    {
        var column = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(5)), "10", "1300").Appraise().FactsOf(0).Measures[0];
        Assert.StartsWith("In at least 999 of 1,000 cases noise and rounding reach no further than ", En.NotesOf(column)[1], StringComparison.Ordinal);
    }

    [Fact]
    public void Column_of_continuous_noise_written_with_decimals_says_that_it_was_rounded()
    {
        var column = new SmallRelease().Figures(MeasureKind.Mean, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 1.4)), "51.63").Appraise().FactsOf(0).Measures[0];
        Assert.StartsWith("In at least 999 of 1,000 cases noise and rounding reach no further than ", En.NotesOf(column)[1], StringComparison.Ordinal);
    }

    [Fact]
    public void Column_with_a_threshold_speaks_of_the_range()
    {
        var column = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30)), "45").Appraise().FactsOf(0).Measures[0];
        Assert.Equal(
            [
                "For figures not set to 0, the count before noise lies in the range in at least 95 of 100 cases.",
                "Values above the range of a 0 become 0 in at most 3 of 100 cases.",
            ],
            En.NotesOf(column));
    }

    [Fact]
    public void Column_of_several_margins_says_from_where_to_where()
    {
        var rules = new NoiseRule[] { new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(9.5)), new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(4)) };
        var column = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count), rules, [0, 1], "100", "200").Appraise().FactsOf(0).Measures[0];
        Assert.Equal(
            ["In at least 95 of 100 cases the count before noise lies within the margin of its figure.", "The margins of this column run from 8 to 19\u00a0households."],
            En.NotesOf(column).Take(2));
    }

    [Fact]
    public void Column_without_margins_is_silent()
    {
        var release = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count), [new NoiseRule.Public(SmallRelease.Words("list"))], [0], "12").Appraise();
        Assert.Empty(En.NotesOf(release.FactsOf(0).Measures[0]));
    }
}
