namespace ReleaseKit.Wording;

/// <summary>Whether a figure keeps the bound that a writer names: over its whole printed range, for the number before noise may be any of it.</summary>
internal static class WriterBound
{
    public static SaidAs Of(WrittenNumber number, decimal value, FigureSpan figure) => number.Bound switch
    {
        NumberBound.Over => Kept(always: value < figure.Low, ever: value < figure.High),
        NumberBound.AtLeast => Kept(always: value <= figure.Low, ever: value <= figure.High),
        NumberBound.Under => Kept(always: value > figure.High, ever: value > figure.Low),
        NumberBound.AtMost => Kept(always: value >= figure.High, ever: value >= figure.Low),
        NumberBound.Nearly => Near(value, number.Step, figure, isOnItsSide: value > figure.Value),
        NumberBound.JustOver => Near(value, number.Step, figure, isOnItsSide: value < figure.Value),
        _ => WriterRounding.Of(value, number.Step, figure),
    };

    private static SaidAs Kept(bool always, bool ever) => (always, ever) switch
    {
        (true, _) => SaidAs.Bound,
        (false, true) => SaidAs.DoubtfulBound,
        _ => SaidAs.Other,
    };

    /// <summary>"Nearly 1,220" for 1,214 is a rounding that says its direction.</summary>
    private static SaidAs Near(decimal value, decimal step, FigureSpan figure, bool isOnItsSide)
    {
        if (isOnItsSide && figure.Holds(value))
            return SaidAs.Rounded;
        if (isOnItsSide && WriterRounding.Of(value, step, figure) is var said and not SaidAs.Other)
            return said;
        return figure.Holds(value) || (isOnItsSide && WriterRounding.IsNear(value, figure)) ? SaidAs.DoubtfulBound : SaidAs.Other;
    }
}
