using ReleaseKit.Charts;
using ReleaseKit.Pages.Prose;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Home;

/// <summary>The release's first page: what it is, its headlines, its first prose, how to read the marks, what it holds.</summary>
internal static class HomePage
{
    public static void Write(SiteContext context, SiteFolder site)
    {
        var head = new PageHead(PageMap.Home, null, SiteSection.Release);
        var model = context.Model();
        model["title"] = context.In(context.Release.Title);
        model["lead"] = context.Release.Lead is { } lead ? context.In(lead) : null;
        model["particulars"] = Particulars.Of(context);
        AddHeadlines(model, context);
        AddProse(model, context);
        model["key"] = context.Figures.Noised > 0 ? new RawHtml(Marks.Key(context.Release, context.Language)) : null;
        model["contents"] = Contents.Of(context);
        model["budget"] = PageMap.Budget;
        model["unit"] = UnitText.One(context.Release.Noise.Who, context.Language.Tag);
        model["reading"] = PageMap.Reading;
        context.Write(site, head, "home.html", model);
    }

    private static void AddHeadlines(ScriptObject model, SiteContext context)
    {
        var headlines = context.Release.Headlines.Select((headline, index) => HeadlineModel.Of(context, headline, isLeading: index == 0)).ToList();
        model["hero"] = headlines.FirstOrDefault();
        model["headlines"] = new ScriptArray(headlines.Skip(1));
    }

    private static void AddProse(ScriptObject model, SiteContext context)
    {
        var pages = context.Release.Narrative.Where(page => page.Language == context.Language.Tag).ToList();
        var composed = pages.Count == 0 ? null : new ProseComposer(context, PageMap.Home, deeper: 1).Compose(pages[0]);
        model["prose_title"] = composed?.Title ?? context.Language.Text("home.prose");
        model["prose"] = composed is null ? null : new RawHtml(composed.Html);
        model["more_prose"] = new ScriptArray(pages.Skip(1).Select(page => new ScriptObject
        {
            ["title"] = ProsePages.TitleOf(page),
            ["href"] = context.Pages.OfProse(page),
        }));
    }
}
