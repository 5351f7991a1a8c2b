using System.Text;
using ReleaseKit.Charts.Ordered;
using ReleaseKit.Pages;
using ReleaseKit.Releases;

namespace ReleaseKit.Charts;

/// <summary>A chart in a page: the picture wide and narrow, its caption in words, a table with the same figures behind it, the files to save.</summary>
public static class ChartFigure
{
    /// <param name="chart">The chart.</param>
    /// <param name="context">The release and its words.</param>
    /// <param name="page">Path in the site of the page it stands on.</param>
    public static string Html(ChartOrder chart, SiteContext context, string page = PageMap.Home)
    {
        using var type = TypeCase.Load(context.Templates.FontsFolder);
        var figures = OrderedSelection.Of(context.Appraised, context.Language, chart);
        var words = OrderedWords.Of(figures, context.Language);
        var title = context.In(chart.Title);
        return new StringBuilder()
            .Append("<figure class=\"chart-figure\"><p class=\"chart-title\" id=\"chart-").Append(HtmlText.Encode(chart.Id)).Append("\">").Append(HtmlText.Encode(title)).Append("</p>")
            .Append(SvgPainter.ForPage(OrderedChart.Wide(figures, type).Drawing, $"chart-{chart.Id}-wide", "chart only-wide", title, words.DescriptionInPage))
            .Append(SvgPainter.ForPage(OrderedChart.Narrow(figures, type).Drawing, $"chart-{chart.Id}-narrow", "chart only-narrow", title, words.DescriptionInPage))
            .Append("<figcaption>").Append(HtmlText.Encode(string.Join(' ', words.Caption))).Append(Saving(chart, context, page))
            .Append(ChartTable.Html(chart, figures, context, page)).Append("</figcaption></figure>").ToString();
    }

    private static string Saving(ChartOrder chart, SiteContext context, string page)
    {
        string To(string path, string key) => $"<a href=\"{HtmlText.Encode(Link.From(page, path))}\" download>{HtmlText.Encode(context.Language.Text(key))}</a>";
        return $" <span class=\"chart-save\">{HtmlText.Encode(context.Language.Text("charts.save"))} {To(ChartImages.SvgPath(chart), "charts.save.svg")} {To(ChartImages.PngPath(chart), "charts.save.png")}</span>";
    }
}
