using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// Uniform noise on ±h, one cell moved by d: what falls outside the common part shows the shift with certainty. No pure ε and no ρ;
/// δ = min(1, d/(2h)) at every ε, and 1 − Π(1 − δᵢ) for several cells. Common practice; derived.
/// </summary>
internal sealed class UniformLoss(UniformLaw law) : LawLoss
{
    public override string Source => "common practice; derived";

    public override Bounds<Epsilon> Pure(double shift) => Exactly(shift == 0 ? Epsilon.Zero : Epsilon.Infinite);

    public override Bounds<Rho> Concentrated(double shift) => Exactly(shift == 0 ? Rho.Zero : Rho.Infinite);

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift) => Exactly(Delta.AtMost(shift / (2 * law.HalfWidth)));

    public override string PureArithmetic(double shift) => "∞";

    public override string ConcentratedArithmetic(double shift) => "∞";

    internal override bool IsExactForCells => true;

    internal override Delta JointDeltaAt(Epsilon epsilon, IReadOnlyList<LossTerm> terms) =>
        AnyOf(terms, term => term.Loss.DeltaAt(epsilon, term.Shift).Upper.Value);

    // 1 − Π(1 − δᵢ) ≤ Σδᵢ, and δᵢ grows with the shift alone.
    internal override Delta NormDeltaAt(Epsilon epsilon, LossTerm term) => Delta.AtMost(term.Cells * DeltaAt(epsilon, term.Shift).Upper.Value);
}
