using ReleaseKit.Noise;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// What one noise law spends on cells that a unit can move. Shifts are in the figure's unit and mean "at most this far, either way".
/// A lattice law takes upper bounds at the next step of its grid up, lower bounds at the next one down. Immutable.
/// </summary>
public abstract class LawLoss
{
    private protected LawLoss()
    {
    }

    /// <summary>The literature the formulas come from.</summary>
    public abstract string Source { get; }

    /// <summary>The loss of a law.</summary>
    /// <exception cref="ArgumentException">A law that no file in this folder knows.</exception>
    public static LawLoss Of(NoiseLaw law) => law switch
    {
        LaplaceLaw laplace => new LaplaceLoss(laplace),
        DiscreteLaplaceLaw discrete => new DiscreteLaplaceLoss(discrete),
        GaussianLaw gaussian => new GaussianLoss(gaussian),
        DiscreteGaussianLaw discrete => new DiscreteGaussianLoss(discrete),
        UniformLaw uniform => new UniformLoss(uniform),
        DiscreteUniformLaw discrete => new DiscreteUniformLoss(discrete),
        StaircaseLaw staircase => new StaircaseLoss(staircase),
        TruncatedDiscreteLaplaceLaw truncated => new TruncatedDiscreteLaplaceLoss(truncated),
        TabulatedLaw tabulated => new TabulatedLoss(tabulated),
        _ => throw new ArgumentException($"No loss is known for {law.GetType().Name}.", nameof(law)),
    };

    /// <summary>The largest log ratio of densities for one cell; infinite where there is none.</summary>
    public abstract Bounds<Epsilon> Pure(double shift);

    /// <summary>ρ for one cell; infinite where there is none.</summary>
    public abstract Bounds<Rho> Concentrated(double shift);

    /// <summary>The curve δ(ε) for one cell.</summary>
    public abstract Bounds<Delta> DeltaAt(Epsilon epsilon, double shift);

    /// <summary>The pure upper bound for one cell as a calculation: "1 ÷ 4".</summary>
    public abstract string PureArithmetic(double shift);

    /// <summary>The concentrated upper bound for one cell as a calculation: "1² ÷ (2 × 9.5²)".</summary>
    public abstract string ConcentratedArithmetic(double shift);

    /// <summary>The grid of a lattice law; 0 for a continuous one.</summary>
    internal virtual double Grid => 0;

    /// <summary>
    /// Whether doubling a shift at least doubles the loss of a cell, so that a bounded sum of shifts is worst where it is spent on as few cells
    /// as can be. A law of steps loses as much for a small shift as for a large one.
    /// </summary>
    internal virtual bool GrowsWithShift => true;

    /// <summary>Whether <see cref="DeltaAt"/> is exact for one cell that is moved by whole steps.</summary>
    internal virtual bool IsExactForOneCell => true;

    /// <summary>Whether <see cref="JointDeltaAt"/> is exact too.</summary>
    internal virtual bool IsExactForCells => false;

    /// <summary>Shifts that bound every way in which absolute differences can add up to a sum over a number of cells: all in one cell.</summary>
    internal virtual ShiftRun RunOfAbsoluteSum(double sum, long cells) => new(sum, 1);

    /// <summary>The same for a Euclidean distance, where ε adds: spread evenly, Δ₁ ≤ √cells·Δ₂ (Cauchy–Schwarz).</summary>
    internal virtual ShiftRun RunOfDistance(double distance, long cells) => new(distance / Math.Sqrt(cells), cells);

    /// <summary>The same, where ρ adds.</summary>
    internal virtual ShiftRun RunOfDistanceConcentrated(double distance, long cells) => RunOfDistance(distance, cells);

    /// <summary>
    /// An upper bound on δ(ε) of several cells of this family of laws together; here by basic composition with ε split evenly over the cells.
    /// </summary>
    internal virtual Delta JointDeltaAt(Epsilon epsilon, IReadOnlyList<LossTerm> terms)
    {
        var each = Epsilon.Of(epsilon.Value / terms.Sum(term => term.Cells));
        return Delta.AtMost(terms.Sum(term => term.Cells * term.Loss.DeltaAt(each, term.Shift).Upper.Value));
    }

    /// <summary>
    /// An upper bound on δ(ε) where only a norm of the shifts is known, given the shifts that bound its pure loss: the curve of that loss alone,
    /// because which way of spreading the norm is worst at one ε is not certain.
    /// </summary>
    internal virtual Delta NormDeltaAt(Epsilon epsilon, LossTerm term)
    {
        var pure = term.Cells * Pure(term.Shift).Upper;
        return pure.IsFinite ? ApproximateCurve.OfPure(pure).DeltaAt(epsilon) : Delta.One;
    }

    /// <summary>1 − Π(1 − δᵢ): the chance that any of several independent cells shows what it must not.</summary>
    private protected static Delta AnyOf(IReadOnlyList<LossTerm> terms, Func<LossTerm, double> delta) =>
        Delta.AtMost(-Elementary.ExpM1(terms.Sum(term => term.Cells * Elementary.Log1P(-delta(term)))));

    private protected static Bounds<T> Exactly<T>(T value)
        where T : struct => new(value, value);
}
