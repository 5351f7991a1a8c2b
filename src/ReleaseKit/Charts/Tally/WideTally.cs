namespace ReleaseKit.Charts.Tally;

/// <summary>The stick lying: the solid half notched by table, the hatched half below it by level, a scale at the foot.</summary>
public static class WideTally
{
    /// <summary>Width on a wide page, and on paper, where letters keep their size.</summary>
    public const double PageWidth = 1160;
    public const double PaperWidth = 680;

    private const double Left = 1;
    private const double Half = 44;
    private const double Gap = 7;
    private const double Line = 18;
    private const double FirstAbove = 10;
    private const double FirstBelow = 22;
    private const double NotchDepth = 24;

    public static DrawnTally Of(TallyAccount account, TypeCase type, double width = PageWidth)
    {
        var right = width - Left;
        var perUnit = (right - Left) / account.Whole;
        var tables = Slice.Lay(account.ByTable, Left, perUnit);
        var levels = Slice.Lay(account.ByLevel, Left, perUnit);
        var rest = TallyRest.Wide(account, tables, perUnit, type);
        var above = WideLabels.Of(rest.IsLabelledInside ? tables : [.. tables, rest.Slice], width, outwardIsUp: true, type);
        var below = WideLabels.Of(levels, width, outwardIsUp: false, type);

        var top = FirstAbove + (above.Depth * Line);
        var lower = top + Half + Gap;
        var foot = lower + Half;
        var axis = foot + FirstBelow + (below.Depth * Line);
        Shape[] shapes =
        [
            .. Solid(tables, top), .. Hatched(levels, lower), .. rest.Shapes(top, foot),
            .. Text(above, slot => top - FirstAbove - (slot * Line), top), .. Text(below, slot => foot + FirstBelow + (slot * Line), foot),
            .. TallyScale.Lying(account, type, Left, right, axis),
        ];
        return new DrawnTally(new Drawing(width, axis + 45, shapes), [.. above.Unlabelled, .. below.Unlabelled]);
    }

    private static IEnumerable<Shape> Solid(IReadOnlyList<Slice> slices, double top) =>
    [
        .. slices.Select(slice => new Shape.Box(Inks.Solid, slice.From, top, slice.Length, Half) { Mark = "table" }),
        .. Notch.Between(slices).SelectMany(notch => Cut(notch, top, top - 0.5, NotchDepth)),
    ];

    private static IEnumerable<Shape> Hatched(IReadOnlyList<Slice> slices, double top) =>
    [
        .. slices.Select(slice => new Shape.Box(Inks.HatchGround, slice.From, top, slice.Length, Half) { Mark = "level" }),
        .. slices.Select(slice => Hatching.Of(slice.From, top, slice.Length, Half)),
        .. Notch.Between(slices).SelectMany(notch => Cut(notch, top, top + Half + 0.5, -NotchDepth)),
    ];

    private static IEnumerable<Shape> Cut(Notch notch, double top, double edge, double depth) =>
    [
        new Shape.Box(Inks.Notch, notch.At - (notch.CutWidth / 2), top, notch.CutWidth, Half),
        new Shape.Outline(Inks.Notch,
        [
            new Spot(notch.At - notch.HalfWidth, edge), new Spot(notch.At, edge + (depth * notch.Share)), new Spot(notch.At + notch.HalfWidth, edge),
        ]),
    ];

    private static IEnumerable<Shape> Text(WideLabels labels, Func<int, double> baseline, double stick) =>
    [
        .. labels.Leaders.Select(leader => new Shape.Line(Inks.Leader, new Spot(leader.X, stick), new Spot(leader.X, LeaderEnd(baseline(leader.Slot), stick)))),
        .. labels.Lines.Select(line => new Shape.Words(line.Line.Ink, new Spot(line.X, baseline(line.Slot)), line.Line.Text)),
    ];

    // A leader runs along the height of its label, so that eye and label meet.
    private static double LeaderEnd(double baseline, double stick) => baseline < stick ? baseline - 11 : baseline + 2;
}
