using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;
using ReleaseKit.Wording;

namespace ReleaseKit.Reading.Tables;

/// <summary>What can be wrong between totals and their parts, one factory a failure.</summary>
internal static class TotalProblems
{
    public static Finding NoTotalRow(Place at, string column, string total, IEnumerable<string> known, FindingOwner owner) => new(
        FindingLevel.Stop, "total-missing", owner, at,
        $"No row has \"{KeyProblems.Cut(total)}\" in column \"{column}\", which \"all\" gives as the heading of totals.",
        "a total under another heading would be counted among its parts.",
        Nearest.Of(total, known) is { } near ? $"write \"all\": \"{near}\"." : "write the heading that totals have in the CSV, or take \"all\" out if there is none.");

    public static Finding LooksLikeTotal(Place at, string column, string label, int line, FindingOwner owner) => new(
        FindingLevel.Caution, "looks-like-total", owner, at,
        $"\"{KeyProblems.Cut(label)}\" in column \"{column}\", first at line {line} of the CSV, reads like the heading of totals, and \"all\" does not say so.",
        "the total would be counted among its own parts: in charts, in selections, and in what one unit costs.",
        $"if it is the total, write {{ \"column\": \"{column}\", …, \"all\": \"{KeyProblems.Cut(label)}\" }}; if it is one row among the others, it may stand.");

    public static Finding LooksLikePeriod(Place at, string column, string first, bool isIso, FindingOwner owner) => new(
        FindingLevel.Caution, "looks-like-period", owner, at,
        $"The headings in column \"{column}\" all read like periods, such as \"{KeyProblems.Cut(first)}\", and \"period\" does not say so.",
        "what is counted in several periods stands in several cells: left unsaid, what one unit costs would come out too small.",
        $"if one unit can be counted in several of them, {(isIso ? "" : "write them as 2031, 2031-Q1, 2031-03 or 2030-07/2031-06, and ")}write {{ \"column\": \"{column}\", …, \"period\": true }}; if each unit is in one of them only, as by year of birth, write {{ \"column\": \"{column}\", …, \"period\": false }}.");

    public static Finding NotATotal(Place at, string address, string column, FindingOwner owner) => new(
        FindingLevel.Stop, "sum-not-a-total", owner, at,
        $"{address} has the rule \"sumOver\" \"{column}\" but is no total there.",
        "only a row whose heading in that column is the one for all, or the \"parent\" of others in labels.csv, is the sum of other rows.",
        $"add \"where\": {{ \"{column}\": \"…\" }} with the heading of totals to this rule, or give \"all\" to the stub column, or name it in labels.csv as the \"parent\" of its parts.")
    {
        Address = address,
    };

    public static Finding NoParts(Place at, string address, string column, FindingOwner owner) => new(
        FindingLevel.Stop, "parts-missing", owner, at,
        $"{address} is declared as the sum over \"{column}\", but none of its parts is in the table.",
        "its margin follows from the noise of its parts.",
        "publish the parts, or name the mechanism of the total.")
    {
        Address = address,
    };

    public static Finding SumDiffers(Place at, string address, string column, string published, string sum, string gap, string? hidden, FindingOwner owner) => new(
        FindingLevel.Stop, "sum-differs", owner, at,
        $"{address} is {published}, but its parts over \"{column}\" add up to {sum}: a gap of {gap}.",
        "a sum of published parts has their noise and no other; with a gap, something else was added.",
        hidden ?? "correct the total; or, if it has noise of its own, end its rule in \"mechanism\".")
    {
        Address = address,
    };

    public static Finding SumOfNothing(Place at, string address, string column, int parts, FindingOwner owner) => new(
        FindingLevel.Stop, "sum-of-nothing", owner, at,
        $"{address} is 0, but {(parts == 1 ? "its one part" : $"none of its {Numerals.Digits(parts)} parts")} over \"{column}\" has {(parts == 1 ? "no" : "a")} number.",
        "nothing was added up here, and readers would take the 0 for a count of none.",
        "leave the cell of the total empty, or write in it what its parts have in place of a number. If the total does hold hidden parts, publish it as it is and say so: \"hidden\": { \"by\": …, \"inTotals\": true }.")
    {
        Address = address,
    };

    public const string SayInTotals = "if hidden parts are counted in the total, say so: \"hidden\": { \"by\": …, \"inTotals\": true }. Else correct the total.";

    public static Finding NoTotals(Place at, string figure, string over, string total, FindingOwner owner) => new(
        FindingLevel.Stop, "total-missing", owner, at,
        $"\"{figure}\" is said to add up over \"{over}\" to \"{KeyProblems.Cut(total)}\", but no row has that heading.",
        "readers would be told of a total that is not there.",
        "add the row, correct \"total\", or take the entry out.");

    public static Finding NoTotalName(Place at, string over, FindingOwner owner) => new(
        FindingLevel.Stop, "missing-key", owner, at,
        $"\"adds\" over \"{over}\" does not say which row is the total.",
        "the stub column gives no heading for all.",
        "add \"total\": \"…\" with the heading of the total.");

    public static Finding PartsNotYet(Place at, string address, string why, FindingOwner owner) => new(
        FindingLevel.Stop, "not-yet", owner, at,
        $"\"sumOver\": {address} is a sum of parts {why}; its margin is not worked out by this version of the program.",
        "adding margins, or assuming a bell curve, would give a wrong one.",
        "leave these totals out of the table, or publish them with noise of their own.")
    {
        Address = address,
    };
}
