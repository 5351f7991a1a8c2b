using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>A figure as published, and the ends of its printed range, as a writer would write them; a figure without a range is its own.</summary>
internal readonly record struct FigureSpan(decimal Value, decimal Low, decimal High)
{
    /// <summary>The same without the sign of a figure below zero.</summary>
    public FigureSpan Mirrored => new(-Value, -High, -Low);

    public static FigureSpan Of(AppraisedFigure figure)
    {
        var value = figure.Value.ToDecimal() * figure.Measure.PrintFactor;
        return figure.Main is { Printed: var range } ? new(value, range.Low.ToDecimal(), range.High.ToDecimal()) : new(value, value, value);
    }

    /// <summary>Whether a number is held against one below zero: a bound against the range, which ends at zero where noise alone carried the figure below.</summary>
    public bool IsBelowZero(NumberBound bound) =>
        bound is NumberBound.Over or NumberBound.AtLeast or NumberBound.Under or NumberBound.AtMost ? Low < 0 && Value < 0 : Value < 0;

    public bool Holds(decimal value) => value >= Low && value <= High;
}
