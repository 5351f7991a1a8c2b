using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// Uniform noise on the whole steps −H..H, one cell moved by s steps: δ = min(1, s/(2H + 1)) at every ε; no pure ε and no ρ.
/// Common practice; derived.
/// </summary>
internal sealed class DiscreteUniformLoss(DiscreteUniformLaw law) : LatticeLoss(law)
{
    public override string Source => "common practice; derived";

    public override Bounds<Epsilon> Pure(double shift) => InSteps(shift, steps => steps == 0 ? Epsilon.Zero : Epsilon.Infinite);

    public override Bounds<Rho> Concentrated(double shift) => InSteps(shift, steps => steps == 0 ? Rho.Zero : Rho.Infinite);

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift) =>
        InSteps(shift, steps => Delta.AtMost(steps / ((2 * Math.Round(law.HalfWidth / law.Grid)) + 1)));

    public override string PureArithmetic(double shift) => "∞";

    public override string ConcentratedArithmetic(double shift) => "∞";

    internal override bool IsExactForCells => true;

    internal override Delta JointDeltaAt(Epsilon epsilon, IReadOnlyList<LossTerm> terms) =>
        AnyOf(terms, term => term.Loss.DeltaAt(epsilon, term.Shift).Upper.Value);

    // 1 − Π(1 − δᵢ) ≤ Σδᵢ, and δᵢ grows with the shift alone.
    internal override Delta NormDeltaAt(Epsilon epsilon, LossTerm term) => Delta.AtMost(term.Cells * DeltaAt(epsilon, term.Shift).Upper.Value);
}
