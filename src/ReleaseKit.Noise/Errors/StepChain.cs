using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>The steps after the noise, checked against each other and against the law, as one rising function of the noised value.</summary>
internal sealed class StepChain
{
    /// <summary>Rounding to more grid steps than this is bounded, not worked out remainder by remainder.</summary>
    private const double LargestExactUnit = 10_000;

    private readonly List<AfterStep.RoundTo> roundings;

    private StepChain(NoiseLaw law, IReadOnlyList<AfterStep> steps)
    {
        Steps = [.. steps];
        Unit = (law as LatticeLaw)?.Grid ?? 1;
        roundings = [.. EffectiveRoundings(law, steps)];
        ExactRounding = law is LatticeLaw && roundings is [var only] ? Whole(only) : null;
        Shift = ExactRounding is null ? roundings.Sum(rounding => rounding.How is RoundingHow.Nearest ? rounding.Unit / 2 : rounding.Unit) : 0;
    }

    /// <summary>The steps in order.</summary>
    public IReadOnlyList<AfterStep> Steps { get; }

    /// <summary>The grid of a lattice law, 1 for a continuous one.</summary>
    public double Unit { get; }

    /// <summary>The one rounding of a lattice law to a whole number of its steps; null if there is none or it is bounded by <see cref="Shift"/>.</summary>
    public Rounding? ExactRounding { get; }

    /// <summary>
    /// How far rounding can move a value, in the figure's unit; 0 where it is worked out exactly. Rounding to the nearest multiple of r moves a
    /// value by at most r/2, any other rounding by less than r; several add up. So |E| ≤ |N| + shift for every value before noise.
    /// </summary>
    public double Shift { get; }

    public static StepChain Of(NoiseLaw law, IReadOnlyList<AfterStep> steps)
    {
        return new StepChain(law, steps);
    }

    // A rounding changes nothing where all values before it are multiples of its unit: on a grid, or after a coarser rounding.
    private static IEnumerable<AfterStep.RoundTo> EffectiveRoundings(NoiseLaw law, IReadOnlyList<AfterStep> steps)
    {
        var finest = (law as LatticeLaw)?.Grid ?? 0;
        foreach (var rounding in steps.OfType<AfterStep.RoundTo>())
        {
            if (finest > 0 && Lattice.IsWhole(finest / rounding.Unit))
                continue;
            finest = rounding.Unit;
            yield return rounding;
        }
    }

    private Rounding? Whole(AfterStep.RoundTo rounding)
    {
        var quotient = rounding.Unit / Unit;
        return quotient <= LargestExactUnit && Lattice.IsWhole(quotient)
            ? new Rounding((long)Math.Round(quotient), rounding.How, rounding.Ties)
            : null;
    }
}
