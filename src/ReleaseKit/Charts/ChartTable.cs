using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Charts.Ordered;
using ReleaseKit.Pages;
using ReleaseKit.Releases;

namespace ReleaseKit.Charts;

/// <summary>The figures of a chart as a folded table: name, figure, margin, range; those without a number last, with why.</summary>
internal static class ChartTable
{
    public static string Html(ChartOrder chart, OrderedFigures figures, SiteContext context, string page)
    {
        var language = context.Language;
        var html = new StringBuilder("<details class=\"chart-data\"><summary>").Append(HtmlText.Encode(language.Text("charts.table")))
            .Append("</summary><div class=\"scroll\" role=\"region\" tabindex=\"0\" aria-label=\"").Append(HtmlText.Encode(context.In(chart.Title)))
            .Append("\"><table class=\"plain\"><caption>").Append(HtmlText.Encode(Caption(chart, figures, context))).Append("</caption><thead><tr><td></td>");
        foreach (var key in new[] { "charts.table.figure", "charts.table.margin", "charts.table.from", "charts.table.to" })
            html.Append("<th scope=\"col\" class=\"r\">").Append(HtmlText.Encode(language.Text(key))).Append("</th>");
        html.Append("</tr></thead><tbody>");
        foreach (var row in figures.Rows)
            AppendRow(html, row, context, page);
        foreach (var figure in figures.WithoutNumber)
            AppendWithoutNumber(html, figure, figures.NameOf(figure), context, page);
        return html.Append("</tbody></table></div></details>").ToString();
    }

    private static string Caption(ChartOrder chart, OrderedFigures figures, SiteContext context)
    {
        var title = ("title", context.In(chart.Title));
        if (figures.Rows.Select(row => row.Figure.Main).FirstOrDefault(range => range is not null) is not { } first)
            return context.Language.Text("charts.table.caption-plain", title);
        return context.Language.Text("charts.table.caption" + OrderedWords.PromiseOf(figures), title, ("cases", context.Language.Cases(first.Coverage, OrderedWords.IsMoreThanNominal(figures))));
    }

    private static void AppendRow(StringBuilder html, OrderedRow row, SiteContext context, string page)
    {
        html.Append("<tr><th scope=\"row\">").Append(LinkTo(row.Figure, row.Name, context, page)).Append("</th>");
        AppendCell(html, row.Heavy + row.Light);
        AppendCell(html, row.Margin);
        var printed = row.Figure.Main?.Printed;
        AppendCell(html, printed is null ? context.Language.Text("charts.none") : context.Language.Number(printed.Low));
        AppendCell(html, printed is null ? context.Language.Text("charts.none") : context.Language.Number(printed.High));
        html.Append("</tr>");
    }

    private static void AppendWithoutNumber(StringBuilder html, AppraisedFigure figure, string name, SiteContext context, string page) =>
        html.Append("<tr><th scope=\"row\">").Append(LinkTo(figure, name, context, page)).Append("</th><td colspan=\"4\">")
            .Append(HtmlText.Encode(context.Language.ReadingOf(figure).Text)).Append("</td></tr>");

    private static void AppendCell(StringBuilder html, string text) => html.Append("<td class=\"r\">").Append(HtmlText.Encode(text)).Append("</td>");

    private static string LinkTo(AppraisedFigure figure, string name, SiteContext context, string page) =>
        $"<a href=\"{HtmlText.Encode(Link.From(page, context.Pages.Of(figure.Ref)))}\">{HtmlText.Encode(name)}</a>";
}
