namespace ReleaseKit.Privacy.Composition;

/// <summary>A guarantee as a curve: for each ε ≥ 0 a δ such that (ε, δ)-differential privacy holds. Never rising in ε. Immutable.</summary>
public abstract record PrivacyCurve
{
    private protected PrivacyCurve()
    {
    }

    /// <summary>The ε beyond which δ falls no further, or is below 1e-18.</summary>
    public abstract Epsilon LastUseful { get; }

    /// <summary>δ(ε), an upper bound.</summary>
    public abstract Delta DeltaAt(Epsilon epsilon);

    /// <summary>The smallest ε ≥ 0 with δ(ε) ≤ δ; infinite if there is none.</summary>
    public abstract Epsilon EpsilonAt(Delta delta);
}
