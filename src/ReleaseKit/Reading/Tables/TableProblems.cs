using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>Where what release.json says about a table does not hold together, or not with its CSV; one factory a failure.</summary>
internal static class TableProblems
{
    public static Finding NoKind(Place at, string column, FindingOwner owner) => new(
        FindingLevel.Note, "kind-not-given", owner, at,
        $"\"{column}\" has no \"kind\" and is read as an amount, which may be negative and broken.",
        "the kind decides which values are possible, and so how far a range reaches.",
        "add \"kind\": \"count\" for whole numbers of things (or estimate, amount, share, rate, mean, median, index).");

    public static Finding RateWithoutPer(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "missing-key", owner, at,
        "A rate needs \"per\".",
        "readers must know per how many it is.",
        "add \"per\": 1000");

    public static Finding UndeclaredUnit(Place at, string unit, IEnumerable<string> known, FindingOwner owner) => new(
        FindingLevel.Note, "undeclared-unit", owner, at,
        $"\"{KeyProblems.Cut(unit)}\" is not in \"units\" and is used as written for every number.",
        "it may read oddly with 1 or with many.",
        Nearest.Of(unit, known) is { } near
            ? $"write \"{near}\", or declare it."
            : $"add it to \"units\": \"{KeyProblems.Cut(unit)}\": {{ \"en\": {{ \"one\": \"…\", \"other\": \"…\" }} }}");

    public static Finding TooManyRules(Place at, int count, FindingOwner owner) => new(
        FindingLevel.Stop, "too-many-rules", owner, at,
        $"There are {count} rules; at most {RulesReader.MostRules} are read.",
        "the rest would be left aside.",
        "join rules that end in the same mechanism.");

    public static Finding RuleEnds(Place at, IReadOnlyList<string> ends, FindingOwner owner) => new(
        FindingLevel.Stop, "rule-unclear", owner, at,
        ends.Count == 0 ? "This rule does not say where the noise comes from." : $"This rule ends in several ways: {string.Join(", ", ends)}.",
        "the margin follows from the one way it ends in.",
        "end each rule in exactly one of: \"mechanism\", \"sumOver\", \"exact\", \"public\".");

    public static Finding MissingColumn(Place at, string column, string file, IReadOnlyList<string> headers, FindingOwner owner) => new(
        FindingLevel.Stop, "missing-column", owner, at,
        $"{file} has no column \"{KeyProblems.Cut(column)}\".",
        "what stands in it cannot be published.",
        Nearest.Of(column, headers) is { } near ? $"write \"{near}\"." : $"name one of its columns: {string.Join(", ", headers.Take(8).Select(KeyProblems.Cut))}.")
    {
        Column = column,
    };

    public static Finding ColumnTwice(Place at, string column, FindingOwner owner) => new(
        FindingLevel.Stop, "column-twice", owner, at,
        $"Column \"{column}\" is named twice: a column is stub, figure, or one of \"columns\".",
        "its values would be read in two ways.",
        "name it once.");

    public static Finding UndeclaredColumn(Place at, string column, FindingOwner owner) => new(
        FindingLevel.Stop, "undeclared-column", owner, at,
        $"Nobody says what column \"{KeyProblems.Cut(column)}\" is.",
        "a column that comes from the confidential records and is not accounted for gives away what the noise protects.",
        $"remove it from the CSV, or say in the table where it comes from: \"columns\": {{ \"{KeyProblems.Cut(column)}\": {{ \"from\": … }} }}, public, published or confidential.")
    {
        Column = column,
    };

    public static Finding NotAStub(Place at, string key, string column, IEnumerable<string> stub, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-column", owner, at,
        $"\"{key}\" names \"{KeyProblems.Cut(column)}\", which is no stub column of this table.",
        "it can only be one that holds row headings.",
        Nearest.Of(column, stub) is { } near ? $"write \"{near}\"." : $"name one of: {string.Join(", ", stub)}.");

    public static Finding NotAFigure(Place at, string figure, IEnumerable<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-column", owner, at,
        $"\"adds\" names \"{KeyProblems.Cut(figure)}\", which is no figure of this table.",
        "nothing could be said about its sums.",
        Nearest.Of(figure, known) is { } near ? $"write \"{near}\"." : $"name one of: {string.Join(", ", known)}.");

    public static Finding NoSuchValue(Place at, string column, string value, IEnumerable<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-label", owner, at,
        $"Column \"{column}\" has no value \"{KeyProblems.Cut(value)}\".",
        "a condition that nothing meets hides a slip of the pen.",
        Nearest.Of(value, known) is { } near ? $"write \"{near}\"." : $"use a value of the CSV: {string.Join(", ", known.Take(5).Select(KeyProblems.Cut))}.");

    public static Finding NoRule(Place at, string address, int count, string column, FindingOwner owner) => new(
        FindingLevel.Stop, "no-rule", owner, at,
        $"{address} has no noise rule{More(count, "nor has one more figure", "nor have {0} more figures", $" of \"{column}\"")}.",
        "a figure without one would stand there without a margin.",
        $"add a last rule without \"where\" to \"noise\" of \"{column}\": {{ \"mechanism\": \"…\" }}, or \"exact\" or \"public\" with the reason.")
    {
        Address = address,
    };

    public static Finding RuleUnused(Place at, string column, bool hasWhere, FindingOwner owner) => new(
        FindingLevel.Caution, "rule-unused", owner, at,
        $"No row comes to this rule of \"{column}\": {(hasWhere ? "the rules before it take its rows, or none is like it" : "the rules before it take all rows")}.",
        "the first rule that fits a row decides; what this one says holds for no figure.",
        "put it before the rule that takes its rows, or take it out.");

    public static Finding NoNoise(Place at, string column, FindingOwner owner) => new(
        FindingLevel.Stop, "no-rule", owner, at,
        $"\"{column}\" does not say where its noise comes from.",
        "its figures would stand there without a margin.",
        "add \"noise\": [ { \"mechanism\": \"…\" } ], or name it under \"covers\" in a mechanism.");

    public static Finding RulesAndCovers(Place at, string column, string mechanism, FindingOwner owner) => new(
        FindingLevel.Stop, "rules-and-covers", owner, at,
        $"\"{column}\" has \"noise\" rules, and \"{mechanism}\" says that it covers it.",
        "the two could disagree.",
        "keep one of them for this measure.");

    public static Finding CoveredTwice(Place at, string address, int count, string one, string other, FindingOwner owner) => new(
        FindingLevel.Stop, "covered-twice", owner, at,
        $"{address} is covered by \"{one}\" and by \"{other}\"{More(count, "and so is one more figure", "and so are {0} more figures")}.",
        "a figure carries the noise of one of them, and its margin depends on which.",
        "let each selection under \"covers\" name rows of its own.")
    {
        Address = address,
    };

    private static string More(int count, string one, string several, string whose = "") => count < 2
        ? ""
        : $", {(count == 2 ? one : several.Replace("{0}", $"{count - 1}", StringComparison.Ordinal))}{whose}";

    public static Finding ScaleNotPositive(Place at, string column, string key, FindingOwner owner) => new(
        FindingLevel.Stop, "scale-not-positive", owner, at,
        $"Column \"{column}\", which gives \"{key}\", holds no positive number here.",
        "the margin of this row cannot be worked out.",
        "write the number that the noise of this row was drawn with.")
    {
        Column = column,
    };

    public static Finding ScaleColumnMissing(Place at, string column, string mechanism, string file, IReadOnlyList<string> headers, FindingOwner owner) => new(
        FindingLevel.Stop, "missing-column", owner, at,
        $"{file} has no column \"{KeyProblems.Cut(column)}\", which \"{mechanism}\" takes a number from.",
        "without it the margins of this table cannot be worked out.",
        Nearest.Of(column, headers) is { } near ? $"write \"{near}\" in mechanisms.json." : $"add the column to {file}, and to \"columns\" of the table.")
    {
        Column = column,
    };

    public static Finding SlugTwins(Place at, string column, string one, string other, string slug, FindingOwner owner) => new(
        FindingLevel.Stop, "slug-twins", owner, at,
        $"\"{KeyProblems.Cut(one)}\" and \"{KeyProblems.Cut(other)}\" in column \"{column}\" would both be called \"{slug}\" in addresses.",
        "a link must lead to one figure.",
        $"give one of them an id in labels.csv: {column},{Quote(other)},{slug}-2 under the columns column,value,id.");

    public static Finding SlugEmpty(Place at, string column, string value, FindingOwner owner) => new(
        FindingLevel.Stop, "slug-empty", owner, at,
        $"\"{KeyProblems.Cut(value)}\" in column \"{column}\" has no letter or digit that can stand in an address.",
        "figures and pages are named after it.",
        $"give it an id in labels.csv: {column},{Quote(value)},a-short-name under the columns column,value,id.");

    public static Finding SlugTaken(Place at, string column, string value, string slug, FindingOwner owner) => new(
        FindingLevel.Stop, "slug-taken", owner, at,
        $"The page of \"{KeyProblems.Cut(value)}\" would be called \"{slug}\", which is taken or kept for devices.",
        "one page would overwrite the other.",
        $"give it an id in labels.csv: {column},{Quote(value)},{slug}-1 under the columns column,value,id.");

    public static Finding ColumnTwins(Place at, string one, string other, FindingOwner owner) => new(
        FindingLevel.Stop, "slug-twins", owner, at,
        $"The columns \"{one}\" and \"{other}\" would have the same name in addresses, or none.",
        "a link must lead to one figure.",
        "rename one of them in the CSV, in letters a to z and digits.");

    private static string Quote(string value) => value.AsSpan().IndexOfAny(',', '"') < 0 ? KeyProblems.Cut(value) : $"\"{KeyProblems.Cut(value).Replace("\"", "\"\"", StringComparison.Ordinal)}\"";

    public static Finding TooManyDigits(Place at, string address, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-overflow", owner, at,
        $"{address} has noise, and more than 15 digits, counted after \"multiplier\".",
        "margins and ranges are worked out to 15 digits; the last ones here would be wrong.",
        "give the figure in a larger unit, or round it as declared in \"afterwards\".");
}
