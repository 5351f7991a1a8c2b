using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>Reads one entry of "tables" of release.json.</summary>
internal static class TableDraftReader
{
    private static readonly Dictionary<string, SideColumnOrigin> Origins = new()
    {
        ["public"] = SideColumnOrigin.Public,
        ["published"] = SideColumnOrigin.Published,
        ["confidential"] = SideColumnOrigin.Confidential,
    };

    private static readonly Dictionary<string, HiddenBy> Hiders = new()
    {
        ["public-rule"] = HiddenBy.PublicRule,
        ["noised-value"] = HiddenBy.NoisedValue,
        ["value-before-noise"] = HiddenBy.ValueBeforeNoise,
    };

    /// <summary>The draft, or null if the table has no id, file, stub or figures that could be read.</summary>
    public static TableDraft? Read(JsonValue value, IReadOnlyDictionary<string, Unit> units, ReadContext context)
    {
        if (ObjectReader.Open(value, "tables", ReleaseShapes.Table, context) is not { } keys)
            return null;
        var id = ReadId(keys);
        var file = keys.Text("file");
        var stub = keys.Filled("stub").Select(one => ReadStub(one, context)).OfType<StubDraft>().ToList();
        var figures = keys.Filled("figures").Select(one => FigureDraftReader.Read(one, units, context)).OfType<FigureDraft>().ToList();
        var rest = Rest(keys);
        CheckRows(keys);
        return id is null || file is null || stub.Count == 0 || figures.Count == 0
            ? null
            : rest with { Id = id, File = file, Stub = stub, Figures = figures };
    }

    private static string? ReadId(ObjectReader keys)
    {
        if (keys.Text("id") is not { } id)
            return null;
        if (!Slug.IsOne(id) || Files.PathRules.IsDevice(id))
            keys.Context.Add(Mechanisms.MechanismProblems.BadId(keys.PlaceOf("id"), id, keys.Context.Owner));
        return id;
    }

    /// <summary>What a table can do without.</summary>
    private static TableDraft Rest(ObjectReader keys) => new()
    {
        Id = "",
        At = keys.PlaceOf("id"),
        File = "",
        FileAt = keys.PlaceOf("file"),
        Title = keys.ReaderText("title") ?? ReaderText.Plain(keys.Context.Language, ""),
        Universe = keys.ReaderText("universe"),
        Source = keys.ReaderText("source"),
        Notes = [.. keys.List("notes").Select(note => ReadNote(note, keys.Context)).OfType<NoteDraft>()],
        Stub = [],
        Figures = [],
        Columns = [.. keys.Members("columns").Select(column => ReadColumn(column, keys.Context)).OfType<SideDraft>()],
        Adds = [.. keys.List("adds").Select(addition => ReadAddition(addition, keys.Context)).OfType<AdditionDraft>()],
        CutBy = keys.Object("page", ReleaseShapes.Page) is { } page ? ColumnName(page, "cutBy") : null,
        Places = ColumnName(keys, "places"),
        Hidden = ReadHidden(keys),
        Statuses = StatusesReader.Read(keys),
        Context = keys.Context,
    };

    private static Named<string>? ColumnName(ObjectReader keys, string key) =>
        keys.Text(key) is { } name ? new Named<string>(name, keys.PlaceOf(key)) : null;

    private static NoteDraft? ReadNote(JsonValue value, ReadContext context)
    {
        if (value is not JsonObject json || (json.Member("text") is null && json.Member("at") is null))
            return Values.ReaderText(value, "notes", context) is { } plain ? new NoteDraft(new TableNote(null, plain), value.At) : null;
        return ObjectReader.Open(value, "notes", ReleaseShapes.Note, context) is { } keys && keys.ReaderText("text") is { } text
            ? new NoteDraft(new TableNote(keys.Text("at"), text), keys.PlaceOf("at"))
            : null;
    }

    private static StubDraft? ReadStub(JsonValue value, ReadContext context)
    {
        if (ObjectReader.Open(value, "stub", ReleaseShapes.Stub, context) is not { } keys || keys.Text("column") is not { } column)
            return null;
        var title = keys.ReaderText("title") ?? ReaderText.Plain(context.Language, column);
        return new StubDraft(column, title, keys.Text("all"), keys.Flag("period"), keys.PlaceOf("column"));
    }

    private static SideDraft? ReadColumn(JsonMember member, ReadContext context) =>
        ObjectReader.Open(member.Value, member.Name, ReleaseShapes.Column, context.For(FindingOwner.Noise)) is { } keys
        && keys.Choice("from", Origins) is { } from
            ? new SideDraft(member.Name, from, keys.Text("mechanism"), member.At)
            : null;

    private static AdditionDraft? ReadAddition(JsonValue value, ReadContext context) =>
        ObjectReader.Open(value, "adds", ReleaseShapes.Addition, context) is { } keys
        && keys.Text("figure") is { } figure && keys.Text("over") is { } over
            ? new AdditionDraft(figure, over, keys.Text("total"), keys.At)
            : null;

    private static Hiding? ReadHidden(ObjectReader table) =>
        table.Object("hidden", ReleaseShapes.Hidden) is { } keys && keys.Choice("by", Hiders) is { } by
            ? new Hiding(by, keys.Flag("inTotals") ?? false) { At = keys.PlaceOf("by") }
            : null;

    /// <summary>"rows" is "public", or an object of a later version.</summary>
    private static void CheckRows(ObjectReader table)
    {
        if (table.Find("rows") is JsonObject)
            _ = table.Object("rows", ReleaseShapes.Rows);
        else
            _ = table.Choice("rows", new Dictionary<string, bool> { ["public"] = true });
    }
}
