namespace ReleaseKit.Privacy.Losses;

/// <summary>The cells of a mechanism in the order in which shifts are charged to them: the law that loses most comes first.</summary>
internal sealed class CellOrder
{
    private readonly IReadOnlyList<(LawLoss Loss, long Count)> laws;

    public CellOrder(IReadOnlyList<NoisedCells> cells)
        : this([.. cells.Select(part => (LawLoss.Of(part.Law), part.Count))])
    {
    }

    private CellOrder(IReadOnlyList<(LawLoss Loss, long Count)> laws) => this.laws = laws;

    public long Count => laws.Sum(part => part.Count);

    public bool GrowsWithShift => laws.All(part => part.Loss.GrowsWithShift);

    public bool IsExactForCells => laws.All(part => part.Loss.IsExactForCells);

    public LawLoss First => laws[0].Loss;

    public LawLoss Last => laws[^1].Loss;

    public CellOrder Reversed => new([.. laws.Reverse()]);

    public CellOrder WorstFirst(Func<LawLoss, double> loss) => new([.. laws.OrderByDescending(part => loss(part.Loss))]);

    /// <summary>The shifts of an arrangement, largest first, each charged to the next cell.</summary>
    public IReadOnlyList<LossTerm> Charge(IReadOnlyList<ShiftRun> runs)
    {
        var terms = new List<LossTerm>();
        var (law, free) = (0, laws[0].Count);
        foreach (var run in runs)
        {
            for (var left = run.Cells; left > 0 && law < laws.Count;)
            {
                var taken = Math.Min(left, free);
                terms.Add(new LossTerm(laws[law].Loss, run.Shift, taken));
                (left, free) = (left - taken, free - taken);
                if (free == 0 && ++law < laws.Count)
                    free = laws[law].Count;
            }
        }

        return terms;
    }
}
