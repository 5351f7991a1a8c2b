using System.Text;
using ReleaseKit.Charts.Ordered;
using ReleaseKit.Pages;
using ReleaseKit.Releases;

namespace ReleaseKit.Charts;

/// <summary>The pictures of a release as files: each chart as SVG and PNG, each headline as a PNG to share.</summary>
public static class ChartImages
{
    private const double PixelsPerUnit = 2;

    /// <summary>Path of a chart's picture in the site.</summary>
    public static string SvgPath(ChartOrder chart) => $"images/{chart.Id}.svg";

    public static string PngPath(ChartOrder chart) => $"images/{chart.Id}.png";

    /// <summary>Writes every picture of the release.</summary>
    public static void WriteAll(SiteContext context, SiteFolder site)
    {
        using var type = TypeCase.Load(context.Templates.FontsFolder);
        var palette = Palette.Of(context.Release.Look);
        foreach (var chart in context.Release.Charts)
            Write(chart, context, site, palette, type);
        HeadlineImages.Write(context, site, palette, type);
    }

    private static void Write(ChartOrder order, SiteContext context, SiteFolder site, Palette palette, TypeCase type)
    {
        var figures = OrderedSelection.Of(context.Appraised, context.Language, order);
        var words = OrderedWords.Of(figures, context.Language);
        var title = context.In(order.Title);
        var sheet = ChartSheet.Of(OrderedChart.Wide(figures, type), title, words.Caption, Source(context), type);
        site.Write(SvgPath(order), Encoding.UTF8.GetBytes(SvgPainter.StandAlone(sheet, order.Id, title, words.Description, palette, type)));
        site.Write(PngPath(order), PngPainter.Paint(sheet, PixelsPerUnit, palette, type));
    }

    /// <summary>Where a picture comes from, in words.</summary>
    internal static string Source(SiteContext context) => context.Language.Text(
        "charts.source",
        ("office", context.Release.Publisher.Name), ("title", context.In(context.Release.Title)), ("edition", EditionLine.Of(context)));
}
