namespace ReleaseKit.Charts.Ordered;

/// <summary>
/// An ordered chart as pure geometry: figures by size, each with its name, its swelled rule on one scale, its value and margin. The scale of
/// the marks is kept, so that every mark can be read back.
/// </summary>
public sealed record OrderedChart(Drawing Drawing, Scale Scale)
{
    public static OrderedChart Wide(OrderedFigures figures, TypeCase type) => Of(figures, OrderedForm.Wide, type);

    public static OrderedChart Narrow(OrderedFigures figures, TypeCase type) => Of(figures, OrderedForm.Narrow, type);

    private static OrderedChart Of(OrderedFigures figures, OrderedForm form, TypeCase type)
    {
        var columns = OrderedColumns.Of(figures.Rows, form, type);
        var scale = columns.ScaleOf(OrderedScale.Of(figures.Rows));
        var rows = new List<PlacedRow>();
        foreach (var row in figures.Rows)
            rows.Add(PlacedRow.Of(row, rows.Count == 0 ? OrderedForm.HeadHeight : rows[^1].Bottom, columns, form, type));
        var axis = new OrderedAxis(scale, figures, form, type);
        var foot = rows[^1].Bottom;
        // Where names stand over the marks, lines of the axis run beside the marks only, so that none runs through a name.
        IReadOnlyList<(double Top, double Bottom)> strips = form.MarkBeside
            ? [(OrderedAxis.Head, foot)]
            : [.. rows.Select(row => (row.MarkTop, row.MarkTop + OrderedForm.MarkHeight))];
        Shape[] shapes = [.. axis.Shapes(foot, strips), .. rows.Select(row => row.Draw(scale, columns, form, figures.Print, type))];
        return new OrderedChart(new Drawing(form.Width, foot + OrderedAxis.FootHeight, shapes), scale);
    }
}
