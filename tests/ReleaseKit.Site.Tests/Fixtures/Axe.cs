using Deque.AxeCore.Commons;
using Microsoft.Playwright;

namespace ReleaseKit.Site.Tests.Fixtures;

/// <summary>axe-core in an open page: brought in once, asked as often as the page changes its width, theme or folds.</summary>
public static class Axe
{
    // Pages hold no frames, so that one run in the page itself sees all of it; what passes is not listed, which would be most of the work.
    private const string Violations = """
        async () => {
          const rules = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];
          const result = await axe.run({ runOnly: { type: 'tag', values: rules }, resultTypes: ['violations'] });
          if (result.passes.length === 0 || document.querySelector('iframe, frame')) throw new Error('axe did not see the whole page');
          return result.violations.map(found => `${found.id} × ${found.nodes.length}: ${found.nodes[0].html}`);
        }
        """;

    private static readonly string Script = new BundledAxeScriptProvider().GetScript();

    public static Task BringInAsync(IPage page) => page.EvaluateAsync(Script);

    public static async Task<IEnumerable<string>> ViolationsAsync(IPage page, string where) =>
        (await page.EvaluateAsync<string[]>(Violations)).Select(violation => $"{where}: {violation}");
}
