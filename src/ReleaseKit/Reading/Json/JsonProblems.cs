using ReleaseKit.Review;

namespace ReleaseKit.Reading.Json;

/// <summary>What can be wrong with the text of a JSON file, one factory a failure.</summary>
internal static class JsonProblems
{
    private const string Why = "nothing of this file can be read; the other files were reviewed.";

    public static Finding Broken(Place at, FindingOwner owner, string found) => new(
        FindingLevel.Stop, "json-broken", owner, at,
        $"The JSON breaks here. {found}",
        Why,
        "look at this place and just before it: a comma between two members, a quote at both ends of a text, a bracket for each bracket.");

    public static Finding OtherQuote(Place at, FindingOwner owner, string found) => new(
        FindingLevel.Stop, "json-broken", owner, at,
        $"The JSON breaks here. {found}",
        Why,
        "use plain quotes, \", at both ends of every key and text of the file: a word processor puts curly ones in their place, a text editor does not.");

    public static Finding Unfinished(Place at, FindingOwner owner, char bracket, Place opened) => new(
        FindingLevel.Stop, "json-broken", owner, at,
        $"The file ends here, and the {bracket} of line {opened.Line}, column {opened.Column}, is still open.",
        Why,
        $"write {(bracket == '{' ? '}' : ']')} where it should end; if the rest of the file is lost, write it again from its source.");

    public static Finding NoValue(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "json-broken", owner, at,
        "The file is empty, or ends in the middle of its first value.",
        Why,
        "write the file again from its source.");

    public static Finding TooDeep(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "json-broken", owner, at,
        $"Here brackets stand inside brackets more than {FolderLimits.JsonDepth} deep.",
        Why,
        "take out the brackets that are too many: no key of a release folder stands half as deep.");

    public static Finding Encoding(Place at, FindingOwner owner, string likely) => new(
        FindingLevel.Stop, "json-encoding", owner, at,
        $"This is no UTF-8; it looks like {likely}.",
        "letters beyond a to z would be read wrong.",
        "save the file as UTF-8.");

    public static Finding Nul(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "json-broken", owner, at,
        "There is a zero byte in the file.",
        "a text file has none: it is damaged, or no text at all.",
        "write the file again from its source.");
}
