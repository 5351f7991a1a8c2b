using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Mechanisms;

/// <summary>Reads mechanisms.json: whom the guarantee protects, what was allowed, and each mechanism.</summary>
internal static class MechanismsFile
{
    private static readonly Dictionary<string, Neighbouring> Neighbourings = new()
    {
        ["add-or-remove"] = Neighbouring.AddOrRemove,
        ["replace"] = Neighbouring.Replace,
    };

    private static readonly Dictionary<string, Accounting> Accountings = new()
    {
        ["pure"] = Accounting.Pure,
        ["approximate"] = Accounting.Approximate,
        ["concentrated"] = Accounting.Concentrated,
    };

    private static readonly string[] AuthorisedNumbers = ["epsilon", "delta", "rho"];

    public static MechanismsDraft Read(JsonValue root, IReadOnlyDictionary<string, Unit> units, FolderFiles files, ReadContext context)
    {
        if (ObjectReader.Open(root, "mechanisms.json", MechanismShapes.Root, context) is not { } keys)
            return MechanismsDraft.Unread;
        var drafts = keys.List("mechanisms").Select(value => MechanismReader.Read(value, files, context)).OfType<MechanismDraft>().ToList();
        CheckIds(drafts, context);
        CheckComposition(keys, drafts, context);
        var mechanisms = drafts.Select(draft => draft.Mechanism).OfType<Mechanism>().DistinctBy(mechanism => mechanism.Id).ToList();
        return new MechanismsDraft(
            Account(keys, units, mechanisms),
            mechanisms,
            drafts.Select(draft => draft.Id).ToHashSet(),
            [.. drafts.SelectMany(draft => draft.Covers)]);
    }

    private static NoiseAccount? Account(ObjectReader keys, IReadOnlyDictionary<string, Unit> units, IReadOnlyList<Mechanism> mechanisms)
    {
        var unit = keys.Object("unitOfPrivacy", MechanismShapes.UnitOfPrivacy);
        var who = unit is null ? null : Who(unit, units);
        var neighbouring = keys.Choice("neighbouring", Neighbourings);
        var accounting = ReadAccounting(keys);
        var authorised = keys.Object("authorised", MechanismShapes.Authorised) is { } allowed ? ReadAuthorised(allowed, accounting) : null;
        var practice = ReadPractice(keys);
        if (who is null || neighbouring is null || accounting is null || authorised is null)
            return null;
        return new NoiseAccount
        {
            Who = who,
            Over = unit?.ReaderText("over"),
            Neighbouring = neighbouring.Value,
            Accounting = accounting.Value,
            Authorised = authorised,
            Mechanisms = mechanisms,
            Practice = practice,
        };
    }

    private static Unit? Who(ObjectReader unit, IReadOnlyDictionary<string, Unit> units)
    {
        if (unit.Find("who") is JsonObject)
            return unit.Object("who", MechanismShapes.Who) is { } forms && UnitReader.Forms(forms) is { } read
                ? new Unit(read.One, new Dictionary<string, UnitForms> { [unit.Context.Language] = read })
                : null;
        return unit.Text("who") is { } word ? units.GetValueOrDefault(word) ?? UnitReader.AsWritten(word, unit.Context.Language) : null;
    }

    private static Accounting? ReadAccounting(ObjectReader keys)
    {
        if (keys.Find("accounting") is not JsonText { Value: "exact" } exact)
            return keys.Choice("accounting", Accountings);
        keys.Context.Add(KeyProblems.NotYet(exact.At, "accounting\": \"exact", keys.Context.Owner, "write \"accounting\": \"concentrated\" (or pure, approximate): the total is then a little larger, never too small."));
        return null;
    }

    private static Authorised? ReadAuthorised(ObjectReader keys, Accounting? accounting)
    {
        var authorised = new Authorised
        {
            Epsilon = keys.Number("epsilon", NumberRange.Positive),
            Delta = keys.Number("delta", NumberRange.Delta),
            Rho = keys.Number("rho", NumberRange.Positive),
            By = keys.Text("by"),
            On = keys.Find("on") is { } on ? Values.Date(on, "on", keys.Context) : null,
            Paper = keys.Text("paper"),
            Unspent = keys.Text("unspent"),
            Over = keys.Text("over"),
            At = keys.At,
        };
        if (NumbersOf(authorised) != AuthorisedNumbers.Count(keys.Has))
            authorised = authorised with { Epsilon = null, Delta = null, Rho = null };
        if (keys.Has("rho") && (keys.Has("epsilon") || keys.Has("delta")))
            keys.Context.Add(MechanismProblems.AuthorisedTwice(keys.At, keys.Context.Owner));
        if (accounting is null || IsComplete(keys, accounting.Value))
            return authorised;
        keys.Context.Add(MechanismProblems.AuthorisedIncomplete(keys.At, accounting.Value, keys.Context.Owner));
        return null;
    }

    /// <summary>Where one of the numbers could not be read, the others alone would say something else.</summary>
    private static int NumbersOf(Authorised authorised) => new[] { authorised.Epsilon, authorised.Delta, authorised.Rho }.Count(number => number is not null);

    private static bool IsComplete(ObjectReader keys, Accounting accounting) => accounting switch
    {
        Accounting.Pure => keys.Has("epsilon"),
        Accounting.Concentrated => keys.Has("rho") || (keys.Has("epsilon") && keys.Has("delta")),
        _ => keys.Has("epsilon") && keys.Has("delta"),
    };

    private static Practice ReadPractice(ObjectReader keys)
    {
        var said = keys.Object("practice", MechanismShapes.Practice);
        return new Practice(
            said?.Text("heldBy"), said?.Text("sampler"), said?.Text("rows"), said?.Text("corrections"),
            said?.Text("tuned"), said?.Text("span"), said?.Text("renewal"));
    }

    private static void CheckIds(IReadOnlyList<MechanismDraft> drafts, ReadContext context)
    {
        foreach (var twins in drafts.GroupBy(draft => draft.Id).Where(group => group.Count() > 1))
            context.Add(MechanismProblems.DoubledId(twins.Last().At, twins.Key, twins.First().At, context.Owner));
    }

    private static void CheckComposition(ObjectReader keys, IReadOnlyList<MechanismDraft> drafts, ReadContext context)
    {
        if (keys.Object("composition", MechanismShapes.Composition) is not { } composition)
            return;
        var ids = drafts.Select(draft => draft.Id).ToList();
        var named = composition.List("together").Select(value => NameIn(value, ids, context)).OfType<string>().ToHashSet();
        foreach (var left in drafts.Where(draft => !named.Contains(draft.Id)).DistinctBy(draft => draft.Id))
            context.Add(MechanismProblems.JoinsTogether(composition.PlaceOf("together"), left.Id, context.Owner));
    }

    private static string? NameIn(JsonValue value, IReadOnlyList<string> ids, ReadContext context)
    {
        if (value is JsonObject)
        {
            _ = ObjectReader.Open(value, "together", MechanismShapes.Group, context);
            return null;
        }
        var id = Values.Text(value, "together", context);
        if (id is not null && !ids.Contains(id))
            context.Add(MechanismProblems.NotInComposition(value.At, id, ids, context.Owner));
        return id;
    }
}
