using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts;

/// <summary>The marks that stand alone on pages, as SVG with their description: the leading figure's, a headline's, and the key.</summary>
public static class Marks
{
    /// <summary>The mark of the leading figure, wide and narrow, with a measured line for each coverage.</summary>
    public static string Hero(AppraisedFigure figure, ILanguage language) =>
        HeroMark.Wide.Draw(figure, language) + HeroMark.Narrow.Draw(figure, language);

    /// <summary>The mark beside a headline figure, on a scale whose ends are labelled.</summary>
    public static string Line(AppraisedFigure figure, ILanguage language) => LineMark.Draw(figure, language);

    /// <summary>The key: what digits, swelled rule, hollow and dashed marks mean.</summary>
    public static string Key(Release release, ILanguage language) => new MarkKey(release, language).Draw();

    /// <summary>What a mark shows, in words.</summary>
    public static string Description(AppraisedFigure figure, ILanguage language)
    {
        var value = language.WithUnit(figure.Printed, figure.Measure);
        if (figure.Main is null)
            return language.Text("marks.stem-alone", ("figure", value));
        var ranges = figure.Ranges.Select(range => language.Text(
            "marks.range" + PromiseKey.Of(figure.Promise),
            ("cases", CasesOf(figure, range, language)),
            ("low", language.NumberInProse(range.Printed.Low)),
            ("high", language.NumberInProse(range.Printed.High))));
        return language.Text("marks.bar", ("figure", value), ("ranges", string.Join(' ', ranges)));
    }

    private static string CasesOf(AppraisedFigure figure, FigureRange range, ILanguage language) => figure.Promise is RangePromise.ZeroForSmall
        ? language.CasesOfZero(range.Coverage)
        : language.Cases(range.Coverage, figure.HoldsAtLeast(range));

    internal static StringBuilder Open(string kind, double width, double height, string description) => new StringBuilder("<svg class=\"")
        .Append(kind).Append("\" viewBox=\"0 0 ").Append(SvgMark.Number(width)).Append(' ').Append(SvgMark.Number(height))
        .Append("\" role=\"img\" aria-label=\"").Append(HtmlText.Encode(description)).Append("\">");

    internal static StringBuilder AppendLabel(this StringBuilder svg, string kind, double x, double y, string text, bool atEnd = false) => svg
        .Append("<text class=\"").Append(kind).Append("\" x=\"").Append(SvgMark.Number(x)).Append("\" y=\"").Append(SvgMark.Number(y)).Append('"')
        .Append(atEnd ? " text-anchor=\"end\">" : ">").Append(HtmlText.Encode(text)).Append("</text>");

    internal static StringBuilder AppendPath(this StringBuilder svg, string kind, string path) =>
        svg.Append("<path class=\"").Append(kind).Append("\" d=\"").Append(path).Append("\"/>");
}
