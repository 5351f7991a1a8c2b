using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Leaks;

/// <summary>A total less the sum of its parts, in the figure's unit, and what the declared noise says of it.</summary>
internal sealed record Gap(TotalAndParts Rows, double Width, string Sum, double Reach, double ChanceBound)
{
    // A chance below this is taken for none.
    private const double Unlikely = 1e-9;

    // No coverage is asked for that a double does not tell from 1 with room to spare.
    private const double LeastRest = 5e-12;

    public bool IsTooWide => Width > Reach;

    public static Gap Of(Measure measure, TotalAndParts rows, Func<int, FigureError?> errorOf)
    {
        var sum = ExactSum.Of(rows.Parts.Select(measure.ValueAt));
        var less = ExactSum.Of([measure.ValueAt(rows.Total)]).Less(sum);
        var width = Math.Abs((double)less.Unscaled) / PublishedValue.PowerOfTen(less.Decimals) * measure.Multiplier;
        int[] all = [rows.Total, .. rows.Parts];
        var (reach, chance) = width == 0 ? (0, 0) : ReachOf(measure, all, errorOf);
        return new Gap(rows, width, sum.ToString(), reach, chance);
    }

    /// <summary>The sum of the margins of all figures at a coverage so large that the chance that any of them is missed is as small as given with it.</summary>
    private static (double Reach, double Chance) ReachOf(Measure measure, int[] rows, Func<int, FigureError?> errorOf)
    {
        var noised = rows.Where(row => measure.RuleAt(row) is NoiseRule.FromMechanism or NoiseRule.SumOver).Select(errorOf).ToList();
        var coverage = Coverage.OfShare(1 - Math.Max(Unlikely / Math.Max(1, noised.Count), LeastRest));
        return noised.Count == 0 || noised.Exists(error => error is null || error.DependsOnPublished || error.Law.Within(double.PositiveInfinity) < coverage.Share)
            ? (double.PositiveInfinity, 1)
            : (noised.Sum(error => error!.MarginAt(coverage).Width), coverage.Rest * noised.Count);
    }
}
