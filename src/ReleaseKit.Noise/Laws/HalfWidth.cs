namespace ReleaseKit.Noise.Laws;

/// <summary>A symmetric half-width and the coverage it attains.</summary>
/// <param name="Width">w ≥ 0, in the unit of the figure.</param>
/// <param name="Attained">A lower bound on P(|error| ≤ w), whatever the value before noise is; a pure number in [0, 1].</param>
public readonly record struct HalfWidth(double Width, double Attained);
