using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// The error E = published − value before noise of one figure: a noise law and the steps that follow it. Immutable, shared by all figures alike,
/// safe between threads. Built once per distinct (law, steps).
/// </summary>
public sealed class FigureError
{
    private FigureError(NoiseLaw law, IReadOnlyList<AfterStep> steps) => (Law, Steps) = (law, steps);

    /// <summary>The law of the noise.</summary>
    public NoiseLaw Law { get; }

    /// <summary>The steps after the noise, in order.</summary>
    public IReadOnlyList<AfterStep> Steps { get; }

    /// <summary>Whether the range depends on the published value beyond a shift (thresholds).</summary>
    public bool DependsOnPublished => Steps.Any(step => step is AfterStep.ZeroBelow or AfterStep.PublishedFrom);

    /// <summary>The error of a figure with this noise and these steps.</summary>
    /// <exception cref="ArgumentException">A bound is no multiple of the rounding unit before it, or a step has a value that makes no sense.</exception>
    public static FigureError Of(NoiseLaw law, params IReadOnlyList<AfterStep> steps) => new(law, steps);

    /// <summary>The smallest half-width that holds |E| at the coverage for every value before noise, without thresholds.</summary>
    public HalfWidth MarginAt(Coverage coverage) => throw new NotSupportedException();

    /// <summary>The range of values before noise at a coverage for one published value.</summary>
    public ErrorRange RangeAt(double published, Coverage coverage, PossibleValues possible) => throw new NotSupportedException();

    /// <summary>The density or pmf of the noise at an offset from 0 ÷ its peak, in [0, 1]: the thickness of the error bar.</summary>
    public double RelativeDensity(double offset) => throw new NotSupportedException();
}
