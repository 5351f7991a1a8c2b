namespace ReleaseKit.Noise.Laws;

/// <summary>
/// The discrete uniform law on −H..H with H = half-width ÷ grid: P(K = k) = 1/(2H + 1). P(|K| ≤ s) = (2s + 1)/(2H + 1). Textbook.
/// </summary>
public sealed record DiscreteUniformLaw : LatticeLaw
{
    private readonly long farthest;

    private DiscreteUniformLaw(double halfWidth, double grid)
        : base(grid) => (HalfWidth, farthest) = (halfWidth, Require.WholeSteps(halfWidth, grid, nameof(halfWidth)));

    /// <summary>The half-width ≥ 0, a multiple of the grid, in the unit of the figure.</summary>
    public double HalfWidth { get; }

    /// <inheritdoc/>
    public override double Variance => farthest * (farthest + 1.0) / 3 * Grid * Grid;

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation => farthest * (farthest + 1.0) / Count * Grid;

    internal override bool IsLogConcave => true;

    private double Count => 2.0 * farthest + 1;

    /// <summary>The law with a half-width on a grid.</summary>
    /// <param name="halfWidth">≥ 0, a multiple of the grid, at most 2⁵² steps, in the unit of the figure.</param>
    /// <param name="grid">g &gt; 0, finite, in the unit of the figure.</param>
    /// <exception cref="ArgumentOutOfRangeException">A parameter is outside its range.</exception>
    public static DiscreteUniformLaw Of(double halfWidth, double grid = 1) => new(halfWidth, grid);

    /// <inheritdoc/>
    public override double Probability(long step) => step >= -farthest && step <= farthest ? 1 / Count : 0;

    /// <inheritdoc/>
    public override double WithinSteps(long steps) => steps < 0 ? 0 : (2.0 * Math.Min(steps, farthest) + 1) / Count;

    private protected override double TailFrom(long step) => Math.Max(0, farthest - step + 1) / Count;
}
