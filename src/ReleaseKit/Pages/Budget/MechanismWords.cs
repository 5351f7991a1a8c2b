using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Budget;

/// <summary>A mechanism in words: its law and parameters, how far one unit can move its answers, what follows the noise.</summary>
internal sealed class MechanismWords(Mechanism mechanism, BudgetWords words)
{
    private readonly MechanismNumbers numbers = new(words.Context, mechanism);

    public string Law()
    {
        var law = words.Say($"budget.law.{mechanism.Law}");
        string[] parameters = [.. mechanism.Parameters.Where(parameter => parameter.Key != "grid").Select(parameter => Parameter(parameter.Key, parameter.Value))];
        string[] grid = mechanism.Grid == 1 ? [] : [words.Say("budget.parameter.grid", ("number", numbers.WithUnit(mechanism.Grid)))];
        string[] all = [.. parameters, .. grid];
        return all.Length == 0 ? law : words.Say("budget.law-with", ("law", law), ("parameters", words.Language.List(all)));
    }

    public string Sensitivity() => string.Join(' ', SensitivityParts(mechanism.Sensitivity));

    public string? Afterwards()
    {
        string[] steps =
        [
            .. mechanism.Afterwards.Select(After),
            .. mechanism.Adjusted ? [words.Say("budget.after.adjusted")] : Array.Empty<string>(),
            .. numbers.FileRounding is { } unit ? [words.Say("budget.after.written", ("unit", unit))] : Array.Empty<string>(),
            .. numbers.Thresholds.Select(from => After(new AfterStep.PublishedFrom(from))),
        ];
        return steps.Length == 0 ? null : words.Say("budget.after", ("steps", words.Language.List(steps)));
    }

    public string? Clipped() => mechanism.Clipped is { } clipped && numbers.Pair(clipped.From, clipped.To) is var (from, to)
        ? words.Say("budget.clipped", ("from", from), ("to", to))
        : null;

    /// <summary>Whether what is published is made from the noised value by further steps: then a loss proven for the noise alone is one before them.</summary>
    public bool HasSteps => mechanism.Afterwards.Count > 0 || mechanism.Adjusted || numbers.Thresholds.Any() || numbers.FileRounding is not null;

    private string Parameter(string key, NumberOrColumn value)
    {
        if (value.Column is not { } column)
            return Named(key, WithUnit(key, value.Number ?? 0));
        return numbers.InColumn(column) is var (smallest, largest)
            ? Named(key, smallest == largest ? WithUnit(key, smallest) : ByRow(numbers.Pair(smallest, largest)))
            : words.Say("budget.parameter.by-row", ("parameter", Named(key, "").Trim()), ("column", column));
    }

    private string ByRow((string From, string To) numbers) => words.Say("budget.parameter.from-to", ("from", numbers.From), ("to", numbers.To));

    private string Named(string key, string number) => words.Say($"budget.parameter.{key}", ("number", number));

    private string WithUnit(string key, double number) => key is "epsilon" or "gamma" ? Number(number) : numbers.WithUnit(number);

    private IEnumerable<string> SensitivityParts(Sensitivity sensitivity)
    {
        if (sensitivity is { CellsPerUnit: { } cells, PerCell: { } perCell })
            yield return words.Say(
                $"budget.sensitivity.cells.{(cells == 1 ? "one" : "other")}{(sensitivity.Signed ? "-signed" : "")}",
                ("who", words.One), ("cells", Number(cells)), ("most", numbers.WithUnit(perCell)));
        if (sensitivity.PerUnit is { } perUnit)
            yield return words.Say("budget.sensitivity.per-unit", ("who", words.One), ("most", numbers.WithUnit(perUnit)));
        if (!sensitivity.Moves)
            yield return words.Say("budget.sensitivity.stays", ("who", words.One));
        if (sensitivity.L1 is { } l1)
            yield return words.Say("budget.sensitivity.l1", ("who", words.One), ("most", numbers.WithUnit(l1)));
        if (sensitivity.L2 is { } l2)
            yield return words.Say("budget.sensitivity.l2", ("who", words.One), ("most", numbers.WithUnit(l2)));
    }

    private string After(AfterStep step) => step switch
    {
        AfterStep.RoundTo { How: RoundingHow.Nearest } round => words.Say("budget.after.round", ("unit", numbers.WithUnit(round.Unit))),
        AfterStep.RoundTo { How: RoundingHow.Down } round => words.Say("budget.after.round-down", ("unit", numbers.WithUnit(round.Unit))),
        AfterStep.RoundTo { How: RoundingHow.Up } round => words.Say("budget.after.round-up", ("unit", numbers.WithUnit(round.Unit))),
        AfterStep.RoundTo round => words.Say("budget.after.round-at-random", ("unit", numbers.WithUnit(round.Unit))),
        AfterStep.NotBelow below => words.Say("budget.after.not-below", ("bound", numbers.WithUnit(below.Bound))),
        AfterStep.NotAbove above => words.Say("budget.after.not-above", ("bound", numbers.WithUnit(above.Bound))),
        AfterStep.ZeroBelow zero => words.Say("budget.after.zero-below", ("bound", numbers.WithUnit(zero.Threshold))),
        AfterStep.PublishedFrom from => words.Say("budget.after.published-from", ("bound", numbers.WithUnit(from.Threshold))),
        _ => throw new ArgumentOutOfRangeException(nameof(step), step, "No words for this step."),
    };

    private string Number(double number) => words.Language.Number(LossPrint.AsWritten(number));
}
