using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>What can be wrong in release.json beyond single keys, one factory a failure.</summary>
internal static class ReleaseProblems
{
    public static Finding NoTables(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "no-tables", owner, at,
        "\"tables\" is empty.",
        "a release without a table publishes nothing.",
        "add \"tables\": [ { \"id\": \"arrears\", \"file\": \"tables/arrears.csv\", … } ]");

    public static Finding NoLicence(Place at, FindingOwner owner) => new(
        FindingLevel.Note, "no-licence", owner, at,
        "No licence is given.",
        "readers will not know what they may do with the figures.",
        "add \"licence\": { \"name\": \"CC BY 4.0\", \"url\": \"https://creativecommons.org/licenses/by/4.0/\" }");

    public static Finding NoAddress(Place at, FindingOwner owner) => new(
        FindingLevel.Note, "no-address", owner, at,
        "It is not said where the release will stand.",
        "canonical links, the feed, the sitemap, the link to the latest edition, and the links and the style of 404.html are left out.",
        "add \"address\": \"https://office.example/release/1/\"");

    public static Finding HeadlineTwice(Place at, string address, Place first, FindingOwner owner) => new(
        FindingLevel.Caution, "headline-twice", owner, at,
        $"\"{KeyProblems.Cut(address)}\" is a headline already; first at line {first.Line}.",
        "the first page would show the same figure twice.",
        "name another figure, or take it out.");

    public static Finding LanguageNotYet(Place at, string language, FindingOwner owner) => KeyProblems.NotYet(
        at, $"languages\": \"{KeyProblems.Cut(language)}", owner, "write \"languages\": [\"en\"], and text in English; other languages come later.");

    public static Finding WordingNotYet(Place at, FindingOwner owner) => KeyProblems.NotYet(
        at, "wording", owner, "take the folder wording/ out; the sentences that ship with the program are used.");

    public static Finding CoverageAlso(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "coverage-also", owner, at,
        "\"also\" must hold exactly two coverages, one below and one above \"main\".",
        "each figure shows its range at three coverages.",
        "write \"coverage\": { \"main\": 0.95, \"also\": [0.5, 0.99] }");

    public static Finding Thresholds(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "out-of-range", owner, at,
        "\"close\" must be below \"rough\".",
        "they part close, rough and weak figures.",
        "write \"reliability\": { \"close\": 0.1, \"rough\": 0.5 }");

    public static Finding AccentForm(Place at, string accent, FindingOwner owner) => new(
        FindingLevel.Stop, "accent", owner, at,
        $"\"{KeyProblems.Cut(accent)}\" is no colour of the form #RRGGBB.",
        "it is written into the style of every page.",
        "write \"accent\": \"#7A1D4E\" with the six digits of your colour.");

    public static Finding AccentContrast(Place at, string accent, double contrast, FindingOwner owner) => new(
        FindingLevel.Stop, "accent", owner, at,
        FormattableString.Invariant($"{accent} stands out from the grounds of the page by {Math.Floor(contrast * 100) / 100:0.00} to 1 only; 4.5 to 1 is needed."),
        "links and marks in it could not be read by everyone (WCAG 2.2, 1.4.3).",
        "choose a darker tone of the colour.");

    public static Finding IdTaken(Place at, string id, string what, string otherWhat, Place other, FindingOwner owner) => new(
        FindingLevel.Stop, "doubled-id", owner, at,
        $"\"{KeyProblems.Cut(id)}\" names {what}, and {otherWhat} at {other}.",
        "tables, short names and charts share one set of names, so that an address means one thing.",
        "give one of the two another name.");

    public static Finding Address(Place at, AddressException problem, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-figure", owner, at,
        problem.Message + ".",
        "a figure that is not found cannot be shown.",
        problem.Do);

    public static Finding NoteMatchesNothing(Place at, string table, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-figure", owner, at,
        $"This note is for rows that table \"{table}\" does not have.",
        "it would be printed nowhere.",
        "check the values against the CSV, or take \"at\" out: then it is for the whole table.");

    public static Finding ChartHasOneFigure(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "chart-too-small", owner, at,
        "This chart has one figure.",
        "nothing can be put in order.",
        "leave stub columns out of the address, so that it means several rows.");

    public static Finding FileMissing(string file, FindingOwner owner, string contents) => new(
        FindingLevel.Stop, "missing-file", owner, new Place(file),
        $"There is no {file} in the folder.",
        $"it says {contents}.",
        $"write it; the schema {file.Replace(".json", ".schema.json", StringComparison.Ordinal)} beside the program gives completion in an editor. What is there was reviewed.");
}
