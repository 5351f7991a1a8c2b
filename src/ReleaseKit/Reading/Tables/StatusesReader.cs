using ReleaseKit.Reading.Keys;

namespace ReleaseKit.Reading.Tables;

/// <summary>Reads "statuses": the pattern of status columns, and what marks mean as letters of SDMX CL_OBS_STATUS.</summary>
internal static class StatusesReader
{
    /// <summary>The codes of SDMX CL_OBS_STATUS 2.2 (from memory).</summary>
    public const string Codes = "ABDEFGHIJKLMNOPQSUVW";

    private static readonly Dictionary<string, char> Letters = Codes.ToDictionary(code => code.ToString(), code => code);

    public static StatusDraft Read(ObjectReader table)
    {
        var keys = table.Object("statuses", ReleaseShapes.Statuses);
        var marks = new Dictionary<string, char>();
        foreach (var member in keys?.Members("marks") ?? [])
            if (Values.Text(member.Value, member.Name, table.Context) is { } text)
                AddMark(marks, member, text, table.Context);
        return new StatusDraft(keys?.Text("column"), marks, keys?.PlaceOf("column") ?? table.At);
    }

    private static void AddMark(Dictionary<string, char> marks, Json.JsonMember member, string text, ReadContext context)
    {
        if (Letters.TryGetValue(text, out var letter))
            marks[member.Name] = letter;
        else
            context.Add(KeyProblems.UnknownValue((Json.JsonText)member.Value, member.Name, [.. Letters.Keys], context.Owner));
    }
}
