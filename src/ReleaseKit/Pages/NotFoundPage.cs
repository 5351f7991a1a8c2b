namespace ReleaseKit.Pages;

/// <summary>What a server shows for an address that is not there.</summary>
internal static class NotFoundPage
{
    public static void Write(SiteContext context, SiteFolder site)
    {
        var head = new PageHead(PageMap.NotFound, context.Language.Text("notfound.title"), SiteSection.Release);
        var model = context.Model();
        model["home"] = Link.From(head.Path, PageMap.Home);
        model["title"] = context.In(context.Release.Title);
        context.Write(site, head, "404.html", model);
    }
}
