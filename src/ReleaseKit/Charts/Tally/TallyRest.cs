namespace ReleaseKit.Charts.Tally;

/// <summary>What was not spent: a dashed outline that goes on from the stick, labelled inside it if there is room.</summary>
internal sealed record TallyRest(Slice Slice, bool Exists, bool IsLabelledInside)
{
    private const double Inset = 12;

    public static TallyRest Wide(TallyAccount account, IReadOnlyList<Slice> slices, double perUnit, TypeCase type)
    {
        if (account.Rest is not { } rest)
            return new TallyRest(default, false, true);
        var slice = After(slices, rest, perUnit);
        var width = Math.Max(type.Width(rest.Key, Inks.TallyKey), type.Width(rest.Amount, Inks.TallyValue));
        return new TallyRest(slice, true, width + (2 * Inset) <= slice.Length);
    }

    public static TallyRest Upright(TallyAccount account, IReadOnlyList<Slice> slices, double perUnit) => account.Rest is { } rest
        ? new TallyRest(After(slices, rest, perUnit), true, After(slices, rest, perUnit).Length >= 48)
        : new TallyRest(default, false, true);

    public IEnumerable<Shape> Shapes(double top, double foot)
    {
        if (!Exists)
            return [];
        Spot[] corners = [new(Slice.From, top), new(Slice.To, top), new(Slice.To, foot), new(Slice.From, foot)];
        var middle = (top + foot) / 2;
        return [new Shape.Outline(Inks.Rest, corners, Closed: false) { Mark = "rest" }, .. Inside(Slice.From + Inset, middle, TallyInks.Wide, Anchor.Start)];
    }

    public IEnumerable<Shape> UprightShapes(double left, double right)
    {
        if (!Exists)
            return [];
        Spot[] corners = [new(left, Slice.From), new(left, Slice.To), new(right, Slice.To), new(right, Slice.From)];
        return
        [
            new Shape.Outline(Inks.Rest, corners, Closed: false) { Mark = "rest" },
            .. Inside((left + right) / 2, (Slice.From + Slice.To) / 2, TallyInks.Upright, Anchor.Middle),
        ];
    }

    private static Slice After(IReadOnlyList<Slice> slices, TallyPiece rest, double perUnit) =>
        new(rest, slices[^1].To, slices[^1].To + (rest.Length * perUnit));

    private IEnumerable<Shape> Inside(double x, double middle, TallyInks inks, Anchor anchor) => IsLabelledInside
        ? [new Shape.Words(inks.Key, new Spot(x, middle - 4), Slice.Piece.Key, anchor), new Shape.Words(inks.Amount, new Spot(x, middle + 15), Slice.Piece.Amount, anchor)]
        : [];
}
