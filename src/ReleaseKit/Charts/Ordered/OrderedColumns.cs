namespace ReleaseKit.Charts.Ordered;

/// <summary>Where names, marks, figures and margins stand in an ordered chart, found by measuring them all.</summary>
internal sealed record OrderedColumns(double NameWidth, double PlotFrom, double PlotTo, double ValueRight, double MarginLeft)
{
    public static OrderedColumns Of(IReadOnlyList<OrderedRow> rows, OrderedForm form, TypeCase type)
    {
        var lozenge = rows.Any(row => row.IsWeak) ? OrderedForm.LozengeWidth : 0;
        var margin = rows.Max(row => type.Width(row.Margin, Inks.Margin)) + lozenge;
        var value = rows.Max(row => type.Width(row.Heavy, Inks.Figure) + type.Width(row.Light, Inks.FigureLight));
        var marginLeft = form.Width - margin - 1;
        var valueRight = marginLeft - OrderedForm.ValueGap;
        var valueLeft = valueRight - value;
        if (!form.MarkBeside)
            return new OrderedColumns(valueLeft - OrderedForm.ColumnGap, 0, form.Width, valueRight, marginLeft);
        var name = Math.Min(OrderedForm.MostName, rows.Max(row => type.Width(row.Name, Inks.Name)) + 1);
        return new OrderedColumns(name, name + OrderedForm.ColumnGap, valueLeft - OrderedForm.ColumnGap, valueRight, marginLeft);
    }

    public Scale ScaleOf(OrderedScale scale) => new(scale.From, scale.To, PlotFrom + OrderedForm.Inset, PlotTo - OrderedForm.Inset);
}
