using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>Whether a number is a figure as a writer rounded it: to the last digit that was written.</summary>
internal static class WriterRounding
{
    /// <summary>A rounding that moves a figure further than this share of it may say another thing, unless it stays within its range (own rule: common practice, no source).</summary>
    private const decimal MostRounded = 0.05m;

    public static SaidAs Of(decimal value, decimal step, AppraisedFigure figure)
    {
        var published = figure.Value.ToDecimal() * figure.Measure.PrintFactor;
        var moved = Math.Abs(value - published);
        if (moved > step / 2 || (value == 0 && !IsWithinRange(0, figure)))
            return SaidAs.Other;
        return moved <= MostRounded * Math.Abs(published) || IsWithinRange(value, figure) ? SaidAs.Rounded : SaidAs.RoundedFar;
    }

    private static bool IsWithinRange(decimal value, AppraisedFigure figure) =>
        figure.Main is { Printed: var range } && value >= range.Low.ToDecimal() && value <= range.High.ToDecimal();
}
