using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>Part 2 of a reading: how far the noise reaches, then the range that follows from it.</summary>
internal sealed class NoiseSentences(Voice voice)
{
    public IEnumerable<string> Of(AppraisedFigure figure) => figure.Main is { } main ? [.. Noise(figure, main), .. Range(figure, main)] : figure.Ranges.SelectMany(range => Known(figure, range));

    /// <summary>The range that is known where none reaches the main coverage.</summary>
    private IEnumerable<string> Known(AppraisedFigure figure, FigureRange range) => figure.Promise switch
    {
        RangePromise.Every => [Between(figure, range, "reading.range.alone", voice.Cases(figure, range))],
        RangePromise.ZeroForSmall => [Threshold(figure), ZeroForSmall(figure, range)],
        _ => [Threshold(figure), Among(figure, range)],
    };

    private IEnumerable<string> Noise(AppraisedFigure figure, FigureRange main)
    {
        if (figure.Draws > 1)
            yield return voice.Say("reading.noise.sum-of", ("draws", voice.Numerals.Whole(figure.Draws)));
        yield return Reach(figure, main);
        if (IsBeyondMargin(figure, main))
            yield return Beyond(figure);
    }

    private string Reach(AppraisedFigure figure, FigureRange main)
    {
        var printed = main.Printed;
        if (figure.Promise is not RangePromise.Every)
            return Threshold(figure);
        // A range that reaches further down than up comes from noise that reaches further up than down.
        if (printed.IsUneven)
            return voice.Say(
                Together(figure, "reading.noise.uneven"),
                ("upward", Number(printed.MarginDown)), ("downward", Number(printed.MarginUp)), ("cases", voice.Cases(figure, main)));
        var key = figure.Draws > 1 ? "reading.noise.sum" : Together(figure, "reading.noise");
        return voice.Say(key, ("margin", Number(printed.Margin)), ("cases", voice.Cases(figure, main)));
    }

    /// <summary>What the promise of a range under a threshold is about: the figures that passed it.</summary>
    private string Threshold(AppraisedFigure figure)
    {
        var threshold = ("threshold", voice.Threshold(figure));
        return voice.Say(figure.Error!.Steps.OfType<AfterStep.ZeroBelow>().Any() ? "reading.noise.zero-below" : "reading.noise.published-from", threshold);
    }

    private IEnumerable<string> Range(AppraisedFigure figure, FigureRange main)
    {
        if (figure.Promise is RangePromise.ZeroForSmall)
        {
            yield return ZeroForSmall(figure, main);
            yield break;
        }
        if (IsMadeWider(main))
            yield return voice.Say("reading.range.wider");
        yield return figure.Promise is RangePromise.Every
            ? Between(figure, main, IsMadeWider(main) || IsBeyondMargin(figure, main) ? "reading.range.alone" : "reading.range", voice.SuchCases(figure, main))
            : Among(figure, main);
        if (figure.Case.First is not (SpecialCase.BelowZero or SpecialCase.AboveHighest) && !IsBeyondMargin(figure, main))
            foreach (var cut in Cut(figure, main.Printed))
                yield return cut;
    }

    /// <summary>The figure lies outside what is possible, and its range reaches further than its margin.</summary>
    private static bool IsMadeWider(FigureRange main) => main.High > main.UncutHigh || main.Low < main.UncutLow;

    /// <summary>The half-width as printed does not even reach what is possible: here the noise was certainly larger.</summary>
    private static bool IsBeyondMargin(AppraisedFigure figure, FigureRange main)
    {
        if (figure.Error!.DependsOnPublished)
            return false;
        var (value, factor) = ((double)(figure.Value.ToDecimal() * figure.Measure.PrintFactor), figure.Measure.PrintFactor);
        return value + main.Printed.MarginUp.ToDouble() < figure.Possible.Lowest * factor
            || value - main.Printed.MarginDown.ToDouble() > figure.Possible.Highest * factor;
    }

    /// <summary>Under a threshold the promise is about the figures that passed it.</summary>
    private string Among(AppraisedFigure figure, FigureRange range) =>
        Between(figure, range, "reading.range" + PromiseKey.Of(figure.Promise), voice.Cases(figure, range));

    private string Between(AppraisedFigure figure, FigureRange range, string key, string cases)
    {
        var (kind, low, high) = (("kind", voice.Kind(figure.Measure)), range.Printed.Low, range.Printed.High);
        return low == high
            ? voice.Say($"{key}.single", kind, ("low", Number(low)), ("cases", cases))
            : voice.Say(key, kind, ("low", Number(low)), ("high", Number(high)), ("cases", cases));
    }

    /// <summary>
    /// What a zero that stands for small values says is not that the value lies in a range in so many cases (above its end it never does), but how rarely larger values become 0:
    /// in at most (1 − c)/2 of the cases.
    /// </summary>
    private string ZeroForSmall(AppraisedFigure figure, FigureRange main) => voice.Say(
        "reading.range.zero-for-small",
        ("kind", voice.Kind(figure.Measure)),
        ("high", Number(main.Printed.High)),
        ("cases", voice.CasesOfZero(main.Coverage)));

    private string Beyond(AppraisedFigure figure)
    {
        var isBelow = figure.Value.ToDouble() < figure.Possible.Lowest;
        return voice.Say(
            isBelow ? "reading.noise.more-below" : "reading.noise.more-above",
            ("kind", voice.Kind(figure.Measure)),
            ("bound", isBelow ? voice.Lowest(figure) : voice.Highest(figure)));
    }

    /// <summary>An end that was cut is said to be cut.</summary>
    private IEnumerable<string> Cut(AppraisedFigure figure, PrintedRange printed)
    {
        var kind = ("kind", voice.Kind(figure.Measure));
        if (printed is { LowIsCut: true, HighIsCut: true })
            yield return voice.Say("reading.range.cut-both", kind, ("lowest", voice.Lowest(figure)), ("highest", voice.Highest(figure)));
        else if (printed.LowIsCut)
            yield return voice.Say("reading.range.cut-low", kind, ("bound", voice.Lowest(figure)));
        else if (printed.HighIsCut)
            yield return voice.Say("reading.range.cut-high", kind, ("bound", voice.Highest(figure)));
    }

    private static string Together(AppraisedFigure figure, string key) => figure.Case.Rounded ? $"{key}.rounded" : key;

    private string Number(PublishedValue value) => voice.Numerals.InProse(value);
}
