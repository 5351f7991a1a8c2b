using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// The law of a sum of independent draws on one grid, without after-steps, by convolution: the error of a figure that is published as the
/// sum of its parts. Chances are right to 1e-14; what was trimmed from the tails (<see cref="LostMass"/>) counts as outside every range.
/// </summary>
public sealed record IntegerSum : LatticeLaw
{
    private readonly StepChances chances;

    // P(K ≤ First + i), and P(K ≥ First + i) added from the far end, so that both tails keep their digits.
    private readonly double[] upTo, from;

    private IntegerSum(IReadOnlyList<(LatticeLaw Law, int Count)> parts, double grid)
        : base(grid)
    {
        Parts = parts;
        var tail = 1e-17 / parts.Sum(part => (double)part.Count);
        chances = parts
            .Select(part => StepChances.Of(part.Law, tail).Times(part.Count, tail))
            .Aggregate((sum, part) => sum.Plus(part, tail));
        (upTo, from) = ([.. chances.Chances], [.. chances.Chances]);
        for (var i = 1; i < upTo.Length; i++)
            (upTo[i], from[^(i + 1)]) = (upTo[i] + upTo[i - 1], from[^(i + 1)] + from[^i]);
        Variance = parts.Sum(part => part.Count * part.Law.Variance);
        MeanAbsoluteDeviation = chances.Chances.Select((chance, i) => chance * Math.Abs(chances.First + i)).Sum() * grid;
    }

    /// <summary>The laws that are added, each with the number of its independent draws.</summary>
    public IReadOnlyList<(LatticeLaw Law, int Count)> Parts { get; }

    /// <summary>A bound on the chance of the steps left out, which count as outside every range; about 1e-15, and what a tabulated part
    /// lacks.</summary>
    public double LostMass => chances.Lost;

    /// <inheritdoc/>
    public override double Variance { get; }

    /// <inheritdoc/>
    public override double MeanAbsoluteDeviation { get; }

    // A sum of independent log-concave draws is log-concave.
    internal override bool IsLogConcave => Parts.All(part => part.Law.IsLogConcave);

    /// <summary>
    /// The law of a sum. One draw gives its own law, and discrete Gaussian draws of at least 4 grid steps are added in closed form: sigmas
    /// as the root of the sum of squares, which is right to 1e-60 (the pmf of such a sum is that of the discrete Gaussian times a theta
    /// function that differs from 1 by at most e^(−16π²) a draw; Canonne, Kamath &amp; Steinke 2020, section on sums; from memory, and by
    /// Poisson summation).
    /// </summary>
    /// <param name="parts">Laws on one grid, each with the number ≥ 1 of its independent draws.</param>
    /// <exception cref="ArgumentException">There is no part, a count is below 1, grids differ, or the sum is too wide to be worked
    /// out.</exception>
    public static LatticeLaw Of(params IEnumerable<(LatticeLaw Law, int Count)> parts)
    {
        var merged = Merged([.. parts]);
        if (merged.Count == 0 || merged.Any(part => part.Count < 1))
            throw new ArgumentException("A sum needs at least one part, and each at least one draw.", nameof(parts));
        var grid = merged[0].Law.Grid;
        if (merged.Any(part => part.Law.Grid != grid))
            throw new ArgumentException("The parts of a sum lie on different grids: the law of their sum is not worked out.", nameof(parts));
        return merged is [(var single, 1)] ? single : new IntegerSum(merged, grid);
    }

    /// <inheritdoc/>
    public override double Probability(long step) => IsInside(step) ? chances.Chances[step - chances.First] : 0;

    /// <inheritdoc/>
    public override double AtMostStep(long step) => step < chances.First ? 0 : IsInside(step) ? upTo[step - chances.First] : upTo[^1];

    /// <inheritdoc/>
    public override double AtLeastStep(long step) => step < chances.First ? from[0] : IsInside(step) ? from[step - chances.First] : 0;

    /// <inheritdoc/>
    public override double WithinSteps(long steps) => steps < 0 ? 0 : AtMostStep(steps) - AtMostStep(-steps - 1);

    /// <summary>Same grid, same parts in the same order.</summary>
    public bool Equals(IntegerSum? other) => other is not null && Grid.Equals(other.Grid) && Parts.SequenceEqual(other.Parts);

    /// <inheritdoc/>
    public override int GetHashCode() => Parts.Aggregate(Grid.GetHashCode(), HashCode.Combine);

    private protected override double TailFrom(long step) => AtLeastStep(step);

    private bool IsInside(long step) => step >= chances.First && step < chances.First + chances.Chances.Length;

    private static List<(LatticeLaw Law, int Count)> Merged(IReadOnlyList<(LatticeLaw Law, int Count)> parts)
    {
        var merged = parts.Where(part => !AddsClosed(part))
            .GroupBy(part => part.Law)
            .Select(same => (same.Key, same.Sum(part => part.Count)))
            .ToList();
        foreach (var grid in parts.Where(AddsClosed).GroupBy(part => part.Law.Grid))
        {
            var sigma = Math.Sqrt(grid.Sum(part => part.Count * Math.Pow(((DiscreteGaussianLaw)part.Law).Sigma, 2)));
            merged.Add((DiscreteGaussianLaw.Of(sigma, grid.Key), 1));
        }
        return merged;
    }

    private static bool AddsClosed((LatticeLaw Law, int Count) part) =>
        part is { Law: DiscreteGaussianLaw law, Count: >= 1 } && law.Sigma >= 4 * law.Grid;
}
