using System.Collections.Concurrent;
using Microsoft.Playwright;

namespace ReleaseKit.Site.Tests.Fixtures;

/// <summary>A page in a browser context of its own, with what went wrong on it.</summary>
public sealed class OpenPage : IAsyncDisposable
{
    private readonly IBrowserContext context;

    public OpenPage(IBrowserContext context, IPage page)
    {
        this.context = context;
        Page = page;
        page.Console += (_, message) =>
        {
            if (message.Type is "error" or "warning")
                Complaints.Add(message.Text);
        };
        page.PageError += (_, error) => Complaints.Add(error);
    }

    public IPage Page { get; }

    /// <summary>Requests to any other host.</summary>
    public ConcurrentBag<string> Foreign { get; } = [];

    /// <summary>Requests to files that the site does not have.</summary>
    public ConcurrentBag<string> Missing { get; } = [];

    /// <summary>Console errors and warnings: broken policy, scripts, markup.</summary>
    public ConcurrentBag<string> Complaints { get; } = [];

    public async ValueTask DisposeAsync() => await context.DisposeAsync();
}
