using System.Globalization;
using Scriban.Runtime;

namespace ReleaseKit.Pages;

/// <summary>What stands around the body of every page: head, navigation, foot. One template, parted where the body goes.</summary>
internal static class PageFrame
{
    private const string BodyPlace = "<!--body-->";

    public static (string Top, string Foot) Of(SiteContext context, PageHead head)
    {
        var html = context.Templates.Render("page.html", Model(context, head));
        // The mark stands in the template's own text; a value cannot bring it, as its "<" is escaped.
        var at = html.IndexOf(BodyPlace, StringComparison.Ordinal);
        return (html[..at], html[(at + BodyPlace.Length)..]);
    }

    private static ScriptObject Model(SiteContext context, PageHead head)
    {
        var release = context.Release;
        var title = context.In(release.Title);
        var model = context.Model();
        model["lang"] = context.Language.Tag;
        model["page_title"] = head.Title is null ? title : $"{head.Title}. {title}";
        model["release_title"] = title;
        model["home"] = head.LinkTo(PageMap.Home, release.Address);
        model["is_home"] = head.Path == PageMap.Home;
        model["style"] = head.LinkTo(context.Assets.Style, release.Address);
        model["canonical"] = WebAddress.Of(release.Address) is { } address ? address + head.Path : null;
        model["latest"] = WebAddress.Above(release.Address);
        model["office"] = release.Publisher.Name;
        model["edition"] = EditionLine.Of(context);
        model["sections"] = Sections(context, head);
        model["tables"] = Tables(context, head);
        model["in_tables"] = head.Section == SiteSection.Tables;
        AddFoot(model, context);
        return model;
    }

    private static ScriptArray Sections(SiteContext context, PageHead head)
    {
        ScriptObject Item(SiteSection section, string path, string key) =>
            Entry(context, context.Language.Text(key), head, path, isCurrent: section == head.Section);
        return
        [
            Item(SiteSection.Budget, PageMap.Budget, "frame.budget"),
            Item(SiteSection.Reading, PageMap.Reading, "frame.reading"),
            Item(SiteSection.Methods, PageMap.Methods, "frame.methods"),
            Item(SiteSection.Downloads, PageMap.Downloads, "frame.downloads"),
        ];
    }

    private static ScriptArray Tables(SiteContext context, PageHead head) =>
        [.. context.Release.Tables.Select((table, index) =>
            Entry(context, context.In(table.Title), head, context.Pages.FirstPageOf(index), isCurrent: head.Table == index))];

    /// <summary>An entry of the navigation; "page" marks the very page, "true" the part that the page belongs to.</summary>
    private static ScriptObject Entry(SiteContext context, string text, PageHead head, string path, bool isCurrent) => new()
    {
        ["text"] = text,
        ["href"] = head.LinkTo(path, context.Release.Address),
        ["current"] = path == head.Path ? "page" : isCurrent ? "true" : null,
    };

    private static void AddFoot(ScriptObject model, SiteContext context)
    {
        var release = context.Release;
        model["published"] = context.Language.Date(DateOnly.FromDateTime(release.Published.DateTime));
        model["year"] = release.Published.Year.ToString(CultureInfo.InvariantCulture);
        model["foot"] = release.Look.Foot ?? release.Publisher.Name;
        model["homepage"] = WebAddress.Of(release.Publisher.Homepage);
        model["address"] = WebAddress.Of(release.Address);
        model["identifier"] = release.Identifier;
        model["licence"] = release.Licence?.Name;
        model["licence_url"] = WebAddress.Of(release.Licence?.Url);
        model["contact"] = release.Publisher.Contact;
        model["contact_url"] = WebAddress.OfContact(release.Publisher.Contact);
    }
}
