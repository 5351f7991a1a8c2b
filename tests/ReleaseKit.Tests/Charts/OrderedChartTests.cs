using System.Globalization;
using System.Xml.Linq;
using ReleaseKit.Charts;
using ReleaseKit.Charts.Ordered;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using ReleaseKit.Tests.Pages;
using ReleaseKit.Wording;
using SkiaSharp;
using Xunit;

namespace ReleaseKit.Tests.Charts;

/// <summary>The ordered chart read back from what was painted.</summary>
public sealed class OrderedChartTests
{
    private static readonly XNamespace Svg = "http://www.w3.org/2000/svg";
    private static readonly string[] Values = ["41", "0", "132", "-12", "57", "41", "Q", "88"];

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Every_mark_gives_its_figure_and_its_ends_back_within_half_a_pixel(bool wide)
    {
        using var type = TextBoxes.Type();
        var figures = Figures(Values);
        var chart = Draw(figures, wide, type);

        var groups = Painted(chart, type).Descendants(Svg + "g").ToList();

        Assert.Equal(figures.Rows.Count, groups.Count);
        foreach (var (row, group) in figures.Rows.Zip(groups))
        {
            Assert.Equal(row.Figure.Address, group.Attribute("data-figure")!.Value);
            Assert.Equal(row.Figure.Value.ToDouble(), chart.Scale.ValueAt(Places(group, "figure").Single()), 0.5 / chart.Scale.PerUnit);
            Assert.Equal(row.Figure.Main!.UncutLow, chart.Scale.ValueAt(Places(group, "end").Min()), 0.5 / chart.Scale.PerUnit);
            Assert.Equal(Math.Max(row.Figure.Main.UncutHigh, row.Figure.Main.High), chart.Scale.ValueAt(Places(group, "end").Max()), 0.5 / chart.Scale.PerUnit);
        }
    }

    [Fact]
    public void Rows_stand_largest_first_and_ties_keep_the_tables_order()
    {
        var rows = Figures(Values).Rows;

        Assert.Equal(["r3", "r8", "r5", "r1", "r6", "r2", "r4"], rows.Select(row => row.Name));
    }

    [Fact]
    public void Figure_without_number_is_left_out_of_the_picture_and_named()
    {
        var figures = Figures(Values);

        Assert.Equal(["r7"], figures.WithoutNumber.Select(figures.NameOf));
        Assert.Contains(OrderedWords.Of(figures, Words).Caption, sentence => sentence.StartsWith("1 figure of this selection has no number", StringComparison.Ordinal));
    }

    [Fact]
    public void Axis_of_counts_starts_at_zero_or_below_where_a_range_does()
    {
        using var type = TextBoxes.Type();

        Assert.Equal(0, Draw(Figures(["400", "500"]), true, type).Scale.From);
        var below = Draw(Figures(["4", "500"]), true, type);
        Assert.True(below.Scale.From < -15);
        Assert.Contains(below.Drawing.Marks, mark => mark.Mark == "zero");
    }

    [Fact]
    public void Range_far_off_the_scale_ends_in_an_arrow_and_its_number()
    {
        using var type = TextBoxes.Type();
        var figures = Means(("100.0", 0.5), ("102.0", 0.5), ("101.0", 40));

        var chart = OrderedChart.Wide(figures, type);

        var wide = chart.Drawing.Shapes.OfType<Shape.Group>().ElementAt(1);
        Assert.Equal(2, wide.Shapes.Count(mark => mark.Mark == "goes-on"));
        var printed = figures.Rows[1].Figure.Main!.Printed;
        Assert.Equal([Words.Number(printed.High), Words.Number(printed.Low)], wide.Shapes.OfType<Shape.Words>().Where(words => words.Mark == "end-off-scale").Select(words => words.Text));
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Every_range_ends_at_a_stop_or_at_an_arrow_with_its_number(bool wide)
    {
        using var type = TextBoxes.Type();

        var chart = Draw(Means(("100.0", 0.5), ("102.0", 3), ("101.0", 40)), wide, type);

        Assert.All(chart.Drawing.Shapes.OfType<Shape.Group>(), row =>
        {
            Assert.Equal(2, row.Shapes.Count(mark => mark.Mark is "end" or "goes-on"));
            Assert.Equal(row.Shapes.Count(mark => mark.Mark == "goes-on"), row.Shapes.Count(mark => mark.Mark == "end-off-scale"));
        });
    }

    [Theory]
    [InlineData(1, true)]
    [InlineData(2, true)]
    [InlineData(5, true)]
    [InlineData(12, true)]
    [InlineData(40, true)]
    [InlineData(1, false)]
    [InlineData(2, false)]
    [InlineData(5, false)]
    [InlineData(12, false)]
    [InlineData(40, false)]
    public void Labels_never_meet_and_never_leave_the_drawing(int rows, bool wide)
    {
        using var type = TextBoxes.Type();
        var values = Enumerable.Range(0, rows).Select(row => (row * row * 17 % 1900).ToString(CultureInfo.InvariantCulture)).ToArray();
        var names = values.Select((_, row) => row % 4 == 0 ? $"Ward number {row} of the old harbour, the long drove and the upper marsh"
            : row % 4 == 1 ? $"Harbourmastersgatekeeperslodgeandlongdroveallotmentgardens{row}" : $"Ward {row}").ToArray();

        var drawing = Draw(Figures(values, names), wide, type).Drawing;

        TextBoxes.DemandNoOverlap(drawing, type);
        TextBoxes.DemandInside(drawing, type);
    }

    [Fact]
    public void Digits_within_reach_of_the_noise_are_set_light()
    {
        using var type = TextBoxes.Type();

        var row = Figures(["1842"]).Rows.Single();

        Assert.Equal(("1,8", "42"), (row.Heavy, row.Light));
    }

    [Fact]
    public void Caption_says_what_the_bar_is_at_which_coverage_and_that_order_is_not_reliable()
    {
        var caption = string.Join(' ', OrderedWords.Of(Figures(Values), Words).Caption);

        Assert.Contains("the bar shows how far noise, and rounding where there is any, may have moved it", caption, StringComparison.Ordinal);
        Assert.Contains("In at least 95 of 100 cases the value before noise lies between such stops.", caption, StringComparison.Ordinal);
        Assert.Contains("Figures that stand close together may not be separated: noise alone can put them in this order.", caption, StringComparison.Ordinal);
        Assert.Contains("Whether two bars overlap does not show", caption, StringComparison.Ordinal);
    }

    [Fact]
    public void Chart_of_counts_under_a_threshold_promises_for_those_that_passed_it()
    {
        var caption = OrderedWords.Of(Select(new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(5, new AfterStep.ZeroBelow(10)), "100", "0")), Words).Caption;

        Assert.Contains(caption, sentence => sentence.EndsWith("For figures not set to 0, the value before noise lies between such stops in at least 95 of 100 cases.", StringComparison.Ordinal));
        Assert.Contains("A value above the upper stop of a 0 becomes 0 in at most 3 of 100 cases.", caption);
        Assert.DoesNotContain(caption, sentence => sentence.Contains("In at least 95", StringComparison.Ordinal));
    }

    [Fact]
    public void Chart_of_rounded_means_says_at_least_as_its_readings_do()
    {
        var figures = Means(("18.29", 0.1), ("23.07", 1));

        Assert.All(figures.Rows, row => Assert.Contains("in at least 95 of 100 cases", Words.ReadingOf(row.Figure).Text, StringComparison.Ordinal));
        Assert.Contains(OrderedWords.Of(figures, Words).Caption, sentence => sentence.Contains("In at least 95 of 100 cases the value before noise lies between such stops.", StringComparison.Ordinal));
    }

    [Fact]
    public void Table_behind_the_picture_says_at_least_as_well()
    {
        var release = new SmallRelease().Figures(MeasureKind.Mean, SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.1)), "18.29", "23.07").Build();
        var page = ChartFigure.Html(new ChartOrder("chart", SmallRelease.Words("A chart"), "table/figure", "ordered"), PagesRelease.ContextOf(release));

        Assert.Contains("<caption>A chart. In at least 95 of 100 cases the value before noise lies in such a range.</caption>", page, StringComparison.Ordinal);
        Assert.Contains("The table behind the picture gives", page, StringComparison.Ordinal);
    }

    [Fact]
    public void Only_a_page_has_the_table_behind_the_picture()
    {
        var words = OrderedWords.Of(Figures(Values), Words);

        Assert.DoesNotContain("table", words.Description, StringComparison.Ordinal);
        Assert.Equal(words.Description + " The table behind the picture gives every figure, its margin and its range.", words.DescriptionInPage);
    }

    [Fact]
    public void Mark_alone_says_in_how_many_cases_each_of_its_ranges_holds()
    {
        // Discrete Gaussian noise lies on whole steps, so each range attains more than its name (tests/reference/noise-intervals.csv: ± 19 at 0.95 for sigma 9.5).
        var description = Marks.Description(Figures(["1842"]).Rows[0].Figure, Words);

        Assert.StartsWith("Error bar of 1,842\u00a0households. The range that holds in at least 50 of 100 cases is from ", description, StringComparison.Ordinal);
        Assert.Contains(" The range that holds in at least 95 of 100 cases is from 1,823 to 1,861. ", description, StringComparison.Ordinal);
    }

    [Fact]
    public void Png_shows_something_and_is_the_same_every_time()
    {
        using var type = TextBoxes.Type();
        var drawing = Draw(Figures(Values), true, type).Drawing;
        var palette = Palette.Of(new Look(null, null));

        var first = PngPainter.Paint(drawing, 2, palette, type);

        Assert.Equal(first, PngPainter.Paint(drawing, 2, palette, type));
        using var bitmap = SKBitmap.Decode(first);
        Assert.Equal(1440, bitmap.Width);
        var colours = bitmap.Pixels.GroupBy(pixel => pixel).ToDictionary(group => group.Key, group => group.Count());
        // Paper, ink, damson and its lighter half all cover more than a few specks.
        foreach (var colour in new[] { "#F4F6F3", "#1A2023", "#7A1D4E", "#B0608C" })
            Assert.True(colours.GetValueOrDefault(SKColor.Parse(colour)) > 200, $"{colour} is hardly there");
    }

    [Fact]
    public void Font_that_is_missing_is_an_error_and_no_empty_picture()
    {
        using var folder = new TemporaryFolder();

        var fault = Assert.Throws<FileNotFoundException>(() => TypeCase.Load(folder.Path));

        Assert.Contains("asap-320.ttf", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_ink_of_a_page_has_its_colours_in_the_style_sheets()
    {
        var styles = string.Concat(Directory.GetFiles(Path.Combine(AppContext.BaseDirectory, "site-templates", "styles"), "*.css").Select(File.ReadAllText));
        var inks = typeof(Inks).GetProperties().Select(property => (Ink)property.GetValue(null)!).Where(ink => ink.Class.Length > 0 && !ink.Class.StartsWith("cd-", StringComparison.Ordinal));

        // Title and notes of a chart are HTML in a page; only pictures that stand alone draw them.
        Assert.All(inks.Where(ink => ink != Inks.Heading && ink != Inks.Note), ink => Assert.Contains($".{ink.Class.Split(' ')[0]}", styles, StringComparison.Ordinal));
    }

    internal static ILanguage Words { get; } = Language.Load(Path.Combine(AppContext.BaseDirectory, "site-templates"), "en");

    internal static OrderedFigures Figures(string[] values, string[]? names = null)
    {
        var release = new SmallRelease().Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(9.5), values);
        return Select(names is null ? release : release.Stub("ward", null, names));
    }

    private static OrderedFigures Means(params (string Value, double Scale)[] rows)
    {
        var rules = rows.Select((row, index) => (NoiseRule)new NoiseRule.FromMechanism(SmallRelease.Mechanism($"m{index}", LawName.Laplace, ("scale", row.Scale)))).ToList();
        var measure = SmallRelease.Measure(MeasureKind.Mean);
        return Select(new SmallRelease().Figures(measure, rules, [.. rows.Select((_, index) => (byte)index)], [.. rows.Select(row => row.Value)]));
    }

    private static OrderedFigures Select(SmallRelease release) =>
        OrderedSelection.Of(release.Appraise(), Words, new ChartOrder("chart", SmallRelease.Words("A chart"), "table/figure", "ordered"));

    private static OrderedChart Draw(OrderedFigures figures, bool wide, TypeCase type) => wide ? OrderedChart.Wide(figures, type) : OrderedChart.Narrow(figures, type);

    private static XElement Painted(OrderedChart chart, TypeCase type) =>
        XElement.Parse(SvgPainter.StandAlone(chart.Drawing, "chart", "Title", "Description", Palette.Of(new Look(null, null)), type));

    private static IEnumerable<double> Places(XElement group, string mark) => group.Elements(Svg + "path")
        .Where(path => path.Attribute("data-mark")?.Value == mark)
        .Select(path => double.Parse(path.Attribute("d")!.Value[1..].Split(' ')[0], CultureInfo.InvariantCulture));
}
