using ReleaseKit.Appraisal;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>How the total was reached, step by step: words, numbers, rule and source; first each mechanism, then the whole.</summary>
internal static class StepsModel
{
    public static ScriptArray Of(BudgetWords words) => new(
        words.Statement.Steps.GroupBy(step => step.Mechanism ?? "").Select(group => new ScriptObject
        {
            ["name"] = group.Key.Length == 0 ? words.Say("budget.steps.whole") : Name(group.Key, words),
            ["id"] = group.Key,
            ["steps"] = new ScriptArray(group.Select(step => StepOf(step, words))),
        }));

    private static ScriptObject StepOf(AccountStep step, BudgetWords words) => new()
    {
        ["words"] = words.Say($"budget.step.{step.Key}"),
        ["arithmetic"] = step.Arithmetic,
        ["rule"] = words.Rule(step.Rule),
        ["source"] = step.Rule.Source,
    };

    private static string Name(string id, BudgetWords words)
    {
        var mechanism = words.Statement.Mechanisms.First(account => account.Mechanism.Id == id).Mechanism;
        return mechanism.Answers is { } answers ? words.Context.In(answers) : id;
    }
}
