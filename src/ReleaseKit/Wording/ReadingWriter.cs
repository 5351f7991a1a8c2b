using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>Writes the reading of one figure: its five parts in order, each left out where it does not apply.</summary>
internal sealed class ReadingWriter(Voice voice)
{
    private readonly NoiseSentences noise = new(voice);
    private readonly SpecialSentences special = new(voice);
    private readonly ReliabilitySentences reliability = new(voice);

    public Reading Write(AppraisedFigure figure) => new([
        .. Part(ReadingPart.Value, Value(figure)),
        .. Part(ReadingPart.Noise, noise.Of(figure)),
        .. Part(ReadingPart.Special, special.Of(figure)),
        .. Part(ReadingPart.Reliability, reliability.Of(figure)),
        .. Part(ReadingPart.NotCovered, NotCovered(figure)),
    ]);

    private static IEnumerable<Sentence> Part(ReadingPart part, IEnumerable<string> texts) => texts.Select(text => new Sentence(part, text));

    private IEnumerable<string> Value(AppraisedFigure figure)
    {
        if (!figure.HasNumber)
            yield break;
        var said = Said(figure);
        var value = voice.WithUnit(said, figure.Measure);
        var about = said.ToDecimal() == figure.Value.ToDecimal() * figure.Measure.PrintFactor ? "" : ".about";
        yield return figure.Measure.Per is { } per
            ? voice.Say($"reading.value.rate{about}", ("value", value), ("per", voice.Numerals.Plain(per)))
            : voice.Say($"reading.value{about}", ("value", value));
    }

    /// <summary>The figure as printed; where the margin is so large that nothing would be left of it, two digits of its own.</summary>
    private static PublishedValue Said(AppraisedFigure figure)
    {
        if (figure.Printed.Unscaled != 0 || figure.Value.Unscaled == 0)
            return figure.Printed;
        var value = figure.Value.ToDecimal() * figure.Measure.PrintFactor;
        return PublishedValue.Shortest(PrintUnit.InTwoDigits(value));
    }

    /// <summary>What the range leaves out; a figure without noise can still be wrong.</summary>
    private IEnumerable<string> NotCovered(AppraisedFigure figure)
    {
        if (figure.Main is not null)
            yield return voice.Say(figure.Case.Rounded ? "reading.not-covered.rounded" : "reading.not-covered");
        else if (figure.Case.First is SpecialCase.Exact)
            yield return voice.Say("reading.not-covered.exact");
    }
}
