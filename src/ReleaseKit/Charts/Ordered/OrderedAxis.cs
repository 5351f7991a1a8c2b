using ReleaseKit.Releases;

namespace ReleaseKit.Charts.Ordered;

/// <summary>The axis of an ordered chart: unit, numbers and marks at the head, numbers again at the foot, hairlines between, a dotted zero line.</summary>
internal sealed class OrderedAxis(Scale scale, OrderedFigures figures, OrderedForm form, TypeCase type)
{
    public const double FootHeight = 24;
    private const double TickLength = 5;

    private readonly IReadOnlyList<PublishedValue> ticks = Ticks.Between(scale.From, scale.To, form.Ticks);

    public IEnumerable<Shape> Shapes(double foot)
    {
        var head = OrderedForm.HeadHeight - 6;
        return
        [
            new Shape.Words(Inks.AxisText, new Spot(scale.Start, 13), figures.Unit),
            .. ticks.Select(tick => new Shape.Line(Inks.Grid, new Spot(scale.At(tick.ToDouble()), head), new Spot(scale.At(tick.ToDouble()), foot))),
            .. ticks.Select(tick => new Shape.Line(Inks.AxisTick, new Spot(scale.At(tick.ToDouble()), head - TickLength), new Spot(scale.At(tick.ToDouble()), head))),
            new Shape.Line(Inks.AxisTick, new Spot(scale.Start, head), new Spot(scale.End, head)),
            .. Zero(head, foot),
            .. Numbers(head - TickLength - 3),
            new Shape.Line(Inks.AxisTick, new Spot(scale.Start, foot), new Spot(scale.End, foot)),
            .. Numbers(foot + 17),
        ];
    }

    private IEnumerable<Shape> Zero(double head, double foot) => scale.From < 0 && scale.To > 0
        ? [new Shape.Line(Inks.Zero, new Spot(scale.At(0), head), new Spot(scale.At(0), foot)) { Mark = "zero" }]
        : [];

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
