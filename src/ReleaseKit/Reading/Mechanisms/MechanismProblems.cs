using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Mechanisms;

/// <summary>What can be wrong in mechanisms.json beyond single keys, one factory a failure.</summary>
internal static class MechanismProblems
{
    public static Finding AuthorisedTwice(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "authorised-twice", owner, at,
        "What is authorised is given twice: as epsilon and delta, and as rho.",
        "they are two different limits, and the release would be held against one while the budget page promises both.",
        "keep the one that the office decided, \"epsilon\" and \"delta\" or \"rho\", and take the other out.");

    public static Finding AuthorisedIncomplete(Place at, Accounting accounting, FindingOwner owner) => new(
        FindingLevel.Stop, "authorised-incomplete", owner, at,
        $"What is authorised is not given in numbers that {accounting.ToString().ToLowerInvariant()} accounting can be held against.",
        "the budget page compares what was spent with what was allowed.",
        accounting switch
        {
            Accounting.Pure => "give \"epsilon\".",
            Accounting.Concentrated => "give \"epsilon\" and \"delta\", or \"rho\".",
            _ => "give \"epsilon\" and \"delta\".",
        });

    public static Finding DoubledId(Place at, string id, Place first, FindingOwner owner) => new(
        FindingLevel.Stop, "doubled-id", owner, at,
        $"The id \"{id}\" is taken; first at line {first.Line}.",
        "an id must mean one thing.",
        "give one of the two another id.");

    public static Finding BadId(Place at, string id, FindingOwner owner) => new(
        FindingLevel.Stop, "bad-id", owner, at,
        $"\"{KeyProblems.Cut(id)}\" cannot be an id.",
        Slug.IsOne(id) ? "it becomes the name of a folder, and Windows keeps this one for a device." : "ids become parts of addresses and file names: a to z, 0 to 9, - _ and the point only, beginning with a letter or digit.",
        Usable(id) is { } usable ? $"write \"{usable}\"." : "write a short name in these letters.");

    public static Finding JoinsTogether(Place at, string id, FindingOwner owner) => new(
        FindingLevel.Note, "joins-together", owner, at,
        $"\"{id}\" is not named in \"composition\"; its loss is added to the others.",
        "adding is never too little.",
        $"nothing, or name \"{id}\" under \"together\".");

    private static string? Usable(string id)
    {
        var slug = Slug.IsOne(id) ? id : Slug.Of(id).TrimStart('_', '-');
        var name = slug.Split('.')[0];
        var usable = PathRules.IsDevice(name) ? $"{name}-1{slug[name.Length..]}" : slug;
        return Slug.IsOne(usable) ? usable : null;
    }

    public static Finding NotInComposition(Place at, string id, IReadOnlyCollection<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-mechanism", owner, at,
        $"\"composition\" names \"{KeyProblems.Cut(id)}\", which is no mechanism of mechanisms.json.",
        "a loss that was meant to be added to the others may be missing.",
        Nearest.Of(id, known) is { } near ? $"write \"{near}\", or take it out." : $"take it out{(known.Count > 0 ? $", or name one of: {string.Join(", ", known)}" : "")}.");

    public static Finding UnknownMechanism(Place at, string id, IReadOnlyCollection<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "unknown-mechanism", owner, at,
        $"\"{KeyProblems.Cut(id)}\" is no mechanism of mechanisms.json.",
        "no margin can be worked out without it.",
        Nearest.Of(id, known) is { } near ? $"write \"{near}\"." : $"add a mechanism with this id to mechanisms.json{(known.Count > 0 ? $", or name one of: {string.Join(", ", known)}" : ", which has none")}.");

    public static Finding ParameterMissing(Place at, string law, string key, FindingOwner owner) => new(
        FindingLevel.Stop, "parameter-missing", owner, at,
        $"The law \"{law}\" needs \"{key}\".",
        "the margin follows from it.",
        $"add \"{key}\": {(key == "file" ? "\"tables/law.csv\"" : "and its number, or { \"column\": \"…\" } for one in each row")}.");

    public static Finding ParameterOfOtherLaw(Place at, string law, string key, IEnumerable<string> own, FindingOwner owner) => new(
        FindingLevel.Stop, "parameter-of-other-law", owner, at,
        $"The law \"{law}\" has no \"{key}\".",
        "law and parameter do not belong together, so one of them is wrong.",
        own.Any() ? $"take it out, or name the law it belongs to. \"{law}\" takes {string.Join(", ", own)}." : "take it out, or name the law it belongs to.");

    public static Finding ParameterOutOfRange(Place at, string key, string value, FindingOwner owner) => new(
        FindingLevel.Stop, "parameter-out-of-range", owner, at,
        $"\"{key}\" is {value}; it must lie between 0.001 and 1,000,000,000.",
        "outside this range margins are not certified to the last digit.",
        "check the unit the parameter is given in; give figure and noise in a larger or smaller unit if it is right.");

    public static Finding NotOnGrid(Place at, string key, double value, double grid, FindingOwner owner) => new(
        FindingLevel.Stop, "parameter-off-grid", owner, at,
        FormattableString.Invariant($"\"{key}\" is {value}, which is no multiple of the grid {grid}."),
        "noise of this law moves in steps of the grid.",
        $"give \"{key}\" as a multiple of the grid, or the grid that the sampler used.");

    public static Finding SensitivityMissing(Place at, string id, FindingOwner owner) => new(
        FindingLevel.Stop, "sensitivity-missing", owner, at,
        $"\"{id}\" does not say how much one unit can change its answers.",
        "without it the privacy loss cannot be worked out.",
        "add \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 1 }, or with \"l1\" or \"l2\".");

    public static Finding StaircaseNeedsPerCell(Place at, string id, FindingOwner owner) => new(
        FindingLevel.Stop, "sensitivity-missing", owner, at,
        $"\"{id}\" is a staircase law, whose steps are as wide as one unit can move a cell.",
        "without \"perCell\" the width of its steps is not known.",
        "write \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 1 } with the numbers of this mechanism.");

    public static Finding SpentMissing(Place at, string id, FindingOwner owner) => new(
        FindingLevel.Stop, "spent-missing", owner, at,
        $"\"{id}\" has the law \"declared\" and does not say what it spent.",
        "what a declared mechanism costs is taken from there alone.",
        "add \"spent\": { \"epsilon\": 0.1 }, with \"delta\" or \"rho\" as the case may be.");

    public static Finding SpentEmpty(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "spent-missing", owner, at,
        "\"spent\" holds no number.",
        "an empty declaration says nothing.",
        "give \"epsilon\", \"delta\" or \"rho\", or leave \"spent\" out and the computed value is used.");

    public static Finding StepUnclear(Place at, FindingOwner owner) => new(
        FindingLevel.Stop, "after-step-unclear", owner, at,
        "An entry of \"afterwards\" must be exactly one step.",
        "the order of the steps decides the margin.",
        "write one object for each: [ { \"roundTo\": 5 }, { \"notBelow\": 0 } ].");

    public static Finding BoundOffRounding(Place at, string key, double bound, double unit, FindingOwner owner) => new(
        FindingLevel.Stop, "bound-off-rounding", owner, at,
        FormattableString.Invariant($"\"{key}\" {bound} is no multiple of {unit}, to which a later step rounds."),
        "rounding would move values across the bound, and the margin would not hold.",
        "put the bound after \"roundTo\", or give a bound that is a multiple of it.");

    public static Finding LawRow(Place at, string found, FindingOwner owner) => new(
        FindingLevel.Stop, "law-table", owner, at,
        found,
        "the margin is summed from this table.",
        "give two columns, noise,probability: noise a multiple of the grid, each once; probabilities from 0 to 1 that add up to at most 1.");
}
