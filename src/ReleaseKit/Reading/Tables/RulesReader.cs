using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>Reads "noise": a list of rules, of which the first that fits a row decides. Its findings are the noise side's.</summary>
internal static class RulesReader
{
    /// <summary>A byte numbers the rules, and one number is kept for rows that no rule fits.</summary>
    public const int MostRules = byte.MaxValue - 1;

    private static readonly string[] Ends = ["mechanism", "sumOver", "exact", "public"];

    public static IReadOnlyList<RuleDraft> Read(ObjectReader figure)
    {
        var context = figure.Context.For(FindingOwner.Noise);
        var values = figure.List("noise");
        if (values.Count > MostRules)
            context.Add(TableProblems.TooManyRules(figure.PlaceOf("noise"), values.Count, context.Owner));
        return [.. values.Take(MostRules).Select(value => ReadRule(value, context)).OfType<RuleDraft>()];
    }

    /// <summary>Whether a rule asks for what a later version works out.</summary>
    public static bool HasLater(ObjectReader figure) =>
        figure.Find("noise") is JsonArray { Items: var rules }
        && rules.OfType<JsonObject>().Any(rule => ReleaseShapes.NoiseRule.Later.Any(key => rule.Member(key) is not null));

    private static RuleDraft? ReadRule(JsonValue value, ReadContext context)
    {
        if (ObjectReader.Open(value, "noise", ReleaseShapes.NoiseRule, context) is not { } keys)
            return null;
        var where = keys.Members("where").Select(member => (member.Name, Text: Values.Text(member.Value, member.Name, context))).ToList();
        var isRead = keys.Find("where") is null or JsonObject && where.TrueForAll(pair => pair.Text is not null);
        var end = ReadEnd(keys);
        return new RuleDraft([.. where.Where(pair => pair.Text is not null).Select(pair => new StubValue(pair.Name, pair.Text!))], keys.PlaceOf("where"), isRead ? end : null, keys.At);
    }

    private static RuleEnd? ReadEnd(ObjectReader keys)
    {
        var ends = Ends.Concat(ReleaseShapes.NoiseRule.Later).Where(keys.Has).ToList();
        if (ends.Count != 1)
            keys.Context.Add(TableProblems.RuleEnds(keys.At, ends, keys.Context.Owner));
        return ends is [var end] ? ReadEnd(keys, end) : null;
    }

    private static RuleEnd? ReadEnd(ObjectReader keys, string end) => end switch
    {
        "mechanism" => keys.Text(end) is { } id ? new RuleEnd.Mechanism(id, keys.PlaceOf(end)) : null,
        "sumOver" => keys.Text(end) is { } column ? new RuleEnd.SumOver(column, keys.PlaceOf(end)) : null,
        "exact" => keys.ReaderText(end) is { } reason ? new RuleEnd.Exact(reason, keys.PlaceOf(end)) : null,
        "public" => keys.ReaderText(end) is { } source ? new RuleEnd.Public(source) : null,
        _ => null,
    };
}
