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

    /// <summary>
    /// By rule of a measure, the most decimals that a figure of it is written with; null where none has a number. A program that drops zeros at the end
    /// writes 0 for 0.00, so that one figure does not show how it was rounded.
    /// </summary>
    public static IReadOnlyList<byte?> DecimalsByRule(Measure measure)
    {
        var most = new byte?[measure.Rules.Count];
        for (var row = 0; row < measure.RuleOf.Length; row++)
        {
            if (measure.HasNumber(row) && !(measure.DecimalsOf[row] <= most[measure.RuleOf[row]]))
                most[measure.RuleOf[row]] = measure.DecimalsOf[row];
        }

        return most;
    }

    /// <summary>The steps of all figures that carry the noise of a mechanism, the smallest first; none for noise in whole steps of a grid.</summary>
    public static IReadOnlyList<double> Steps(Release release, Mechanism mechanism) => IsContinuous(mechanism.Law)
        ? [.. MechanismRows.Of(release, mechanism).SelectMany(rows => StepsOf(mechanism, rows)).Distinct().Order()]
        : [];

    private static IEnumerable<double> StepsOf(Mechanism mechanism, MechanismRows rows)
    {
        var decimals = DecimalsByRule(rows.Measure);
        return rows.Rows.Where(rows.Measure.HasNumber).Select(row => decimals[rows.Measure.RuleOf[row]]).OfType<byte>().Distinct()
            .Select(most => Step(mechanism, rows.Measure, most)).OfType<double>();
    }

    /// <summary>A value rounded to such a unit is written in so many decimals without loss.</summary>
    private static bool IsMultiple(double unit, byte decimals, double multiplier)
    {
        var last = (decimal)unit / (decimal)multiplier * (decimal)PublishedValue.PowerOfTen(decimals);
        return decimal.Floor(last) == last;
    }
}
