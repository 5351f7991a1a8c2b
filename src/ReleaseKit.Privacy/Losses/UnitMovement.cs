namespace ReleaseKit.Privacy.Losses;

/// <summary>How neighbouring data can move the cells of a mechanism: the worst ways for upper bounds, a named one for lower bounds.</summary>
internal abstract class UnitMovement(CellOrder cells)
{
    /// <summary>The furthest that one cell can be moved.</summary>
    public abstract double LargestShift { get; }

    /// <summary>One moved cell of a pair of neighbours, at the law it is known to concern.</summary>
    public abstract LossTerm SingleShift { get; }

    /// <summary>Whether <see cref="DeltaAt"/> is the loss of some pair of neighbours that uses its bounds in full.</summary>
    public abstract bool HasExactCurve { get; }

    private protected CellOrder Cells => cells;

    /// <exception cref="ArgumentException">A bound on the contribution is not above 0.</exception>
    public static UnitMovement Of(CellOrder cells, UnitContribution unit, NeighbourRelation relation) => unit switch
    {
        UnitContribution.PerCell { CellsPerUnit: >= 1, Most: > 0, PerUnit: null or > 0 } perCell => new PerCellMovement(cells, perCell, relation),
        UnitContribution.AbsoluteSum { Most: > 0 } sum => new NormMovement(cells, sum.Most, isSum: true),
        UnitContribution.Euclidean { Most: > 0 } distance => new NormMovement(cells, distance.Most, isSum: false),
        _ => throw new ArgumentException($"A bound on the contribution is not above 0: {unit}.", nameof(unit)),
    };

    /// <summary>Each way to move the cells, charged in an order of the laws.</summary>
    public abstract IReadOnlyList<IReadOnlyList<LossTerm>> Charged(Func<LawLoss, double> order, bool concentrated = false);

    /// <summary>An upper bound on δ(ε) of all cells together, from the laws themselves.</summary>
    public abstract Delta DeltaAt(Epsilon epsilon);

    /// <summary>A loss that some pair of neighbours attains.</summary>
    public abstract double Proven(Func<LawLoss, double> order, Func<LossTerm, double> loss);

    /// <summary>The way that loses most.</summary>
    public IReadOnlyList<LossTerm> Worst(Func<LawLoss, double> order, Func<LossTerm, double> loss, bool concentrated = false) =>
        Charged(order, concentrated).MaxBy(terms => Total(terms, loss))!;

    private protected static double Total(IEnumerable<LossTerm> terms, Func<LossTerm, double> loss) => terms.Sum(term => term.Cells * loss(term));
}

/// <summary>Movement by a bound in each cell.</summary>
internal sealed class PerCellMovement(CellOrder cells, UnitContribution.PerCell unit, NeighbourRelation relation) : UnitMovement(cells)
{
    private readonly IReadOnlyList<IReadOnlyList<ShiftRun>> worst = Movement.Worst(unit, relation, cells.Count, cells.GrowsWithShift);

    // How a bounded sum is best spread at one ε is not certain: δ is taken without that bound.
    private readonly IReadOnlyList<IReadOnlyList<ShiftRun>> unbounded = Movement.Worst(unit with { PerUnit = null }, relation, cells.Count, cells.GrowsWithShift);
    private readonly IReadOnlyList<IReadOnlyList<ShiftRun>> attained = Movement.Attained(unit, relation, cells.Count);

    public override double LargestShift => worst.Max(runs => runs[0].Shift);

    public override LossTerm SingleShift =>
        new(Cells.WorstFirst(loss => loss.DeltaAt(Epsilon.Zero, LargestShift).Upper.Value).First, attained.Max(runs => runs[0].Shift), 1);

    public override bool HasExactCurve => unit is { PerUnit: null } && (Cells.IsExactForCells || (worst is [[{ Cells: 1 }]] && Cells.First.IsExactForOneCell));

    public override IReadOnlyList<IReadOnlyList<LossTerm>> Charged(Func<LawLoss, double> order, bool concentrated = false)
    {
        var ordered = Cells.WorstFirst(order);
        return [.. worst.Select(ordered.Charge)];
    }

    // The worst cells at this ε, split evenly, in the worst arrangement.
    public override Delta DeltaAt(Epsilon epsilon)
    {
        var each = Epsilon.Of(epsilon.Value / unbounded.Max(runs => runs.Sum(run => run.Cells)));
        var ordered = Cells.WorstFirst(loss => loss.DeltaAt(each, LargestShift).Upper.Value);
        return unbounded.Select(ordered.Charge)
            .Max(terms => terms is [{ Cells: 1 } one] ? one.Loss.DeltaAt(epsilon, one.Shift).Upper : terms[0].Loss.JointDeltaAt(epsilon, terms));
    }

    // Where scales vary it is not known which cells go together: either one cell of the worst law, or as many of the mildest.
    public override double Proven(Func<LawLoss, double> order, Func<LossTerm, double> loss)
    {
        var ordered = Cells.WorstFirst(order);
        var together = attained.Max(runs => Total(ordered.Reversed.Charge(runs), loss));
        return Math.Max(together, attained.Max(runs => loss(new LossTerm(ordered.First, runs[0].Shift, 1))));
    }
}

/// <summary>
/// Movement by a norm over all cells, which does not say over how many it is spread: the upper bound takes the worst way at the law that
/// loses most, the lower one the mildest way at the law that loses least.
/// </summary>
internal sealed class NormMovement(CellOrder cells, double norm, bool isSum) : UnitMovement(cells)
{
    public override double LargestShift => norm;

    public override LossTerm SingleShift
    {
        get
        {
            var mildest = Cells.WorstFirst(loss => loss.DeltaAt(Epsilon.Zero, norm).Upper.Value).Last;
            return new LossTerm(mildest, Spread(mildest).Shift, 1);
        }
    }

    // Only where the length alone counts can one cell take the whole norm and lose the most.
    public override bool HasExactCurve => Cells.First is GaussianLoss;

    public override IReadOnlyList<IReadOnlyList<LossTerm>> Charged(Func<LawLoss, double> order, bool concentrated = false)
    {
        var loss = Cells.WorstFirst(order).First;
        var run = isSum ? loss.RunOfAbsoluteSum(norm, Cells.Count)
            : concentrated ? loss.RunOfDistanceConcentrated(norm, Cells.Count)
            : loss.RunOfDistance(norm, Cells.Count);
        return [[new LossTerm(loss, run.Shift, run.Cells)]];
    }

    public override Delta DeltaAt(Epsilon epsilon)
    {
        var term = Charged(loss => loss.DeltaAt(Epsilon.Zero, norm).Upper.Value)[0][0];
        return term.Loss.NormDeltaAt(epsilon, term);
    }

    public override double Proven(Func<LawLoss, double> order, Func<LossTerm, double> loss)
    {
        var mildest = Cells.WorstFirst(order).Last;
        var spread = Spread(mildest);
        return Math.Min(loss(new LossTerm(mildest, norm, 1)), spread.Cells * loss(new LossTerm(mildest, spread.Shift, 1)));
    }

    private ShiftRun Spread(LawLoss loss)
    {
        var steps = loss.Grid == 0 ? double.PositiveInfinity : GridSteps.Down(norm, loss.Grid);
        var spread = (long)Math.Max(1, Math.Min(Cells.Count, isSum ? steps : steps * steps));
        return new ShiftRun(isSum ? norm / spread : norm / Math.Sqrt(spread), spread);
    }
}
