using ReleaseKit.Noise.Errors;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Leaks;

/// <summary>An upper bound on the chance that a total is, digit for digit, the sum of its parts, under the noise that is declared for them.</summary>
internal static class ChanceOfNoGap
{
    public static double Of(Measure measure, TotalAndParts rows, Func<int, FigureError?> errorOf) =>
        Math.Min(OfOne(measure, [rows.Total, .. rows.Parts], errorOf), OfAll(measure, rows, errorOf));

    // Whatever the other figures are, each with noise of its own must come out as just the value that closes the gap.
    private static double OfOne(Measure measure, int[] rows, Func<int, FigureError?> errorOf) => rows
        .Where(row => measure.RuleAt(row) is NoiseRule.FromMechanism)
        .Select(row => errorOf(row)?.ChanceOfJust(measure.ValueAt(row).Times(measure.Multiplier).ToDouble()) ?? 1).DefaultIfEmpty(1).Min();

    // Noise that is symmetric and falls off to both sides adds up to noise that does: its likeliest value is 0.
    private static double OfAll(Measure measure, TotalAndParts rows, Func<int, FigureError?> errorOf) =>
        GapLaw.Of(Gap.ErrorsOf(measure, rows, errorOf)) is { } law ? Math.Min(1, law.Probability(0) + GapLaw.Lost(law)) : 1;
}
