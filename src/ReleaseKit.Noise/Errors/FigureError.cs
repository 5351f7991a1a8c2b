using System.Collections.Concurrent;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// The error E = published − value before noise of one figure: a noise law and the steps that follow it. Immutable, shared by all figures
/// alike, safe between threads. Built once per distinct (law, steps).
/// </summary>
/// <remarks>
/// The decimals of a published file are a rounding too: for a continuous law append <c>new AfterStep.RoundTo(0.01)</c> for a file with two
/// decimals.
/// </remarks>
public sealed class FigureError
{
    // Values more grid steps than this from 0 are worked out anew each time, so that what is kept stays small.
    private const double MostKept = 10_000;

    private readonly StepChain chain;
    private readonly RoundedError? rounded;
    private readonly ThresholdRange? threshold;
    private readonly LikelihoodRatioRange? likelihood;
    private readonly ConcurrentDictionary<Coverage, HalfWidth> margins = new();

    // On a lattice the same few values come again and again near a threshold or below a bound; continuous ones seldom repeat and are not
    // kept.
    private readonly ConcurrentDictionary<(double Value, Coverage Coverage), (double Low, double High)> passedRanges = new();
    private readonly ConcurrentDictionary<(double Value, Coverage Coverage), (double Low, double High)> reaches = new();

    private FigureError(NoiseLaw law, StepChain chain)
    {
        (Law, this.chain) = (law, chain);
        rounded = chain.ExactRounding is { } rounding ? new RoundedError((LatticeLaw)law, rounding) : null;
        threshold = DependsOnPublished ? new ThresholdRange(law, chain) : null;
        likelihood = law.IsLogConcave ? new LikelihoodRatioRange(law) : null;
    }

    /// <summary>The law of the noise.</summary>
    public NoiseLaw Law { get; }

    /// <summary>The steps after the noise, in order.</summary>
    public IReadOnlyList<AfterStep> Steps => chain.Steps;

    /// <summary>Whether the range depends on the published value beyond a shift (thresholds).</summary>
    public bool DependsOnPublished => Steps.Any(step => step is AfterStep.ZeroBelow or AfterStep.PublishedFrom);

    /// <summary>
    /// Whether the margin is a proven upper bound rather than the smallest one: rounding of a continuous law, several roundings,
    /// or a rounding unit that is no whole number of grid steps or more than 10,000 of them.
    /// </summary>
    public bool MarginIsUpperBound => chain.Shift > 0;

    /// <summary>The error of a figure with this noise and these steps.</summary>
    /// <param name="law">The law of the noise.</param>
    /// <param name="steps">The steps in order; none for the noise alone.</param>
    /// <exception cref="ArgumentException">
    /// A step has a value that makes no sense; a bound stands before a rounding and is no multiple of its unit; or a threshold stands with
    /// steps or a law for which its range is not worked out. The message lists every fault.
    /// </exception>
    public static FigureError Of(NoiseLaw law, params IReadOnlyList<AfterStep> steps) => new(law, StepChain.Of(law, steps));

    /// <summary>
    /// The smallest half-width that holds |E| at the coverage for every value before noise, without thresholds, and the coverage it attains
    /// at the worst one. 0 if the noise leaves the value as it was that often.
    /// </summary>
    public HalfWidth MarginAt(Coverage coverage) => margins.GetOrAdd(coverage, WorkOutMargin);

    /// <summary>The smallest P(|E| ≤ width) over all values before noise, without thresholds; a lower bound where the margin is an upper
    /// one.</summary>
    /// <param name="width">In the unit of the figure; below 0 gives 0.</param>
    public double AttainedAt(double width) => rounded is null
        ? Law.Within(chain.NoiseThatStaysWithin(width))
        : rounded.AttainedAt(Lattice.ToStep(Lattice.Floor(width / chain.Unit)));

    /// <summary>
    /// The range of values before noise at a coverage for one published value, cut to the possible values and never empty.
    /// </summary>
    /// <remarks>
    /// Without thresholds: y ± margin. With a threshold: the law given that it was passed, inverted; so among the figures that passed
    /// it the range holds the value before noise at the coverage, whatever that value is; an end is infinite where the set has none. For a y
    /// outside what is possible the far end is the larger one of that and of the likelihood-ratio range (Feldman &amp; Cousins 1998). A 0 under <see cref="AfterStep.ZeroBelow"/> is
    /// answered by
    /// <see cref="RangeWhenNotPublished"/>.
    /// </remarks>
    /// <param name="published">In the unit of the figure.</param>
    /// <param name="coverage">The coverage.</param>
    /// <param name="possible">What the value before noise can be.</param>
    public ErrorRange RangeAt(double published, Coverage coverage, PossibleValues possible)
    {
        if (threshold is null)
            return PlainRange(published, coverage, possible);
        if (published == 0 && Steps.Any(step => step is AfterStep.ZeroBelow))
            return RangeWhenNotPublished(coverage, possible);
        var (low, high) = Kept(passedRanges, published, coverage, threshold.At);
        var reached = Math.Min(low, BelowHighest(published, coverage, possible));
        return possible.Cut(reached, Math.Max(high, BeyondLowest(published, coverage, possible)), coverage.Share) with
        {
            UncutLow = low,
            UncutHigh = high,
        };
    }

    /// <summary>
    /// The range of a cell that failed the threshold: every possible value up to the largest one that fails it with a chance above (1 −
    /// c)/2. A value above the range goes unpublished in at most (1 − c)/2 of the cases; that chance is what <c>Attained</c> leaves to 1.
    /// </summary>
    /// <exception cref="InvalidOperationException">The steps hold no threshold.</exception>
    public ErrorRange RangeWhenNotPublished(Coverage coverage, PossibleValues possible) => threshold is null
        ? throw new InvalidOperationException("No step of this figure keeps small values from being published.")
        : possible.Cut(double.NegativeInfinity, threshold.HighestBelow(coverage), 1 - coverage.Rest / 2);

    /// <summary>
    /// The largest chance, over all values before noise, that the range of what was published misses the value. Where only some figures are
    /// published it is the chance among those. Where small values are published as 0 it counts every case: a 0 misses above its end H, where
    /// at most β = (1 − c)/2 become 0, and the rest misses in at most 2β; up to H a 0 never misses. So it is at most β + (1 − β)·2β.
    /// </summary>
    public double MissesAtMost(Coverage coverage)
    {
        if (threshold is null)
            return 1 - MarginAt(coverage).Attained;
        var beta = coverage.Rest / 2;
        return Steps.Any(step => step is AfterStep.ZeroBelow) ? beta + (1 - beta) * coverage.Rest : coverage.Rest;
    }

    /// <summary>
    /// Whether the noise and the steps can lead to a published value from some possible value before noise: false for a value off the grid,
    /// off the rounding unit, past a bound, under a threshold, or farther from the possible values than the noise reaches.
    /// </summary>
    /// <param name="published">In the unit of the figure.</param>
    /// <param name="possible">What the value before noise can be.</param>
    public bool CanPublish(double published, PossibleValues possible) =>
        chain.IsOnSpacing(published) && chain.Reaching(published) < chain.Exceeding(published) && ChanceToReach(published, possible) > 0;

    /// <summary>
    /// The chance that the noise reaches a published value, or one still farther out, from the nearest possible value before noise: an upper
    /// bound, in [0, 1]. Near 1 for a published value that is itself possible; 0 where the noise has an end and the value lies beyond it.
    /// 1 for a value that the steps let no noise lead to (past a bound, under a threshold): that says nothing of the noise.
    /// </summary>
    /// <param name="published">In the unit of the figure.</param>
    /// <param name="possible">What the value before noise can be.</param>
    public double ChanceToReach(double published, PossibleValues possible)
    {
        var (from, beyond) = (chain.Reaching(published) * chain.Unit, chain.Exceeding(published) * chain.Unit);
        return from < beyond
            ? Math.Min(1, Math.Min(Law.AtLeast(from - chain.Blur - possible.Highest), Law.AtMost(beyond - chain.HalfStep - possible.Lowest)) + Unlisted)
            : 1;
    }

    /// <summary>
    /// The chance that just this value is published, whatever the value before noise: an upper bound, in [0, 1]. 1 at the bound of a floor, a
    /// ceiling or a threshold, where many noised values are published as one.
    /// </summary>
    /// <remarks>
    /// The noised values that are published so are a run of steps, or an interval. Of all runs as long, one about 0 holds the most of a law
    /// that falls off to both sides; a tabulated law may not, and there the largest chance of a step counts for each.
    /// </remarks>
    /// <param name="published">In the unit of the figure.</param>
    public double ChanceOfJust(double published)
    {
        var width = (chain.Exceeding(published) - chain.Reaching(published)) * chain.Unit + 2 * chain.Blur;
        if (!double.IsFinite(width))
            return 1;
        return Law is TabulatedLaw table
            ? Math.Min(1, Math.Ceiling(width / chain.Unit) * (double)table.Rows.Max(row => row.Probability) + Unlisted)
            : Math.Min(1, Law.Within(width / 2) + Unlisted);
    }

    /// <summary>The density or pmf of the noise at an offset from 0 ÷ its peak, in [0, 1]: the thickness of the error bar.</summary>
    /// <param name="offset">In the unit of the figure.</param>
    public double RelativeDensity(double offset) => Law.RelativeDensity(offset);

    // What the law does not say where it lies.
    private double Unlisted => Law switch
    {
        TabulatedLaw table => (double)table.MissingMass,
        IntegerSum sum => sum.LostMass,
        _ => 0,
    };

    private ErrorRange PlainRange(double published, Coverage coverage, PossibleValues possible)
    {
        var margin = MarginAt(coverage);
        var low = Math.Min(published - margin.Width, BelowHighest(published, coverage, possible));
        var high = Math.Max(published + margin.Width, BeyondLowest(published, coverage, possible));
        return possible.Cut(low, high, margin.Attained) with { UncutLow = published - margin.Width, UncutHigh = published + margin.Width };
    }

    // The upper end that a value below the lowest possible one needs at least: above that bound, so that a range of one value is never
    // shown.
    private double BeyondLowest(double published, Coverage coverage, PossibleValues possible) => published >= possible.Lowest
        ? double.NegativeInfinity
        : possible.Lowest + LikelyReach(published - possible.Lowest + chain.Lift, coverage);

    private double BelowHighest(double published, Coverage coverage, PossibleValues possible) => published <= possible.Highest
        ? double.PositiveInfinity
        : possible.Highest - LikelyReach(possible.Highest - published + chain.Fall, coverage);

    // How far from a bound at 0 the likelihood-ratio range reaches for a value on its wrong side; the plain margin where that is not worked
    // out.
    private double LikelyReach(double value, Coverage coverage)
    {
        var reach = likelihood is null ? double.NaN : Kept(reaches, value, coverage, (v, c) => (0, likelihood.UpperEnd(v, 0, c))).High;
        return Math.Max(double.IsNaN(reach) ? MarginAt(coverage).Width : reach, Law is LatticeLaw ? chain.Unit : 0);
    }

    private (double Low, double High) Kept(
        ConcurrentDictionary<(double Value, Coverage Coverage), (double Low, double High)> known,
        double value,
        Coverage coverage,
        Func<double, Coverage, (double, double)> workOut) => Law is LatticeLaw && Math.Abs(value) <= MostKept * chain.Unit
            ? known.GetOrAdd((value, coverage), key => workOut(key.Value, key.Coverage))
            : workOut(value, coverage);

    private HalfWidth WorkOutMargin(Coverage coverage)
    {
        if (rounded is not null)
        {
            var steps = rounded.MarginAt(coverage);
            return new HalfWidth(steps * chain.Unit, rounded.AttainedAt(steps));
        }
        // |E| ≤ |N| + shift whatever the value before noise is, so the margin of N and the shift together hold E at least as often.
        var noise = Law.HalfWidthAt(coverage);
        return noise with { Width = chain.OnSpacing(noise.Width + chain.Shift) };
    }
}
