using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;
using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>WCAG 2.2 A and AA by axe-core over every page (Web Content Accessibility Guidelines 2.2, W3C 2023).</summary>
public sealed class AccessibilityTests(ComposedSample sample, Chromium chromium)
{
    private static readonly List<string> Rules = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"];

    public static TheoryData<int, ColorScheme> Views => new()
    {
        { 1280, ColorScheme.Light }, { 1280, ColorScheme.Dark }, { 390, ColorScheme.Light }, { 390, ColorScheme.Dark },
    };

    [Theory]
    [MemberData(nameof(Views))]
    public async Task Every_page_has_no_violation(int width, ColorScheme theme)
    {
        var violations = new List<string>();
        foreach (var path in sample.Pages)
            violations.AddRange(await ViolationsOf(path, width, theme));
        Assert.Empty(violations);
    }

    [Fact]
    public async Task Open_panels_have_no_violation()
    {
        var path = sample.Pages.First(page => page.StartsWith("tables/", StringComparison.Ordinal));
        await using var opened = await chromium.OpenAsync(sample, path, bypassPolicy: true);
        await opened.Page.EvaluateAsync("for (const fold of document.querySelectorAll('details')) fold.open = true");
        Assert.Empty(await RunAsync(opened, path));
    }

    private async Task<IEnumerable<string>> ViolationsOf(string path, int width, ColorScheme theme)
    {
        await using var opened = await chromium.OpenAsync(sample, path, width, theme: theme, bypassPolicy: true);
        return await RunAsync(opened, path);
    }

    private static async Task<IEnumerable<string>> RunAsync(OpenPage opened, string path)
    {
        var result = await opened.Page.RunAxe(new AxeRunOptions { RunOnly = new RunOnlyOptions { Type = "tag", Values = Rules } });
        return result.Violations.Select(violation => $"{path}: {violation.Id} × {violation.Nodes.Length}: {violation.Nodes[0].Html}");
    }
}
