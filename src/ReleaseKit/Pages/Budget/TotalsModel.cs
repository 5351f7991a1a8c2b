using ReleaseKit.Appraisal;
using ReleaseKit.Appraisal.Budget;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>The totals side by side: authorised, declared, worked out here, smallest bound, lower bound; each with its rule and source.</summary>
internal static class TotalsModel
{
    public static ScriptObject Of(BudgetWords words)
    {
        var statement = words.Statement;
        return new ScriptObject
        {
            ["promise"] = Promise(words),
            ["rows"] = new ScriptArray(Rows(words)),
            ["has_declared"] = statement.Declared is not null,
        };
    }

    /// <summary>The promise in one line: "at most X, shown by rule Y".</summary>
    private static string Promise(BudgetWords words)
    {
        var bound = words.Statement.SmallestBound;
        var key = words.Statement.IsWithinAuthorised ? "budget.promise.kept" : "budget.promise.open";
        return words.Say(key, ("bound", InWords(bound, words, LossDigits.Up)), ("rule", words.Rule(bound.Rule)), ("promise", InWords(words.Statement.Promise, words, LossDigits.AsWritten)));
    }

    /// <summary>"epsilon 5.983 at delta 0.000000001", "rho 0.11".</summary>
    public static string InWords(LossTotal total, BudgetWords words, LossDigits digits)
    {
        if (total.Epsilon is not { } epsilon)
            return words.Say("budget.total.rho", ("rho", Number(total.Rho ?? 0, words, digits)));
        return total.Delta is { } delta and > 0
            ? words.Say("budget.total.epsilon-delta", ("epsilon", Number(epsilon, words, digits)), ("delta", Delta(delta, words, digits)))
            : words.Say("budget.total.epsilon", ("epsilon", Number(epsilon, words, digits)));
    }

    /// <summary>Whether a lower bound is one of nothing: then it is not worth saying.</summary>
    public static bool IsNothing(LossTotal total) => total is { Epsilon: null or 0, Delta: null or 0, Rho: null or 0 };

    private static IEnumerable<ScriptObject> Rows(BudgetWords words)
    {
        var statement = words.Statement;
        yield return Row("budget.total.authorised", statement.Promise, words, LossDigits.AsWritten);
        if (statement.Declared is { } declared)
            yield return Row("budget.total.declared", declared, words, DigitsOfDeclared(statement));
        yield return Row("budget.total.recomputed", statement.Recomputed, words, LossDigits.Up);
        foreach (var conversion in statement.Conversions)
            yield return Row("budget.total.conversion", conversion, words, LossDigits.Up);
        yield return Row("budget.total.smallest", statement.SmallestBound, words, LossDigits.Up);
        if (!IsNothing(statement.Lower))
            yield return Row("budget.total.lower", statement.Lower, words, LossDigits.Down);
    }

    /// <summary>The sum of written numbers has their digits; a ρ worked out from a declared ε has more than can be printed.</summary>
    private static LossDigits DigitsOfDeclared(BudgetStatement statement) =>
        statement.Mechanisms.All(account => account.Declared?.Rule == AccountRules.Declared) ? LossDigits.SumAsWritten : LossDigits.Up;

    private static ScriptObject Row(string key, LossTotal total, BudgetWords words, LossDigits digits) => new()
    {
        ["name"] = words.Say(key),
        ["epsilon"] = total.Epsilon is { } epsilon ? Number(epsilon, words, digits) : null,
        ["delta"] = total.Delta is { } delta ? Delta(delta, words, digits) : null,
        ["rho"] = total.Rho is { } rho ? Number(rho, words, digits) : null,
        ["rule"] = words.Rule(total.Rule),
        ["source"] = total.Rule.Source,
    };

    private static string Number(double number, BudgetWords words, LossDigits digits) => LossPrint.OrNoBound(number, digits.Loss, words.Language);

    // A bound that is shown at the authorised δ names it as it is written.
    private static string Delta(double delta, BudgetWords words, LossDigits digits) =>
        words.Language.Number(delta == words.Statement.Promise.Delta ? LossPrint.AsWritten(delta) : digits.Delta(delta));
}
