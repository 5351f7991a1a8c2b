namespace ReleaseKit.Charts;

/// <summary>A place in a drawing, in CSS pixels from the upper left corner.</summary>
public readonly record struct Spot(double X, double Y);

/// <summary>Which end of a line of text stands at its place.</summary>
public enum Anchor { Start, Middle, End }

/// <summary>One mark of a drawing. Its ink says how it looks, in the page's style sheet and in a PNG alike.</summary>
public abstract record Shape(Ink Ink)
{
    /// <summary>What the mark stands for, written as data-mark; null for mere lines.</summary>
    public string? Mark { get; init; }

    public sealed record Line(Ink Ink, Spot From, Spot To) : Shape(Ink);

    public sealed record Box(Ink Ink, double X, double Y, double Width, double Height) : Shape(Ink);

    /// <summary>Many strokes alike, painted as one.</summary>
    public sealed record Strokes(Ink Ink, IReadOnlyList<(Spot From, Spot To)> Parts) : Shape(Ink);

    /// <summary>A row of corners joined by straight lines, closed or open.</summary>
    public sealed record Outline(Ink Ink, IReadOnlyList<Spot> Corners, bool Closed = true) : Shape(Ink);

    /// <summary>A line of text; At lies on its baseline.</summary>
    public sealed record Words(Ink Ink, Spot At, string Text, Anchor Anchor = Anchor.Start) : Shape(Ink);

    /// <summary>Marks that belong together, named by what they show.</summary>
    public sealed record Group(string Name, IReadOnlyList<Shape> Shapes) : Shape(Inks.None);
}

/// <summary>A picture as pure geometry: painted as SVG and as PNG without further thought.</summary>
public sealed record Drawing(double Width, double Height, IReadOnlyList<Shape> Shapes)
{
    /// <summary>Every mark, groups opened.</summary>
    public IEnumerable<Shape> Marks => Shapes.SelectMany(Open);

    private static IEnumerable<Shape> Open(Shape shape) => shape is Shape.Group group ? group.Shapes.SelectMany(Open) : [shape];
}
