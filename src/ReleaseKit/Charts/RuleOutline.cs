namespace ReleaseKit.Charts;

/// <summary>The outline of the body: points where the density is taken, the same for all three coverages, so that the nested shapes share their edge.</summary>
internal sealed class RuleOutline(MarkSubject subject, Scale scale, MarkSize size)
{
    private readonly double[] places = Places(subject, size.PointsASide);

    /// <summary>The closed outline from one value to another: along the top, back along the bottom.</summary>
    public IReadOnlyList<MarkPoint> Between(double from, double to)
    {
        var inside = places.Where(place => place > from && place < to);
        var top = inside.Prepend(from).Append(to).Select(place => new MarkPoint(scale.At(place), size.Middle - HalfThickness(place))).ToList();
        return [.. top, .. Enumerable.Reverse(top).Select(point => point with { Y = (2 * size.Middle) - point.Y })];
    }

    private double HalfThickness(double place) => Math.Max(size.Hair, size.Peak * subject.ThicknessAt(place)) / 2;

    private static double[] Places(MarkSubject subject, int pointsASide)
    {
        if (subject.IsStemAlone || subject.Density is null)
            return [];
        var (low, high) = (subject.Tail.Low - subject.Value, subject.Tail.High - subject.Value);
        return [.. Side(low, pointsASide, subject.Grid).Reverse().Append(0).Concat(Side(high, pointsASide, subject.Grid)).Select(offset => subject.Value + offset)];
    }

    // Even steps outward from the figure; on a grid, on its own points and never closer than they are.
    private static IEnumerable<double> Side(double reach, int points, double grid)
    {
        var step = Math.Abs(reach) / points;
        if (grid > 0)
            step = Math.Max(1, Math.Round(step / grid)) * grid;
        if (step <= 0)
            return [];
        var count = (int)Math.Min(4 * points, Math.Floor(Math.Abs(reach) / step));
        return Enumerable.Range(1, count).Select(index => Math.Sign(reach) * index * step);
    }
}
