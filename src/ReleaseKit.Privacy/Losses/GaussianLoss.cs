using ReleaseKit.Noise.Laws;
using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// Gaussian noise with standard deviation σ, moved by the Euclidean distance d: no pure ε; ρ = d²/(2σ²) (Bun &amp; Steinke 2016, Proposition 1.6);
/// the exact curve of Balle &amp; Wang 2018, also for many cells together, because only the distance counts.
/// </summary>
internal sealed class GaussianLoss(GaussianLaw law) : LawLoss
{
    public override string Source => "Bun & Steinke 2016; Balle & Wang 2018";

    public override Bounds<Epsilon> Pure(double shift) => Exactly(shift == 0 ? Epsilon.Zero : Epsilon.Infinite);

    public override Bounds<Rho> Concentrated(double shift) => Exactly(new GaussianCurve(shift / law.Sigma).Rho);

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift) => Exactly(new GaussianCurve(shift / law.Sigma).DeltaAt(epsilon));

    public override string PureArithmetic(double shift) => "∞";

    public override string ConcentratedArithmetic(double shift) => $"{Signs.Of(shift)}² ÷ (2 × {Signs.Of(law.Sigma)}²)";

    internal override bool IsExactForCells => true;

    internal override ShiftRun RunOfDistance(double distance, long cells) => new(distance, 1);

    internal override Delta JointDeltaAt(Epsilon epsilon, IReadOnlyList<LossTerm> terms)
    {
        var square = terms.Sum(term => term.Cells * 2 * term.Loss.Concentrated(term.Shift).Upper.Value);
        return new GaussianCurve(Math.Sqrt(square)).DeltaAt(epsilon);
    }

    // Only the Euclidean length of the shifts counts, and every norm bounds it.
    internal override Delta NormDeltaAt(Epsilon epsilon, LossTerm term) => DeltaAt(epsilon, term.Shift).Upper;
}
