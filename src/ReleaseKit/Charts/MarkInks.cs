namespace ReleaseKit.Charts;

/// <summary>The shapes of a figure's mark as shapes of a drawing: the same class in pages, the same colours in a PNG.</summary>
internal static class MarkInks
{
    /// <summary>A shape moved down to its row.</summary>
    public static Shape Of(MarkShape shape, double top)
    {
        Spot[] corners = [.. shape.Points.Select(point => new Spot(point.X, point.Y + top))];
        var ink = InkOf(shape.Ink) with { Class = SvgMark.ClassOf(shape.Ink), Weight = shape.Thickness };
        return new Shape.Outline(ink, corners, shape.Closed) { Mark = NameOf(shape.Ink) };
    }

    private static Ink InkOf(MarkInk ink) => ink switch
    {
        MarkInk.Tail or MarkInk.Body => new Ink("") { Fill = Tint.AccentMid },
        MarkInk.Core => new Ink("") { Fill = Tint.Accent },
        MarkInk.Hollow => new Ink("") { Fill = Tint.Paper, Stroke = Tint.Accent },
        MarkInk.TailLine or MarkInk.Stop or MarkInk.Arrow => new Ink("") { Stroke = Tint.Accent },
        MarkInk.Ghost => new Ink("") { Stroke = Tint.AccentMid, Dashes = [2, 2] },
        MarkInk.GhostStop => new Ink("") { Stroke = Tint.AccentMid },
        MarkInk.Halo => new Ink("") { Stroke = Tint.Paper },
        MarkInk.Stem => new Ink("") { Stroke = Tint.Ink },
        _ => new Ink("") { Stroke = Tint.Firmline, Dashes = [1, 2] },
    };

    private static string? NameOf(MarkInk ink) => ink switch
    {
        MarkInk.Stem => "figure",
        MarkInk.Stop or MarkInk.GhostStop => "end",
        MarkInk.Arrow => "goes-on",
        _ => null,
    };
}
