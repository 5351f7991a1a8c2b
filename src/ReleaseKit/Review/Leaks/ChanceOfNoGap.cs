using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Leaks;

/// <summary>An upper bound on the chance that a total is, digit for digit, the sum of its parts, under the noise that is declared for them.</summary>
internal static class ChanceOfNoGap
{
    public static double Of(Measure measure, TotalAndParts rows, Func<int, FigureError?> errorOf)
    {
        int[] all = [rows.Total, .. rows.Parts];
        return Math.Min(OfOne(measure, all, errorOf), OfAll(measure, all, errorOf));
    }

    // Whatever the other figures are, each with noise of its own must come out as just the value that closes the gap.
    private static double OfOne(Measure measure, int[] rows, Func<int, FigureError?> errorOf) => rows
        .Where(row => measure.RuleAt(row) is NoiseRule.FromMechanism)
        .Select(row => errorOf(row)?.ChanceOfJust(measure.ValueAt(row).Times(measure.Multiplier).ToDouble()) ?? 1).DefaultIfEmpty(1).Min();

    // Noise that is symmetric and falls off to both sides adds up to noise that does: its likeliest value is 0.
    private static double OfAll(Measure measure, int[] rows, Func<int, FigureError?> errorOf)
    {
        var errors = rows.Where(row => measure.RuleAt(row) is NoiseRule.FromMechanism or NoiseRule.SumOver).Select(errorOf).ToList();
        if (errors.Count == 0 || errors.Exists(error => error is not { Steps.Count: 0, Law: LatticeLaw law } || !IsSymmetric(law)))
            return 1;
        var counted = errors.GroupBy(error => (LatticeLaw)error!.Law).ToDictionary(law => law.Key, law => law.Count());
        return new SumKey(counted).TryMakeLaw() is { } sum ? Math.Min(1, sum.Probability(0) + ((sum as IntegerSum)?.LostMass ?? 0)) : 1;
    }

    private static bool IsSymmetric(LatticeLaw law) => law switch
    {
        IntegerSum sum => sum.Parts.All(part => IsSymmetric(part.Law)),
        DiscreteLaplaceLaw or DiscreteGaussianLaw or DiscreteUniformLaw or TruncatedDiscreteLaplaceLaw => true,
        _ => false,
    };
}
