using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>Every mechanism: what it answers, law, sensitivity, what follows, declared and recomputed loss, share of the whole.</summary>
internal static class MechanismsModel
{
    public static ScriptArray Of(BudgetWords words) => new(words.Statement.Mechanisms.Select(account => RowOf(account, words)));

    private static ScriptObject RowOf(MechanismAccount account, BudgetWords words)
    {
        var mechanism = account.Mechanism;
        var said = new MechanismWords(mechanism, words);
        return new ScriptObject
        {
            ["id"] = mechanism.Id,
            ["name"] = mechanism.Answers is { } answers ? words.Context.In(answers) : mechanism.Id,
            ["level"] = mechanism.Level is { } level ? words.Context.In(level) : null,
            ["use"] = mechanism.Use == MechanismUse.Figures ? null : words.Say($"budget.use.{mechanism.Use}"),
            ["cells"] = Cells(account.Published, "budget.cells", words),
            ["hidden"] = account.Hidden == 0 ? null : Cells(account.Hidden, "budget.cells.hidden", words),
            ["law"] = said.Law(),
            ["sensitivity"] = said.Sensitivity(),
            ["after"] = said.Afterwards(),
            ["clipped"] = said.Clipped(),
            ["declared"] = account.Declared is { } declared ? TotalsModel.InWords(declared, words, LossDigits.AsWritten) : words.Say("budget.not-declared"),
            ["recomputed"] = words.AmountAlone(account.Amount),
            ["delta"] = account.Recomputed.Delta is { } delta and > 0 ? words.Say("budget.with-delta", ("delta", words.Language.Number(LossPrint.AsWritten(delta)))) : null,
            ["lower"] = TotalsModel.IsNothing(account.Lower) ? null : words.Say(
                said.HasSteps ? "budget.mechanisms.lower.before-steps" : "budget.mechanisms.lower", ("lower", TotalsModel.InWords(account.Lower, words, LossDigits.Down))),
            ["rule"] = words.Rule(account.Recomputed.Rule),
            ["source"] = account.Recomputed.Rule.Source,
            ["share"] = words.Say("budget.in-100", ("number", words.Language.Number(PrintedShares.Of(account, words.Statement)))),
            ["only_declared"] = account.OnlyDeclared,
        };
    }

    private static string Cells(long count, string key, BudgetWords words) =>
        words.Say(count == 1 ? $"{key}.one" : $"{key}.other", ("count", words.Language.Number(new PublishedValue(count, 0))));
}
