namespace ReleaseKit.Pages;

/// <summary>What a server shows for an address that is not there.</summary>
internal static class NotFoundPage
{
    public static void Write(SiteContext context, SiteFolder site)
    {
        var head = new PageHead(PageMap.NotFound, context.Language.Text("notfound.title"), SiteSection.Release) { IsShownAnywhere = true };
        var model = context.Model();
        model["home"] = head.LinkTo(PageMap.Home, context.Release.Address);
        model["title"] = context.In(context.Release.Title);
        context.Write(site, head, "404.html", model);
    }
}
