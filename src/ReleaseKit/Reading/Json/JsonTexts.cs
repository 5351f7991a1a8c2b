namespace ReleaseKit.Reading.Json;

/// <summary>All texts of a tree, in the order of the file.</summary>
internal static class JsonTexts
{
    public static IEnumerable<JsonText> In(JsonValue value) => value switch
    {
        JsonText text => [text],
        JsonArray list => list.Items.SelectMany(In),
        JsonObject keys => keys.Members.SelectMany(member => In(member.Value)),
        _ => [],
    };
}
