namespace ReleaseKit.Charts.Tally;

/// <summary>The stick standing, for narrow pages: tables at its left, levels at its right.</summary>
public static class UprightTally
{
    private const double Width = 340;
    private const double Height = 620;
    private const double Top = 8;
    private const double Bottom = 598;
    private const double Half = 42;
    private const double SolidLeft = 138;
    private const double HatchLeft = 186;
    private const double NotchDepth = 22;
    private const double Reach = 10;

    public static DrawnTally Of(TallyAccount account, TypeCase type)
    {
        var perUnit = (Bottom - Top) / account.Whole;
        var tables = Slice.Lay(account.ByTable, Top, perUnit);
        var levels = Slice.Lay(account.ByLevel, Top, perUnit);
        var rest = TallyRest.Upright(account, tables, perUnit);
        var left = UprightLabels.Of(rest.IsLabelledInside ? tables : [.. tables, rest.Slice], SolidLeft - Reach, 2, Height, type);
        var right = UprightLabels.Of(levels, Width - HatchLeft - Half - Reach, 2, Bottom - 20, type);
        Shape[] shapes =
        [
            .. Solid(tables), .. Hatched(levels), .. rest.UprightShapes(SolidLeft, HatchLeft + Half),
            .. left.Labels.SelectMany(label => Text(label, SolidLeft, -1)), .. right.Labels.SelectMany(label => Text(label, HatchLeft + Half, 1)),
            .. End(account, type),
        ];
        return new DrawnTally(new Drawing(Width, Height, shapes), [.. left.Unlabelled, .. right.Unlabelled]);
    }

    private static IEnumerable<Shape> Solid(IReadOnlyList<Slice> slices) =>
    [
        .. slices.Select(slice => new Shape.Box(Inks.Solid, SolidLeft, slice.From, Half, slice.Length) { Mark = "table" }),
        .. Notch.Between(slices).SelectMany(notch => Cut(notch, SolidLeft, SolidLeft - 0.5, NotchDepth)),
    ];

    private static IEnumerable<Shape> Hatched(IReadOnlyList<Slice> slices) =>
    [
        .. slices.Select(slice => new Shape.Box(Inks.HatchGround, HatchLeft, slice.From, Half, slice.Length) { Mark = "level" }),
        .. slices.Select(slice => Hatching.Of(HatchLeft, slice.From, Half, slice.Length)),
        .. Notch.Between(slices).SelectMany(notch => Cut(notch, HatchLeft, HatchLeft + Half + 0.5, -NotchDepth)),
    ];

    private static IEnumerable<Shape> Cut(Notch notch, double left, double edge, double depth) =>
    [
        new Shape.Box(Inks.Notch, left, notch.At - (notch.CutWidth / 2), Half, notch.CutWidth),
        new Shape.Outline(Inks.Notch,
        [
            new Spot(edge, notch.At - notch.HalfWidth), new Spot(edge + (depth * notch.Share), notch.At), new Spot(edge, notch.At + notch.HalfWidth),
        ]),
    ];

    private static IEnumerable<Shape> Text(UprightLabel label, double edge, int side)
    {
        if (!label.IsAtHome)
            yield return new Shape.Line(Inks.Leader, new Spot(edge, label.Slice.Handle), new Spot(edge + (side * (Reach - 3)), label.Top + 9));
        for (var index = 0; index < label.Text.Lines.Count; index++)
            yield return new Shape.Words(label.Text.Lines[index].Ink, new Spot(edge + (side * Reach), label.Top + 13 + (index * UprightLabels.Line)),
                label.Text.Lines[index].Text, side < 0 ? Anchor.End : Anchor.Start);
    }

    private static IEnumerable<Shape> End(TallyAccount account, TypeCase type)
    {
        var x = HatchLeft + Half + Reach;
        var lines = type.Wrap(account.WholeLabel, Inks.TallyAxisText, Width - x);
        return
        [
            new Shape.Line(Inks.TallyAxis, new Spot(HatchLeft + Half, Bottom), new Spot(x - 3, Bottom)),
            .. lines.Select((line, index) => new Shape.Words(Inks.TallyAxisText, new Spot(x, Bottom + 4 + ((index - lines.Count + 1) * 15)), line)),
        ];
    }
}
