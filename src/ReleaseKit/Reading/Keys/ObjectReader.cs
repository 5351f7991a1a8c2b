using ReleaseKit.Reading.Json;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Keys;

/// <summary>
/// One object of a folder's JSON, read by its shape. Opening it reports unknown, doubled, missing and later keys; each getter reports a value of the
/// wrong kind and then answers null, as for a key that is not there.
/// </summary>
public sealed class ObjectReader
{
    private readonly JsonObject json;
    private readonly ObjectShape shape;
    private readonly ReadContext context;

    private ObjectReader(JsonObject json, ObjectShape shape, ReadContext context) => (this.json, this.shape, this.context) = (json, shape, context);

    /// <summary>Reads an object; null, with a stop, if the value is none.</summary>
    public static ObjectReader? Open(JsonValue value, string key, ObjectShape shape, ReadContext context) => Open(value, key, shape, shape.Paste, context);

    private static ObjectReader? Open(JsonValue value, string key, ObjectShape shape, string paste, ReadContext context)
    {
        if (value is not JsonObject json)
        {
            context.Add(KeyProblems.WrongType(value, key, "an object { … }", paste, context.Owner));
            return null;
        }
        CheckKeys(json, shape, context);
        return new ObjectReader(json, shape, context);
    }

    public Place At => json.At;

    public ReadContext Context => context;

    public bool Has(string key) => Find(key) is not null;

    /// <summary>The value of a key, null if it is not there or is null.</summary>
    public JsonValue? Find(string key) => json.Member(key)?.Value is { } value and not JsonNull ? value : null;

    /// <summary>Where the value of a key stands, or the object if the key is not there.</summary>
    public Place PlaceOf(string key) => json.Member(key)?.Value.At ?? json.At;

    /// <summary>Where each given key's value stands.</summary>
    public IReadOnlyDictionary<string, Place> Places => json.Members.DistinctBy(member => member.Name).ToDictionary(member => member.Name, member => member.Value.At);

    public string? Text(string key) => Find(key) is { } value ? Values.Text(value, key, context) : null;

    public ReaderText? ReaderText(string key) => Find(key) is { } value ? Values.ReaderText(value, key, context) : null;

    public double? Number(string key, NumberRange range) => Find(key) is { } value ? Values.Number(value, key, range, context) : null;

    public int? Whole(string key, int from, int to) => (int?)Number(key, NumberRange.Whole(from, to));

    public bool? Flag(string key)
    {
        var value = Find(key);
        if (value is null or JsonFlag)
            return (value as JsonFlag)?.Value;
        context.Add(KeyProblems.WrongType(value, key, "true or false", $"\"{key}\": true", context.Owner));
        return null;
    }

    public T? Choice<T>(string key, IReadOnlyDictionary<string, T> choices) where T : struct
    {
        if (Find(key) is not { } value || Values.Text(value, key, context) is not { } text)
            return null;
        if (choices.TryGetValue(text, out var choice))
            return choice;
        context.Add(KeyProblems.UnknownValue((JsonText)value, key, [.. choices.Keys], context.Owner));
        return null;
    }

    public IReadOnlyList<JsonValue> List(string key)
    {
        var value = Find(key);
        if (value is null or JsonArray)
            return (value as JsonArray)?.Items ?? [];
        context.Add(KeyProblems.WrongType(value, key, "a list [ … ]", $"\"{key}\": [ … ]", context.Owner));
        return [];
    }

    /// <summary>A list that must be given and must hold something.</summary>
    public IReadOnlyList<JsonValue> Filled(string key)
    {
        if (Find(key) is JsonArray { Items.Count: 0 } empty)
            context.Add(KeyProblems.EmptyList(empty.At, key, shape.Must.First(must => must.Key == key).Paste, context.Owner));
        return List(key);
    }

    public ObjectReader? Object(string key, ObjectShape shape) =>
        Find(key) is { } value ? Open(value, key, shape, $"\"{key}\": {shape.Paste}", context) : null;

    /// <summary>The members of an object whose keys are names of the folder's own (units, columns, marks).</summary>
    public IReadOnlyList<JsonMember> Members(string key) => Find(key) is { } value ? Values.Members(value, key, context) : [];

    private static void CheckKeys(JsonObject json, ObjectShape shape, ReadContext context)
    {
        var first = new Dictionary<string, JsonMember>();
        foreach (var member in json.Members)
            if (!first.TryAdd(member.Name, member))
                context.Add(KeyProblems.Doubled(member, first[member.Name], context.Owner));
            else if (shape.Later.Contains(member.Name))
                context.Add(KeyProblems.NotYet(member.At, member.Name, context.Owner, LaterKeys.Instead(member.Name)));
            else if (!shape.Keys.Contains(member.Name))
                context.Add(KeyProblems.Unknown(member, shape, context.Owner));
        foreach (var (key, paste) in shape.Must)
            if (!first.TryGetValue(key, out var member) || member.Value is JsonNull)
                context.Add(KeyProblems.Missing(json, key, paste, context.Owner));
    }
}
