using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// What one mechanism spends on all its cells together: the composition of the cells that a unit can move, taken at the cells whose law
/// loses most. Upper bounds hold for every unit within the declared contribution; lower bounds come from a named pair of neighbouring data:
/// with and without a unit (or with one unit in place of another) that uses its bounds in full.
/// </summary>
public sealed class MechanismLoss
{
    private readonly UnitMovement movement;

    private MechanismLoss(UnitMovement movement, NeighbourRelation relation)
    {
        (this.movement, Relation) = (movement, relation);
        PureTerms = movement.Worst(loss => loss.Pure(movement.LargestShift).Upper.Value, PureOf);
        ConcentratedTerms = movement.Worst(loss => loss.Concentrated(movement.LargestShift).Upper.Value, ConcentratedOf, concentrated: true);
        Pure = new(
            Epsilon.Of(movement.Proven(loss => loss.Pure(movement.LargestShift).Upper.Value, term => term.Loss.Pure(term.Shift).Lower.Value)),
            BasicComposition.Sum(PureTerms.Select(term => term.Cells * term.Loss.Pure(term.Shift).Upper)));
        Concentrated = new(
            Rho.Of(movement.Proven(loss => loss.Concentrated(movement.LargestShift).Upper.Value, term => term.Loss.Concentrated(term.Shift).Lower.Value)),
            BasicComposition.Sum(ConcentratedTerms.Select(term => term.Cells * term.Loss.Concentrated(term.Shift).Upper)));
    }

    /// <summary>Which data are neighbours.</summary>
    public NeighbourRelation Relation { get; }

    /// <summary>The furthest that one cell can be moved, in the unit of the figure; for a bound on a norm, that bound.</summary>
    public double LargestShift => movement.LargestShift;

    /// <summary>ε without δ; infinite where the law has none.</summary>
    public Bounds<Epsilon> Pure { get; }

    /// <summary>ρ; infinite where the law has none.</summary>
    public Bounds<Rho> Concentrated { get; }

    /// <summary>The parts whose upper bounds add up to <see cref="Pure"/>.</summary>
    public IReadOnlyList<LossTerm> PureTerms { get; }

    /// <summary>The parts whose upper bounds add up to <see cref="Concentrated"/>.</summary>
    public IReadOnlyList<LossTerm> ConcentratedTerms { get; }

    /// <summary>Whether the upper bound of <see cref="DeltaAt"/> is the loss itself.</summary>
    internal bool HasExactCurve => movement.HasExactCurve;

    /// <summary>The loss of a mechanism.</summary>
    /// <param name="cells">All its cells, by law; at least one. The laws are of one family.</param>
    /// <param name="unit">What a unit can contribute.</param>
    /// <param name="relation">Which data are neighbours.</param>
    /// <exception cref="ArgumentException">There is no cell, or a bound on the contribution is not above 0.</exception>
    public static MechanismLoss Of(IReadOnlyList<NoisedCells> cells, UnitContribution unit, NeighbourRelation relation)
    {
        if (cells.Count == 0)
            throw new ArgumentException("A mechanism without a cell has no law.", nameof(cells));
        return new MechanismLoss(UnitMovement.Of(new CellOrder(cells), unit, relation), relation);
    }

    /// <summary>δ at an ε: the exact curve where it is known in closed form, else the smallest of the bounds that hold.</summary>
    public Bounds<Delta> DeltaAt(Epsilon epsilon)
    {
        if (Pure.Upper <= epsilon)
            return new(Delta.Zero, Delta.Zero);
        var upper = Delta.Min(ConcentratedConversion.DeltaAt(Concentrated.Upper, epsilon), movement.DeltaAt(epsilon));
        var one = movement.SingleShift;
        return new(Delta.Min(one.Loss.DeltaAt(epsilon, one.Shift).Lower, upper), upper);
    }

    /// <summary>The smallest ε at a δ; infinite where δ is never that small. At δ = 0 that is the pure loss.</summary>
    public Bounds<Epsilon> EpsilonAt(Delta delta) => delta == Delta.Zero ? Pure : new(
        Smallest(epsilon => DeltaAt(epsilon).Lower <= delta),
        Epsilon.Min(Pure.Upper, Smallest(epsilon => DeltaAt(epsilon).Upper <= delta)));

    private static double PureOf(LossTerm term) => term.Loss.Pure(term.Shift).Upper.Value;

    private static double ConcentratedOf(LossTerm term) => term.Loss.Concentrated(term.Shift).Upper.Value;

    private static Epsilon Smallest(Func<Epsilon, bool> holds)
    {
        const double Farthest = 1e6;
        if (holds(Epsilon.Zero))
            return Epsilon.Zero;
        return holds(Epsilon.Of(Farthest)) ? Epsilon.Of(Bisection.FirstThat(value => holds(Epsilon.Of(value)), 0, Farthest)) : Epsilon.Infinite;
    }
}
