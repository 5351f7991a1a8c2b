namespace ReleaseKit.Privacy;

/// <summary>A loss as (ε, δ)-differential privacy; pure where δ = 0.</summary>
/// <param name="Epsilon">ε.</param>
/// <param name="Delta">δ.</param>
public readonly record struct ApproximateLoss(Epsilon Epsilon, Delta Delta);
