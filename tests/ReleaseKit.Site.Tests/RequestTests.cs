using Microsoft.Playwright;
using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>What pages ask for: nothing from elsewhere, nothing that is not there, nothing that the strict policy forbids.</summary>
public sealed class RequestTests(ComposedSample sample, Chromium chromium)
{
    [Fact]
    public async Task Pages_ask_no_other_host_and_miss_nothing()
    {
        var trouble = new List<string>();
        foreach (var path in sample.Pages)
        {
            await using var opened = await chromium.OpenAsync(sample, path);
            await opened.Page.WaitForLoadStateAsync(LoadState.Load);
            trouble.AddRange(opened.Foreign.Select(url => $"{path} asks {url}"));
            trouble.AddRange(opened.Missing.Select(file => $"{path} misses {file}"));
            trouble.AddRange(opened.Complaints.Select(text => $"{path}: {text}"));
        }

        Assert.Empty(trouble);
    }

    [Fact]
    public void Every_page_carries_the_strict_policy_itself()
    {
        foreach (var path in sample.Pages)
            Assert.Contains("default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self'; font-src 'self'; base-uri 'none'; form-action 'none'",
                File.ReadAllText(sample.File(path)).Replace("&#39;", "'"));
    }
}
