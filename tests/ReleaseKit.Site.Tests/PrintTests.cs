using System.Text.RegularExpressions;
using Microsoft.Playwright;
using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>A page prints to a tagged PDF whose text holds the notes of weak and special figures.</summary>
public sealed partial class PrintTests(ComposedSample sample, Chromium chromium)
{
    [Fact]
    public async Task Table_pages_print_tagged_with_their_notes()
    {
        var checkedNotes = 0;
        foreach (var path in sample.Pages.Where(page => page.StartsWith("tables/", StringComparison.Ordinal)))
        {
            using var folder = new TemporaryFolder();
            await using var opened = await chromium.OpenAsync(sample, path);
            var notes = await opened.Page.EvaluateAsync<string[]>("[...document.querySelectorAll('.print-notes li')].map(note => note.textContent)");
            await opened.Page.PdfAsync(new() { Path = folder.In("page.pdf"), PreferCSSPageSize = true, PrintBackground = true, Tagged = true, Outline = true });
            Assert.Matches("Tagged: +yes", ReleaseKitProgram.Start("pdfinfo", [folder.In("page.pdf")]).Output);
            var text = Letters(ReleaseKitProgram.Start("pdftotext", ["-layout", "-nopgbrk", folder.In("page.pdf"), "-"]).Output);
            var flow = Letters(ReleaseKitProgram.Start("pdftotext", ["-nopgbrk", folder.In("page.pdf"), "-"]).Output);
            foreach (var note in notes)
            {
                Assert.True(flow.Contains(Letters(note)) || text.Contains(Letters(note)), $"{path} does not print: {note}");
                checkedNotes++;
            }
        }

        Assert.True(checkedNotes > 10, $"only {checkedNotes} notes in all table pages");
    }

    [Theory]
    [InlineData(1)]
    [InlineData(7)]
    [InlineData(8)]
    [InlineData(12)]
    public async Task Every_measures_title_stands_over_its_own_figures_on_paper(int measures)
    {
        using var folder = new TemporaryFolder();
        using var odd = OddRelease.Compose(folder, measures);
        await using var opened = await chromium.OpenAsync(odd, "tables/odd/index.html");
        await opened.Page.EmulateMediaAsync(new() { Media = Media.Print });

        var titles = await opened.Page.EvaluateAsync<double[][]>(TitlesAndFigures);

        Assert.Equal(measures, titles.Length);
        Assert.All(titles, title => Assert.True(title[0] <= title[2] && title[3] <= title[1], $"title {title[0]} to {title[1]}, figures {title[2]} to {title[3]}"));
        Assert.All(titles.Zip(titles.Skip(1)), pair => Assert.True(pair.First[1] <= pair.Second[0] + 0.5, $"a title reaches to {pair.First[1]}, the next begins at {pair.Second[0]}"));
    }

    /// <summary>For each measure where its title's cell begins and ends, and where the digits and margins of its column do.</summary>
    private const string TitlesAndFigures = """
        [...document.querySelectorAll('.sheet > thead .meas')].map(title => {
          const key = title.className.split(' ').at(-1), box = title.getBoundingClientRect();
          const numbers = [...document.querySelectorAll(`.sheet > tbody td.v.${key} .num, .sheet > tbody td.mg.${key}`)].map(number => number.getBoundingClientRect());
          return [box.left, box.right, Math.min(...numbers.map(number => number.left)), Math.max(...numbers.map(number => number.right))];
        })
        """;

    // Line ends, hyphens and spaces differ in a PDF; letters and digits do not.
    private static string Letters(string text) => NoLetter().Replace(text, "");

    [GeneratedRegex(@"[^\p{L}\p{N}]")]
    private static partial Regex NoLetter();
}
