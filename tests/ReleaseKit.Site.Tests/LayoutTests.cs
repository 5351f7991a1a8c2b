using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>No page scrolls sideways from 320 px up (WCAG 2.2, 1.4.10 Reflow); only a table's own region may.</summary>
public sealed class LayoutTests(ComposedSample sample, Chromium chromium)
{
    private static readonly int[] Widths = [320, 360, 390, 768, 1280];

    [Fact]
    public async Task No_page_scrolls_sideways()
    {
        var wide = new List<string>();
        foreach (var path in sample.Pages)
        {
            await using var opened = await chromium.OpenAsync(sample, path, Widths[0]);
            foreach (var width in Widths)
            {
                await opened.Page.SetViewportSizeAsync(width, 900);
                var over = await opened.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");
                if (over > 0)
                    wide.Add($"{path} is {over} px too wide at {width}");
            }
        }

        Assert.Empty(wide);
    }
}
