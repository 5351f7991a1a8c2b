using System.Globalization;
using System.Text;

namespace ReleaseKit.Charts;

/// <summary>Where a symbol of a page stands for one figure: its name, and the stretch of the scale that it fills.</summary>
internal readonly record struct PlacedSymbol(string Id, double From, double To);

/// <summary>
/// The marks of one page, each distinct one drawn once as a symbol of its own width, stretched by those who use it. Marks are told apart by what they look like:
/// figures whose noise has the same law and margin share one, and so do all figures of a law that only changes its scale.
/// </summary>
internal sealed class MarkSymbols(string prefix, Func<MarkSubject, bool, string> draw, double height)
{
    /// <summary>
    /// Width of every symbol's own drawing, in whole steps: a mark is hardly ever wider than 200 pixels, so that half a step is never more than half a pixel, and
    /// marks that look alike are alike.
    /// </summary>
    public const double Width = 200;

    private readonly Dictionary<string, string> idOfDrawing = [];
    private readonly Dictionary<MarkShapeKey, string> idOfShape = [];

    public int Count => idOfDrawing.Count;

    /// <summary>The symbol of a mark, or of its dashed twin for what lies where the value before noise cannot be.</summary>
    public PlacedSymbol Of(MarkSubject subject, bool isGhost)
    {
        var key = MarkShapeKey.Of(subject, isGhost);
        if (!idOfShape.TryGetValue(key, out var id))
            idOfShape[key] = id = IdOf(draw(subject, isGhost));
        return new(id, subject.Tail.Low, subject.Tail.High);
    }

    /// <summary>The symbols drawn so far, as content of one SVG.</summary>
    public string Definitions()
    {
        var svg = new StringBuilder();
        foreach (var (drawing, id) in idOfDrawing)
            svg.Append("<symbol id=\"").Append(id).Append("\" viewBox=\"0 0 200 ").Append(SvgMark.Number(height)).Append("\" preserveAspectRatio=\"none\">").Append(drawing).Append("</symbol>");
        return svg.ToString();
    }

    private string IdOf(string drawing)
    {
        if (!idOfDrawing.TryGetValue(drawing, out var id))
            idOfDrawing[drawing] = id = prefix + (idOfDrawing.Count + 1).ToString(CultureInfo.InvariantCulture);
        return id;
    }
}

/// <summary>What decides how a mark looks, apart from where it stands: its law, its form, and its ranges around the figure to six digits.</summary>
internal readonly record struct MarkShapeKey(object? Law, bool Weak, bool IsGhost, long TailLow, long TailHigh, long BodyLow, long BodyHigh, long CoreLow, long CoreHigh, double Unit)
{
    public static MarkShapeKey Of(MarkSubject subject, bool isGhost)
    {
        var reach = Math.Max(Math.Abs(subject.Tail.High - subject.Value), Math.Abs(subject.Value - subject.Tail.Low));
        var unit = Math.Pow(10, Math.Floor(Math.Log10(Math.Max(reach, 1e-9))) - 6);
        long Steps(double place) => (long)Math.Round((place - subject.Value) / unit);
        return new(subject.Law, subject.Weak, isGhost, Steps(subject.Tail.Low), Steps(subject.Tail.High), Steps(subject.Body.Low), Steps(subject.Body.High), Steps(subject.Core.Low), Steps(subject.Core.High), unit);
    }
}
