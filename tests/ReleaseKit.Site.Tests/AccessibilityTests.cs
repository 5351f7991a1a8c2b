using System.Collections.Concurrent;
using Microsoft.Playwright;
using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>WCAG 2.2 A and AA by axe-core over every page (Web Content Accessibility Guidelines 2.2, W3C 2023).</summary>
public sealed class AccessibilityTests(ComposedSample sample, Chromium chromium)
{
    private static readonly int[] Widths = [1280, 390];

    [Fact]
    public async Task Every_page_has_no_violation_in_either_theme()
    {
        var violations = new ConcurrentBag<string>();
        await Parallel.ForEachAsync(sample.Pages, new ParallelOptions { MaxDegreeOfParallelism = 2 }, async (path, _) =>
        {
            await using var opened = await chromium.OpenAsync(sample, path, Widths[0], bypassPolicy: true);
            await Axe.BringInAsync(opened.Page);
            foreach (var width in Widths)
            {
                await opened.Page.SetViewportSizeAsync(width, 900);
                foreach (var theme in new[] { ColorScheme.Light, ColorScheme.Dark })
                {
                    await opened.Page.EmulateMediaAsync(new() { ColorScheme = theme });
                    foreach (var violation in await Axe.ViolationsAsync(opened.Page, $"{path} at {width}, {theme}"))
                        violations.Add(violation);
                }
            }
        });
        Assert.Empty(violations);
    }

    [Fact]
    public async Task Open_readings_have_no_violation()
    {
        foreach (var path in sample.Pages.Where(page => page.StartsWith("tables/", StringComparison.Ordinal)).Take(2))
        {
            await using var opened = await chromium.OpenAsync(sample, path, bypassPolicy: true);
            await Axe.BringInAsync(opened.Page);
            await opened.Page.EvaluateAsync("for (const fold of document.querySelectorAll('details')) fold.open = true");
            Assert.Empty(await Axe.ViolationsAsync(opened.Page, path));
        }
    }

    /// <summary>The check itself: a page in which something is wrong in one theme alone is found, in that theme alone.</summary>
    [Fact]
    public async Task Text_too_faint_in_the_dark_is_found_in_the_dark_alone()
    {
        await using var opened = await chromium.OpenAsync(sample, "reading.html", bypassPolicy: true);
        await Axe.BringInAsync(opened.Page);
        await opened.Page.AddStyleTagAsync(new() { Content = "@media (prefers-color-scheme: dark) { main p { color: #222; background: #111 } }" });
        Assert.Empty(await Axe.ViolationsAsync(opened.Page, "light"));
        await opened.Page.EmulateMediaAsync(new() { ColorScheme = ColorScheme.Dark });
        Assert.Contains(await Axe.ViolationsAsync(opened.Page, "dark"), violation => violation.Contains("color-contrast"));
    }
}
