using System.Globalization;
using System.Text;

namespace ReleaseKit.Charts;

/// <summary>Paints shapes of a mark as SVG paths: classes and presentation attributes only, no style.</summary>
public static class SvgMark
{
    public static string Paint(IEnumerable<MarkShape> shapes, int decimals = 1, int heightDecimals = 2)
    {
        var svg = new StringBuilder();
        foreach (var shape in shapes)
            svg.Append("<path class=\"").Append(ClassOf(shape.Ink)).Append('"').Append(StrokeOf(shape)).Append(" d=\"").Append(PathOf(shape, decimals, heightDecimals)).Append("\"/>");
        return svg.ToString();
    }

    /// <summary>A coordinate: invariant, no trailing zeros.</summary>
    public static string Number(double value, int decimals = 1)
    {
        var text = Math.Round(value, decimals, MidpointRounding.AwayFromZero).ToString("0.####", CultureInfo.InvariantCulture);
        return text == "-0" ? "0" : text;
    }

    private static string StrokeOf(MarkShape shape) => shape.Thickness > 0 ? $" stroke-width=\"{Number(shape.Thickness, 2)}\"" : "";

    private static string PathOf(MarkShape shape, int decimals, int heightDecimals)
    {
        var path = new StringBuilder();
        foreach (var point in shape.Points)
            path.Append(path.Length == 0 ? 'M' : 'L').Append(Number(point.X, decimals)).Append(' ').Append(Number(point.Y, heightDecimals));
        return (shape.Closed ? path.Append('Z') : path).ToString();
    }

    public static string ClassOf(MarkInk ink) => ink switch
    {
        MarkInk.Tail => "sr-99",
        MarkInk.Body => "sr-95",
        MarkInk.Core => "sr-50",
        MarkInk.Hollow => "sr-hollow",
        MarkInk.TailLine => "sr-tail",
        MarkInk.Ghost => "sr-ghost",
        MarkInk.Stop => "stop",
        MarkInk.GhostStop => "stop stop-ghost",
        MarkInk.Halo => "halo",
        MarkInk.Stem => "stem",
        MarkInk.ZeroLine => "zero",
        _ => "cut",
    };
}
