namespace ReleaseKit.Noise.Laws;

/// <summary>A noise law with a density on the real line, symmetric about 0.</summary>
public abstract record ContinuousLaw : NoiseLaw
{
    private protected ContinuousLaw()
    {
    }

    /// <summary>The density at x, per unit of the figure.</summary>
    public abstract double Density(double x);
}
