using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>The rounding that continuous noise always has: to the decimals that its figures are written with in the file.</summary>
internal static class FileRounding
{
    public static bool IsContinuous(LawName law) => law is LawName.Laplace or LawName.Gaussian or LawName.Uniform or LawName.Staircase;

    /// <summary>Its step in the figure's unit; null where a declared rounding leaves nothing that so many decimals would lose.</summary>
    public static double? Step(Mechanism mechanism, Measure measure, byte decimals) =>
        mechanism.Afterwards.OfType<AfterStep.RoundTo>().Any(step => IsMultiple(step.Unit, decimals, measure.Multiplier))
            ? null
            : measure.Multiplier / PublishedValue.PowerOfTen(decimals);

    /// <summary>The steps of all figures that carry the noise of a mechanism, the smallest first; none for noise in whole steps of a grid.</summary>
    public static IReadOnlyList<double> Steps(Release release, Mechanism mechanism) => IsContinuous(mechanism.Law)
        ? [.. MechanismRows.Of(release, mechanism).SelectMany(rows => StepsOf(mechanism, rows)).Distinct().Order()]
        : [];

    private static IEnumerable<double> StepsOf(Mechanism mechanism, MechanismRows rows) => rows.Rows.Where(rows.Measure.HasNumber)
        .Select(row => rows.Measure.DecimalsOf[row]).Distinct().Select(decimals => Step(mechanism, rows.Measure, decimals)).OfType<double>();

    /// <summary>A value rounded to such a unit is written in so many decimals without loss.</summary>
    private static bool IsMultiple(double unit, byte decimals, double multiplier)
    {
        var last = (decimal)unit / (decimal)multiplier * (decimal)PublishedValue.PowerOfTen(decimals);
        return decimal.Floor(last) == last;
    }
}
