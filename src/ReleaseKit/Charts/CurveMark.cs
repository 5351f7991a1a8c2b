using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts;

/// <summary>
/// The curve of a figure's noise in its reading: a column for each possible whole number while there are no more than <see cref="MostColumns"/>, else the area under
/// the curve. Drawn as a symbol of the page that fills the drawing, with its margins written under it.
/// </summary>
internal sealed class CurveMark(MarkSymbols symbols)
{
    public const int MostColumns = 120;
    private const double Height = 152;
    private const double Base = 120;
    private const double Peak = 112;

    /// <summary>Free space at both sides, as a share of the tails' length.</summary>
    private const double Inset = 0.02;

    public static MarkSymbols SymbolsOfPage() => new("c", Draw, Height);

    /// <summary>The whole SVG; its numbers stand in the table of ranges too, so it is hidden from screen readers.</summary>
    public string Draw(AppraisedFigure figure, MarkSubject subject, ILanguage language)
    {
        var scale = ScaleOf(subject) with { Start = 0, End = 100 };
        var svg = new StringBuilder("<svg class=\"curve\" aria-hidden=\"true\">");
        AppendPiece(svg, subject, scale, scale.From, Math.Min(subject.Lowest, scale.To), isGhost: true);
        AppendPiece(svg, subject, scale, Math.Max(subject.Lowest, scale.From), Math.Min(subject.Highest, scale.To), isGhost: false);
        AppendPiece(svg, subject, scale, Math.Max(subject.Highest, scale.From), scale.To, isGhost: true);
        AppendLabels(svg, figure, subject, scale, language);
        return svg.Append("</svg>").ToString();
    }

    private void AppendPiece(StringBuilder svg, MarkSubject subject, Scale scale, double from, double to, bool isGhost)
    {
        if (from >= to)
            return;
        var id = symbols.Of(subject, isGhost).Id;
        if (from <= scale.From && to >= scale.To)
        {
            svg.Append("<use href=\"#").Append(id).Append("\"/>");
            return;
        }
        var inner = new Scale(from, to, 0, 100);
        var (start, end) = (scale.At(from), scale.At(to));
        svg.Append("<svg x=\"").Append(CellMark.Percent(start)).Append("\" width=\"").Append(CellMark.Percent(end - start)).Append("\"><use href=\"#").Append(id)
            .Append("\" x=\"").Append(CellMark.Percent(inner.At(scale.From))).Append("\" width=\"").Append(CellMark.Percent(inner.At(scale.To) - inner.At(scale.From))).Append("\"/></svg>");
    }

    // The margins on both sides, the same for all figures alike; none where the range ends elsewhere than the margin does.
    private static void AppendLabels(StringBuilder svg, AppraisedFigure figure, MarkSubject subject, Scale scale, ILanguage language)
    {
        var main = figure.Main!;
        if (main.Low >= main.UncutLow)
            AppendLabel(svg, scale.At(subject.Body.Low), language.Text("tables.curve.less", ("margin", language.Number(main.Printed.MarginDown))));
        if (main.High <= main.UncutHigh)
            AppendLabel(svg, scale.At(subject.Body.High), language.Text("tables.curve.more", ("margin", language.Number(main.Printed.MarginUp))));
    }

    private static void AppendLabel(StringBuilder svg, double place, string text) =>
        svg.Append("<text x=\"").Append(CellMark.Percent(place)).Append("\" y=\"148\">").Append(HtmlText.Encode(text)).Append("</text>");

    private static string Draw(MarkSubject subject, bool isGhost)
    {
        var scale = ScaleOf(subject);
        var svg = new StringBuilder();
        if (isGhost)
            svg.Append("<path class=\"col-ghost\" d=\"").Append(Area(subject, scale, subject.Tail)).Append("\"/>");
        else
            AppendBody(svg, subject, scale);
        svg.Append("<path class=\"axis-l\" d=\"M0 ").Append(SvgMark.Number(Base)).Append("H200\"/>");
        foreach (var end in new[] { subject.Body.Low, subject.Body.High })
            AppendUpright(svg, isGhost ? "stop stop-ghost" : "stop", scale.At(end), Base - 10, 1.8);
        AppendUpright(svg, "halo", scale.At(subject.Value), 0, 4.4);
        AppendUpright(svg, "stem", scale.At(subject.Value), 0, 2.4);
        return svg.ToString();
    }

    private static void AppendUpright(StringBuilder svg, string kind, double x, double top, double width) => svg
        .Append("<path class=\"").Append(kind).Append("\" stroke-width=\"").Append(SvgMark.Number(width)).Append("\" d=\"M").Append(SvgMark.Number(x)).Append(' ')
        .Append(SvgMark.Number(top)).Append('V').Append(SvgMark.Number(Base + 10)).Append("\"/>");

    private static void AppendBody(StringBuilder svg, MarkSubject subject, Scale scale)
    {
        foreach (var (kind, range) in new[] { ("sr-99", subject.Tail), ("sr-95", subject.Body), ("sr-50", subject.Core) })
            svg.Append("<path class=\"").Append(kind).Append("\" d=\"").Append(HasColumns(subject) ? Columns(subject, scale, range) : Area(subject, scale, range)).Append("\"/>");
    }

    private static bool HasColumns(MarkSubject subject) => subject.Grid > 0 && (subject.Tail.High - subject.Tail.Low) / subject.Grid <= MostColumns;

    // One outline that comes back to the base between the columns, which are seven tenths of a step wide, so that even the narrowest stand apart.
    private static string Columns(MarkSubject subject, Scale scale, MarkRange range)
    {
        var step = subject.Grid * scale.PerUnit;
        var first = (int)Math.Ceiling(((range.Low - subject.Value) / subject.Grid) - 1e-9);
        var last = (int)Math.Floor(((range.High - subject.Value) / subject.Grid) + 1e-9);
        var path = new StringBuilder("M").Append(SvgMark.Number(scale.At(subject.Value + ((first - 0.35) * subject.Grid)), 2)).Append(' ').Append(SvgMark.Number(Base));
        for (var index = first; index <= last; index++)
        {
            var height = SvgMark.Number(Peak * subject.ThicknessAt(subject.Value + (index * subject.Grid)), 0);
            path.Append("v-").Append(height).Append('h').Append(SvgMark.Number(0.7 * step, 2)).Append('v').Append(height).Append('h').Append(SvgMark.Number(0.3 * step, 2));
        }
        return path.Append('Z').ToString();
    }

    private static string Area(MarkSubject subject, Scale scale, MarkRange range)
    {
        const int Points = 48;
        var path = new StringBuilder("M").Append(SvgMark.Number(scale.At(range.Low), 0)).Append(' ').Append(SvgMark.Number(Base));
        var places = Enumerable.Range(0, Points + 1).Select(index => range.Low + ((range.High - range.Low) * index / Points)).Append(Math.Clamp(subject.Value, range.Low, range.High));
        foreach (var place in places.Order())
            path.Append('L').Append(SvgMark.Number(scale.At(place), 0)).Append(' ').Append(Top(subject, place));
        return path.Append('L').Append(SvgMark.Number(scale.At(range.High), 0)).Append(' ').Append(SvgMark.Number(Base)).Append('Z').ToString();
    }

    private static string Top(MarkSubject subject, double place) => SvgMark.Number(Base - (Peak * subject.ThicknessAt(place)), 0);

    private static Scale ScaleOf(MarkSubject subject)
    {
        var inset = Inset * (subject.Tail.High - subject.Tail.Low);
        return new(subject.Tail.Low - inset, subject.Tail.High + inset, 0, MarkSymbols.Width);
    }
}
