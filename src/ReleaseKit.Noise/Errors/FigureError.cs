using System.Collections.Concurrent;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// The error E = published − value before noise of one figure: a noise law and the steps that follow it. Immutable, shared by all figures alike,
/// safe between threads. Built once per distinct (law, steps).
/// </summary>
/// <remarks>
/// The decimals of a published file are a rounding too: for a continuous law append <c>new AfterStep.RoundTo(0.01)</c> for a file with two decimals.
/// </remarks>
public sealed class FigureError
{
    private readonly StepChain chain;
    private readonly RoundedError? rounded;
    private readonly ConcurrentDictionary<Coverage, HalfWidth> margins = new();

    private FigureError(NoiseLaw law, StepChain chain)
    {
        (Law, this.chain) = (law, chain);
        rounded = chain.ExactRounding is { } rounding ? new RoundedError((LatticeLaw)law, rounding) : null;
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
    /// <exception cref="ArgumentException">A bound is no multiple of the rounding unit before it, or a step has a value that makes no sense.</exception>
    public static FigureError Of(NoiseLaw law, params IReadOnlyList<AfterStep> steps) => new(law, StepChain.Of(law, steps));

    /// <summary>
    /// The smallest half-width that holds |E| at the coverage for every value before noise, without thresholds, and the coverage it attains at the
    /// worst one. 0 if the noise leaves the value as it was that often.
    /// </summary>
    public HalfWidth MarginAt(Coverage coverage) => margins.GetOrAdd(coverage, WorkOutMargin);

    /// <summary>The smallest P(|E| ≤ width) over all values before noise, without thresholds; a lower bound where the margin is an upper one.</summary>
    /// <param name="width">In the unit of the figure; below 0 gives 0.</param>
    public double AttainedAt(double width) => rounded is null
        ? Law.Within(width - chain.Shift)
        : rounded.AttainedAt(Lattice.ToStep(Lattice.Floor(width / chain.Unit)));

    /// <summary>The range of values before noise at a coverage for one published value.</summary>
    public ErrorRange RangeAt(double published, Coverage coverage, PossibleValues possible)
    {
        if (DependsOnPublished)
            throw new NotSupportedException("Ranges under a threshold follow with the next change.");
        var margin = MarginAt(coverage);
        var (low, high) = (published - margin.Width, published + margin.Width);
        return possible.Cut(low, high, margin.Attained);
    }

    /// <summary>The density or pmf of the noise at an offset from 0 ÷ its peak, in [0, 1]: the thickness of the error bar.</summary>
    /// <param name="offset">In the unit of the figure.</param>
    public double RelativeDensity(double offset) => Law.RelativeDensity(offset);

    private HalfWidth WorkOutMargin(Coverage coverage)
    {
        if (rounded is not null)
        {
            var steps = rounded.MarginAt(coverage);
            return new HalfWidth(steps * chain.Unit, rounded.AttainedAt(steps));
        }
        // |E| ≤ |N| + shift whatever the value before noise is, so the margin of N and the shift together hold E at least as often.
        var noise = Law.HalfWidthAt(coverage);
        return noise with { Width = noise.Width + chain.Shift };
    }
}
