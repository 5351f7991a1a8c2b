namespace ReleaseKit.Charts;

/// <summary>A place in a drawing, in CSS pixels from the upper left corner.</summary>
public readonly record struct Spot(double X, double Y)
{
    public Spot Moved(double right, double down) => new(X + right, Y + down);
}

/// <summary>Which end of a line of text stands at its place.</summary>
public enum Anchor { Start, Middle, End }

/// <summary>One mark of a drawing. Its ink says how it looks, in the page's style sheet and in a PNG alike.</summary>
public abstract record Shape(Ink Ink)
{
    /// <summary>What the mark stands for, written as data-mark; null for mere lines.</summary>
    public string? Mark { get; init; }

    /// <summary>The same mark elsewhere.</summary>
    public Shape Moved(double right, double down) => this switch
    {
        Line line => line with { From = line.From.Moved(right, down), To = line.To.Moved(right, down) },
        Box box => box with { X = box.X + right, Y = box.Y + down },
        Strokes strokes => strokes with { Parts = [.. strokes.Parts.Select(part => (part.From.Moved(right, down), part.To.Moved(right, down)))] },
        Outline outline => outline with { Corners = [.. outline.Corners.Select(corner => corner.Moved(right, down))] },
        Words words => words with { At = words.At.Moved(right, down) },
        Group group => group with { Shapes = [.. group.Shapes.Select(shape => shape.Moved(right, down))] },
        _ => this,
    };

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
