namespace ReleaseKit.Privacy.Composition;

/// <summary>The curve of a concentrated loss ρ by the tighter conversion, <see cref="ConcentratedConversion"/>.</summary>
/// <param name="Rho">ρ.</param>
public sealed record ConcentratedCurve(Rho Rho) : PrivacyCurve
{
    private static readonly Delta Negligible = Delta.Of(1e-18);

    /// <inheritdoc/>
    public override Epsilon LastUseful => EpsilonAt(Negligible);

    /// <inheritdoc/>
    public override Delta DeltaAt(Epsilon epsilon) => ConcentratedConversion.DeltaAt(Rho, epsilon);

    /// <inheritdoc/>
    public override Epsilon EpsilonAt(Delta delta) => ConcentratedConversion.EpsilonAt(Rho, delta);
}
