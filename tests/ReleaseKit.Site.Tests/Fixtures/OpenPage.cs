using System.Collections.Concurrent;
using Microsoft.Playwright;

namespace ReleaseKit.Site.Tests.Fixtures;

/// <summary>A page in a browser context that no other test uses meanwhile, with what went wrong on it.</summary>
public sealed class OpenPage : IAsyncDisposable
{
    private readonly Action<OpenPage> giveBack;

    public OpenPage(IPage page, Action<OpenPage> giveBack)
    {
        (Page, this.giveBack) = (page, giveBack);
        page.Console += (_, message) =>
        {
            if (message.Type is "error" or "warning")
                Complaints.Add(message.Text);
        };
        page.PageError += (_, error) => Complaints.Add(error);
    }

    public IPage Page { get; }

    /// <summary>Requests to any other host.</summary>
    public ConcurrentBag<string> Foreign { get; private set; } = [];

    /// <summary>Requests to files that the site does not have.</summary>
    public ConcurrentBag<string> Missing { get; private set; } = [];

    /// <summary>Console errors and warnings: broken policy, scripts, markup.</summary>
    public ConcurrentBag<string> Complaints { get; private set; } = [];

    public async ValueTask DisposeAsync()
    {
        // An empty page ends the scripts, folds and focus of this one, and makes the next one load even if only its fragment differs.
        await Page.GotoAsync("about:blank");
        (Foreign, Missing, Complaints) = ([], [], []);
        giveBack(this);
    }
}
