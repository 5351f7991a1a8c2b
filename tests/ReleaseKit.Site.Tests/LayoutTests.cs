using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>No page scrolls sideways from 320 px up (WCAG 2.2, 1.4.10 Reflow); only a table's own region may.</summary>
public sealed class LayoutTests(ComposedSample sample, Chromium chromium)
{
    private static readonly int[] Widths = [320, 360, 390, 768, 1280];

    private static readonly int[] FigureWidths = [320, 390, 800, 1121, 1280];

    /// <summary>Numbers whose drawn digits begin before their cell's left edge or end beyond its right one, by more than a rounding of half a pixel.</summary>
    private const string FiguresOutOfTheirCells = """
        [...document.querySelectorAll('.sheet td.v')].filter(cell => cell.getClientRects().length > 0).filter(cell => {
          const [box, text] = [cell.getBoundingClientRect(), cell.querySelector('.num').getBoundingClientRect()];
          return text.right > box.right + .5 || text.left < box.left - .5;
        }).map(cell => cell.textContent)
        """;

    /// <summary>A page wider than its window, words of a picture that lie on others, and names narrower than a few letters.</summary>
    private const string Faults = """
        async () => {
          await document.fonts.ready;
          const page = document.documentElement, faults = page.scrollWidth > page.clientWidth ? [`${page.scrollWidth} px wide`] : [];
          for (const picture of document.querySelectorAll('main svg')) {
            const words = [...picture.querySelectorAll('text')].filter(word => word.textContent.trim() && word.getClientRects().length > 0 && !word.closest('details:not([open])'));
            const boxes = words.map(word => word.getBoundingClientRect());
            for (let one = 0; one < words.length; one++)
              for (let other = one + 1; other < words.length; other++)
                if (Math.min(boxes[one].right, boxes[other].right) - Math.max(boxes[one].left, boxes[other].left) > 1
                    && Math.min(boxes[one].bottom, boxes[other].bottom) - Math.max(boxes[one].top, boxes[other].top) > 4)
                  faults.push(`${words[one].textContent} lies on ${words[other].textContent}`);
          }
          for (const name of document.querySelectorAll('.sheet .stub .nm'))
            if (name.textContent.length > 8 && name.getBoundingClientRect().width < 50) faults.push(`${name.textContent} is ${name.getBoundingClientRect().width} px wide`);
          return faults;
        }
        """;

    private const string ShownMeasures = """
        [...document.querySelectorAll('.sheet thead .meas')].filter(head => getComputedStyle(head).display !== 'none').map(head => head.className.split(' ').at(-1))
        """;

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

    [Fact]
    public async Task Long_words_and_long_numbers_push_no_page_wide_and_run_into_nothing()
    {
        using var folder = new TemporaryFolder();
        using var odd = OddRelease.Compose(folder, measures: 4, letters: 58);
        var faults = new List<string>();
        foreach (var path in odd.Pages)
        {
            await using var opened = await chromium.OpenAsync(odd, path, Widths[0]);
            foreach (var width in Widths)
            {
                await opened.Page.SetViewportSizeAsync(width, 900);
                faults.AddRange((await opened.Page.EvaluateAsync<string[]>(Faults)).Select(fault => $"{path} at {width}: {fault}"));
            }
        }

        Assert.Empty(faults);
    }

    [Fact]
    public async Task No_label_of_a_scale_runs_into_another()
    {
        var faults = new List<string>();
        foreach (var path in sample.Pages.Where(path => path.StartsWith("tables/", StringComparison.Ordinal)))
        {
            await using var opened = await chromium.OpenAsync(sample, path, FigureWidths[0]);
            foreach (var width in FigureWidths)
            {
                await opened.Page.SetViewportSizeAsync(width, 900);
                faults.AddRange((await opened.Page.EvaluateAsync<string[]>(Faults)).Select(fault => $"{path} at {width}: {fault}"));
            }
        }

        Assert.Empty(faults);
    }

    [Fact]
    public async Task No_figure_runs_out_of_its_cell()
    {
        var over = new List<string>();
        foreach (var path in sample.Pages.Where(path => path.StartsWith("tables/", StringComparison.Ordinal)))
        {
            await using var opened = await chromium.OpenAsync(sample, path, FigureWidths[0]);
            foreach (var width in FigureWidths)
            {
                await opened.Page.SetViewportSizeAsync(width, 900);
                var figures = await opened.Page.EvaluateAsync<string[]>(FiguresOutOfTheirCells);
                over.AddRange(figures.Select(figure => $"{path}: {figure} at {width}"));
            }
        }

        Assert.Empty(over);
    }

    [Theory]
    [InlineData(320)]
    [InlineData(390)]
    public async Task Address_of_a_figure_shows_the_column_of_its_measure_until_another_is_chosen(int width)
    {
        var path = sample.Pages.First(page => File.ReadAllText(sample.File(page)).Contains("id=\"k2\"", StringComparison.Ordinal));
        await using var first = await chromium.OpenAsync(sample, path, width);
        var id = await first.Page.EvaluateAsync<string>("document.querySelector('.unfold details:nth-of-type(2) > .panel').id");
        await using var opened = await chromium.OpenAsync(sample, $"{path}#{id}", width);

        Assert.Equal(["k1"], await first.Page.EvaluateAsync<string[]>(ShownMeasures));
        Assert.Equal(["k2"], await opened.Page.EvaluateAsync<string[]>(ShownMeasures));
        await opened.Page.CheckAsync("#k1");
        Assert.Equal(["k1"], await opened.Page.EvaluateAsync<string[]>(ShownMeasures));
    }
}
