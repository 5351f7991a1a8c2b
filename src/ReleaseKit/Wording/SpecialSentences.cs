using ReleaseKit.Appraisal;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>Part 3 of a reading: the first special case that fits, then everything else that applies.</summary>
internal sealed class SpecialSentences(Voice voice)
{
    public IEnumerable<string> Of(AppraisedFigure figure) => [.. First(figure), .. AlsoTrue(figure)];

    private IEnumerable<string> First(AppraisedFigure figure) => figure.Case.First switch
    {
        SpecialCase.NoNumber => [voice.Say($"reading.status.{figure.Status}")],
        SpecialCase.NotPublishedBelow => [voice.Say("reading.below-publication")],
        SpecialCase.Exact => [voice.Say("reading.exact"), voice.Say("reading.exact.promise")],
        SpecialCase.Public => [voice.Say("reading.public")],
        SpecialCase.NoMargin => [voice.Say(figure.Ranges.Count == 0 ? "reading.no-margin" : "reading.no-margin.more")],
        SpecialCase.BelowZero => [Outside(figure, "below", voice.Lowest(figure)), ReadAs(figure)],
        SpecialCase.AboveHighest => [Outside(figure, "above", voice.Highest(figure)), ReadAs(figure)],
        SpecialCase.Zero => [voice.Say("reading.zero"), .. figure.Promise is RangePromise.ZeroForSmall ? [ReadAs(figure)] : Nothing],
        SpecialCase.FromThreshold => [Threshold(figure)],
        SpecialCase.FlooredSum => [voice.Say("reading.floored-sum")],
        SpecialCase.MostlyUnchanged => [MostlyUnchanged(figure)],
        SpecialCase.Capped => Capped(figure),
        SpecialCase.MarginAsLargeAsFigure => [voice.Say(figure.MarginToFigure > 1 ? "reading.margin-larger" : "reading.margin-as-large")],
        _ => [],
    };

    private IEnumerable<string> AlsoTrue(AppraisedFigure figure)
    {
        var (first, rounded, floored, capped, threshold) = figure.Case;
        if (figure.Main is null)
            return [.. UnseenParts(figure), .. Marked(figure)];
        return
        [
            .. UnseenParts(figure),
            .. figure.Printed.Unscaled == 0 && first is not (SpecialCase.Zero or SpecialCase.BelowZero) ? [voice.Say("reading.zero")] : Nothing,
            .. threshold && first is not (SpecialCase.FromThreshold or SpecialCase.Zero) ? [Threshold(figure)] : Nothing,
            .. first is SpecialCase.Zero && figure.LeftAsItWas is not null ? [MostlyUnchanged(figure)] : Nothing,
            .. capped && first is not SpecialCase.Capped ? Capped(figure) : Nothing,
            .. rounded || floored ? Afterwards(figure) : Nothing,
            .. Marked(figure),
        ];
    }

    private static IEnumerable<string> Nothing => [];

    private string Outside(AppraisedFigure figure, string side, string bound) => bound == "0" && side == "below"
        ? voice.Say("reading.below-zero")
        : voice.Say($"reading.{side}-bound", ("kind", voice.Kind(figure.Measure)), ("bound", bound));

    private string ReadAs(AppraisedFigure figure)
    {
        var printed = figure.Main!.Printed;
        if (printed.Low == printed.High)
            return voice.Say("reading.read-as.single", ("low", voice.Numerals.InProse(printed.Low)));
        var key = figure.Case.First is SpecialCase.BelowZero && figure.Possible.Lowest == 0 ? "reading.read-as.small" : "reading.read-as";
        return voice.Say(key, ("low", voice.Numerals.InProse(printed.Low)), ("high", voice.Numerals.InProse(printed.High)));
    }

    private string Threshold(AppraisedFigure figure) => voice.Say("reading.threshold", ("threshold", voice.Threshold(figure)));

    private string MostlyUnchanged(AppraisedFigure figure) => voice.Say(
        "reading.mostly-unchanged",
        ("kind", voice.Kind(figure.Measure)),
        ("cases", voice.Frequency("coverage.cases", NaturalFrequency.About(figure.LeftAsItWas!.Value))));

    private IEnumerable<string> Capped(AppraisedFigure figure)
    {
        var clipped = figure.Mechanism!.Clipped!;
        yield return voice.Say("reading.capped", ("highest", Amount(figure, clipped.To)), ("counted", InPrint(figure, clipped.To)));
        if (clipped.From != 0)
            yield return voice.Say("reading.capped.below", ("lowest", Amount(figure, clipped.From)), ("counted", InPrint(figure, clipped.From)));
    }

    /// <summary>Rounding on purpose, and the bound that the figure stands at, in the order in which they were done.</summary>
    private IEnumerable<string> Afterwards(AppraisedFigure figure)
    {
        var value = figure.Value.ToDouble();
        foreach (var step in figure.Mechanism!.Afterwards)
            switch (step)
            {
                case AfterStep.RoundTo round:
                    yield return voice.Say("reading.rounded" + Direction(round.How), ("unit", InPrint(figure, round.Unit)));
                    break;
                case AfterStep.NotBelow below when below.Bound == value:
                    yield return voice.Say("reading.set-to-bound.below", ("bound", InPrint(figure, value)), ("as", InPrint(figure, value)));
                    break;
                case AfterStep.NotAbove above when above.Bound == value:
                    yield return voice.Say("reading.set-to-bound.above", ("bound", InPrint(figure, value)), ("as", InPrint(figure, value)));
                    break;
            }
    }

    private static string Direction(RoundingHow how) => how switch
    {
        RoundingHow.Up => ".up",
        RoundingHow.Down => ".down",
        _ => "",
    };

    /// <summary>A sum says which of its parts nobody sees, and whether they are in it.</summary>
    private IEnumerable<string> UnseenParts(AppraisedFigure figure)
    {
        var parts = ("parts", voice.Numerals.Whole(figure.Parts));
        if (figure is { HasNumber: true, PartsHidden: > 0 and var hidden })
            yield return voice.Say(hidden == 1 ? "reading.hidden-in.one" : "reading.hidden-in", parts, ("hidden", voice.Numerals.Whole(hidden)));
        if (figure is { HasNumber: true, PartsLeftOut: > 0 and var leftOut })
            yield return voice.Say(leftOut == 1 ? "reading.left-out.one" : "reading.left-out", parts, ("missing", voice.Numerals.Whole(leftOut)));
    }

    /// <summary>A number that the office marks (provisional, estimated …) says so.</summary>
    private IEnumerable<string> Marked(AppraisedFigure figure)
    {
        if (figure.HasNumber && figure.Status != 'A')
            yield return voice.Say("reading.marked", ("status", voice.Say($"status.{figure.Status}")));
    }

    private string Amount(AppraisedFigure figure, double number) =>
        voice.WithUnit(PublishedValue.Shortest((decimal)(number * figure.Measure.PrintFactor)), figure.Measure);

    private string InPrint(AppraisedFigure figure, double number) => voice.Numerals.Plain(number * figure.Measure.PrintFactor);
}
