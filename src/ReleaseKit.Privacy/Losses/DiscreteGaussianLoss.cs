using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// Discrete Gaussian noise with parameter σ, moved by the Euclidean distance d: no pure ε; ρ = d²/(2σ²), exact on the grid.
/// Canonne, Kamath &amp; Steinke 2020, Theorem 4 (number from memory). The curve of one cell is exact.
/// </summary>
internal sealed class DiscreteGaussianLoss(DiscreteGaussianLaw law) : LatticeLoss(law)
{
    public override string Source => "Canonne, Kamath & Steinke 2020";

    public override Bounds<Epsilon> Pure(double shift) => InSteps(shift, steps => steps == 0 ? Epsilon.Zero : Epsilon.Infinite);

    public override Bounds<Rho> Concentrated(double shift) => InSteps(shift, steps => Of(steps * law.Grid));

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift) =>
        HalfLine(epsilon, shift, steps => Math.Ceiling((steps / 2) - (epsilon.Value * Width * Width / steps)) - 1);

    public override string PureArithmetic(double shift) => "∞";

    public override string ConcentratedArithmetic(double shift) => $"{Signs.Of(StepsUp(shift) * law.Grid)}² ÷ (2 × {Signs.Of(law.Sigma)}²)";

    internal override ShiftRun RunOfDistance(double distance, long cells) => RunOfSquaredSteps(distance, cells) ?? new(distance, 1);

    private double Width => law.Sigma / law.Grid;

    private Rho Of(double distance) => Rho.Of(distance * distance / (2 * law.Sigma * law.Sigma));
}
