using System.Globalization;
using ReleaseKit.Reading.Json;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Mechanisms;

/// <summary>The noise laws by their names in the folder, and the parameters that each takes.</summary>
internal static class LawReader
{
    /// <summary>Between these limits margins are certified; both belong to the range.</summary>
    public const double SmallestParameter = 1e-3;
    public const double LargestParameter = 1e9;

    private static readonly Dictionary<string, LawName> Names = new()
    {
        ["laplace"] = LawName.Laplace,
        ["discrete-laplace"] = LawName.DiscreteLaplace,
        ["gaussian"] = LawName.Gaussian,
        ["discrete-gaussian"] = LawName.DiscreteGaussian,
        ["uniform"] = LawName.Uniform,
        ["discrete-uniform"] = LawName.DiscreteUniform,
        ["staircase"] = LawName.Staircase,
        ["truncated-discrete-laplace"] = LawName.TruncatedDiscreteLaplace,
        ["tabulated"] = LawName.Tabulated,
        ["declared"] = LawName.Declared,
    };

    private static readonly string[] LaterLaws = ["randomised-response", "exponential-quantile"];

    private static readonly string[] AllParameters = ["scale", "sigma", "halfWidth", "epsilon", "gamma", "cutoff", "grid", "file"];

    /// <summary>The name of a law as the folder writes it.</summary>
    public static string Written(LawName law) => Names.First(pair => pair.Value == law).Key;

    public static LawName? Name(ObjectReader keys)
    {
        if (keys.Find("law") is not JsonText { Value: var name } text || !LaterLaws.Contains(name))
            return keys.Choice("law", Names);
        keys.Context.Add(KeyProblems.NotYet(text.At, name, keys.Context.Owner, "leave the figures of this mechanism out of the release for now."));
        return null;
    }

    /// <summary>The parameters of a law; null if one is missing or out of range.</summary>
    public static IReadOnlyDictionary<string, NumberOrColumn>? Parameters(ObjectReader keys, LawName law)
    {
        var takes = Takes(law);
        foreach (var other in AllParameters.Except(takes).Where(keys.Has))
            keys.Context.Add(MechanismProblems.ParameterOfOtherLaw(keys.PlaceOf(other), Written(law), other, takes, keys.Context.Owner));
        foreach (var missing in takes.Where(key => key != "grid" && !keys.Has(key)))
            keys.Context.Add(MechanismProblems.ParameterMissing(keys.At, Written(law), missing, keys.Context.Owner));
        var read = takes.Where(key => key != "file" && keys.Has(key)).ToDictionary(key => key, key => Parameter(keys, key));
        if (read.Values.Any(value => value is null) || takes.Any(key => key != "grid" && !keys.Has(key)))
            return null;
        var parameters = read.ToDictionary(pair => pair.Key, pair => pair.Value!.Value);
        return StepsAreWhole(keys, parameters, law) ? parameters : null;
    }

    /// <summary>The steps of a staircase are as wide as one unit can move a cell.</summary>
    public static IReadOnlyDictionary<string, NumberOrColumn> WithStepWidth(
        IReadOnlyDictionary<string, NumberOrColumn> parameters, LawName law, Sensitivity sensitivity) =>
        law != LawName.Staircase || sensitivity.PerCell is not { } perCell
            ? parameters
            : new Dictionary<string, NumberOrColumn>(parameters) { ["sensitivity"] = NumberOrColumn.Of(perCell) };

    public static bool IsInRange(string key, double value) =>
        key == "gamma" ? value is > 0 and < 1 : value is >= SmallestParameter and <= LargestParameter;

    private static string[] Takes(LawName law) => law switch
    {
        LawName.Laplace => ["scale"],
        LawName.DiscreteLaplace => ["scale", "grid"],
        LawName.Gaussian => ["sigma"],
        LawName.DiscreteGaussian => ["sigma", "grid"],
        LawName.Uniform => ["halfWidth"],
        LawName.DiscreteUniform => ["halfWidth", "grid"],
        LawName.Staircase => ["epsilon", "gamma"],
        LawName.TruncatedDiscreteLaplace => ["scale", "cutoff", "grid"],
        LawName.Tabulated => ["file", "grid"],
        _ => [],
    };

    private static NumberOrColumn? Parameter(ObjectReader keys, string key)
    {
        if (keys.Find(key) is JsonObject && key != "grid")
            return keys.Object(key, MechanismShapes.FromColumn)?.Text("column") is { } column ? NumberOrColumn.From(column) : null;
        if (keys.Find(key) is not JsonNumber number || IsInRange(key, number.Value))
            return keys.Number(key, NumberRange.Any) is { } value ? NumberOrColumn.Of(value) : null;
        keys.Context.Add(key == "gamma"
            ? KeyProblems.OutOfRange(number, key, NumberRange.Share.Words, keys.Context.Owner)
            : MechanismProblems.ParameterOutOfRange(number.At, key, KeyProblems.Cut(number.Digits), keys.Context.Owner));
        return null;
    }

    private static bool StepsAreWhole(ObjectReader keys, IReadOnlyDictionary<string, NumberOrColumn> parameters, LawName law)
    {
        var key = law == LawName.DiscreteUniform ? "halfWidth" : "cutoff";
        var grid = parameters.GetValueOrDefault("grid").Number ?? 1;
        if (law is not (LawName.DiscreteUniform or LawName.TruncatedDiscreteLaplace) || parameters[key].Number is not { } value || IsMultiple(value, grid))
            return true;
        keys.Context.Add(MechanismProblems.NotOnGrid(keys.PlaceOf(key), key, value, grid, keys.Context.Owner));
        return false;
    }

    /// <summary>Whether a number is a multiple of a unit, both taken as the decimals they print as.</summary>
    public static bool IsMultiple(double value, double unit) =>
        Math.Abs(value) < 1e15 && unit is > 1e-12 and < 1e15 && AsDecimal(value) % AsDecimal(unit) == 0;

    private static decimal AsDecimal(double value) =>
        decimal.Parse(value.ToString("R", CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture);
}
