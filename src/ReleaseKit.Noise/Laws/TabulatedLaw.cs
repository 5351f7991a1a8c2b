namespace ReleaseKit.Noise.Laws;

/// <summary>
/// A law given as a table of steps and chances, added in decimal arithmetic. What the chances lack to 1 counts as outside every range;
/// variance, E|N| and the tails are those of the listed steps.
/// </summary>
public sealed record TabulatedLaw : LatticeLaw
{
    private readonly long[] steps;

    // The chances of steps[0..i], and of the steps with |step| ≤ distances[i].
    private readonly decimal[] upTo, within;
    private readonly long[] distances;
    private readonly decimal total;

    private TabulatedLaw(IReadOnlyList<(long Step, decimal Probability)> rows, double grid)
        : base(grid)
    {
        Rows = rows;
        steps = [.. rows.Select(row => row.Step)];
        upTo = Cumulated(rows.Select(row => row.Probability));
        var byDistance = rows.GroupBy(row => Math.Abs(row.Step)).OrderBy(group => group.Key).ToList();
        distances = [.. byDistance.Select(group => group.Key)];
        within = Cumulated(byDistance.Select(group => group.Sum(row => row.Probability)));
        total = upTo[^1];
        MeanAbsoluteDeviation = Mean(step => Math.Abs(step)) * grid;
        var mean = Mean(step => step);
        Variance = Mean(step => (step - mean) * (step - mean)) * grid * grid;
        Peak = (double)rows.Max(row => row.Probability);
    }

    /// <summary>The steps in ascending order with their chances.</summary>
    public IReadOnlyList<(long Step, decimal Probability)> Rows { get; }

    /// <summary>What the listed chances lack to 1, in [0, 1).</summary>
    public decimal MissingMass => 1 - total;

    /// <inheritdoc/>
    public override double Variance { get; }

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation { get; }

    internal override bool IsLogConcave => false;

    private double Peak { get; }

    /// <summary>The law of a table.</summary>
    /// <param name="rows">Steps (multiples of the grid, each once, at most 2⁵² either way) and their chances ≥ 0, which add up to more than
    /// 0 and at most 1.</param>
    /// <param name="grid">g &gt; 0, finite, in the unit of the figure.</param>
    /// <exception cref="ArgumentException">A step stands twice, a chance is negative, or the chances add up to 0 or to more than
    /// 1.</exception>
    public static TabulatedLaw Of(IEnumerable<(long Step, decimal Probability)> rows, double grid = 1)
    {
        var sorted = rows.OrderBy(row => row.Step).ToList();
        var fault = Fault(sorted);
        return fault is null ? new TabulatedLaw(sorted.AsReadOnly(), grid) : throw new ArgumentException(fault, nameof(rows));
    }

    /// <inheritdoc/>
    public override double Probability(long step)
    {
        var index = Array.BinarySearch(steps, step);
        return index < 0 ? 0 : (double)Rows[index].Probability;
    }

    /// <inheritdoc/>
    public override double AtMostStep(long step) => (double)Through(steps, upTo, step);

    /// <inheritdoc/>
    public override double AtLeastStep(long step) =>
        step == long.MinValue ? (double)total : (double)(total - Through(steps, upTo, step - 1));

    /// <inheritdoc/>
    public override double WithinSteps(long steps) => (double)Through(distances, within, steps);

    /// <inheritdoc/>
    public override double RelativeDensity(double offset) => Probability(Lattice.ToStep(Math.Round(offset / Grid))) / Peak;

    /// <summary>Same grid, same steps, same chances.</summary>
    public bool Equals(TabulatedLaw? other) => other is not null && Grid.Equals(other.Grid) && Rows.SequenceEqual(other.Rows);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Grid, Rows.Count, steps[0], total);

    private protected override double TailFrom(long step) => AtLeastStep(step);

    private static string? Fault(List<(long Step, decimal Probability)> rows)
    {
        if (rows.Count == 0)
            return "The table has no row: give at least one step with its chance.";
        if (rows.Any(row => row.Probability < 0))
            return $"Step {rows.First(row => row.Probability < 0).Step} has a negative chance: a chance lies from 0 to 1.";
        if (rows.Any(row => row.Step is < -Lattice.Exact or > Lattice.Exact))
            return "A step lies beyond 2^52 either way: choose a coarser grid.";
        var twice = rows.CountBy(row => row.Step).Where(step => step.Value > 1).ToList();
        if (twice.Count > 0)
            return $"Step {twice[0].Key} stands twice: add its chances.";
        var total = rows.Sum(row => row.Probability);
        return total is > 0 and <= 1 ? null : $"The chances add up to {total}: they must add up to more than 0 and at most 1.";
    }

    private static decimal[] Cumulated(IEnumerable<decimal> chances)
    {
        var sum = 0m;
        return [.. chances.Select(chance => sum += chance)];
    }

    private static decimal Through(long[] places, decimal[] sums, long place)
    {
        var index = Array.BinarySearch(places, place);
        var count = index < 0 ? ~index : index + 1;
        return count == 0 ? 0 : sums[count - 1];
    }

    private double Mean(Func<double, double> of) => Rows.Sum(row => of(row.Step) * (double)row.Probability) / (double)total;
}
