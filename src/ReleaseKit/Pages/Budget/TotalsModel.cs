using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>The totals side by side: authorised, declared, worked out here, smallest bound, lower bound; each with its rule and source.</summary>
internal static class TotalsModel
{
    private const int Digits = 4;

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
        return words.Say(key, ("bound", InWords(bound, words, LossPrint.UpTo)), ("rule", words.Rule(bound.Rule)), ("promise", InWords(words.Statement.Promise, words, AsWritten)));
    }

    /// <summary>"epsilon 5.983 at delta 0.000000001", "rho 0.11".</summary>
    public static string InWords(LossTotal total, BudgetWords words, Func<double, int, PublishedValue> print)
    {
        if (total.Epsilon is not { } epsilon)
            return words.Say("budget.total.rho", ("rho", Number(total.Rho ?? 0, words, print)));
        return total.Delta is { } delta and > 0
            ? words.Say("budget.total.epsilon-delta", ("epsilon", Number(epsilon, words, print)), ("delta", Delta(delta, words)))
            : words.Say("budget.total.epsilon", ("epsilon", Number(epsilon, words, print)));
    }

    public static PublishedValue AsWritten(double number, int digits) => LossPrint.AsWritten(number);

    private static IEnumerable<ScriptObject> Rows(BudgetWords words)
    {
        var statement = words.Statement;
        yield return Row("budget.total.authorised", statement.Promise, words, AsWritten);
        if (statement.Declared is { } declared)
            yield return Row("budget.total.declared", declared, words, LossPrint.UpTo);
        yield return Row("budget.total.recomputed", statement.Recomputed, words, LossPrint.UpTo);
        foreach (var conversion in statement.Conversions)
            yield return Row("budget.total.conversion", conversion, words, LossPrint.UpTo);
        yield return Row("budget.total.smallest", statement.SmallestBound, words, LossPrint.UpTo);
        yield return Row("budget.total.lower", statement.Lower, words, LossPrint.DownTo);
    }

    private static ScriptObject Row(string key, LossTotal total, BudgetWords words, Func<double, int, PublishedValue> print) => new()
    {
        ["name"] = words.Say(key),
        ["epsilon"] = total.Epsilon is { } epsilon ? Number(epsilon, words, print) : null,
        ["delta"] = total.Delta is { } delta ? Delta(delta, words) : null,
        ["rho"] = total.Rho is { } rho ? Number(rho, words, print) : null,
        ["rule"] = words.Rule(total.Rule),
        ["source"] = total.Rule.Source,
    };

    private static string Number(double number, BudgetWords words, Func<double, int, PublishedValue> print) =>
        LossPrint.OrNoBound(number, finite => print(finite, Digits), words.Language);

    private static string Delta(double delta, BudgetWords words) => words.Language.Number(LossPrint.Delta(delta));
}
