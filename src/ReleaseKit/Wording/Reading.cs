namespace ReleaseKit.Wording;

/// <summary>The parts of a reading, in the order they are read.</summary>
public enum ReadingPart
{
    Value = 1,
    Noise = 2,
    Special = 3,
    Reliability = 4,
    NotCovered = 5,
}

/// <summary>One sentence of a reading, as plain text (non-breaking spaces included), not yet escaped.</summary>
public readonly record struct Sentence(ReadingPart Part, string Text);

/// <summary>The full set of sentences for one figure in one language: complete and correct on its own.</summary>
public sealed record Reading(IReadOnlyList<Sentence> Sentences)
{
    /// <summary>All sentences, joined by spaces.</summary>
    public string Text => string.Join(' ', Sentences.Select(sentence => sentence.Text));

    public IEnumerable<string> Of(ReadingPart part) => Sentences.Where(sentence => sentence.Part == part).Select(sentence => sentence.Text);
}
