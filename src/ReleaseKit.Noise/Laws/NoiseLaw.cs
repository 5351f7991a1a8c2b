namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The probability law of the noise N added to one cell, in the figure's unit. Immutable and safe to share between threads;
/// two laws of the same kind with the same parameters are equal. Every law is either a <see cref="LatticeLaw"/> or a
/// <see cref="ContinuousLaw"/>.
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

    /// <summary>
    /// Whether the logarithm of the density or pmf is concave, so that the chance of a value given that a threshold was passed moves one
    /// way only as the value before noise moves.
    /// </summary>
    internal abstract bool IsLogConcave { get; }

    /// <summary>P(N ≤ x), accurate to 1e-12 absolute (1e-12 relative where the law is closed).</summary>
    /// <param name="x">In the unit of the figure; ± ∞ allowed.</param>
    public abstract double AtMost(double x);

    /// <summary>P(N ≥ x), as accurate as <see cref="AtMost"/>.</summary>
    /// <param name="x">In the unit of the figure; ± ∞ allowed.</param>
    public abstract double AtLeast(double x);

    /// <summary>P(|N| ≤ w); 0 for w &lt; 0.</summary>
    /// <param name="w">In the unit of the figure; + ∞ allowed.</param>
    public abstract double Within(double w);

    /// <summary>
    /// The smallest w ≥ 0 with P(|N| ≤ w) ≥ c, and the coverage it attains. A lattice law answers with a multiple of its grid;
    /// the decision is taken at P ≥ c − 1e-12, so that a tie is decided alike everywhere.
    /// </summary>
    /// <exception cref="ArgumentOutOfRangeException">A tabulated law lacks so much mass that no half-width reaches the
    /// coverage.</exception>
    public abstract HalfWidth HalfWidthAt(Coverage coverage);

    /// <summary>The density or pmf at an offset ÷ its largest value, in [0, 1]; a lattice law is drawn at the nearest step.</summary>
    /// <param name="offset">In the unit of the figure.</param>
    public abstract double RelativeDensity(double offset);

    /// <summary>
    /// P(N ≥ from + distance) ÷ P(N ≥ from), also where both chances are too small for a double; NaN where the noise does not reach so far.
    /// Both in steps for a lattice law, in the unit of the figure for a continuous one.
    /// </summary>
    internal abstract double TailRatio(double from, double distance);

    /// <summary>What <see cref="TailRatio"/> tends to as the place goes to ∞; 0 for noise that ends somewhere.</summary>
    internal virtual double TailRatioFarOut(double distance) => 0;
}
