using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// The steps after the noise, checked against each other and against the law, as one function of the noised value. Every step rises with
/// the value (a value that is not published counts as the lowest), so "published at least y" is the same as "noised at least t(y)".
/// </summary>
internal sealed class StepChain
{
    /// <summary>Rounding to more grid steps than this is bounded, not worked out remainder by remainder.</summary>
    public const double LargestExactUnit = 10_000;

    private readonly NoiseLaw law;
    private readonly IReadOnlyList<AfterStep.RoundTo> roundings;

    private StepChain(NoiseLaw law, IReadOnlyList<AfterStep> steps)
    {
        (this.law, Steps) = (law, [.. steps]);
        Unit = (law as LatticeLaw)?.Grid ?? 1;
        roundings = [.. EffectiveRoundings(law, steps)];
        ExactRounding = law is LatticeLaw lattice && roundings is [var only] && IsExact(only, lattice) ? Exactly(only) : null;
        Shift = ExactRounding is null ? roundings.Sum(rounding => Farthest(rounding, 1)) : 0;
        Lift = roundings.Sum(rounding => Farthest(rounding, rounding.How is RoundingHow.Up ? 0 : 1));
        Fall = roundings.Sum(rounding => Farthest(rounding, rounding.How is RoundingHow.Down ? 0 : 1));
        Blur = roundings.Where(rounding => rounding.How is RoundingHow.AtRandom).Sum(rounding => rounding.Unit);
    }

    /// <summary>The steps in order.</summary>
    public IReadOnlyList<AfterStep> Steps { get; }

    /// <summary>The grid of a lattice law, 1 for a continuous one.</summary>
    public double Unit { get; }

    /// <summary>Half a grid step of a lattice law, 0 for a continuous one: what a strict bound stands off.</summary>
    public double HalfStep => law is LatticeLaw ? Unit / 2 : 0;

    /// <summary>The one rounding of a lattice law to a whole number of its steps; null if there is none or it is bounded by
    /// <see cref="Shift"/>.</summary>
    public Rounding? ExactRounding { get; }

    /// <summary>
    /// How far rounding can move a value, in the figure's unit; 0 where it is worked out exactly. Rounding to the nearest multiple of r
    /// moves a value by at most r/2, any other rounding by less than r; several add up. So |E| ≤ |N| + shift for every value before noise.
    /// </summary>
    public double Shift { get; }

    /// <summary>How far above the published value the noised one can lie because of rounding, in the figure's unit.</summary>
    public double Lift { get; }

    /// <summary>How far below the published value the noised one can lie because of rounding, in the figure's unit.</summary>
    public double Fall { get; }

    /// <summary>The part of <see cref="Fall"/> that <see cref="Reaching(double)"/> does not know of: that of random rounding.</summary>
    public double Blur { get; }

    public static StepChain Of(NoiseLaw law, IReadOnlyList<AfterStep> steps)
    {
        StepRules.Check(law, steps);
        return new StepChain(law, steps);
    }

    /// <summary>A rounding changes nothing where all values before it are multiples of its unit: on a grid, or after a coarser
    /// rounding.</summary>
    public static IEnumerable<AfterStep.RoundTo> EffectiveRoundings(NoiseLaw law, IReadOnlyList<AfterStep> steps)
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

    public static bool IsExact(AfterStep.RoundTo rounding, LatticeLaw law) =>
        rounding.Unit / law.Grid <= LargestExactUnit && Lattice.IsWhole(rounding.Unit / law.Grid);

    /// <summary>
    /// The smallest noised value whose published value is at least the given one; ± ∞ if all are, or none. In steps of the grid for a
    /// lattice law, in the figure's unit for a continuous one (there the place may itself belong to either side, which has no chance of
    /// happening).
    /// </summary>
    public double Reaching(double published) => Reaching(published, Steps.Count);

    /// <summary>The smallest noised value whose published value is above the given one; as <see cref="Reaching(double)"/>.</summary>
    public double Exceeding(double published)
    {
        var bounds = Steps.Select(StepRules.BoundOf).OfType<double>().Where(bound => bound > published);
        return Reaching(bounds.Prepend(NextAbove(published)).Min());
    }

    /// <summary>The smallest noised value that passes the threshold among the steps.</summary>
    public double Passing()
    {
        var place = Steps.Index().First(step => StepRules.ThresholdOf(step.Item) is not null).Index;
        return Steps[place] is AfterStep.PublishedFrom from ? Reaching(from.Threshold, place) : Exceeding(0);
    }

    /// <summary>Whether a value is a multiple of the grid or of the last rounding unit, or a bound.</summary>
    public bool IsOnSpacing(double published) =>
        Spacing == 0 || Lattice.IsWhole(published / Spacing) || Steps.Any(step => StepRules.BoundOf(step) == published);

    /// <summary>
    /// The largest half-width that published values can differ by from values on the grid within a given one: a whole number of grid steps
    /// where a lattice law is rounded to a whole number of them. In the figure's unit.
    /// </summary>
    public double OnSpacing(double width) => IsOnGrid ? Lattice.Floor(width / Unit) * Unit : width;

    /// <summary>So far the noise alone can reach, in the figure's unit, if rounding on top of it must keep the error within a
    /// half-width.</summary>
    public double NoiseThatStaysWithin(double width) =>
        IsOnGrid ? (Lattice.Ceiling(Lattice.Floor(width / Unit) + 1 - Shift / Unit) - 1) * Unit : width - Shift;

    private bool IsOnGrid => law is LatticeLaw && roundings.All(rounding => Lattice.IsWhole(rounding.Unit / Unit));

    private double Spacing => roundings.Count > 0 ? roundings[^1].Unit : law is LatticeLaw ? Unit : 0;

    private double Reaching(double target, int count)
    {
        for (var i = count - 1; i >= 0; i--)
            target = Before(Steps[i], target);
        return law is LatticeLaw ? Lattice.Ceiling(target / Unit) : target;
    }

    // The smallest value before a step that the step takes to the target or higher.
    private double Before(AfterStep step, double target) => step switch
    {
        AfterStep.NotBelow lower => target <= lower.Bound ? double.NegativeInfinity : target,
        AfterStep.NotAbove upper => target > upper.Bound ? double.PositiveInfinity : target,
        AfterStep.ZeroBelow zero => target <= 0 ? double.NegativeInfinity : Math.Max(target, zero.Threshold),
        AfterStep.PublishedFrom from => Math.Max(target, from.Threshold),
        AfterStep.RoundTo rounding when roundings.Contains(rounding) && double.IsFinite(target) => BeforeRounding(rounding, target),
        _ => target,
    };

    private double BeforeRounding(AfterStep.RoundTo rounding, double target)
    {
        var number = Lattice.Ceiling(target / rounding.Unit);
        if (ExactRounding is { } exact)
            return exact.First(Lattice.ToStep(number)) * Unit;
        // The multiple below is not itself rounded up to the target; that counts where a threshold before the rounding heaps values on it.
        if (rounding.How is RoundingHow.Up)
            return Math.BitIncrement((number - 1) * rounding.Unit);
        return (number - (rounding.How is RoundingHow.Nearest ? 0.5 : 0)) * rounding.Unit;
    }

    private double NextAbove(double published) =>
        Spacing > 0 ? (Lattice.Floor(published / Spacing) + 1) * Spacing : Math.BitIncrement(published);

    private static double Farthest(AfterStep.RoundTo rounding, double units) =>
        rounding.How is RoundingHow.Nearest ? rounding.Unit / 2 : rounding.Unit * units;

    private Rounding Exactly(AfterStep.RoundTo rounding) => new((long)Math.Round(rounding.Unit / Unit), rounding.How, rounding.Ties);
}
