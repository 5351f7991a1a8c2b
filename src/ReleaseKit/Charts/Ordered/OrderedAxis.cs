using ReleaseKit.Releases;

namespace ReleaseKit.Charts.Ordered;

/// <summary>The axis of an ordered chart: unit, numbers and marks at the head, numbers again at the foot, hairlines between, a dotted zero line.</summary>
internal sealed class OrderedAxis(Scale scale, OrderedFigures figures, OrderedForm form, TypeCase type)
{
    public const double FootHeight = 24;
    private const double TickLength = 5;

    private readonly IReadOnlyList<PublishedValue> ticks = Ticks.Between(scale.From, scale.To, form.Ticks);

    /// <summary>Where the line at the head runs.</summary>
    public const double Head = OrderedForm.HeadHeight - 6;

    /// <param name="foot">Where the line at the foot runs.</param>
    /// <param name="strips">Where lines may run down through the chart.</param>
    public IEnumerable<Shape> Shapes(double foot, IReadOnlyList<(double Top, double Bottom)> strips) =>
    [
        new Shape.Words(Inks.AxisText, new Spot(scale.Start, 13), figures.Unit),
        .. ticks.SelectMany(tick => Down(Inks.Grid, scale.At(tick.ToDouble()), strips)),
        .. ticks.SelectMany(tick => Down(Inks.AxisTick, scale.At(tick.ToDouble()), [(Head - TickLength, Head)])),
        new Shape.Line(Inks.AxisTick, new Spot(scale.Start, Head), new Spot(scale.End, Head)),
        .. Zero(strips),
        .. Numbers(Head - TickLength - 3),
        new Shape.Line(Inks.AxisTick, new Spot(scale.Start, foot), new Spot(scale.End, foot)),
        .. Numbers(foot + 17),
    ];

    private IEnumerable<Shape> Zero(IReadOnlyList<(double Top, double Bottom)> strips) => scale.From < 0 && scale.To > 0
        ? Down(Inks.Zero, scale.At(0), strips).Select(line => line with { Mark = "zero" })
        : [];

    private static IEnumerable<Shape> Down(Ink ink, double x, IReadOnlyList<(double Top, double Bottom)> strips) =>
        strips.Select(strip => new Shape.Line(ink, new Spot(x, strip.Top), new Spot(x, strip.Bottom)));

    // A number that would run into the one before it, or out of the drawing, is left out; its mark stays.
    private IEnumerable<Shape> Numbers(double y)
    {
        var free = 0.0;
        foreach (var tick in ticks)
        {
            var text = figures.Print(tick);
            var half = type.Width(text, Inks.AxisText) / 2;
            var x = scale.At(tick.ToDouble());
            if (x - half < free || x + half > form.Width)
                continue;
            free = x + half + 8;
            yield return new Shape.Words(Inks.AxisText, new Spot(x, y), text, Anchor.Middle) { Mark = "tick" };
        }
    }
}
