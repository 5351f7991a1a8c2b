using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class PageMapTests
{
    [Fact]
    public void Figure_lives_on_the_page_of_its_part_under_its_slugs() =>
        Assert.Equal("tables/late/south.html#late.south.mill", PageMap.Of(PagesRelease.Make()).Of(new FigureRef(0, 0, 4)));

    [Fact]
    public void Figure_of_the_all_value_lives_on_the_first_page() =>
        Assert.Equal("tables/late/index.html#late.all.all", PageMap.Of(PagesRelease.Make()).Of(new FigureRef(0, 0, 0)));

    [Fact]
    public void Table_cut_by_a_column_has_a_first_page_and_one_for_each_part()
    {
        var pages = PageMap.Of(PagesRelease.Make()).CutOf(0).Pages;
        Assert.Equal(["tables/late/index.html", "tables/late/north.html", "tables/late/south.html"], pages.Select(page => page.Path));
        Assert.Equal([0], pages[0].Rows);
        Assert.Equal([1, 2], pages[1].Rows);
    }

    [Fact]
    public void Table_not_cut_has_200_rows_a_page()
    {
        var pages = CutOf(Plain(401)).Pages;
        Assert.Equal(["tables/table/index.html", "tables/table/rows-2.html", "tables/table/rows-3.html"], pages.Select(page => page.Path));
        Assert.Equal([200, 200, 1], pages.Select(page => page.Rows.Count));
    }

    [Fact]
    public void Table_of_200_rows_is_one_page() => Assert.Single(CutOf(Plain(200)).Pages);

    [Fact]
    public void Part_longer_than_a_page_goes_on_under_its_number()
    {
        var table = new SmallRelease().Stub("part", "All", [.. Enumerable.Repeat("North", 201), "North 2"])
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(1), [.. Enumerable.Repeat("1", 202)]).Build().Tables[0];
        var paths = CutOf(table with { CutBy = 0 }).Pages.Select(page => Path.GetFileName(page.Path));
        Assert.Equal(["index.html", "north.html", "north-2.html", "north-2-part.html"], paths);
    }

    [Fact]
    public void Part_named_index_does_not_take_the_first_page()
    {
        var table = new SmallRelease().Stub("part", null, "Index").Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(1), "1").Build().Tables[0];
        Assert.Equal(["index.html", "index-part.html"], CutOf(table with { CutBy = 0 }).Pages.Select(page => Path.GetFileName(page.Path)));
    }

    [Fact]
    public void Rows_stand_in_the_order_of_the_stub()
    {
        var table = new SmallRelease().Stub("a", null, "x", "y", "x").Stub("b", null, "1", "2", "3")
            .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(1), "1", "2", "3").Build().Tables[0];
        Assert.Equal([0, 2, 1], CutOf(table).Pages[0].Rows);
    }

    private static TableCut CutOf(Table table) => TableCut.Of(table);

    private static Table Plain(int rows) => new SmallRelease()
        .Stub("row", null, [.. Enumerable.Range(1, rows).Select(row => row.ToString(CultureInfo.InvariantCulture))])
        .Figures(MeasureKind.Count, SmallRelease.DiscreteGaussian(1), [.. Enumerable.Repeat("1", rows)]).Build().Tables[0];
}
