using ReleaseKit.Appraisal;

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
        yield return voice.Say(figure.IsRoundedForPrint ? "reading.value.about" : "reading.value", ("value", voice.WithUnit(figure.Printed, figure.Measure)));
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
