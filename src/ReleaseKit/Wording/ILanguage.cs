using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>Everything a page says in one language: readings, numbers, and the page's own words by key from the wording file.</summary>
public interface ILanguage
{
    /// <summary>BCP 47 tag.</summary>
    string Tag { get; }

    Reading ReadingOf(AppraisedFigure figure);

    /// <summary>What is said once under a table: how many ranges may miss (on all its pages, where it is cut into several), why parts may not add up.</summary>
    IReadOnlyList<string> NotesOf(TableFacts facts, bool onSeveralPages = false);

    /// <summary>What is said once for a column (on all pages of its table): how far its noise reaches, and the distance that 999 of 1,000 hold; empty without margins.</summary>
    IReadOnlyList<string> NotesOf(MeasureFacts facts, bool onSeveralPages = false);

    /// <summary>A number as the language writes it in tables: "1,842", "−7" (U+2212).</summary>
    string Number(PublishedValue value);

    /// <summary>A number as the language writes it in running text: "minus 7".</summary>
    string NumberInProse(PublishedValue value);

    /// <summary>The numbers that stand in a text, read as the language writes them; in the order of the text.</summary>
    IReadOnlyList<WrittenNumber> NumbersIn(string text);

    /// <summary>"1,240 households", "51.3 in each 100": number, non-breaking space, unit in the right form.</summary>
    string WithUnit(PublishedValue value, Measure measure);

    /// <summary>The unit of a measure in the form that goes with a number; a share says that it counts in each 100, whatever its unit is.</summary>
    string UnitOf(Measure measure, PublishedValue value);

    /// <summary>"±&#160;19", or "−12 +17" if uneven.</summary>
    string Margin(PrintedRange range);

    /// <summary>A coverage in words: "95 in 100".</summary>
    string Share(Noise.Coverage coverage);

    /// <summary>A coverage as a promise of the procedure: "95 of 100 cases", "at least 95 of 100 cases".</summary>
    string Cases(Noise.Coverage coverage, bool atLeast);

    /// <summary>In how many cases at most a value above the range of a 0 that stands for small values becomes 0: "25 of 1,000 cases".</summary>
    string CasesOfZero(Noise.Coverage coverage);

    /// <summary>A text of the wording file by key, its {names} filled in; a missing key is the stop that names it.</summary>
    string Text(string key, params (string Name, string Value)[] fill);

    /// <summary>"16 March 2032".</summary>
    string Date(DateOnly date);

    /// <summary>"wards, districts and Norrvale".</summary>
    string List(IReadOnlyList<string> items);
}
