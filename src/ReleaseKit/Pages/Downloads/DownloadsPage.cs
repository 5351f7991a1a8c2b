using Scriban.Runtime;

namespace ReleaseKit.Pages.Downloads;

/// <summary>Every file to download, with its size, its format and what it is for; and what the columns mean. Written after the files themselves.</summary>
internal static class DownloadsPage
{
    private const string Folder = "downloads/";
    private const string Images = "images/";

    public static void Write(SiteContext context, SiteFolder site)
    {
        var head = new PageHead(PageMap.Downloads, context.Language.Text("downloads-page.title"), SiteSection.Downloads);
        var files = site.Written.Where(path => path.StartsWith(Folder, StringComparison.Ordinal)).Select(path => DownloadFile.Of(context, path)).ToList();
        var model = context.Model();
        model["home"] = Link.From(head.Path, PageMap.Home);
        model["methods"] = Link.From(head.Path, PageMap.Methods);
        model["release_title"] = context.In(context.Release.Title);
        model["has_noise"] = context.Figures.Noised > 0;
        model["tables"] = new ScriptArray(context.Release.Tables.Select((table, index) => new ScriptObject
        {
            ["title"] = context.In(table.Title),
            ["href"] = Link.From(head.Path, context.Pages.FirstPageOf(index)),
            ["files"] = Rows(context, site, files.Where(file => file.Table == index).OrderBy(file => file.Place)),
        }));
        model["others"] = Rows(context, site, files.Where(file => file.Table is null));
        var images = site.Written.Where(path => path.StartsWith(Images, StringComparison.Ordinal)).Select(path => DownloadFile.Of(context, path));
        model["images"] = Rows(context, site, images);
        context.Write(site, head, "downloads.html", model);
    }

    private static ScriptArray Rows(SiteContext context, SiteFolder site, IEnumerable<DownloadFile> files) => new(files.Select(file => new ScriptObject
    {
        ["name"] = Path.GetFileName(file.Path),
        ["href"] = Link.From(PageMap.Downloads, file.Path),
        ["what"] = file.What(context.Language),
        ["size"] = FileSize.Of(site.LengthOf(file.Path), context.Language),
    }));
}
