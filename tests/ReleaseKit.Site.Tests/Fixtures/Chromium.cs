using System.Collections.Concurrent;
using Microsoft.Playwright;
using ReleaseKit.Site.Tests.Fixtures;

[assembly: AssemblyFixture(typeof(Chromium))]

namespace ReleaseKit.Site.Tests.Fixtures;

/// <summary>The distribution's Chromium, started once. Pages are served from the composed folder under a host that exists nowhere else.</summary>
public sealed class Chromium : IAsyncLifetime
{
    public const string Origin = "http://release.test";
    private const string ContentSecurityPolicy = "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self'; font-src 'self'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'";

    // Browsers wait long on a machine that also runs simulations; the default of 30 s would turn load into failures.
    private const float PatienceInMilliseconds = 180_000;

    // Idle pages by (site, script, policy bypassed): a page is opened in one of them, since starting a browser's process for each takes longer than
    // most of what is looked at.
    private readonly ConcurrentDictionary<(ComposedSample Sample, bool Script, bool BypassPolicy), ConcurrentBag<OpenPage>> pages = new();
    private IPlaywright? playwright;
    private IBrowser? browser;

    public async ValueTask InitializeAsync()
    {
        playwright = await Playwright.CreateAsync();
        browser = await playwright.Chromium.LaunchAsync(new()
        {
            ExecutablePath = "/usr/bin/chromium",
            Headless = true,
            Args = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
        });
    }

    /// <summary>A page at a size, in the light theme; everything it asks for is answered from the site or recorded as foreign.</summary>
    public async Task<OpenPage> OpenAsync(ComposedSample sample, string path, int width = 1280, int height = 900, bool script = true, bool bypassPolicy = false)
    {
        var idle = pages.GetOrAdd((sample, script, bypassPolicy), _ => []);
        if (!idle.TryTake(out var opened))
            opened = await StartAsync(sample, script, bypassPolicy, idle);
        await opened.Page.SetViewportSizeAsync(width, height);
        await opened.Page.EmulateMediaAsync(new() { ColorScheme = ColorScheme.Light, Media = Media.Null });
        await opened.Page.GotoAsync($"{Origin}/{path}");
        return opened;
    }

    public async ValueTask DisposeAsync()
    {
        if (browser is not null)
            await browser.DisposeAsync();
        playwright?.Dispose();
    }

    private async Task<OpenPage> StartAsync(ComposedSample sample, bool script, bool bypassPolicy, ConcurrentBag<OpenPage> idle)
    {
        var context = await browser!.NewContextAsync(new() { JavaScriptEnabled = script, ReducedMotion = ReducedMotion.Reduce, BypassCSP = bypassPolicy });
        context.SetDefaultTimeout(PatienceInMilliseconds);
        var opened = new OpenPage(await context.NewPageAsync(), idle.Add);
        await context.RouteAsync("**/*", route => AnswerAsync(route, sample, opened));
        return opened;
    }

    private static Task AnswerAsync(IRoute route, ComposedSample sample, OpenPage opened)
    {
        var address = new Uri(route.Request.Url);
        if (address.GetLeftPart(UriPartial.Authority) != Origin)
        {
            opened.Foreign.Add(route.Request.Url);
            return route.AbortAsync();
        }

        var file = sample.File(ComposedSample.FileAt(address.AbsolutePath));
        if (!File.Exists(file))
        {
            opened.Missing.Add(address.AbsolutePath);
            return route.FulfillAsync(new() { Status = 404 });
        }

        return route.FulfillAsync(new()
        {
            BodyBytes = File.ReadAllBytes(file),
            ContentType = TypeOf(file),
            Headers = new Dictionary<string, string> { ["Content-Security-Policy"] = ContentSecurityPolicy },
        });
    }

    private static string TypeOf(string file) => Path.GetExtension(file) switch
    {
        ".html" => "text/html; charset=utf-8",
        ".css" => "text/css; charset=utf-8",
        ".js" => "text/javascript; charset=utf-8",
        ".svg" => "image/svg+xml",
        ".png" => "image/png",
        ".woff2" => "font/woff2",
        ".json" => "application/json",
        _ => "application/octet-stream",
    };
}
