using System.Text;

namespace ReleaseKit.Charts;

/// <summary>
/// Marks in the cells of one column: uses of the page's symbols at places in per cent of the cell's width, so that they meet the ticks of the boxhead at any
/// width. Marks that reach beyond the scale or the possible are cut there; what is impossible is dashed.
/// </summary>
internal sealed class CellMark(MarkSymbols symbols)
{
    /// <summary>
    /// Definitions that every page with cell marks needs beside its symbols: the stem alone, the zero line, the arrow heads, the line of a scale of its own. Heights in
    /// per cent, so that they keep to the marks in slots of every height.
    /// </summary>
    public const string Common = "<g id=\"st\"><line class=\"halo\" stroke-width=\"3\" y1=\"13.5%\" y2=\"86.5%\"/><line class=\"stem\" stroke-width=\"1.8\" y1=\"13.5%\" y2=\"86.5%\"/></g>"
        + "<line id=\"zl\" class=\"zero\" y2=\"100%\"/>"
        + "<g id=\"al\"><line class=\"cut\" stroke-width=\"1.6\" x1=\"-3\" y1=\"35%\" x2=\"-7\" y2=\"50%\"/><line class=\"cut\" stroke-width=\"1.6\" x1=\"-7\" y1=\"50%\" x2=\"-3\" y2=\"65%\"/></g>"
        + "<g id=\"ar\"><line class=\"cut\" stroke-width=\"1.6\" x1=\"3\" y1=\"35%\" x2=\"7\" y2=\"50%\"/><line class=\"cut\" stroke-width=\"1.6\" x1=\"7\" y1=\"50%\" x2=\"3\" y2=\"65%\"/></g>"
        + "<g id=\"ow\"><line class=\"hair\" x2=\"100%\" y1=\"50%\" y2=\"50%\"/><line class=\"hair\" y1=\"35%\" y2=\"65%\"/><line class=\"hair\" x1=\"100%\" x2=\"100%\" y1=\"35%\" y2=\"65%\"/></g>";

    /// <summary>A symbol narrower than this share of the cell, in per cent, would vanish; it is drawn as wide.</summary>
    private const double Narrowest = 0.1;

    public static MarkSymbols SymbolsOfPage() => new("m", Draw, 2 * MarkSize.Cell.Middle);

    /// <summary>The content of the cell's SVG. The scale counts in per cent of its width.</summary>
    public string Draw(MarkSubject subject, Scale scale)
    {
        var svg = new StringBuilder();
        if (subject.Lowest > scale.From && scale.Holds(subject.Lowest))
            svg.Append("<use href=\"#zl\" x=\"").Append(Percent(scale.At(subject.Lowest))).Append("\"/>");
        if (subject.IsStemAlone)
            return scale.Holds(subject.Value) ? svg.Append("<use href=\"#st\" x=\"").Append(Percent(scale.At(subject.Value))).Append("\"/>").ToString() : svg.ToString();
        AppendPieces(svg, subject, scale);
        AppendArrows(svg, subject, scale);
        return svg.ToString();
    }

    private void AppendPieces(StringBuilder svg, MarkSubject subject, Scale scale)
    {
        AppendPiece(svg, subject, scale, scale.From, Math.Min(subject.Lowest, scale.To), isGhost: true);
        AppendPiece(svg, subject, scale, Math.Max(subject.Lowest, scale.From), Math.Min(subject.Highest, scale.To), isGhost: false);
        AppendPiece(svg, subject, scale, Math.Max(subject.Highest, scale.From), scale.To, isGhost: true);
    }

    private void AppendPiece(StringBuilder svg, MarkSubject subject, Scale scale, double from, double to, bool isGhost)
    {
        if (from >= to || subject.Tail.Low >= to || subject.Tail.High <= from)
            return;
        var symbol = symbols.Of(subject, isGhost);
        if (subject.Tail.Low >= from && subject.Tail.High <= to)
            AppendUse(svg, symbol, scale);
        else
        {
            var (start, end) = (scale.At(from), scale.At(to));
            svg.Append("<svg x=\"").Append(Percent(start)).Append("\" width=\"").Append(Percent(end - start)).Append("\">");
            AppendUse(svg, symbol, new Scale(from, to, 0, 100));
            svg.Append("</svg>");
        }
    }

    // The width, the same for all figures alike, stands before the place.
    private static void AppendUse(StringBuilder svg, PlacedSymbol symbol, Scale scale)
    {
        var (start, end) = (scale.At(symbol.From), scale.At(symbol.To));
        var lacking = Math.Max(0, Narrowest - (end - start)) / 2;
        svg.Append("<use href=\"#").Append(symbol.Id).Append("\" width=\"").Append(Percent(end - start + (2 * lacking))).Append("\" x=\"").Append(Percent(start - lacking, 1)).Append("\"/>");
    }

    private static void AppendArrows(StringBuilder svg, MarkSubject subject, Scale scale)
    {
        if (subject.Tail.Low < scale.From && subject.Lowest < scale.From)
            svg.Append("<use href=\"#al\" x=\"").Append(Percent(scale.Start)).Append("\"/>");
        if (subject.Tail.High > scale.To && subject.Highest > scale.To)
            svg.Append("<use href=\"#ar\" x=\"").Append(Percent(scale.End)).Append("\"/>");
    }

    private static string Draw(MarkSubject subject, bool isGhost)
    {
        var everywhere = isGhost
            ? subject with { Lowest = double.PositiveInfinity, Highest = double.PositiveInfinity }
            : subject with { Lowest = double.NegativeInfinity, Highest = double.PositiveInfinity };
        var scale = new Scale(subject.Tail.Low, subject.Tail.High, 0, MarkSymbols.Width);
        return SvgMark.Paint(SwelledRule.Of(everywhere, scale, MarkSize.Cell).Shapes, decimals: 0, heightDecimals: 1);
    }

    internal static string Percent(double value, int decimals = 2) => SvgMark.Number(value, decimals) + "%";
}
