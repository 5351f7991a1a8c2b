using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Review.Leaks;

/// <summary>The exact law of the sum of independent errors, whatever their signs.</summary>
internal static class GapLaw
{
    /// <summary>Null where it cannot be worked out: errors that are not known, have after-steps, lie on no one grid or are not symmetric.</summary>
    public static LatticeLaw? Of(IReadOnlyList<FigureError?> errors)
    {
        if (errors.Count == 0 || errors.Any(error => error is not { Steps.Count: 0, Law: LatticeLaw law } || !IsSymmetric(law)))
            return null;
        return new SumKey(errors.GroupBy(error => (LatticeLaw)error!.Law).ToDictionary(law => law.Key, law => law.Count())).TryMakeLaw();
    }

    /// <summary>What the law does not say where it lies.</summary>
    public static double Lost(LatticeLaw law) => (law as IntegerSum)?.LostMass ?? 0;

    private static bool IsSymmetric(LatticeLaw law) => law switch
    {
        IntegerSum sum => sum.Parts.All(part => IsSymmetric(part.Law)),
        DiscreteLaplaceLaw or DiscreteGaussianLaw or DiscreteUniformLaw or TruncatedDiscreteLaplaceLaw => true,
        _ => false,
    };
}
