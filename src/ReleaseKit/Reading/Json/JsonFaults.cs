using System.Text;
using System.Text.Json;
using System.Text.RegularExpressions;

namespace ReleaseKit.Reading.Json;

/// <summary>What is wrong with the text of a JSON file where its reader stopped, in words of our own: the reader's are for those who call it.</summary>
internal static partial class JsonFaults
{
    private const string CommentForm = "A comment is written // to the end of the line, or /* … */.";

    /// <summary>Words of the reader that tell its messages apart, and what we say; {0} is the character that stands there.</summary>
    private static readonly (Regex Message, string Words)[] Known =
    [
        (SingleValue, "There is {0} after the end of it all."),
        (AfterValue, "There is {0} where a comma or a closing bracket should stand."),
        (AfterName, "There is {0} where a colon should stand."),
        (StartOfName, "There is {0} where a key in double quotes should begin."),
        (Literal, "There is a word without quotes; only true, false and null are written so."),
        (Escape, "There is {0} after a backslash in a text; a backslash itself is written \\\\."),
        (LineInText, "A text in double quotes must end on its line; a line break in it is written \\n."),
        (Surrogate, "The \\u escape is half of a character."),
        (Comment, CommentForm),
        (NumberForm, "This is not how a number is written: digits, with a point before the broken part."),
        (StartOfValue, "There is {0} where a value should begin."),
    ];

    /// <summary>What stands where the reader stopped.</summary>
    /// <param name="message">The reader's message.</param>
    /// <param name="rest">The text from that place on; not empty.</param>
    public static string Words(string message, ReadOnlySpan<byte> rest)
    {
        var known = rest[0] == (byte)'/' ? CommentForm : Known.FirstOrDefault(pair => pair.Message.IsMatch(message)).Words ?? "There is {0}, which cannot stand here.";
        return known.Replace("{0}", Character(rest), StringComparison.Ordinal);
    }

    /// <summary>Whether a quote stands there that JSON does not know.</summary>
    public static bool IsOtherQuote(ReadOnlySpan<byte> rest)
    {
        _ = Rune.DecodeFromUtf8(rest, out var rune, out _);
        return rune.Value is '\'' or '`' or '´' or '«' or '»' or '‘' or '’' or '‚' or '“' or '”' or '„' or '″';
    }

    /// <summary>The innermost bracket that is still open where the text ends; null if it breaks before, or ends outside all brackets.</summary>
    public static (char Bracket, long Offset)? Open(byte[] text, JsonReaderOptions options)
    {
        var reader = new Utf8JsonReader(text, isFinalBlock: false, new JsonReaderState(options));
        var open = new Stack<(char, long)>();
        try
        {
            while (reader.Read())
                if (reader.TokenType is JsonTokenType.StartObject or JsonTokenType.StartArray)
                    open.Push((reader.TokenType == JsonTokenType.StartObject ? '{' : '[', reader.TokenStartIndex));
                else if (reader.TokenType is JsonTokenType.EndObject or JsonTokenType.EndArray)
                    open.Pop();
        }
        catch (JsonException)
        {
            return null;
        }
        return open.TryPeek(out var innermost) ? innermost : null;
    }

    /// <summary>Whether the reader stopped at the depth it was given.</summary>
    public static bool IsDepth(string message) => Depth.IsMatch(message);

    private static string Character(ReadOnlySpan<byte> rest)
    {
        _ = Rune.DecodeFromUtf8(rest, out var rune, out _);
        return Rune.IsControl(rune) || Rune.IsWhiteSpace(rune) ? rune.Value == '\n' ? "the end of the line" : $"U+{rune.Value:X4}" : $"\"{rune}\"";
    }

    [GeneratedRegex("single JSON value")]
    private static partial Regex SingleValue { get; }

    [GeneratedRegex("after a value|without a matching open")]
    private static partial Regex AfterValue { get; }

    [GeneratedRegex("after a property name")]
    private static partial Regex AfterName { get; }

    [GeneratedRegex("start of a property name")]
    private static partial Regex StartOfName { get; }

    [GeneratedRegex("JSON literal")]
    private static partial Regex Literal { get; }

    [GeneratedRegex("escapable character|hex digit")]
    private static partial Regex Escape { get; }

    [GeneratedRegex("within a JSON string|end of string")]
    private static partial Regex LineInText { get; }

    [GeneratedRegex("surrogate")]
    private static partial Regex Surrogate { get; }

    [GeneratedRegex("comment")]
    private static partial Regex Comment { get; }

    [GeneratedRegex("number|digit|leading zero")]
    private static partial Regex NumberForm { get; }

    [GeneratedRegex("start of a value")]
    private static partial Regex StartOfValue { get; }

    [GeneratedRegex("configured depth")]
    private static partial Regex Depth { get; }
}
