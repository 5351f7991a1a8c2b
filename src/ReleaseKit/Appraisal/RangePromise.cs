using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>What the coverage of a range is a promise about.</summary>
public enum RangePromise
{
    /// <summary>Every figure.</summary>
    Every,

    /// <summary>The figures that were published at all, from a threshold up.</summary>
    AmongPublished,

    /// <summary>The figures that were not published as 0 for being small.</summary>
    AmongNotZero,

    /// <summary>A 0 that stands for small values: how rarely a larger value than its range has becomes 0.</summary>
    ZeroForSmall,
}

/// <summary>Finds what a promise is about.</summary>
public static class RangePromises
{
    public static RangePromise Of(FigureError error, bool isZero)
    {
        if (error.Steps.Any(step => step is AfterStep.ZeroBelow))
            return isZero ? RangePromise.ZeroForSmall : RangePromise.AmongNotZero;
        return error.DependsOnPublished ? RangePromise.AmongPublished : RangePromise.Every;
    }

    /// <summary>The promise that holds for all figures of a measure that are not zeros for small values.</summary>
    public static RangePromise Of(Measure measure)
    {
        if (measure.Rules.OfType<NoiseRule.FromMechanism>().Any(rule => rule.Mechanism.Afterwards.Any(step => step is AfterStep.ZeroBelow)))
            return RangePromise.AmongNotZero;
        return measure.PublishedFrom is null ? RangePromise.Every : RangePromise.AmongPublished;
    }
}
