using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Decides what is special about a figure: the first case that fits, in the order of the readings, and what else applies.</summary>
internal static class FigureCases
{
    public static FigureCase Of(AppraisedFigure figure, FigureOrigin origin)
    {
        if (figure.Main is not { } main)
            return new(WithoutMargin(figure, origin.Rule), false, false, false, false);
        var steps = figure.Error!.Steps;
        var value = figure.Value.ToDouble();
        var threshold = Threshold(steps);
        var capped = figure.Mechanism?.Clipped is not null && figure.Measure.Kind is not (MeasureKind.Count or MeasureKind.Share);
        var also = new FigureCase(
            SpecialCase.None,
            steps.OfType<AfterStep.RoundTo>().Any(),
            steps.Any(step => step is AfterStep.NotBelow below && below.Bound == value || step is AfterStep.NotAbove above && above.Bound == value),
            capped,
            threshold is { } from && (value - main.Margin < from || main.Printed.IsUneven));
        return also with { First = First(figure, main, also, value) };
    }

    private static SpecialCase WithoutMargin(AppraisedFigure figure, NoiseRule rule)
    {
        if (!figure.HasNumber)
            return figure.Status == 'Q' && figure.Measure.PublishedFrom is not null ? SpecialCase.NotPublishedBelow : SpecialCase.NoNumber;
        return rule switch
        {
            NoiseRule.Exact => SpecialCase.Exact,
            NoiseRule.Public => SpecialCase.Public,
            _ => SpecialCase.NoMargin,
        };
    }

    private static SpecialCase First(AppraisedFigure figure, FigureRange main, FigureCase also, double value)
    {
        if (value < figure.Possible.Lowest)
            return SpecialCase.BelowZero;
        if (value > figure.Possible.Highest)
            return SpecialCase.AboveHighest;
        if (value == 0)
            return SpecialCase.Zero;
        if (also.Threshold)
            return SpecialCase.FromThreshold;
        if (figure.LeftAsItWas is not null)
            return SpecialCase.MostlyUnchanged;
        if (also.Capped)
            return SpecialCase.Capped;
        return main.Margin >= Math.Abs(value) ? SpecialCase.MarginAsLargeAsFigure : SpecialCase.None;
    }

    private static double? Threshold(IReadOnlyList<AfterStep> steps) => steps
        .Select(step => step switch
        {
            AfterStep.ZeroBelow zero => zero.Threshold,
            AfterStep.PublishedFrom from => from.Threshold,
            _ => (double?)null,
        })
        .Max();
}
