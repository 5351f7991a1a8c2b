using ReleaseKit.Noise;

namespace ReleaseKit.Privacy.Composition;

/// <summary>
/// The curve that follows from one (ε*, δ*) alone: δ* from ε* on, and below it the curve of the worst mechanism with that guarantee,
/// δ* + (1 − δ*)(e^ε* − e^ε) ÷ (e^ε* + 1). Kairouz, Oh &amp; Viswanath 2015, Theorem 2.1 (from memory).
/// </summary>
/// <param name="Loss">(ε*, δ*).</param>
public sealed record ApproximateCurve(ApproximateLoss Loss) : PrivacyCurve
{
    /// <summary>The curve of a pure loss.</summary>
    public static ApproximateCurve OfPure(Epsilon epsilon) => new(new ApproximateLoss(epsilon, Delta.Zero));

    /// <inheritdoc/>
    public override Epsilon LastUseful => Loss.Epsilon;

    /// <inheritdoc/>
    public override Delta DeltaAt(Epsilon epsilon)
    {
        if (epsilon >= Loss.Epsilon)
            return Loss.Delta;
        var excess = -Elementary.ExpM1(epsilon.Value - Loss.Epsilon.Value) / (1 + Math.Exp(-Loss.Epsilon.Value));
        return Delta.AtMost(Loss.Delta.Value + ((1 - Loss.Delta.Value) * excess));
    }

    /// <inheritdoc/>
    public override Epsilon EpsilonAt(Delta delta)
    {
        if (delta < Loss.Delta)
            return Epsilon.Infinite;
        var excess = (delta.Value - Loss.Delta.Value) / (1 - Loss.Delta.Value);
        var rest = 1 - (excess * (1 + Math.Exp(-Loss.Epsilon.Value)));
        return rest <= 0 ? Epsilon.Zero : Epsilon.Of(Math.Max(0, Loss.Epsilon.Value + Math.Log(rest)));
    }
}
