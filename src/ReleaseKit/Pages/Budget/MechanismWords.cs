using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Budget;

/// <summary>A mechanism in words: its law and parameters, how far one unit can move its answers, what follows the noise.</summary>
internal static class MechanismWords
{
    public static string Law(Mechanism mechanism, BudgetWords words)
    {
        var law = words.Say($"budget.law.{mechanism.Law}");
        string[] parameters = [.. mechanism.Parameters.Where(parameter => parameter.Key != "grid").Select(parameter => Parameter(parameter.Key, parameter.Value, words))];
        string[] grid = mechanism.Grid == 1 ? [] : [words.Say("budget.parameter.grid", ("number", Number(mechanism.Grid, words)))];
        string[] all = [.. parameters, .. grid];
        return all.Length == 0 ? law : words.Say("budget.law-with", ("law", law), ("parameters", words.Language.List(all)));
    }

    public static string Sensitivity(Mechanism mechanism, BudgetWords words) => string.Join(' ', SensitivityParts(mechanism.Sensitivity, words));

    public static string? Afterwards(Mechanism mechanism, BudgetWords words)
    {
        string[] steps = [.. mechanism.Afterwards.Select(step => After(step, words)), .. mechanism.Adjusted ? [words.Say("budget.after.adjusted")] : Array.Empty<string>()];
        return steps.Length == 0 ? null : words.Say("budget.after", ("steps", words.Language.List(steps)));
    }

    private static string Parameter(string key, NumberOrColumn value, BudgetWords words) => value.Column is { } column
        ? words.Say("budget.parameter.by-row", ("parameter", words.Say($"budget.parameter.{key}", ("number", "")).Trim()), ("column", column))
        : words.Say($"budget.parameter.{key}", ("number", Number(value.Number ?? 0, words)));

    private static IEnumerable<string> SensitivityParts(Sensitivity sensitivity, BudgetWords words)
    {
        if (sensitivity is { CellsPerUnit: { } cells, PerCell: { } perCell })
            yield return words.Say(
                $"budget.sensitivity.cells.{(cells == 1 ? "one" : "other")}{(sensitivity.Signed ? "-signed" : "")}",
                ("who", words.One), ("cells", Number(cells, words)), ("most", Number(perCell, words)));
        if (sensitivity.PerUnit is { } perUnit)
            yield return words.Say("budget.sensitivity.per-unit", ("who", words.One), ("most", Number(perUnit, words)));
        if (!sensitivity.Moves)
            yield return words.Say("budget.sensitivity.stays", ("who", words.One));
        if (sensitivity.L1 is { } l1)
            yield return words.Say("budget.sensitivity.l1", ("who", words.One), ("most", Number(l1, words)));
        if (sensitivity.L2 is { } l2)
            yield return words.Say("budget.sensitivity.l2", ("who", words.One), ("most", Number(l2, words)));
    }

    private static string After(AfterStep step, BudgetWords words) => step switch
    {
        AfterStep.RoundTo { How: RoundingHow.Nearest } round => words.Say("budget.after.round", ("unit", Number(round.Unit, words))),
        AfterStep.RoundTo { How: RoundingHow.Down } round => words.Say("budget.after.round-down", ("unit", Number(round.Unit, words))),
        AfterStep.RoundTo { How: RoundingHow.Up } round => words.Say("budget.after.round-up", ("unit", Number(round.Unit, words))),
        AfterStep.RoundTo round => words.Say("budget.after.round-at-random", ("unit", Number(round.Unit, words))),
        AfterStep.NotBelow below => words.Say("budget.after.not-below", ("bound", Number(below.Bound, words))),
        AfterStep.NotAbove above => words.Say("budget.after.not-above", ("bound", Number(above.Bound, words))),
        AfterStep.ZeroBelow zero => words.Say("budget.after.zero-below", ("bound", Number(zero.Threshold, words))),
        AfterStep.PublishedFrom from => words.Say("budget.after.published-from", ("bound", Number(from.Threshold, words))),
        _ => throw new ArgumentOutOfRangeException(nameof(step), step, "No words for this step."),
    };

    private static string Number(double number, BudgetWords words) => words.Language.Number(LossPrint.AsWritten(number));
}
