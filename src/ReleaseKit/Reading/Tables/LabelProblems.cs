using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>What can be wrong with labels.csv, one factory a failure.</summary>
internal static class LabelProblems
{
    public static Finding UnknownColumn(Place at, string column, IReadOnlyList<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-key", owner, at,
        $"\"{KeyProblems.Cut(column)}\" is no column of labels.csv.",
        "what stands in it has no effect.",
        Nearest.Of(column, known) is { } near ? $"write \"{near}\", or remove it." : $"remove it. Known: {string.Join(",", known)} and name_ with another language.");

    public static Finding MissingColumn(string column, FindingOwner owner) => new(
        FindingLevel.Stop, "missing-column", owner, new Place(LabelBook.FileName, 1, 1),
        $"labels.csv has no column \"{column}\".",
        "it is not known which row headings are meant.",
        "begin the file with the line: column,value,id,order,parent,name_en");

    public static Finding BadId(Place at, string id, FindingOwner owner) => Mechanisms.MechanismProblems.BadId(at, id, owner);

    public static Finding BadOrder(Place at, string text, FindingOwner owner) => new(
        FindingLevel.Stop, "csv-number", owner, at,
        $"The order \"{KeyProblems.Cut(text)}\" is no number.",
        "rows are put in this order.",
        "write 1, 2, 3 …");

    public static Finding Unused(Place at, string name, string what, IEnumerable<string> known, FindingOwner owner) => new(
        FindingLevel.Caution, "label-unused", owner, at,
        $"\"{KeyProblems.Cut(name)}\" is no {what} of any table.",
        "what is said of it here has no effect.",
        Nearest.Of(name, known) is { } near ? $"write \"{near}\", or remove the line." : "correct it, or remove the line.");

    public static Finding UnknownParent(Place at, StubValue value, string parent, IEnumerable<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-label", owner, at,
        $"The parent \"{KeyProblems.Cut(parent)}\" of \"{KeyProblems.Cut(value.Value)}\" is no row heading in column \"{KeyProblems.Cut(value.Column)}\".",
        "on which level a row stands decides in how many cells one unit is counted.",
        Nearest.Of(parent, known) is { } near ? $"write \"{near}\"." : "write a row heading of that column, or leave the field empty.");

    public static Finding ParentCycle(Place at, IEnumerable<string> values, FindingOwner owner) => new(
        FindingLevel.Stop, "parent-cycle", owner, at,
        $"These row headings are each said to be part of the next, and the last of the first: {string.Join(", ", values.Select(value => $"\"{KeyProblems.Cut(value)}\""))}.",
        "on which level a row stands decides in how many cells one unit is counted; in a circle no row stands on any.",
        "leave \"parent\" empty for the one of them that stands highest.");

    public static Finding Twice(Place at, StubValue value, Place first, FindingOwner owner) => new(
        FindingLevel.Stop, "doubled-row", owner, at,
        $"\"{KeyProblems.Cut(value.Value)}\" of column \"{KeyProblems.Cut(value.Column)}\" stands there twice; first at line {first.Line}.",
        "the two could disagree.",
        "keep one of them.");
}
