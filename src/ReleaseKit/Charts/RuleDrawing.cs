namespace ReleaseKit.Charts;

/// <summary>Draws one swelled rule: the possible part solid, the impossible part dashed, all of it cut to the scale.</summary>
internal sealed class RuleDrawing(MarkSubject subject, Scale scale, MarkSize size)
{
    private const double ArrowReach = 7;
    private readonly List<MarkShape> shapes = [];
    private readonly RuleOutline outline = new(subject, scale, size);

    public SwelledRule Draw()
    {
        AddZeroLine();
        if (!subject.IsStemAlone)
            AddRanges();
        AddStem();
        return new() { Shapes = shapes, Stem = scale.Holds(subject.Value) ? scale.At(subject.Value) : null, Stops = StopPlaces() };
    }

    private double PossibleFrom => Math.Max(scale.From, subject.Lowest);
    private double PossibleTo => Math.Min(scale.To, subject.Highest);

    private void AddZeroLine()
    {
        if (subject.Lowest > scale.From && subject.Lowest <= scale.To)
            Line(MarkInk.ZeroLine, scale.At(subject.Lowest), 0, scale.At(subject.Lowest), 2 * size.Middle, 1);
    }

    private void AddRanges()
    {
        AddGhost(scale.From, Math.Min(subject.Lowest, scale.To));
        AddGhost(Math.Max(subject.Highest, scale.From), scale.To);
        AddPossible();
        AddStop(subject.Body.Low);
        AddStop(subject.Body.High);
        AddArrows();
    }

    private void AddPossible()
    {
        if (subject.Density is null)
            AddTailLine(subject.Tail.Low, subject.Tail.High);
        else if (subject.Weak)
            AddHollow();
        else
            AddSwelled();
    }

    private void AddSwelled()
    {
        AddBody(MarkInk.Tail, subject.Tail);
        AddBody(MarkInk.Body, subject.Body);
        AddBody(MarkInk.Core, subject.Core);
    }

    private void AddHollow()
    {
        AddTailLine(subject.Tail.Low, subject.Body.Low);
        AddTailLine(subject.Body.High, subject.Tail.High);
        AddBody(MarkInk.Hollow, subject.Body, size.Hair);
    }

    private void AddBody(MarkInk ink, MarkRange range, double thickness = 0)
    {
        var (from, to) = (Math.Max(range.Low, PossibleFrom), Math.Min(range.High, PossibleTo));
        if (from < to)
            shapes.Add(new(ink, outline.Between(from, to), true, thickness));
    }

    private void AddTailLine(double low, double high)
    {
        var (from, to) = (Math.Max(low, PossibleFrom), Math.Min(high, PossibleTo));
        if (from < to)
            Line(MarkInk.TailLine, scale.At(from), size.Middle, scale.At(to), size.Middle, size.Hair);
    }

    private void AddGhost(double from, double to)
    {
        var (low, high) = (Math.Max(from, subject.Body.Low), Math.Min(to, subject.Body.High));
        if (low < high && subject.Density is not null)
            shapes.Add(new(MarkInk.Ghost, outline.Between(low, high), true, size.Hair));
        AddGhostTail(Math.Max(from, subject.Tail.Low), Math.Min(to, subject.Density is null ? subject.Tail.High : subject.Body.Low));
        AddGhostTail(Math.Max(from, subject.Body.High), Math.Min(to, subject.Tail.High));
    }

    private void AddGhostTail(double from, double to)
    {
        if (from < to)
            Line(MarkInk.Ghost, scale.At(from), size.Middle, scale.At(to), size.Middle, size.Hair);
    }

    private void AddStop(double value)
    {
        if (scale.Holds(value))
            Upright(IsPossible(value) ? MarkInk.Stop : MarkInk.GhostStop, value, size.StopHeight, size.StopWidth);
    }

    private void AddStem()
    {
        if (!scale.Holds(subject.Value))
            return;
        Upright(MarkInk.Halo, subject.Value, size.StemHeight, size.StemWidth + (2 * size.Halo));
        Upright(MarkInk.Stem, subject.Value, size.StemHeight, size.StemWidth);
    }

    // An arrow says that the mark goes on where the value can still lie; at a limit of the possible the mark just ends.
    private void AddArrows()
    {
        if (subject.Tail.Low < scale.From && subject.Lowest < scale.From)
            AddArrow(scale.Start, -1);
        if (subject.Tail.High > scale.To && subject.Highest > scale.To)
            AddArrow(scale.End, 1);
    }

    private void AddArrow(double edge, int direction)
    {
        var tip = edge + (direction * ArrowReach);
        var back = tip - (direction * 4);
        shapes.Add(new(MarkInk.Arrow, [new(back, size.Middle - 4), new(tip, size.Middle), new(back, size.Middle + 4)], false, 1.6));
    }

    private void Upright(MarkInk ink, double value, double height, double width) =>
        Line(ink, scale.At(value), size.Middle - (height / 2), scale.At(value), size.Middle + (height / 2), width);

    private void Line(MarkInk ink, double fromX, double fromY, double toX, double toY, double thickness) =>
        shapes.Add(new(ink, [new(fromX, fromY), new(toX, toY)], false, thickness));

    private bool IsPossible(double value) => value >= subject.Lowest && value <= subject.Highest;

    private (double, double)? StopPlaces() => subject.IsStemAlone
        ? null
        : (scale.At(Math.Clamp(subject.Body.Low, scale.From, scale.To)), scale.At(Math.Clamp(subject.Body.High, scale.From, scale.To)));
}
