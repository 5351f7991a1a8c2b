using ReleaseKit.Charts;

namespace ReleaseKit.Pages.Tables;

/// <summary>What the marks of one column and one level of totals reach: gathered figure by figure, then turned into a scale that fits them.</summary>
internal sealed class ColumnExtent
{
    private const double ZeroFits = 0.4;

    /// <summary>Stems alone are not drawn further apart than this share of their size asks for: they have no noise that a finer scale could show.</summary>
    private const double LeastOfStems = 0.1;

    /// <summary>Lowest end that must be seen: the stem, and the range as far as it is possible.</summary>
    private double low = double.PositiveInfinity;
    private double high = double.NegativeInfinity;

    /// <summary>Lowest end of a figure that lies where the value before noise cannot be.</summary>
    private double below = double.PositiveInfinity;
    private double above = double.NegativeInfinity;
    private bool hasRanges;

    /// <summary>Ranges of weak figures, as far as they are possible, and how wide the ranges of all figures are.</summary>
    private readonly List<MarkRange> weak = [];
    private readonly List<double> widths = [];

    public bool IsEmpty => low > high;
    public double Low => low;
    public double High => high;

    public void Add(MarkSubject subject)
    {
        See(subject.Value);
        if (subject.IsStemAlone)
            return;
        hasRanges = true;
        if (subject.Value < subject.Lowest)
            below = Math.Min(below, subject.Body.Low);
        if (subject.Value > subject.Highest)
            above = Math.Max(above, subject.Body.High);
        widths.Add(subject.Tail.High - subject.Tail.Low);
        var possible = new MarkRange(Math.Max(subject.Tail.Low, subject.Lowest), Math.Min(subject.Tail.High, subject.Highest));
        // Strong figures are seen to the end of their tails; a weak figure's range may run off the scale, and an arrow says so.
        if (subject.Weak)
            weak.Add(possible);
        else
            See(possible);
    }

    public void Add(ColumnExtent other)
    {
        (low, high) = (Math.Min(low, other.low), Math.Max(high, other.high));
        (below, above) = (Math.Min(below, other.below), Math.Max(above, other.above));
        hasRanges |= other.hasRanges;
        weak.AddRange(other.weak);
        widths.AddRange(other.widths);
    }

    /// <summary>The scale of the parts: from zero where zero is not far, below it only for figures that are.</summary>
    public (double From, double To) Fit()
    {
        if (IsEmpty)
            return (0, 1);
        var (lowest, highest) = WithWeak();
        var from = lowest > 0 && lowest < ZeroFits * highest ? 0 : lowest;
        var to = Math.Max(highest, above);
        from = Math.Min(from, below);
        var least = hasRanges ? 0 : LeastOfStems * Math.Max(Math.Abs(from), Math.Abs(to));
        return to - from > least ? (from, to) : (from - (least / 2), to + Math.Max(least / 2, 1));
    }

    /// <summary>
    /// How far the scale reaches with weak figures: to the ends of their ranges, but for one that stands out further than the others are spread and ranges here are
    /// wide: it would squeeze all others.
    /// </summary>
    private (double Low, double High) WithWeak()
    {
        var room = Math.Max(high - low, Median(widths));
        return (
            weak.Select(range => range.Low).Where(end => end >= low - room).Append(low).Min(),
            weak.Select(range => range.High).Where(end => end <= high + room).Append(high).Max());
    }

    private static double Median(List<double> numbers) => numbers.Count == 0 ? 0 : numbers.Order().ElementAt(numbers.Count / 2);

    private void See(MarkRange range)
    {
        See(range.Low);
        See(range.High);
    }

    private void See(double value) => (low, high) = (Math.Min(low, value), Math.Max(high, value));
}
