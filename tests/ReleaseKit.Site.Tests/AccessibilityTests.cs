using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;
using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>WCAG 2.2 A and AA by axe-core over every page (Web Content Accessibility Guidelines 2.2, W3C 2023).</summary>
public sealed class AccessibilityTests(ComposedSample sample, Chromium chromium)
{
    private static readonly List<string> Rules = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"];

    [Theory]
    [InlineData(ColorScheme.Light)]
    [InlineData(ColorScheme.Dark)]
    public async Task Every_page_has_no_violation(ColorScheme theme)
    {
        var violations = new List<string>();
        foreach (var path in sample.Pages)
        {
            await using var opened = await chromium.OpenAsync(sample, path, 1280, theme: theme, bypassPolicy: true);
            violations.AddRange(await RunAsync(opened, $"{path} at 1280"));
            await opened.Page.SetViewportSizeAsync(390, 900);
            violations.AddRange(await RunAsync(opened, $"{path} at 390"));
        }

        Assert.Empty(violations);
    }

    [Fact]
    public async Task Open_readings_have_no_violation()
    {
        foreach (var path in sample.Pages.Where(page => page.StartsWith("tables/", StringComparison.Ordinal)).Take(2))
        {
            await using var opened = await chromium.OpenAsync(sample, path, bypassPolicy: true);
            await opened.Page.EvaluateAsync("for (const fold of document.querySelectorAll('details')) fold.open = true");
            Assert.Empty(await RunAsync(opened, path));
        }
    }

    private static async Task<IEnumerable<string>> RunAsync(OpenPage opened, string where)
    {
        var result = await opened.Page.RunAxe(new AxeRunOptions { RunOnly = new RunOnlyOptions { Type = "tag", Values = Rules } });
        return result.Violations.Select(violation => $"{where}: {violation.Id} × {violation.Nodes.Length}: {violation.Nodes[0].Html}");
    }
}
