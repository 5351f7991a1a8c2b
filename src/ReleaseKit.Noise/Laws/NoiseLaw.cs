namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The probability law of the noise N added to one cell, in the figure's unit. Immutable and safe to share between threads;
/// two laws of the same kind with the same parameters are equal. Every law is either a <see cref="LatticeLaw"/> or a <see cref="ContinuousLaw"/>.
/// </summary>
public abstract record NoiseLaw
{
    private protected NoiseLaw()
    {
    }

    /// <summary>Var(N), in the squared unit of the figure; finite for every law.</summary>
    public abstract double Variance { get; }

    /// <summary>E|N|, in the unit of the figure.</summary>
    public abstract double MeanAbsoluteDeviation { get; }

    /// <summary>P(N ≤ x), accurate to 1e-12 absolute (1e-12 relative where the law is closed).</summary>
    public abstract double AtMost(double x);

    /// <summary>P(|N| ≤ w); 0 for w &lt; 0.</summary>
    public abstract double Within(double w);

    /// <summary>
    /// The smallest w ≥ 0 with P(|N| ≤ w) ≥ c, and the coverage it attains. A lattice law answers with a multiple of its grid;
    /// the decision is taken at P ≥ c − 1e-12, so that a tie is decided alike everywhere.
    /// </summary>
    public abstract HalfWidth HalfWidthAt(Coverage coverage);
}
