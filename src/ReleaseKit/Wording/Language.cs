using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>One language, made from its wording files. Immutable; safe between threads.</summary>
public sealed class Language : ILanguage
{
    private readonly WordingTexts texts;
    private readonly Numerals numerals;

    private Language(WordingTexts texts) => (this.texts, numerals) = (texts, new Numerals(texts));

    public string Tag => texts.Tag;

    /// <summary>Loads <c>wording/TAG/*.json</c> below the templates.</summary>
    /// <exception cref="WordingException">No such language, or its files cannot be used.</exception>
    public static ILanguage Load(string siteTemplatesFolder, string tag) => new Language(WordingTexts.Load(siteTemplatesFolder, tag));

    public Reading ReadingOf(AppraisedFigure figure) => throw new NotSupportedException();

    public string Number(PublishedValue value) => numerals.InTable(value);

    public string NumberInProse(PublishedValue value) => numerals.InProse(value);

    public string WithUnit(PublishedValue value, Unit unit) =>
        $"{numerals.InProse(value)}{Numerals.NoBreak}{PluralCategory.Form(unit, Tag, value)}";

    public string Margin(PrintedRange range) => range.IsUneven
        ? texts.Fill("margin.uneven", ("down", numerals.InTable(range.MarginDown)), ("up", numerals.InTable(range.MarginUp)))
        : texts.Fill("margin.even", ("margin", numerals.InTable(range.Margin)));

    public string Share(Coverage coverage)
    {
        var (cases, of) = NaturalFrequency.Of(coverage);
        return texts.Fill("coverage.share", ("cases", numerals.Whole(cases)), ("all", numerals.Whole(of)));
    }

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
