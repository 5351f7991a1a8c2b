using ReleaseKit.Noise.Errors;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Leaks;

/// <summary>A total less the sum of its parts, in the figure's unit, and an upper bound on the chance that the declared noise makes so wide a gap.</summary>
internal sealed record Gap(TotalAndParts Rows, double Width, string Sum, double Chance)
{
    // A chance below this is taken for none.
    private const double Unlikely = 1e-9;

    public bool IsTooWide => Chance < Unlikely;

    public static Gap Of(Measure measure, TotalAndParts rows, Func<int, FigureError?> errorOf)
    {
        var sum = ExactSum.Of(rows.Parts.Select(measure.ValueAt));
        var less = ExactSum.Of([measure.ValueAt(rows.Total)]).Less(sum);
        var width = Math.Abs((double)less.Unscaled) / PublishedValue.PowerOfTen(less.Decimals) * measure.Multiplier;
        return new Gap(rows, width, sum.ToString(), width == 0 ? 1 : ChanceOfGap.Of(ErrorsOf(measure, rows, errorOf), width));
    }

    /// <summary>The errors of all figures with noise, the total and its parts.</summary>
    public static IReadOnlyList<FigureError?> ErrorsOf(Measure measure, TotalAndParts rows, Func<int, FigureError?> errorOf) =>
        [.. rows.Parts.Prepend(rows.Total).Where(row => measure.RuleAt(row) is NoiseRule.FromMechanism or NoiseRule.SumOver).Select(errorOf)];
}
