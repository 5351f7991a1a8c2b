using ReleaseKit.Releases;

namespace ReleaseKit.Charts.Ordered;

/// <summary>A row with its name broken into lines and its place found.</summary>
internal sealed record PlacedRow(OrderedRow Row, IReadOnlyList<string> Lines, double Top, double Bottom, double MarkTop)
{
    private const double Padding = 4;
    private const double Baseline = 13.5;

    public static PlacedRow Of(OrderedRow row, double top, OrderedColumns columns, OrderedForm form, TypeCase type)
    {
        var lines = type.Wrap(row.Name, Inks.Name, columns.NameWidth);
        var text = lines.Count * OrderedForm.Line;
        return form.MarkBeside
            ? Beside(row, lines, top, Math.Max(text, OrderedForm.MarkHeight) + (2 * Padding))
            : new PlacedRow(row, lines, top, top + text + OrderedForm.MarkHeight + (3 * Padding), top + (2 * Padding) + text - 1);
    }

    private static PlacedRow Beside(OrderedRow row, IReadOnlyList<string> lines, double top, double height) =>
        new(row, lines, top, top + height, top + ((height - OrderedForm.MarkHeight) / 2));

    public Shape Draw(Scale scale, OrderedColumns columns, OrderedForm form, Func<PublishedValue, string> print, TypeCase type)
    {
        var rule = SwelledRule.Of(Row.Subject, scale, OrderedForm.Mark);
        var text = form.MarkBeside ? (Top + Bottom - (Lines.Count * OrderedForm.Line)) / 2 : Top + Padding;
        var figure = form.MarkBeside ? (Top + Bottom - OrderedForm.Line) / 2 : text;
        return new Shape.Group(Row.Figure.Address,
        [
            new Shape.Line(Inks.RowRule, new Spot(0, Bottom), new Spot(form.Width, Bottom)),
            .. Lines.Select((line, index) => new Shape.Words(Inks.Name, new Spot(0, text + Baseline + (index * OrderedForm.Line)), line) { Mark = "name" }),
            // The dotted line at the limit of the possible runs through the whole chart already.
            .. rule.Shapes.Where(shape => shape.Ink != MarkInk.ZeroLine).Select(shape => MarkInks.Of(shape, MarkTop)),
            .. OffScale(scale, print),
            .. Figure(columns, figure + Baseline, type),
        ]);
    }

    private IEnumerable<Shape> Figure(OrderedColumns columns, double y, TypeCase type)
    {
        yield return new Shape.Words(Inks.FigureLight, new Spot(columns.ValueRight, y), Row.Light, Anchor.End) { Mark = "light" };
        yield return new Shape.Words(Inks.Figure, new Spot(columns.ValueRight - type.Width(Row.Light, Inks.FigureLight), y), Row.Heavy, Anchor.End) { Mark = "heavy" };
        yield return new Shape.Words(Inks.Margin, new Spot(columns.MarginLeft, y), Row.Margin) { Mark = "margin" };
        if (Row.IsWeak)
            yield return Lozenge(columns.MarginLeft + type.Width(Row.Margin, Inks.Margin) + (OrderedForm.LozengeWidth / 2) + 1, y - 5);
    }

    private static Shape.Outline Lozenge(double x, double y) =>
        new(Inks.Lozenge, [new Spot(x - 5, y), new Spot(x, y - 5), new Spot(x + 5, y), new Spot(x, y + 5)]) { Mark = "weak" };

    // Where the range goes on beyond the scale, its end stands as a number over the arrow.
    private IEnumerable<Shape> OffScale(Scale scale, Func<PublishedValue, string> print)
    {
        if (Row.Figure.Main is not { } main)
            yield break;
        var y = MarkTop + OrderedForm.Mark.Middle - 6;
        if (Row.Subject.Body.High > scale.To && Row.Subject.Highest > scale.To)
            yield return new Shape.Words(Inks.OffScale, new Spot(scale.End + OrderedForm.Inset, y), print(main.Printed.High), Anchor.End) { Mark = "end-off-scale" };
        if (Row.Subject.Body.Low < scale.From && Row.Subject.Lowest < scale.From)
            yield return new Shape.Words(Inks.OffScale, new Spot(scale.Start - OrderedForm.Inset, y), print(main.Printed.Low)) { Mark = "end-off-scale" };
    }
}
