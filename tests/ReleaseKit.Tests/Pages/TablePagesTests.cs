using System.Globalization;
using System.IO.Compression;
using AngleSharp.Dom;
using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Pages;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class TablePagesTests : IClassFixture<TablePagesTests.Wards>
{
    private readonly TableSite site;
    private readonly IDocument page;

    public TablePagesTests(Wards wards) => (site, page) = (wards.Site, wards.Site.Page());

    [Fact]
    public void Page_has_one_reading_for_every_figure_at_its_permalink()
    {
        var readings = page.QuerySelectorAll(".unfold details > .panel");

        Assert.Equal(4 * 9, readings.Length);
        foreach (var figure in Figures())
        {
            var reading = page.GetElementById(figure.Id);
            Assert.NotNull(reading);
            Assert.Contains(site.Language.ReadingOf(figure).Sentences[0].Text, reading.TextContent, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Reading_holds_every_sentence_in_order()
    {
        foreach (var figure in Figures())
            Assert.Equal(
                site.Language.ReadingOf(figure).Text,
                string.Join(' ', page.GetElementById(figure.Id)!.QuerySelectorAll(":scope > p:not(.panel-links)").Select(paragraph => paragraph.TextContent)));
    }

    [Fact]
    public void Permalink_is_what_the_page_map_says() =>
        Assert.Equal("tables/table/index.html#behind.aldermoor.harrow-lane", PageMap.Of(site.Appraised.Release).Of(new(0, 0, 2)));

    [Fact]
    public void Every_id_is_there_once()
    {
        var ids = page.QuerySelectorAll("[id]").Select(element => element.Id).ToList();

        Assert.Equal(ids.Distinct(), ids);
    }

    [Fact]
    public void Every_link_within_the_page_and_every_use_leads_to_something()
    {
        var ids = page.QuerySelectorAll("[id]").Select(element => element.Id).ToHashSet();
        var targets = page.QuerySelectorAll("a, use").Select(element => element.GetAttribute("href")).Where(href => href is not null && href.StartsWith('#')).Select(href => href![1..]);

        Assert.DoesNotContain(targets, target => !ids.Contains(target));
    }

    [Fact]
    public void Figure_stands_in_its_row_with_its_exact_value_margin_and_bar()
    {
        var row = RowOf("Harrow Lane");

        var figure = row.QuerySelector("td.k1 data")!;
        Assert.Equal("214", figure.GetAttribute("value"));
        Assert.Equal("214", figure.QuerySelector(".vh")!.TextContent);
        Assert.Equal("2", figure.QuerySelector(".firm")!.TextContent);
        Assert.Equal("14", figure.QuerySelector(".soft")!.TextContent);
        Assert.Equal("±\u00A030", row.QuerySelector("td.mg.k1")!.TextContent);
        Assert.NotNull(row.QuerySelector("td.b.k1 svg use"));
    }

    [Fact]
    public void Mean_is_printed_to_its_margin_and_keeps_its_published_value()
    {
        var data = RowOf("Tithe Barn").QuerySelector("td.k2 data")!;

        Assert.Equal("512.9", data.GetAttribute("value"));
        Assert.Equal("513", data.QuerySelector(".vh")?.TextContent ?? data.TextContent);
    }

    [Fact]
    public void Figure_below_zero_has_a_true_minus_and_the_lozenge_with_its_word()
    {
        var row = RowOf("Skerry End");

        Assert.Equal("\u22127", row.QuerySelector("td.k1 data")!.TextContent);
        Assert.Equal("weak", row.QuerySelector("td.mg.k1 .lz .vh")!.TextContent);
        Assert.NotNull(row.QuerySelector("td.b.k1 use[href='#zl']"));
    }

    [Fact]
    public void Hidden_figure_says_so_in_words_and_has_its_reading()
    {
        var cell = RowOf("Bell & <Sons>").QuerySelector("td.none.k3")!;

        Assert.Equal("hidden to protect people", cell.QuerySelector("a")!.TextContent);
        Assert.NotNull(page.GetElementById(cell.QuerySelector("a")!.GetAttribute("href")![1..]));
    }

    [Fact]
    public void Exact_figure_has_the_word_and_a_stem_alone()
    {
        var row = RowOf("Harrow Lane");

        Assert.Equal("exact", row.QuerySelector("td.mg.k4")!.TextContent);
        Assert.Equal(["#st"], row.QuerySelectorAll("td.b.k4 use").Select(use => use.GetAttribute("href")));
    }

    [Fact]
    public void Text_from_the_folder_is_escaped()
    {
        Assert.Contains("Bell &amp; &lt;Sons&gt;", site.Html("tables/table/index.html"), StringComparison.Ordinal);
        Assert.Contains("Register &lt;of&gt; hardship &amp; heat", site.Html("tables/table/index.html"), StringComparison.Ordinal);
        Assert.Null(page.QuerySelector("sons, of"));
    }

    [Fact]
    public void Page_has_no_inline_style_and_no_script() =>
        Assert.Empty(page.QuerySelectorAll("[style], style, script"));

    [Fact]
    public void Headings_are_headers_and_total_rows_head_their_groups()
    {
        Assert.Equal(3, page.QuerySelectorAll("table.sheet > tbody").Length);
        Assert.Equal(["All", "Aldermoor", "Cindry"], page.QuerySelectorAll("table.sheet > tbody th[scope=rowgroup] .nm").Select(name => name.TextContent));
        Assert.Equal(4, page.QuerySelectorAll("table.sheet > thead th[scope=colgroup]").Length);
        Assert.Equal(Enumerable.Range(1, 9).Select(number => $"{number}"), page.QuerySelectorAll("table.sheet > tbody .rn").Select(number => number.TextContent));
    }

    [Fact]
    public void Totals_that_come_last_head_no_group_and_the_stub_keeps_its_columns()
    {
        var release = new SmallRelease().Stub("district", "All", "A", "A", "All").Stub("ward", "All", "a1", "All", "All")
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(2), "40", "41", "42").Build();
        using var last = TableSite.Of(release);

        Assert.Equal(2, last.Page().QuerySelectorAll("table.sheet > thead th.stub").Length);
        Assert.Empty(last.Page().QuerySelectorAll("table.sheet.tree, th[scope=rowgroup]"));
    }

    [Fact]
    public void Notes_stand_beside_what_they_are_for_lettered_in_the_order_of_the_rows()
    {
        Assert.Equal("a", RowOf("Old Kiln").QuerySelector("td.mg.k1 .nt")!.TextContent);
        Assert.Equal("b", RowOf("Skerry End").QuerySelector("th .nt")!.TextContent);
        Assert.Equal(2, page.QuerySelectorAll("table.sheet .nt").Length);
        Assert.Equal(["a", "b"], page.QuerySelectorAll(".sheet-notes sup").Select(mark => mark.TextContent));
    }

    [Fact]
    public void Totals_beyond_the_scale_of_the_parts_stand_on_one_of_their_own_with_both_ends_labelled()
    {
        var labels = RowOf("Aldermoor").QuerySelectorAll("td.b.k1 .own i").Select(label => label.TextContent).ToList();

        Assert.Equal(2, labels.Count);
        Assert.Equal(labels, RowOf("Cindry").QuerySelectorAll("td.b.k1 .own i").Select(label => label.TextContent));
        Assert.NotEqual(labels, RowOf("All").QuerySelectorAll("td.b.k1 .own i").Select(label => label.TextContent));
        Assert.Empty(RowOf("Harrow Lane").QuerySelectorAll(".own"));
    }

    [Fact]
    public void Marks_of_one_law_share_a_symbol()
    {
        var symbols = new[] { "Harrow Lane", "Tithe Barn", "Upper Weir", "Old Kiln" }.Select(row => RowOf(row).QuerySelector("td.b.k1 use:not([href='#zl'])")!.GetAttribute("href"));
        var ofMeans = new[] { "Harrow Lane", "Tithe Barn", "Upper Weir", "Old Kiln", "Aldermoor" }.Select(row => RowOf(row).QuerySelector("td.b.k2 use")!.GetAttribute("href"));

        Assert.Single(symbols.Distinct());
        Assert.Single(ofMeans.Distinct());
    }

    [Fact]
    public void Paper_gets_the_reading_of_each_weak_and_special_figure_and_no_other()
    {
        var expected = Figures().Where(figure => figure.Reliability == Reliability.Weak || !figure.HasNumber).ToList();
        var notes = page.QuerySelectorAll(".print-notes li").Select(note => note.TextContent).ToList();

        Assert.NotEmpty(expected);
        foreach (var figure in expected)
            Assert.Contains(notes, note => note.Contains(figure.Measure.Title.In("en"), StringComparison.Ordinal) && note.EndsWith(site.Language.ReadingOf(figure).Text, StringComparison.Ordinal));
        Assert.Equal(Enumerable.Range(1, notes.Count).Select(number => $"{number}"), page.QuerySelectorAll("table.sheet .pn").Select(number => number.TextContent));
    }

    [Fact]
    public void Foot_tells_noise_cost_and_citation_once_a_measure()
    {
        Assert.Equal(["M.behind", "M.owed", "M.cold", "M.credits"], page.QuerySelectorAll(".about").Select(about => about.Id));
        Assert.Equal(4, page.QuerySelectorAll(".about .cite").Length);
        Assert.Contains("The Relief Act asks for it.", page.GetElementById("M.credits")!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Page_of_a_cut_table_says_that_misses_are_counted_on_all_its_pages()
    {
        using var cut = TableSite.Of(WardTable.Build(isCut: true));

        Assert.Contains("ranges in this table, on all its pages, ", cut.Html("tables/table/cindry.html"), StringComparison.Ordinal);
        Assert.DoesNotContain("on all its pages", page.Body!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Pages_of_a_cut_table_hold_their_rows_with_numbers_and_ids_that_go_on()
    {
        using var cut = TableSite.Of(WardTable.Build(isCut: true));

        var part = cut.Page("tables/table/cindry.html");

        Assert.Equal(["6", "7", "8", "9"], part.QuerySelectorAll("table.sheet > tbody .rn").Select(number => number.TextContent));
        Assert.NotNull(part.GetElementById("behind.cindry.skerry-end"));
        Assert.Equal(3, part.QuerySelectorAll(".parts a").Length);
        Assert.Equal("Cindry", part.QuerySelector(".parts [aria-current]")!.TextContent);
    }

    [Fact]
    public void First_view_of_200_rows_and_5_measures_is_at_most_100_kilobytes()
    {
        using var large = TableSite.Of(LargeTable.Build());

        var bytes = Compressed(large.Html("tables/table/index.html")) + Directory.EnumerateFiles(Path.Combine(large.Root, "assets"), "*.css").Sum(file => Compressed(File.ReadAllText(file)));

        Assert.Equal(1000, large.Page().QuerySelectorAll(".unfold .panel").Length);
        TestContext.Current.TestOutputHelper?.WriteLine($"200 rows, 5 measures: {bytes} bytes");
        Assert.InRange(bytes, 1, 100 * 1024);
    }

    [Fact]
    public void Published_zero_that_stands_for_all_below_a_threshold_is_drawn_as_a_line_without_a_curve()
    {
        using var zeros = TableSite.Of(new SmallRelease().Stub("area", null, "North", "South")
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(5, new AfterStep.ZeroBelow(10)), "100", "0").Build());

        var figures = zeros.Page().QuerySelectorAll(".unfold .panel");
        var bars = zeros.Page().QuerySelectorAll("td.b svg use");

        Assert.Equal([1, 0], figures.Select(panel => panel.QuerySelectorAll("figure").Length));
        Assert.All(bars, bar => Assert.Matches("^[#a-z0-9]+$", bar.GetAttribute("href")!));
        Assert.DoesNotContain("NaN", zeros.Html("tables/table/index.html"), StringComparison.Ordinal);
        Assert.DoesNotContain("∞", zeros.Html("tables/table/index.html"), StringComparison.Ordinal);
    }

    [Fact]
    public void Ranges_under_a_threshold_say_among_which_figures_they_hold()
    {
        using var zeros = TableSite.Of(new SmallRelease().Stub("area", null, "North", "South")
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(5, new AfterStep.ZeroBelow(10)), "100", "0").Build());

        var panels = zeros.Page().QuerySelectorAll(".unfold .panel");

        Assert.Contains("Holds in, of 100 not set to 0", panels[0].QuerySelectorAll(".ranges th").Select(cell => cell.TextContent));
        // Discrete Gaussian 5, below 10: the largest counts that become 0 in more than 25, 2.5 and 0.5 of 100 cases.
        Assert.Equal(
            "At the coverage of|50 in 100|95 in 100|99 in 100 Larger ones set to 0, at most, of 100|25.0|2.5|0.5 Range from|0|0|0 Range to|12|19|22",
            string.Join(' ', panels[1].QuerySelectorAll(".ranges tr").Select(row => string.Join('|', row.Children.Select(cell => cell.TextContent)))));
    }

    [Fact]
    public void Only_run_of_noise_costs_all_of_the_privacy_loss()
    {
        var gauss = SmallRelease.DiscreteGaussian(5);
        var release = new SmallRelease().Figures(MeasureKind.Count, gauss, "100").Build();
        using var one = TableSite.Of(release with { Noise = release.Noise with { Mechanisms = [gauss] } });

        Assert.Contains("Its cost is all of the privacy loss of this release.", one.Page().QuerySelector(".abouts .facts")!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Attained_coverage_has_the_digits_it_takes_not_to_fall_below_the_one_named()
    {
        var coverages = new Coverages(Coverage.OfShare(0.95), Coverage.OfShare(0.5), Coverage.OfShare(0.99999));
        using var fine = TableSite.Of(new SmallRelease { Coverages = coverages }.Stub("area", null, "North").Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(5), "100").Build());

        var cells = fine.Page().QuerySelectorAll(".ranges tr")[2].QuerySelectorAll("td").Select(cell => decimal.Parse(cell.TextContent, CultureInfo.InvariantCulture)).ToList();

        Assert.Equal(3, cells.Count);
        Assert.InRange(cells[2], 99.999m, 100);
        Assert.Equal(1, cells[1].Scale);
    }

    [Fact]
    public void Figure_whose_noise_is_known_in_part_shows_the_ranges_there_are()
    {
        var table = SmallRelease.Mechanism("m", LawName.Tabulated) with { Tabulated = [(-1, 0.2m), (0, 0.5m), (1, 0.2m)] };
        using var part = TableSite.Of(new SmallRelease().Stub("area", null, "North").Figures(MeasureKind.Count, table, "100").Build());

        Assert.Equal(["Of such cases", "50 in 100"], part.Page().QuerySelector(".ranges tr")!.QuerySelectorAll("th").Select(cell => cell.TextContent));
    }

    [Fact]
    public void Column_of_figures_is_as_wide_as_its_widest_number()
    {
        // 3,418 and 255,456: a comma takes no more room than a digit, two take no more than one.
        Assert.Equal("c-v k1 w5", page.QuerySelector("col.c-v.k1")!.ClassName);
        Assert.Equal("c-v k4 w7", page.QuerySelector("col.c-v.k4")!.ClassName);
    }

    [Theory]
    [InlineData("homes", "homes in each 100")]
    [InlineData("homes in each 100", "homes in each 100")]
    public void Unit_of_a_share_says_once_that_it_counts_in_each_100(string unit, string words)
    {
        using var shares = TableSite.Of(new SmallRelease().Stub("area", null, "North", "South").Figures(
            SmallRelease.Measure(MeasureKind.Share, "share") with { Unit = SmallRelease.UnitOf(unit, unit) },
            [new NoiseRule.Exact(SmallRelease.Words("A law asks for it."))], new byte[2], "33.3", "20.0").Build());

        Assert.Equal(words, shares.Page().QuerySelector(".meas .u")!.TextContent);
    }

    [Fact]
    public void Every_axis_keeps_its_outermost_ticks_where_columns_are_narrow() => Assert.All(page.QuerySelectorAll("svg.axis"), axis =>
    {
        var rooms = axis.QuerySelectorAll("g").Select(RoomOf).ToList();
        Assert.True(rooms.Count >= 2, axis.TextContent);
        Assert.Equal(0, rooms[0]);
        Assert.All(rooms.Skip(1), room => Assert.True(room >= rooms[^1], axis.InnerHtml));
    });

    [Fact]
    public void Tick_needs_the_room_of_the_labels_beside_it()
    {
        using var shares = TableSite.Of(new SmallRelease().Stub("area", null, "North", "South").Figures(MeasureKind.Share, SmallRelease.DiscreteGaussian(1), "0", "100").Build());

        var ticks = shares.Page().QuerySelectorAll("svg.axis g");

        Assert.Equal(["0", "25", "50", "75", "100"], ticks.Select(tick => tick.TextContent));
        // All of them need 7 + 21 + 5 px between 75 and 100, which stand 21 to 22 in 100 of the column apart; every other one half as much.
        Assert.Equal([0, 10, 5, 10, 3], ticks.Select(RoomOf));
    }

    [Fact]
    public void Column_of_margins_holds_the_longest()
    {
        using var wide = TableSite.Of(new SmallRelease().Stub("area", null, "North").Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(1_000_000), "5000000").Build());

        Assert.Equal("c-mg k1 w10", wide.Page().QuerySelector("col.c-mg")!.ClassName);
    }

    [Theory]
    [InlineData(1, "scroll sheet-scroll fits one")]
    [InlineData(7, "scroll sheet-scroll wide")]
    [InlineData(8, "scroll sheet-scroll huge")]
    [InlineData(12, "scroll sheet-scroll huge bare")]
    public void Sheet_takes_the_paper_that_its_columns_need(int measures, string classes)
    {
        var release = new SmallRelease().Stub("area", null, "North");
        for (var measure = 0; measure < measures; measure++)
            release = release.Figures(SmallRelease.Measure(MeasureKind.Count, $"m{measure}"), [new NoiseRule.FromMechanism(SmallRelease.DiscreteGaussian(5))], new byte[1], "100");
        using var wide = TableSite.Of(release.Build());

        Assert.Equal(classes, wide.Page().QuerySelector(".sheet-scroll")!.ClassName);
    }

    [Fact]
    public void Scale_holds_the_ranges_where_noise_is_larger_than_all_figures()
    {
        using var small = TableSite.Of(new SmallRelease().Stub("area", null, "North", "South", "East", "West")
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(8), "0", "3", "6", "1").Build());

        Assert.Empty(small.Page().QuerySelectorAll("td.b use[href='#ar'], td.b use[href='#al']"));
    }

    [Fact]
    public void One_range_that_would_squeeze_all_others_ends_in_an_arrow()
    {
        var rules = Enumerable.Range(0, 4).Select(row => (NoiseRule)new NoiseRule.FromMechanism(SmallRelease.Mechanism($"m{row}", LawName.Laplace, ("scale", row == 3 ? 400 : 2)))).ToList();
        using var means = TableSite.Of(new SmallRelease().Stub("area", null, "North", "South", "East", "West")
            .Figures(SmallRelease.Measure(MeasureKind.Mean), rules, [0, 1, 2, 3], "20", "23", "26", "21").Build());

        var arrows = means.Page().QuerySelectorAll("td.b").Select(cell => cell.QuerySelectorAll("use[href='#ar'], use[href='#al']").Length);

        Assert.Equal([0, 0, 0, 2], arrows);
    }

    [Fact]
    public void Page_that_begins_within_a_group_repeats_its_heading_and_is_named_by_its_first_and_last_row()
    {
        string[] regions = ["All", .. Enumerable.Repeat("Hill", 151), .. Enumerable.Repeat("Dale", 151)];
        string[] places = ["All", .. PlacesOf("Hill"), .. PlacesOf("Dale")];
        using var cut = TableSite.Of(new SmallRelease().Stub("region", "All", regions).Stub("place", "All", places)
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(2), [.. places.Select((_, row) => $"{row}")]).Build());

        var second = cut.Page("tables/table/rows-2.html");

        Assert.Equal("Dale, continued", second.QuerySelector(".sheet tbody tr")!.TextContent);
        Assert.Equal(["All to Dale 47, Dale", "Dale 48, Dale to Dale 150, Dale"], second.QuerySelectorAll(".parts a").Select(link => link.TextContent));
        Assert.DoesNotContain("continued", cut.Html("tables/table/index.html"), StringComparison.Ordinal);
    }

    private static IEnumerable<string> PlacesOf(string region) => ["All", .. Enumerable.Range(1, 150).Select(place => $"{region} {place}")];

    [Fact]
    public void Axis_of_a_page_with_one_total_is_labelled_at_its_ends()
    {
        using var cut = TableSite.Of(WardTable.Build(isCut: true));

        var labels = cut.Page().QuerySelectorAll("table.sheet > thead th.k1 svg.axis text");

        Assert.Equal(["axlab start", "axlab end"], labels.Select(label => label.ClassName));
        Assert.InRange(3418, Number(labels[0]), Number(labels[1]));
    }

    /// <summary>The width of its column, in rem, from which a tick is shown.</summary>
    private static int RoomOf(IElement tick) => tick.ClassName is { Length: > 0 } name ? int.Parse(name[1..], CultureInfo.InvariantCulture) : 0;

    private static double Number(IElement label) => double.Parse(label.TextContent, NumberStyles.AllowThousands, CultureInfo.InvariantCulture);

    private IEnumerable<AppraisedFigure> Figures() =>
        from measure in Enumerable.Range(0, 4)
        from row in Enumerable.Range(0, 9)
        select site.Appraised.Figure(new(0, measure, row));

    private IElement RowOf(string name) => page.QuerySelectorAll("table.sheet > tbody > tr").First(row => row.QuerySelector(".nm")?.FirstChild?.TextContent == name);

    // The level that servers use: gzip −6.
    private static long Compressed(string text)
    {
        using var bytes = new MemoryStream();
        using (var gzip = new GZipStream(bytes, new ZLibCompressionOptions { CompressionLevel = 6 }, leaveOpen: true))
            gzip.Write(System.Text.Encoding.UTF8.GetBytes(text));
        return bytes.Length;
    }

    public sealed class Wards : IDisposable
    {
        internal TableSite Site { get; } = TableSite.Of(WardTable.Build());

        public void Dispose() => Site.Dispose();
    }
}
