namespace ReleaseKit.Wording;

/// <summary>Whether a number is a figure as a writer rounded it: to the last digit that was written.</summary>
internal static class WriterRounding
{
    /// <summary>A rounding that moves a figure further than this share of it may say another thing, unless it stays within its range (own rule: common practice, no source).</summary>
    private const decimal MostRounded = 0.05m;

    public static SaidAs Of(decimal value, decimal step, FigureSpan figure)
    {
        if (Math.Abs(value - figure.Value) > step / 2 || (value == 0 && !figure.Holds(0)))
            return SaidAs.Other;
        return IsNear(value, figure) || figure.Holds(value) ? SaidAs.Rounded : SaidAs.RoundedFar;
    }

    /// <summary>Whether the figure moves by so little that a rounding may move it.</summary>
    public static bool IsNear(decimal value, FigureSpan figure) => Math.Abs(value - figure.Value) <= MostRounded * Math.Abs(figure.Value);
}
