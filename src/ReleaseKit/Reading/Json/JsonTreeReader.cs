using System.Text;
using System.Text.Json;
using ReleaseKit.Reading.Files;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Json;

/// <summary>Reads a JSON file into a tree of values that know their places. Comments and trailing commas are allowed; depth is bounded.</summary>
public static class JsonTreeReader
{
    private static JsonReaderOptions Options { get; } = new()
    {
        AllowTrailingCommas = true,
        CommentHandling = JsonCommentHandling.Skip,
        MaxDepth = FolderLimits.JsonDepth,
    };

    /// <summary>The tree, or null if the file is no JSON; then the log has the stop that says where it breaks.</summary>
    public static JsonValue? Read(string file, byte[] bytes, FindingOwner owner, FindingLog log)
    {
        var text = WithoutMark(bytes);
        var lines = new LineMap(file, text);
        if (EncodingProblem(file, text, bytes, lines, owner) is { } problem)
        {
            log.Add(problem);
            return null;
        }
        try
        {
            return ReadRoot(text, lines);
        }
        catch (JsonException broken)
        {
            log.Add(Problem(broken, text, lines, owner));
            return null;
        }
    }

    private static Finding Problem(JsonException broken, byte[] text, LineMap lines, FindingOwner owner)
    {
        var offset = lines.OffsetOf(broken.LineNumber ?? 0, broken.BytePositionInLine ?? 0);
        if (JsonFaults.IsDepth(broken.Message))
            return JsonProblems.TooDeep(lines.At(offset), owner);
        if (JsonFaults.Open(text, Options) is { } open)
            return JsonProblems.Unfinished(lines.At(text.Length), owner, open.Bracket, lines.At(open.Offset));
        if (offset >= text.Length)
            return JsonProblems.NoValue(lines.At(offset), owner);
        var words = JsonFaults.Words(broken.Message, text.AsSpan(offset));
        return JsonFaults.IsOtherQuote(text.AsSpan(offset)) ? JsonProblems.OtherQuote(lines.At(offset), owner, words) : JsonProblems.Broken(lines.At(offset), owner, words);
    }

    private static byte[] WithoutMark(byte[] bytes) => bytes is [0xEF, 0xBB, 0xBF, ..] ? bytes[3..] : bytes;

    private static Finding? EncodingProblem(string file, byte[] text, byte[] bytes, LineMap lines, FindingOwner owner)
    {
        if (bytes is [0xFF, 0xFE, ..] or [0xFE, 0xFF, ..])
            return JsonProblems.Encoding(new Place(file), owner, "UTF-16");
        var invalid = Utf8Text.FirstInvalid(text);
        if (invalid >= 0)
            return JsonProblems.Encoding(lines.At(invalid), owner, "Windows-1252 or Latin-1");
        var nul = text.AsSpan().IndexOf((byte)0);
        return nul >= 0 ? JsonProblems.Nul(lines.At(nul), owner) : null;
    }

    private static JsonValue ReadRoot(byte[] text, LineMap lines)
    {
        var reader = new Utf8JsonReader(text, Options);
        reader.Read();
        var root = ReadValue(ref reader, lines);
        reader.Read(); // anything after the value is an error
        return root;
    }

    private static JsonValue ReadValue(ref Utf8JsonReader reader, LineMap lines)
    {
        var at = lines.At(reader.TokenStartIndex);
        return reader.TokenType switch
        {
            JsonTokenType.StartObject => ReadObject(ref reader, lines, at),
            JsonTokenType.StartArray => ReadArray(ref reader, lines, at),
            JsonTokenType.String => new JsonText(at, Text(ref reader, at)),
            JsonTokenType.Number => new JsonNumber(at, Encoding.UTF8.GetString(reader.ValueSpan)),
            JsonTokenType.Null => new JsonNull(at),
            var flag => new JsonFlag(at, flag == JsonTokenType.True),
        };
    }

    private static JsonObject ReadObject(ref Utf8JsonReader reader, LineMap lines, Place at)
    {
        var members = new List<JsonMember>();
        while (reader.Read() && reader.TokenType != JsonTokenType.EndObject)
        {
            var key = lines.At(reader.TokenStartIndex);
            var name = Text(ref reader, key);
            reader.Read();
            members.Add(new JsonMember(name, key, ReadValue(ref reader, lines)));
        }
        return new JsonObject(at, members);
    }

    private static JsonArray ReadArray(ref Utf8JsonReader reader, LineMap lines, Place at)
    {
        var items = new List<JsonValue>();
        while (reader.Read() && reader.TokenType != JsonTokenType.EndArray)
            items.Add(ReadValue(ref reader, lines));
        return new JsonArray(at, items);
    }

    private static string Text(ref Utf8JsonReader reader, Place at)
    {
        try
        {
            return reader.GetString() ?? "";
        }
        catch (InvalidOperationException lone)
        {
            throw new JsonException("A \\u escape is half of a surrogate pair.", null, at.Line - 1, at.Column - 1, lone);
        }
    }
}
