using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>Reads one entry of "figures" of a table.</summary>
internal static class FigureDraftReader
{
    private static readonly Dictionary<string, MeasureKind> Kinds =
        Enum.GetValues<MeasureKind>().ToDictionary(kind => kind.ToString().ToLowerInvariant());

    private static readonly Dictionary<string, bool> Ins = new() { ["ones"] = true, ["hundreds"] = false };

    private static readonly NumberRange Multipliers = new("a whole number from 1 to 1000000000000", value => value is >= 1 and <= 1e12 && value == Math.Floor(value), "1000");

    public static FigureDraft? Read(JsonValue value, IReadOnlyDictionary<string, Unit> units, ReadContext context)
    {
        if (ObjectReader.Open(value, "figures", ReleaseShapes.Figure, context) is not { } keys || keys.Text("column") is not { } column)
            return null;
        var kind = ReadKind(keys, column);
        var inOnes = keys.Choice("in", Ins) ?? false;
        var (lowest, highest) = Bounds(keys, kind, inOnes);
        return new FigureDraft
        {
            Column = column,
            At = keys.PlaceOf("column"),
            Title = keys.ReaderText("title") ?? ReaderText.Plain(context.Language, column),
            Unit = ReadUnit(keys, units),
            Kind = kind,
            Per = ReadPer(keys, kind),
            InOnes = inOnes,
            Multiplier = keys.Number("multiplier", Multipliers) ?? 1,
            Decimals = keys.Whole("decimals", 0, FigureParser.MostDecimals),
            Lowest = lowest,
            Highest = highest,
            Shown = keys.Flag("shown") ?? true,
            UnadjustedColumn = keys.Text("unadjustedColumn"),
            Rules = keys.Has("noise") ? RulesReader.Read(keys) : null,
            HasLaterRules = RulesReader.HasLater(keys) || ReleaseShapes.Figure.Later.Any(keys.Has),
        };
    }

    private static MeasureKind ReadKind(ObjectReader keys, string column)
    {
        if (!keys.Has("kind"))
            keys.Context.Add(TableProblems.NoKind(keys.PlaceOf("column"), column, keys.Context.Owner));
        return keys.Choice("kind", Kinds) ?? MeasureKind.Amount;
    }

    private static double? ReadPer(ObjectReader keys, MeasureKind kind)
    {
        var per = keys.Number("per", NumberRange.Positive);
        if (kind == MeasureKind.Rate && !keys.Has("per"))
            keys.Context.Add(TableProblems.RateWithoutPer(keys.PlaceOf("kind"), keys.Context.Owner));
        return per;
    }

    /// <summary>The public bounds of what is possible: as declared, else those of the kind.</summary>
    private static (double? Lowest, double? Highest) Bounds(ObjectReader keys, MeasureKind kind, bool inOnes)
    {
        double? least = kind is MeasureKind.Count or MeasureKind.Estimate or MeasureKind.Share ? 0 : null;
        double? most = kind == MeasureKind.Share ? (inOnes ? 1 : 100) : null;
        var lowest = keys.Number("lowest", AtLeast(least)) ?? least;
        var highest = keys.Number("highest", Above(lowest, most)) ?? most;
        return (lowest, highest);
    }

    private static NumberRange AtLeast(double? least) => least is not { } bound
        ? NumberRange.Any
        : new NumberRange(FormattableString.Invariant($"{bound} or more"), value => value >= bound && value <= NumberRange.Largest, "0");

    private static NumberRange Above(double? lowest, double? most) => new(
        FormattableString.Invariant($"above \"lowest\"{(most is null ? "" : $" and at most {most}")}"),
        value => NumberRange.Any.Holds(value) && value > (lowest ?? double.MinValue) && value <= (most ?? double.MaxValue),
        "100");

    private static Unit ReadUnit(ObjectReader keys, IReadOnlyDictionary<string, Unit> units)
    {
        if (keys.Text("unit") is not { } word)
            return UnitReader.AsWritten("", keys.Context.Language);
        if (units.TryGetValue(word, out var unit))
            return unit;
        keys.Context.Add(TableProblems.UndeclaredUnit(keys.PlaceOf("unit"), word, units.Keys, keys.Context.Owner));
        return UnitReader.AsWritten(word, keys.Context.Language);
    }
}
