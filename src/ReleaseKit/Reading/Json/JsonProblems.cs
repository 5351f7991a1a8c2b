using System.Text.RegularExpressions;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Json;

/// <summary>What can be wrong with the text of a JSON file, one factory a failure.</summary>
internal static partial class JsonProblems
{
    public static Finding Broken(Place at, FindingOwner owner, string message) => new(
        FindingLevel.Stop, "json-broken", owner, at,
        $"The JSON breaks here: {Shorten(message)}",
        "nothing of this file can be read; the other files were reviewed.",
        "look at this place and just before it: a comma between two members, a quote at both ends of a text, a bracket for each bracket.");

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

    private static string Shorten(string message) => Position.Replace(Depth.Replace(message, "nested deeper than 32 levels."), "").Trim();

    [GeneratedRegex(@"\s*(LineNumber|BytePositionInLine): \d+( \| BytePositionInLine: \d+)?\.?")]
    private static partial Regex Position { get; }

    [GeneratedRegex(@"The maximum configured depth of \d+ has been exceeded\. Cannot read next JSON (object|array)\.")]
    private static partial Regex Depth { get; }
}
