using Markdig.Renderers;
using Markdig.Renderers.Html;
using Markdig.Syntax;
using Markdig.Syntax.Inlines;
using ReleaseKit.Charts;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Prose;

/// <summary>
/// Turns a prose file into HTML for one page: citations become generated texts or get their margin, charts are placed, headings take
/// their level and id, links that lead elsewhere than allowed lose their destination and keep their words.
/// </summary>
/// <param name="context">The release and its language.</param>
/// <param name="page">Path of the page that the prose stands on.</param>
/// <param name="deeper">By how many levels headings go down: 0 on a page of its own, 1 where the prose is woven into another.</param>
public sealed class ProseComposer(SiteContext context, string page, int deeper)
{
    private readonly CitationText citations = new(context.Appraised.Release, context.Language);
    private readonly HashSet<string> mentioned = new(StringComparer.Ordinal);
    private readonly HeadingIds ids = new("main");

    public ProseText Compose(ProsePage prose)
    {
        var document = ProseDocument.Parse(prose.Markdown);
        var title = TakeTitle(document);
        foreach (var paragraph in document.Descendants<ParagraphBlock>().ToList())
            PlaceCharts(paragraph);
        foreach (var inline in document.Descendants<Inline>().ToList())
            Resolve(inline);
        foreach (var heading in document.Descendants<HeadingBlock>())
            Prepare(heading);
        return new ProseText(title, Render(document));
    }

    private static string? TakeTitle(MarkdownDocument document)
    {
        if (document.OfType<HeadingBlock>().FirstOrDefault() is not { } heading)
            return null;
        document.Remove(heading);
        return ProseDocument.PlainText(heading.Inline);
    }

    private void Prepare(HeadingBlock heading)
    {
        heading.GetAttributes().Id = ids.Next(ProseDocument.PlainText(heading.Inline));
        heading.Level = Math.Clamp(heading.Level + deeper, 2, 6);
    }

    /// <summary>A chart is a block: it leaves its paragraph and stands after it.</summary>
    private void PlaceCharts(ParagraphBlock paragraph)
    {
        var images = paragraph.Inline?.Descendants<LinkInline>().Where(link => link.IsImage && ProseLink.ChartIn(link.Url) is not null).ToList() ?? [];
        var place = paragraph.Parent!.IndexOf(paragraph);
        foreach (var image in images)
        {
            paragraph.Parent.Insert(++place, Markup(Chart(ProseLink.ChartIn(image.Url)!)));
            image.Remove();
        }
        if (images.Count > 0 && paragraph.Inline!.All(inline => inline is LineBreakInline))
            paragraph.Parent.Remove(paragraph);
    }

    private string Chart(string id) => ChartFigure.Html(context.Release.Charts.First(chart => chart.Id == id), context, page);

    private void Resolve(Inline inline)
    {
        if (inline is LinkInline { IsImage: true } image)
            image.ReplaceBy(new LiteralInline(ProseDocument.PlainText(image)), copyChildren: false);
        else if (inline is LinkInline link)
            Resolve(link);
        else if (inline is AutolinkInline { IsEmail: false } address)
            Resolve(address);
    }

    private void Resolve(AutolinkInline address)
    {
        if (ProseLink.FigureIn(address.Url) is { } figure)
            address.ReplaceBy(Cited(CitationForm.ValueAndMargin, figure, address));
        else if (!ProseLink.IsAllowed(address.Url))
            address.ReplaceBy(new LiteralInline(address.Url));
    }

    private void Resolve(LinkInline link)
    {
        var destination = link.Url ?? "";
        if (ProseLink.FigureIn(destination) is { } figure)
            Cite(link, figure);
        else if (ProseLink.IsAllowed(destination))
            link.Url = InSite(destination);
        else
            link.ReplaceBy(new LiteralInline(ProseDocument.PlainText(link)), copyChildren: false);
    }

    private void Cite(LinkInline link, string address)
    {
        var words = ProseDocument.PlainText(link);
        var form = CitationForms.Of(words, context.Language);
        if (form != CitationForm.OwnWords)
        {
            link.ReplaceBy(Cited(form, address, link), copyChildren: false);
            return;
        }
        var figure = context.Appraised.FigureAt(address);
        link.Url = Link.From(page, context.Pages.Of(figure.Ref));
        link.GetAttributes().AddClass("cite");
        var place = CitationPlace.Of(link, figure.Measure, context.Language);
        if (citations.After(words, figure, mentioned.Add(figure.Address), place) is { Length: > 0 } after)
            link.InsertAfter(new HtmlInline(after));
    }

    private HtmlInline Cited(CitationForm form, string address, Inline place)
    {
        var figure = context.Appraised.FigureAt(address);
        mentioned.Add(figure.Address);
        return new HtmlInline(citations.Of(form, figure, Link.From(page, context.Pages.Of(figure.Ref)), CitationPlace.Of(place, figure.Measure, context.Language)));
    }

    /// <summary>A link to another prose file leads to its page.</summary>
    private string InSite(string destination)
    {
        var other = context.Release.Narrative.FirstOrDefault(prose => prose.File == destination || Path.GetFileName(prose.File) == destination);
        return other is null ? destination : Link.From(page, context.Pages.OfProse(other));
    }

    private string Render(MarkdownDocument document)
    {
        using var text = new StringWriter { NewLine = "\n" };
        var renderer = new HtmlRenderer(text);
        renderer.ObjectRenderers.Insert(0, new ProseTableRenderer(context.Language.Text("prose.table")));
        renderer.Render(document);
        return text.ToString();
    }

    private static HtmlBlock Markup(string html) => new(null!)
    {
        Lines = new(html),
    };
}
