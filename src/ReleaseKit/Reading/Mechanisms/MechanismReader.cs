using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Mechanisms;

/// <summary>One entry of "mechanisms"; the mechanism is null where a part that it cannot do without is wrong.</summary>
internal sealed record MechanismDraft(string Id, Place At, Mechanism? Mechanism, IReadOnlyList<Covering> Covers);

/// <summary>Reads one mechanism.</summary>
internal static class MechanismReader
{
    private static readonly Dictionary<string, MechanismUse> Uses = new()
    {
        ["figures"] = MechanismUse.Figures,
        ["choice-of-rows"] = MechanismUse.ChoiceOfRows,
        ["choice-of-bounds"] = MechanismUse.ChoiceOfBounds,
        ["not-published"] = MechanismUse.NotPublished,
    };

    public static MechanismDraft? Read(JsonValue value, FolderFiles files, ReadContext context)
    {
        if (ObjectReader.Open(value, "mechanisms", MechanismShapes.Mechanism, context) is not { } keys || keys.Text("id") is not { } id)
            return null;
        if (!Slug.IsOne(id))
            context.Add(MechanismProblems.BadId(keys.PlaceOf("id"), id, context.Owner));
        var covers = keys.List("covers").Select(address => (address.At, Text: Values.Text(address, "covers", context)))
            .Where(address => address.Text is not null).Select(address => new Covering(id, address.Text!, address.At));
        return new MechanismDraft(id, keys.At, ReadWhole(id, keys, files), [.. covers]);
    }

    private static Mechanism? ReadWhole(string id, ObjectReader keys, FolderFiles files)
    {
        var law = LawReader.Name(keys);
        var parameters = law is null ? null : LawReader.Parameters(keys, law.Value);
        var table = law == LawName.Tabulated ? TabulatedLaw.Read(keys, files) : null;
        var sensitivity = ReadSensitivity(id, keys, law);
        var spent = ReadSpent(id, keys, law);
        var afterwards = AfterStepsReader.Read(keys);
        var mechanism = Rest(keys);
        if (law is null || parameters is null || sensitivity is null || afterwards is null || (law == LawName.Tabulated && table is null))
            return null;
        return mechanism with
        {
            Id = id,
            Law = law.Value,
            Parameters = LawReader.WithStepWidth(parameters, law.Value, sensitivity),
            Tabulated = table,
            Grid = parameters.GetValueOrDefault("grid").Number ?? 1,
            Sensitivity = sensitivity,
            Spent = spent,
            Afterwards = afterwards,
        };
    }

    /// <summary>What a mechanism can do without; the law and its numbers are filled in afterwards.</summary>
    private static Mechanism Rest(ObjectReader keys) => new()
    {
        Id = "",
        Law = LawName.Declared,
        Parameters = new Dictionary<string, NumberOrColumn>(),
        Sensitivity = new Sensitivity(),
        Afterwards = [],
        Answers = keys.ReaderText("answers"),
        Level = keys.ReaderText("level"),
        Clipped = ReadClipped(keys),
        DenominatorColumn = keys.Object("denominator", MechanismShapes.Denominator)?.Text("public"),
        Use = keys.Choice("use", Uses) ?? MechanismUse.Figures,
        DescribedAt = keys.Find("describedAt") is { } link ? Values.Link(link, "describedAt", keys.Context) : null,
        At = keys.At,
        KeyPlaces = keys.Places,
    };

    private static Sensitivity? ReadSensitivity(string id, ObjectReader keys, LawName? law)
    {
        if (!keys.Has("sensitivity") && law == LawName.Declared)
            return new Sensitivity();
        var said = keys.Object("sensitivity", MechanismShapes.Sensitivity);
        var sensitivity = said is null ? new Sensitivity() : ReadNumbers(said);
        var isSaid = sensitivity is { CellsPerUnit: not null, PerCell: not null } or { L1: not null } or { L2: not null };
        if (!isSaid && (said is null ? !keys.Has("sensitivity") : !IsGiven(said)))
            keys.Context.Add(MechanismProblems.SensitivityMissing(keys.PlaceOf("sensitivity"), id, keys.Context.Owner));
        if (isSaid && law == LawName.Staircase && sensitivity.PerCell is null)
            keys.Context.Add(MechanismProblems.StaircaseNeedsPerCell(keys.PlaceOf("sensitivity"), id, keys.Context.Owner));
        return isSaid && (law != LawName.Staircase || sensitivity.PerCell is not null) ? sensitivity : null;
    }

    /// <summary>Whether the keys that are needed are there; a number of theirs that is wrong has been reported.</summary>
    private static bool IsGiven(ObjectReader keys) => (keys.Has("cellsPerUnit") && keys.Has("perCell")) || keys.Has("l1") || keys.Has("l2");

    private static Sensitivity ReadNumbers(ObjectReader keys) => new()
    {
        CellsPerUnit = keys.Whole("cellsPerUnit", 1, int.MaxValue),
        PerCell = keys.Number("perCell", NumberRange.Positive),
        Signed = keys.Flag("signed") ?? false,
        PerUnit = keys.Number("perUnit", NumberRange.Positive),
        Moves = keys.Flag("moves") ?? true,
        L1 = keys.Number("l1", NumberRange.Positive),
        L2 = keys.Number("l2", NumberRange.Positive),
        L1Levels = keys.Whole("l1Levels", 1, int.MaxValue),
    };

    private static DeclaredLoss? ReadSpent(string id, ObjectReader keys, LawName? law)
    {
        var said = keys.Object("spent", MechanismShapes.Spent);
        if (said is null && law == LawName.Declared && !keys.Has("spent"))
            keys.Context.Add(MechanismProblems.SpentMissing(keys.At, id, keys.Context.Owner));
        if (said is null)
            return null;
        if (!said.Has("epsilon") && !said.Has("delta") && !said.Has("rho"))
            keys.Context.Add(MechanismProblems.SpentEmpty(said.At, keys.Context.Owner));
        return new DeclaredLoss(
            said.Number("epsilon", NumberRange.NotNegative), said.Number("delta", NumberRange.Delta), said.Number("rho", NumberRange.NotNegative));
    }

    private static ClippedTo? ReadClipped(ObjectReader keys)
    {
        if (keys.Object("clipped", MechanismShapes.Clipped) is not { } clipped
            || clipped.Number("from", NumberRange.Any) is not { } from
            || clipped.Number("to", new NumberRange(FormattableString.Invariant($"above {from}"), value => value > from && value <= NumberRange.Largest, "400")) is not { } to)
            return null;
        return new ClippedTo(from, to);
    }
}
