using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// Two-sided geometric noise held to ±A and renormalised, one cell moved by d: the d outermost steps show the shift with certainty, so
/// no pure ε and no ρ; within the common part the log ratio is at most d/t. From ε = d/t on, δ is the mass of the d outermost steps.
/// Derived.
/// </summary>
internal sealed class TruncatedDiscreteLaplaceLoss(TruncatedDiscreteLaplaceLaw law) : LatticeLoss(law)
{
    public override string Source => "derived from Ghosh, Roughgarden & Sundararajan 2012";

    private double PerStep => law.Grid / law.Scale;

    private double Farthest => Math.Round(law.Cutoff / law.Grid);

    public override Bounds<Epsilon> Pure(double shift) => InSteps(shift, steps => steps == 0 ? Epsilon.Zero : Epsilon.Infinite);

    public override Bounds<Rho> Concentrated(double shift) => InSteps(shift, steps => steps == 0 ? Rho.Zero : Rho.Infinite);

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift) => HalfLine(epsilon, shift, steps => LastAbove(epsilon, steps));

    public override string PureArithmetic(double shift) => "∞";

    public override string ConcentratedArithmetic(double shift) => "∞";

    // From Σd/t on only the outermost steps of any cell break the bound; below it, or where scales vary, the losses of the cells are split.
    internal override Delta JointDeltaAt(Epsilon epsilon, IReadOnlyList<LossTerm> terms)
    {
        var within = terms.Sum(term => term.Cells * Within(term.Shift));
        return epsilon.Value >= within && terms.All(term => term.Loss == this)
            ? AnyOf(terms, term => term.Loss.DeltaAt(Epsilon.Of(double.MaxValue), term.Shift).Upper.Value)
            : base.JointDeltaAt(epsilon, terms);
    }

    // The tail of a log-concave law is log-concave, so that all steps in one cell leave the least in common. Below Σd/t nothing is certain.
    internal override Delta NormDeltaAt(Epsilon epsilon, LossTerm term)
    {
        var steps = term.Cells * StepsUp(term.Shift);
        return epsilon.Value >= steps * PerStep ? DeltaAt(Epsilon.Of(double.MaxValue), steps * law.Grid).Upper : Delta.One;
    }

    private double Within(double shift) => StepsUp(shift) * PerStep;

    private double LastAbove(Epsilon epsilon, double steps)
    {
        var outermost = Math.Min(Farthest, steps - Farthest - 1);
        var inside = steps * PerStep <= epsilon.Value ? outermost : Math.Ceiling((steps - (epsilon.Value / PerStep)) / 2) - 1;
        return Math.Min(Farthest, Math.Max(outermost, inside));
    }
}
