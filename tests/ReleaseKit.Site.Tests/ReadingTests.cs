using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using CsvHelper;
using ReleaseKit.Appraisal;
using ReleaseKit.Reading;
using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>Every figure has its reading, word for word the same in the pages and in the downloads, and without script.</summary>
public sealed class ReadingTests(ComposedSample sample, Chromium chromium)
{
    [Fact]
    public void Readings_are_the_same_in_pages_and_downloads_and_none_is_missing()
    {
        var inPages = sample.Pages.Where(IsTablePage).SelectMany(ReadingsOf).ToDictionary(reading => reading.Key, reading => reading.Text);
        var figures = Figures().ToList();
        var inDownloads = figures.Select(figure => figure.Table.Id).Distinct().ToDictionary(table => table, ReadingColumnsOf);
        Assert.Equal(figures.Count, inPages.Count);
        Assert.Equal(figures.Count, inDownloads.Values.Sum(rows => rows.Sum(row => row.Count(cell => cell.Value.Length > 0))));
        foreach (var figure in figures)
            Assert.Equal(inDownloads[figure.Table.Id][figure.Row][figure.Measure.Column + "_reading"], inPages[$"{figure.Table.Id}#{figure.Id}"]);
    }

    [Fact]
    public async Task A_permalink_opens_its_reading_without_script()
    {
        foreach (var path in sample.Pages.Where(IsTablePage))
        {
            var id = Panels(path)[0].Id;
            await using var opened = await chromium.OpenAsync(sample, $"{path}#{id}", script: false);
            Assert.True(await opened.Page.Locator($"[id='{id}'] .say").IsVisibleAsync(), $"{path}#{id} does not show");
        }
    }

    private static IEnumerable<AppraisedFigure> Figures()
    {
        var release = ReleaseFolder.Read(Repository.Sample).Release!;
        var appraised = AppraisedRelease.Of(release);
        return from table in Enumerable.Range(0, release.Tables.Count)
               from measure in Enumerable.Range(0, release.Tables[table].Measures.Count)
               from row in Enumerable.Range(0, release.Tables[table].RowCount)
               select appraised.Figure(new FigureRef(table, measure, row));
    }

    /// <summary>For each row of a table's wide CSV, its readings by column.</summary>
    private List<Dictionary<string, string>> ReadingColumnsOf(string table)
    {
        using var csv = CsvReader.FromFile(sample.File($"downloads/{table}.csv"));
        var rows = new List<Dictionary<string, string>>();
        while (csv.Read())
            rows.Add(csv.Headers.Where(column => column.EndsWith("_reading", StringComparison.Ordinal)).ToDictionary(column => column, csv.GetString));
        return rows;
    }

    private static bool IsTablePage(string path) => path.StartsWith("tables/", StringComparison.Ordinal);

    private IHtmlCollection<IElement> Panels(string path) =>
        new HtmlParser().ParseDocument(File.ReadAllText(sample.File(path))).QuerySelectorAll(".panel[id]");

    private IEnumerable<(string Key, string Text)> ReadingsOf(string path) =>
        Panels(path).Select(panel => ($"{path.Split('/')[1]}#{panel.Id}", string.Join(' ', panel.QuerySelectorAll(":scope > p:not(.panel-links)").Select(part => part.TextContent))));
}
