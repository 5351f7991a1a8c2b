using System.Text.RegularExpressions;
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

    // Line ends, hyphens and spaces differ in a PDF; letters and digits do not.
    private static string Letters(string text) => NoLetter().Replace(text, "");

    [GeneratedRegex(@"[^\p{L}\p{N}]")]
    private static partial Regex NoLetter();
}
