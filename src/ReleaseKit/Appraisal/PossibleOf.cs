using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>What the values before noise of a measure can be: what its kind allows, narrowed by the public bounds the release declares.</summary>
public static class PossibleOf
{
    public static PossibleValues Measure(Measure measure)
    {
        var (lowest, highest) = OfKind(measure);
        return new(
            Math.Max(lowest, measure.Lowest ?? double.NegativeInfinity),
            Math.Min(highest, measure.Highest ?? double.PositiveInfinity),
            measure.Kind == MeasureKind.Count);
    }

    /// <summary>The bounds that the kind alone sets.</summary>
    internal static (double Lowest, double Highest) OfKind(Measure measure) => measure.Kind switch
    {
        MeasureKind.Count or MeasureKind.Estimate => (0, double.PositiveInfinity),
        MeasureKind.Share => (0, measure.InOnes ? 1 : 100),
        _ => (double.NegativeInfinity, double.PositiveInfinity),
    };
}
