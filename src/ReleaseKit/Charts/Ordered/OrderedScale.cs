using ReleaseKit.Releases;

namespace ReleaseKit.Charts.Ordered;

/// <summary>From where to where the axis of an ordered chart runs, in the figures' unit.</summary>
internal readonly record struct OrderedScale(double From, double To)
{
    /// <summary>
    /// Every figure is on the scale, and every range but one that reaches further beyond the figures than they themselves are spread: it
    /// would squeeze all others. Such a range is cut with an arrow and its number. Counts and amounts start at zero, below it if a range does.
    /// </summary>
    public static OrderedScale Of(IReadOnlyList<OrderedRow> rows)
    {
        var values = rows.Select(row => row.Subject.Value).ToList();
        var fromZero = StartsAtZero(rows[0].Figure.Measure.Kind);
        var least = fromZero ? Math.Min(0, values.Min()) : values.Min();
        var most = fromZero ? Math.Max(0, values.Max()) : values.Max();
        var spread = most > least ? most - least : WidestMargin(rows);
        var ranges = rows.Select(row => row.Subject).Where(subject => !subject.IsStemAlone).ToList();
        var to = Reach(most, most + spread, ranges.Select(range => (range.Body.High, range.Tail.High)));
        var from = -Reach(-least, spread - least, ranges.Select(range => (-range.Body.Low, -range.Tail.Low)));
        return from < to ? new OrderedScale(from, to) : new OrderedScale(from - 1, to + 1);
    }

    private static double Reach(double figures, double limit, IEnumerable<(double Body, double Tail)> ends)
    {
        var reach = figures;
        foreach (var (body, tail) in ends)
            reach = Math.Max(reach, body <= limit ? tail : limit);
        return reach;
    }

    private static double WidestMargin(IReadOnlyList<OrderedRow> rows) =>
        rows.Select(row => row.Figure.Main?.Margin ?? 0).Append(1).Max() * 2;

    private static bool StartsAtZero(MeasureKind kind) =>
        kind is MeasureKind.Count or MeasureKind.Estimate or MeasureKind.Amount or MeasureKind.Share or MeasureKind.Rate;
}
