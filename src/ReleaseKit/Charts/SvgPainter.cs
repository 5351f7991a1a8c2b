using System.Globalization;
using System.Net;
using System.Text;

namespace ReleaseKit.Charts;

/// <summary>Paints a drawing as SVG: for a page (looks come from its style sheet) or to stand alone (looks are written in).</summary>
public sealed class SvgPainter
{
    private readonly StringBuilder svg = new();
    private readonly Palette? palette;
    private readonly TypeCase? type;

    private SvgPainter(Palette? palette, TypeCase? type) => (this.palette, this.type) = (palette, type);

    /// <summary>An svg element for a page. Title and description are read out instead of the marks.</summary>
    public static string ForPage(Drawing drawing, string id, string cssClass, string title, string description)
    {
        var painter = new SvgPainter(null, null);
        painter.svg.Append(CultureInfo.InvariantCulture,
            $"<svg class=\"{cssClass}\" viewBox=\"0 0 {Number(drawing.Width)} {Number(drawing.Height)}\" role=\"img\" aria-labelledby=\"{id}-title {id}-desc\">");
        return painter.Paint(drawing, id, title, description);
    }

    /// <summary>A whole SVG file. Letters keep their measured widths whatever font the viewer has.</summary>
    public static string StandAlone(Drawing drawing, string id, string title, string description, Palette palette, TypeCase type)
    {
        var painter = new SvgPainter(palette, type);
        painter.svg.Append(CultureInfo.InvariantCulture,
            $"<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 {Number(drawing.Width)} {Number(drawing.Height)}\" width=\"{Number(drawing.Width)}\" height=\"{Number(drawing.Height)}\" role=\"img\" aria-labelledby=\"{id}-title {id}-desc\">");
        return painter.Paint(drawing, id, title, description) + "\n";
    }

    private string Paint(Drawing drawing, string id, string title, string description)
    {
        svg.Append(CultureInfo.InvariantCulture, $"<title id=\"{id}-title\">{Escaped(title)}</title><desc id=\"{id}-desc\">{Escaped(description)}</desc>");
        foreach (var shape in drawing.Shapes)
            Paint(shape);
        return svg.Append("</svg>").ToString();
    }

    private void Paint(Shape shape)
    {
        switch (shape)
        {
            case Shape.Group group:
                svg.Append(CultureInfo.InvariantCulture, $"<g data-figure=\"{Escaped(group.Name)}\">");
                foreach (var part in group.Shapes)
                    Paint(part);
                svg.Append("</g>");
                break;
            case Shape.Box box:
                Element("rect", box, $" x=\"{Number(box.X)}\" y=\"{Number(box.Y)}\" width=\"{Number(box.Width)}\" height=\"{Number(box.Height)}\"");
                break;
            case Shape.Words words:
                PaintWords(words);
                break;
            default:
                Element("path", shape, $" d=\"{PathOf(shape)}\"");
                break;
        }
    }

    private void PaintWords(Shape.Words words)
    {
        var anchor = words.Anchor switch { Anchor.Middle => " text-anchor=\"middle\"", Anchor.End => " text-anchor=\"end\"", _ => "" };
        var width = type is null ? "" : $" textLength=\"{Number(type.Width(words.Text, words.Ink))}\" lengthAdjust=\"spacingAndGlyphs\"";
        svg.Append(CultureInfo.InvariantCulture,
            $"<text{Looks(words)} x=\"{Number(words.At.X)}\" y=\"{Number(words.At.Y)}\"{anchor}{width}>{Escaped(words.Text)}</text>");
    }

    private void Element(string name, Shape shape, string geometry) =>
        svg.Append(CultureInfo.InvariantCulture, $"<{name}{Looks(shape)}{geometry}/>");

    private string Looks(Shape shape)
    {
        var looks = new StringBuilder(palette is null ? $" class=\"{shape.Ink.Class}\"" : Colours(shape.Ink, palette));
        if (shape.Mark is not null)
            looks.Append(CultureInfo.InvariantCulture, $" data-mark=\"{Escaped(shape.Mark)}\"");
        if (shape.Ink.Stroke != Tint.None)
            looks.Append(CultureInfo.InvariantCulture, $" stroke-width=\"{Number(shape.Ink.Weight)}\"");
        if (shape.Ink.Dashes.Count > 0)
            looks.Append(CultureInfo.InvariantCulture, $" stroke-dasharray=\"{string.Join(' ', shape.Ink.Dashes.Select(Number))}\"");
        if (shape.Ink.Size > 0)
            looks.Append(CultureInfo.InvariantCulture, $" font-size=\"{Number(shape.Ink.Size)}\"");
        return looks.ToString();
    }

    private static string Colours(Ink ink, Palette palette)
    {
        var stroke = ink.Stroke == Tint.None ? "" : $" stroke=\"{palette[ink.Stroke]}\"";
        var type = ink.Size > 0 ? $" font-family=\"{Family}\" font-weight=\"{Weight(ink.Face)}\"" : "";
        return $" fill=\"{palette[ink.Fill]}\"{stroke}{type}";
    }

    private const string Family = "Asap, Arial, Helvetica, sans-serif";

    private static int Weight(Face face) => face switch
    {
        Face.Light => 320,
        Face.Bold => 700,
        _ => 400,
    };

    private static string PathOf(Shape shape) => shape switch
    {
        Shape.Line line => Stroke(line.From, line.To),
        Shape.Strokes strokes => string.Concat(strokes.Parts.Select(part => Stroke(part.From, part.To))),
        Shape.Outline outline => $"M{string.Join('L', outline.Corners.Select(Pair))}{(outline.Closed ? "Z" : "")}",
        _ => throw new ArgumentOutOfRangeException(nameof(shape), shape, "This mark is no path."),
    };

    private static string Stroke(Spot from, Spot to) => $"M{Pair(from)}L{Pair(to)}";

    private static string Pair(Spot spot) => $"{Number(spot.X)} {Number(spot.Y)}";

    // Tenths of a pixel: below what can be seen; a minus zero is written as 0.
    private static string Number(double value) => (Math.Round(value, 1) + 0.0).ToString("0.#", CultureInfo.InvariantCulture);

    private static string Escaped(string text) => WebUtility.HtmlEncode(text).Replace("&#39;", "'", StringComparison.Ordinal);
}
