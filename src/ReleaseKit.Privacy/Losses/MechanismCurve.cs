using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Losses;

/// <summary>The curve of one mechanism alone: the upper bound of <see cref="MechanismLoss.DeltaAt"/>.</summary>
/// <param name="Loss">What the mechanism spends.</param>
public sealed record MechanismCurve(MechanismLoss Loss) : PrivacyCurve
{
    private static readonly Delta Negligible = Delta.Of(1e-18);

    /// <inheritdoc/>
    public override Epsilon LastUseful => EpsilonAt(Negligible);

    /// <inheritdoc/>
    public override Delta DeltaAt(Epsilon epsilon) => Loss.DeltaAt(epsilon).Upper;

    /// <inheritdoc/>
    public override Epsilon EpsilonAt(Delta delta) => Loss.EpsilonAt(delta).Upper;
}
