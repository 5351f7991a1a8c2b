using Markdig.Syntax;
using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Prose;

/// <summary>The prose pages after the first, which is woven into the home page.</summary>
internal static class ProsePages
{
    public static void Write(SiteContext context, SiteFolder site)
    {
        var pages = context.Release.Narrative.Where(page => page.Language == context.Language.Tag).ToList();
        foreach (var page in pages.Skip(1))
            Write(context, site, page, pages);
    }

    /// <summary>The first heading's words; the file's name if it has none.</summary>
    public static string TitleOf(ProsePage page) => ProseDocument.Parse(page.Markdown).OfType<HeadingBlock>().FirstOrDefault() is { } heading
        ? ProseDocument.PlainText(heading.Inline)
        : Path.GetFileNameWithoutExtension(page.File);

    private static void Write(SiteContext context, SiteFolder site, ProsePage page, List<ProsePage> all)
    {
        var path = context.Pages.OfProse(page);
        var prose = new ProseComposer(context, path, deeper: 0).Compose(page);
        var title = prose.Title ?? TitleOf(page);
        var model = context.Model();
        model["title"] = title;
        model["home"] = Link.From(path, PageMap.Home);
        model["release_title"] = context.In(context.Release.Title);
        model["prose"] = new RawHtml(prose.Html);
        model["others"] = new ScriptArray(all.Where(other => other != page && other != all[0]).Select(other => new ScriptObject
        {
            ["title"] = TitleOf(other),
            ["href"] = Link.From(path, context.Pages.OfProse(other)),
        }));
        context.Write(site, new PageHead(path, title, SiteSection.Release), "prose.html", model);
    }
}
