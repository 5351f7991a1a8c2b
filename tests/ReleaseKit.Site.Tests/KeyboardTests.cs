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

    private const string FocusedPlace = """
        (() => {
          const e = document.activeElement;
          if (!e || e === document.body) return '';
          const style = getComputedStyle(e);
          const shown = style.outlineStyle !== 'none' && parseFloat(style.outlineWidth) >= 2;
          window.walk = window.walk || new Map();
          if (!window.walk.has(e)) window.walk.set(e, window.walk.size);
          return window.walk.get(e) + (shown ? '' : ' no focus mark on ' + e.outerHTML.slice(0, 120));
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
        var reached = new HashSet<string>();
        for (var pressed = 0; pressed <= controls; pressed++)
        {
            await opened.Page.Keyboard.PressAsync("Tab");
            var place = await opened.Page.EvaluateAsync<string>(FocusedPlace);
            if (place.Length == 0)
                break;
            reached.Add(place);
        }

        var unmarked = reached.Where(place => place.Contains("no focus mark")).Take(1).Select(place => $"{path}: {place}");
        return reached.Count == controls ? unmarked : unmarked.Append($"{path}: reached {reached.Count} of {controls} controls");
    }
}
