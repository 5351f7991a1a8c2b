namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The discrete Laplace law held to −A..A and renormalised: P(K = k) = a^|k|·(1 − a)/(1 + a − 2a^(A+1)) with a = e^(−1/t), t = scale ÷
/// grid, A = cutoff ÷ grid. Derived from the law of Ghosh, Roughgarden &amp; Sundararajan 2012 by conditioning on |K| ≤ A.
/// </summary>
public sealed record TruncatedDiscreteLaplaceLaw : LatticeLaw
{
    private readonly long farthest;
    private readonly double drop, whole;

    private TruncatedDiscreteLaplaceLaw(double scale, double cutoff, double grid)
        : base(grid)
    {
        (Scale, Cutoff, farthest) = (scale, cutoff, Require.WholeSteps(cutoff, grid, nameof(cutoff)));
        drop = Fall(1);
        // 1 + a − 2a^(A+1), written so that nothing cancels when the scale is far above the cutoff.
        whole = Fall(farthest + 1) + Power(1) * Fall(farthest);
        (MeanAbsoluteDeviation, Variance) = Moments();
    }

    /// <summary>The scale &gt; 0 before the cut, in the unit of the figure.</summary>
    public double Scale { get; }

    /// <summary>The largest noise ≥ 0, a multiple of the grid, in the unit of the figure.</summary>
    public double Cutoff { get; }

    /// <inheritdoc/>
    public override double Variance { get; }

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation { get; }

    internal override bool IsLogConcave => true;

    /// <summary>The law with a scale and a cutoff on a grid.</summary>
    /// <param name="scale">&gt; 0, finite, in the unit of the figure.</param>
    /// <param name="cutoff">≥ 0, a multiple of the grid, at most 2⁵² steps, in the unit of the figure.</param>
    /// <param name="grid">g &gt; 0, finite, in the unit of the figure.</param>
    /// <exception cref="ArgumentOutOfRangeException">A parameter is outside its range.</exception>
    public static TruncatedDiscreteLaplaceLaw Of(double scale, double cutoff, double grid = 1) =>
        new(Require.Positive(scale, nameof(scale), "the unit of the figure"), cutoff, grid);

    /// <inheritdoc/>
    public override double Probability(long step) =>
        step >= -farthest && step <= farthest ? Power(Math.Abs((double)step)) * drop / whole : 0;

    private protected override double TailFrom(long step) => step > farthest ? 0 : Power(step) * Fall(farthest - step + 1) / whole;

    // Σ k·a^k and Σ k²·a^k over 1..A by doubling the number of terms, all of them positive, so that no digits are lost for any scale and
    // cutoff.
    private (double MeanAbsolute, double Variance) Moments()
    {
        var (n, s0, s1, s2) = (0L, 0.0, 0.0, 0.0);
        for (var bit = 52; bit >= 0; bit--)
        {
            var shift = Power(n);
            (s2, s1, s0) = (s2 + shift * (s2 + 2.0 * n * s1 + (double)n * n * s0), s1 + shift * (s1 + n * s0), s0 + shift * s0);
            n *= 2;
            if ((farthest >> bit & 1) == 0)
                continue;
            n++;
            var last = Power(n);
            (s0, s1, s2) = (s0 + last, s1 + n * last, s2 + (double)n * n * last);
        }
        return (2 * s1 * drop / whole * Grid, 2 * s2 * drop / whole * Grid * Grid);
    }

    private double Power(double exponent) => Math.Exp(-exponent * (Grid / Scale));

    // 1 − a^exponent.
    private double Fall(double exponent) => -Elementary.ExpM1(-exponent * (Grid / Scale));
}
