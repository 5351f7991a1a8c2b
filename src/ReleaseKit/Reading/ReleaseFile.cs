using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading;

/// <summary>Reads release.json into a draft.</summary>
internal static class ReleaseFile
{
    public static ReleaseDraft? Read(JsonValue root, ReadContext context)
    {
        if (ObjectReader.Open(root, "release.json", ReleaseShapes.Root, context) is not { } keys)
            return null;
        var units = UnitReader.Read(keys);
        var values = keys.List("tables");
        var tables = values.Select(table => TableDraftReader.Read(table, units, context)).OfType<TableDraft>().ToList();
        if (keys.Has("tables") && values.Count == 0)
            context.Add(ReleaseProblems.NoTables(keys.PlaceOf("tables"), context.Owner));
        return new ReleaseDraft
        {
            Head = HeadReader.Read(keys),
            Units = units,
            Tables = tables,
            Narrative = [.. keys.List("narrative").Select(value => ReadNarrative(value, context)).OfType<Named<(string, string)>>()],
            Short = [.. keys.Members("short").Select(member => ReadShort(member, context)).OfType<Named<(string, string)>>()],
            Headlines = [.. keys.List("headlines").Select(value => ReadHeadline(value, context)).OfType<Named<Headline>>()],
            Charts = [.. keys.List("charts").Select(value => ReadChart(value, context)).OfType<Named<ChartOrder>>()],
            HasAllTables = tables.Count == values.Count,
        };
    }

    private static Named<(string, string)>? ReadNarrative(JsonValue value, ReadContext context)
    {
        if (ObjectReader.Open(value, "narrative", ReleaseShapes.Narrative, context) is not { } keys || keys.Text("file") is not { } file)
            return null;
        var language = keys.Text("language") ?? context.Language;
        if (language == context.Language)
            return new Named<(string, string)>((file, language), keys.PlaceOf("file"));
        context.Add(ReleaseProblems.LanguageNotYet(keys.PlaceOf("language"), language, context.Owner));
        return null;
    }

    private static Named<(string, string)>? ReadShort(JsonMember member, ReadContext context)
    {
        if (!Slug.IsOne(member.Name))
            context.Add(Mechanisms.MechanismProblems.BadId(member.At, member.Name, context.Owner));
        return Values.Text(member.Value, member.Name, context) is { } address
            ? new Named<(string, string)>((member.Name, address), member.Value.At)
            : null;
    }

    private static Named<Headline>? ReadHeadline(JsonValue value, ReadContext context)
    {
        if (value is JsonText)
            return Values.Text(value, "headlines", context) is { } address ? new Named<Headline>(new Headline(address, null, null), value.At) : null;
        return ObjectReader.Open(value, "headlines", ReleaseShapes.Headline, context) is { } keys && keys.Text("figure") is { } figure
            ? new Named<Headline>(new Headline(figure, keys.ReaderText("title"), keys.ReaderText("meaning")), keys.PlaceOf("figure"))
            : null;
    }

    private static Named<ChartOrder>? ReadChart(JsonValue value, ReadContext context)
    {
        if (ObjectReader.Open(value, "charts", ReleaseShapes.Chart, context) is not { } keys
            || keys.Text("id") is not { } id || keys.ReaderText("title") is not { } title || keys.Text("figures") is not { } figures)
            return null;
        if (!Slug.IsOne(id))
            context.Add(Mechanisms.MechanismProblems.BadId(keys.PlaceOf("id"), id, context.Owner));
        return new Named<ChartOrder>(new ChartOrder(id, title, figures, ReadForm(keys)) { At = keys.PlaceOf("figures") }, keys.PlaceOf("figures"));
    }

    /// <summary>The form; beside a stop the one that is worked out, so that the chart's id stays known.</summary>
    private static string ReadForm(ObjectReader keys)
    {
        var form = keys.Text("form") ?? "ordered";
        switch (form)
        {
            case "ordered":
                return form;
            case "series" or "grouped" or "difference":
                keys.Context.Add(KeyProblems.NotYet(keys.PlaceOf("form"), $"form\": \"{form}", keys.Context.Owner, "write \"form\": \"ordered\", or leave the chart out for now."));
                return "ordered";
            default:
                keys.Context.Add(KeyProblems.UnknownValue((JsonText)keys.Find("form")!, "form", ["ordered", "series", "grouped", "difference"], keys.Context.Owner));
                return "ordered";
        }
    }
}
