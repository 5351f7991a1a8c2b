using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>
/// Margin ÷ figure against the two thresholds, in decimal arithmetic on a margin of 12 digits, so that a tie falls alike on every machine.
/// A tie belongs to the better word.
/// </summary>
internal static class ReliabilityRule
{
    public static Reliability Of(decimal figure, double margin, bool canBeNegative, ReliabilityThresholds thresholds)
    {
        var size = canBeNegative ? Math.Abs(figure) : Math.Max(figure, 0);
        var width = PrintUnit.Rounded(margin);
        if (width <= (decimal)thresholds.Close * size)
            return Reliability.Close;
        return width <= (decimal)thresholds.Rough * size ? Reliability.Rough : Reliability.Weak;
    }

    /// <summary>Margin ÷ figure; null where the figure is not above 0 though it cannot be negative, or is 0.</summary>
    public static double? Share(decimal figure, double margin, bool canBeNegative)
    {
        var size = canBeNegative ? Math.Abs(figure) : Math.Max(figure, 0);
        return size == 0 ? null : (double)(PrintUnit.Rounded(margin) / size);
    }
}
