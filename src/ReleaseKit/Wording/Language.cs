using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>One language, made from its wording files. Immutable; safe between threads.</summary>
public sealed class Language : ILanguage
{
    private readonly WordingTexts texts;
    private readonly Voice voice;
    private readonly ReadingWriter readings;
    private readonly FactSentences factSentences;
    private readonly NumberReader numbers;

    private Language(WordingTexts texts)
    {
        this.texts = texts;
        voice = new Voice(texts, this);
        readings = new ReadingWriter(voice);
        factSentences = new FactSentences(voice);
        numbers = new NumberReader(texts);
    }

    public string Tag => texts.Tag;

    /// <summary>Loads <c>wording/TAG/*.json</c> below the templates.</summary>
    /// <exception cref="WordingException">No such language, or its files cannot be used.</exception>
    public static ILanguage Load(string siteTemplatesFolder, string tag) => new Language(WordingTexts.Load(siteTemplatesFolder, tag));

    public Reading ReadingOf(AppraisedFigure figure) => readings.Write(figure);

    public IReadOnlyList<string> NotesOf(TableFacts facts, bool onSeveralPages = false) => factSentences.Of(facts, onSeveralPages);

    public IReadOnlyList<string> NotesOf(MeasureFacts facts, bool onSeveralPages = false) => factSentences.Of(facts, onSeveralPages);

    public string Number(PublishedValue value) => voice.Numerals.InTable(value);

    public string NumberInProse(PublishedValue value) => voice.Numerals.InProse(value);

    public IReadOnlyList<WrittenNumber> NumbersIn(string text) => numbers.In(text);

    public string WithUnit(PublishedValue value, Measure measure) => voice.WithUnit(value, measure);

    public string UnitOf(Measure measure, PublishedValue value) => voice.UnitOf(measure, value);

    public string Margin(PrintedRange range)
    {
        var (down, up) = (("down", voice.Numerals.InTable(range.MarginDown)), ("up", voice.Numerals.InTable(range.MarginUp)));
        return range switch
        {
            { IsUneven: false } => texts.Fill("margin.even", ("margin", voice.Numerals.InTable(range.Margin))),
            { MarginDown.Unscaled: 0 } => texts.Fill("margin.upward", up),
            { MarginUp.Unscaled: 0 } => texts.Fill("margin.downward", down),
            _ => texts.Fill("margin.uneven", down, up),
        };
    }

    public string Share(Coverage coverage) => voice.Frequency("coverage.share", NaturalFrequency.Of(coverage));

    public string Cases(Coverage coverage, bool atLeast) =>
        voice.Frequency(atLeast ? "coverage.cases.at-least" : "coverage.cases", NaturalFrequency.Of(coverage));

    public string CasesOfZero(Coverage coverage) => voice.CasesOfZero(coverage);

    public string Text(string key, params (string Name, string Value)[] fill) => texts.Fill(key, fill);

    public string Date(DateOnly date) => texts.Fill(
        "date.day",
        ("day", Numerals.Digits(date.Day)),
        ("month", texts.Template($"date.month.{Numerals.Digits(date.Month)}")),
        ("year", Numerals.Digits(date.Year)));

    public string List(IReadOnlyList<string> items)
    {
        if (items.Count == 0)
            return "";
        var written = items[0];
        for (var at = 1; at < items.Count - 1; at++)
            written = texts.Fill("list.middle", ("before", written), ("next", items[at]));
        return items.Count == 1 ? written : texts.Fill(items.Count == 2 ? "list.two" : "list.last", ("before", written), ("last", items[^1]));
    }
}
