using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Numbers, laws and contributions as the messages of the budget checks say them.</summary>
internal static class BudgetText
{
    private const int PasteDigits = 7;

    private static readonly (double Times, string Word)[] Large = [(1e6, " million"), (1e3, " thousand"), (1, "")];

    /// <summary>A loss as it can be pasted: rounded up to seven significant digits, so that it is never too little.</summary>
    public static string Paste(double loss)
    {
        if (loss is not (> 1e-12 and < 1e12))
            return Plain(loss);
        var decimals = Math.Clamp(PasteDigits - 1 - (int)Math.Floor(Math.Log10(loss)), 0, 20);
        var unit = UnitAt(decimals);
        return (Math.Ceiling((decimal)loss / unit) * unit / 1.000000000000000000000000000m).ToString("0.####################", CultureInfo.InvariantCulture);
    }

    public static string Plain(double number) => Signs.Of(number);

    /// <summary>"epsilon 6 at delta 0.000000001".</summary>
    public static string Authorised(Authorised authorised) => authorised switch
    {
        { Rho: { } rho } => $"rho {Plain(rho)}",
        { Delta: > 0 and var delta } => $"epsilon {Plain(authorised.Epsilon!.Value)} at delta {Plain(delta)}",
        _ => $"epsilon {Plain(authorised.Epsilon!.Value)} without delta",
    };

    /// <summary>A total as it can be pasted: "rho 0.005540167".</summary>
    public static string Spent(LossTotal total) => total switch
    {
        { Rho: { } rho } => $"rho {Paste(rho)}",
        { Delta: > 0 and var delta } => $"epsilon {Paste(total.Epsilon!.Value)} and delta {Paste(delta)}",
        _ => $"epsilon {Paste(total.Epsilon!.Value)}",
    };

    /// <summary>A limit, rounded down to six decimals.</summary>
    public static string Down(double allowed) => Plain(Math.Floor(allowed * 1e6) / 1e6);

    /// <summary>"Sigma 9.5", "Scale from column \"owed_scale\"".</summary>
    public static string Law(Mechanism mechanism) => mechanism.Law switch
    {
        LawName.Laplace or LawName.DiscreteLaplace => Parameter(mechanism, "scale", "Scale"),
        LawName.Gaussian or LawName.DiscreteGaussian => Parameter(mechanism, "sigma", "Sigma"),
        LawName.Uniform or LawName.DiscreteUniform => Parameter(mechanism, "halfWidth", "Half-width"),
        LawName.TruncatedDiscreteLaplace => $"{Parameter(mechanism, "scale", "Scale")}, {Parameter(mechanism, "cutoff", "cutoff")}",
        LawName.Staircase => $"{Parameter(mechanism, "epsilon", "Epsilon")} with steps of {mechanism.Parameters["sensitivity"].Number:R}",
        _ => "Its law",
    };

    /// <summary>What a sensitivity was declared by: "perCell", 1.</summary>
    public static (string Key, double Value) Declared(Sensitivity sensitivity) => sensitivity switch
    {
        { CellsPerUnit: not null, PerCell: { } most } => ("perCell", most),
        { L1: { } sum } => ("l1", sum),
        _ => ("l2", sensitivity.L2 ?? 0),
    };

    /// <summary>"1 cell a household, 1 a cell".</summary>
    public static string Contribution(Sensitivity sensitivity, NoiseAccount account) => sensitivity switch
    {
        { CellsPerUnit: { } cells, PerCell: { } most } =>
            $"{cells} {(cells == 1 ? "cell" : "cells")} a {One(account)}, {(sensitivity.Signed ? "±" : "")}{Plain(most)} a cell{PerUnit(sensitivity, account)}",
        { L1: { } sum } => $"an l1 of {Plain(sum)}",
        _ => $"an l2 of {Plain(sensitivity.L2 ?? 0)}",
    };

    public static string Relation(Neighbouring neighbouring, NoiseAccount account) => neighbouring == Neighbouring.Replace
        ? $"one {One(account)} in place of another"
        : $"one {One(account)} more or less";

    /// <summary>"household".</summary>
    public static string One(NoiseAccount account) => Forms(account)?.One ?? account.Who.Key;

    /// <summary>"households".</summary>
    public static string Other(NoiseAccount account) => Forms(account)?.Other ?? account.Who.Key;

    /// <summary>The key, the singular and the plural are one unit, however each of the two files writes it.</summary>
    public static bool IsUnitOfPrivacy(Unit unit, NoiseAccount account) => unit.Key.Length > 0 && Words(unit).Intersect(Words(account.Who), StringComparer.OrdinalIgnoreCase).Any();

    public static Place PlaceOf(Mechanism mechanism, string key) => mechanism.KeyPlaces.TryGetValue(key, out var place) ? place : mechanism.At;

    /// <summary>A law as the folder writes it: "discrete-laplace".</summary>
    public static string Written(LawName law) =>
        string.Concat(law.ToString().Select((letter, index) => char.IsUpper(letter) && index > 0 ? $"-{char.ToLowerInvariant(letter)}" : $"{char.ToLowerInvariant(letter)}"));

    public static string Written(Accounting accounting) => accounting.ToString().ToLowerInvariant();

    public static string Written(MeasureKind kind) => kind.ToString().ToLowerInvariant();

    /// <summary>Figures of a kind: "means"; of one that adds up, "sums".</summary>
    public static string Several(MeasureKind kind) => kind switch
    {
        MeasureKind.Count or MeasureKind.Amount => "sums",
        MeasureKind.Index => "indices",
        _ => $"{Written(kind)}s",
    };

    /// <summary>What is said of further figures of so many in all; {0} is how many.</summary>
    public static string More(int count, string one, string several, string whose) => count switch
    {
        < 2 => "",
        2 => one + whose,
        _ => several.Replace("{0}", (count - 1).ToString(CultureInfo.InvariantCulture), StringComparison.Ordinal) + whose,
    };

    /// <summary>A bound on a small chance as "at most 1 in 900 million": two digits, rounded so that it is never too little; from 10^10 on the power of ten.</summary>
    public static string Chance(double chance)
    {
        var places = (int)Math.Floor(-Math.Log10(Math.Max(chance, 1e-300)) + 1e-9);
        if (places >= 10)
            return $"at most 1 in 10^{places}";
        var unit = Math.Pow(10, Math.Max(0, places - 1));
        var (times, word) = Large.First(large => Math.Pow(10, places) >= large.Times);
        return $"at most 1 in {Plain(Math.Floor(1 / chance / unit + 1e-9) * unit / times)}{word}";
    }

    private static string PerUnit(Sensitivity sensitivity, NoiseAccount account) =>
        sensitivity.PerUnit is { } bound ? $", {Plain(bound)} a {One(account)} in all" : "";

    private static IEnumerable<string> Words(Unit unit) => unit.Forms.Values.SelectMany(forms => new[] { forms.One, forms.Other }).Append(unit.Key);

    private static UnitForms? Forms(NoiseAccount account) => account.Who.Forms.Values.FirstOrDefault();

    private static string Parameter(Mechanism mechanism, string key, string word) => mechanism.Parameters.GetValueOrDefault(key) switch
    {
        { Number: { } number } => $"{word} {Plain(number)}",
        { Column: { } column } => $"{word} from column \"{column}\"",
        _ => word,
    };

    private static decimal UnitAt(int decimals)
    {
        var unit = 1m;
        for (var i = 0; i < decimals; i++)
            unit /= 10;
        return unit;
    }
}
