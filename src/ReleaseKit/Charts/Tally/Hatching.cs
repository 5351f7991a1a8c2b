namespace ReleaseKit.Charts.Tally;

/// <summary>Slanted strokes inside a box, on one lattice for the whole drawing so that they run on from box to box.</summary>
internal static class Hatching
{
    private const double Step = 8.5;

    // Half a stroke seen aslant: so far in do strokes end, that no corner of theirs sticks out of the box.
    private const double Inset = 0.85;

    public static Shape Of(double left, double top, double width, double height) =>
        Inside(left + Inset, top + Inset, Math.Max(0, width - (2 * Inset)), Math.Max(0, height - (2 * Inset)));

    private static Shape.Strokes Inside(double left, double top, double width, double height)
    {
        var strokes = new List<(Spot From, Spot To)>();
        // A stroke is the part of the line x + y = c inside the box.
        for (var line = Math.Ceiling((left + top) / Step) * Step; line < left + width + top + height; line += Step)
            strokes.Add((new Spot(Math.Min(left + width, line - top), line - Math.Min(left + width, line - top)),
                new Spot(Math.Max(left, line - top - height), line - Math.Max(left, line - top - height))));
        return new Shape.Strokes(Inks.Hatch, strokes);
    }
}
