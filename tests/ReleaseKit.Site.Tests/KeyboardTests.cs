using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>A walk with the Tab key reaches every control once, shows where it is, and ends (WCAG 2.2, 2.1.1, 2.1.2, 2.4.7).</summary>
public sealed class KeyboardTests(ComposedSample sample, Chromium chromium)
{
    // A group of radio buttons is one stop of the walk; arrows move inside it.
    private const string CountControls = """
        (() => {
          const seen = new Set(); let count = 0;
          for (const e of document.querySelectorAll('a[href],button,input,select,textarea,summary,[tabindex="0"]')) {
            if (e.disabled || e.tabIndex < 0 || !e.checkVisibility({ contentVisibilityAuto: true, visibilityProperty: true })) continue;
            if (e.type === 'radio') { if (seen.has(e.name)) continue; seen.add(e.name); }
            count++;
          }
          return count;
        })()
        """;

    // Every control that gets the focus, in order, and what is wrong with its mark; written down in the page, read once at the end.
    private const string NoteFocus = """
        (() => {
          window.walk = new Map();
          document.addEventListener('focusin', ({ target }) => {
            const style = getComputedStyle(target);
            const shown = style.outlineStyle !== 'none' && parseFloat(style.outlineWidth) >= 2;
            window.walk.set(target, shown ? '' : 'no focus mark on ' + target.outerHTML.slice(0, 120));
          });
        })()
        """;

    [Fact]
    public async Task Tab_reaches_every_control_and_shows_it()
    {
        var trouble = new List<string>();
        foreach (var path in sample.Pages)
            trouble.AddRange(await WalkAsync(path));
        Assert.Empty(trouble);
    }

    private async Task<IEnumerable<string>> WalkAsync(string path)
    {
        await using var opened = await chromium.OpenAsync(sample, path, bypassPolicy: true);
        var controls = await opened.Page.EvaluateAsync<int>(CountControls);
        await opened.Page.EvaluateAsync(NoteFocus);
        for (var pressed = 0; pressed <= controls; pressed++)
            await opened.Page.Keyboard.PressAsync("Tab");
        var reached = await opened.Page.EvaluateAsync<string[]>("[...window.walk.values()]");

        var unmarked = reached.Where(mark => mark.Length > 0).Take(1).Select(mark => $"{path}: {mark}");
        return reached.Length == controls ? unmarked : unmarked.Append($"{path}: reached {reached.Length} of {controls} controls");
    }
}
