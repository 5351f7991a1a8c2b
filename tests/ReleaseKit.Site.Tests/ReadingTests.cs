using System.Text.Json;
using AngleSharp.Html.Parser;
using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>Every figure has its reading: in the pages, without script, and in the downloads.</summary>
public sealed class ReadingTests(ComposedSample sample, Chromium chromium)
{
    [Fact]
    public void Addresses_with_a_reading_are_the_same_in_pages_and_downloads()
    {
        var pages = sample.Pages.SelectMany(ReadingsOf).ToList();
        Assert.All(pages, reading => Assert.False(string.IsNullOrWhiteSpace(reading.Text)));
        var inPages = pages.Select(reading => reading.Address).Order(StringComparer.Ordinal).ToList();
        var inDownloads = Directory.EnumerateFiles(sample.File("downloads"), "*.jsonl").SelectMany(File.ReadLines)
            .Select(line => JsonDocument.Parse(line).RootElement)
            .Where(figure => figure.TryGetProperty("reading", out var reading) && reading.GetString() is { Length: > 0 })
            .Select(figure => figure.GetProperty("address").GetString()!).Order(StringComparer.Ordinal).ToList();
        Assert.NotEmpty(inPages);
        Assert.Equal(inDownloads, inPages);
    }

    [Fact]
    public async Task A_permalink_opens_its_reading_without_script()
    {
        foreach (var path in sample.Pages.Where(page => page.StartsWith("tables/", StringComparison.Ordinal)))
        {
            var id = new HtmlParser().ParseDocument(File.ReadAllText(sample.File(path))).QuerySelector("[data-address]")?.Id;
            if (id is null)
                continue;
            await using var opened = await chromium.OpenAsync(sample, $"{path}#{id}", script: false);
            Assert.True(await opened.Page.Locator($"[id='{id}']").IsVisibleAsync(), $"{path}#{id} does not show");
        }
    }

    private IEnumerable<(string Address, string Text)> ReadingsOf(string path) =>
        new HtmlParser().ParseDocument(File.ReadAllText(sample.File(path))).QuerySelectorAll("[data-address]")
            .Select(element => (element.GetAttribute("data-address")!, element.TextContent));
}
