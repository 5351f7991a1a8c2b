using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Budget;

/// <summary>Who authorised the loss, when, on what paper; whom the guarantee protects; which data sets are neighbours.</summary>
internal static class AuthorityModel
{
    public static ScriptArray Of(BudgetWords words) => new(Lines(words).Select(line => new ScriptObject { ["name"] = words.Say(line.Key), ["text"] = line.Text }));

    /// <summary>The sentences beside the two large numbers.</summary>
    public static ScriptArray Beside(BudgetWords words) => [.. Sentences(words)];

    private static IEnumerable<string> Sentences(BudgetWords words)
    {
        var statement = words.Statement;
        yield return Authorisation(statement.Account.Authorised, TotalsModel.InWords(statement.Promise, words, LossDigits.AsWritten), words);
        if (statement.Promise.Epsilon is not null && statement.Currency == Appraisal.LossCurrency.Rho && statement.Authorised is { } converted)
            yield return words.Say("budget.spent.converted", ("amount", words.Allowance(converted)));
        yield return words.SpentNothing ? words.WithoutSpending : words.Say("budget.spent.used", ("amount", words.Amount(statement.Spent)));
        if (words.Left is { } left)
            yield return words.Say("budget.spent.left", ("amount", words.Language.Number(left)));
    }

    private static string Authorisation(Authorised authorised, string promise, BudgetWords words) => authorised switch
    {
        { By: { } by, On: { } on } => words.Say("budget.spent.by-on", ("by", by), ("date", words.Language.Date(on)), ("promise", promise)),
        { By: { } by } => words.Say("budget.spent.by", ("by", by), ("promise", promise)),
        { On: { } on } => words.Say("budget.spent.on", ("date", words.Language.Date(on)), ("promise", promise)),
        _ => words.Say("budget.spent.by-nobody", ("promise", promise)),
    };

    private static IEnumerable<(string Key, string Text)> Lines(BudgetWords words)
    {
        var account = words.Statement.Account;
        (string Key, string? Text)[] lines =
        [
            ("budget.authority.unit", account.Over is { } over ? words.Say("budget.authority.unit-over", ("who", words.One), ("over", words.Context.In(over))) : words.Say("budget.authority.unit-alone", ("who", words.One))),
            ("budget.authority.neighbours", words.Say($"budget.neighbours.{account.Neighbouring}", ("who", words.One))),
            ("budget.authority.accounting", words.Say($"budget.accounting.{account.Accounting}")),
            ("budget.authority.amount", TotalsModel.InWords(words.Statement.Promise, words, LossDigits.AsWritten)),
            ("budget.authority.by", account.Authorised.By),
            ("budget.authority.on", account.Authorised.On is { } on ? words.Language.Date(on) : null),
            ("budget.authority.paper", account.Authorised.Paper),
            ("budget.authority.unspent", account.Authorised.Unspent),
            ("budget.authority.over", account.Authorised.Over),
        ];
        return lines.Select(line => (line.Key, line.Text ?? words.Say("budget.not-stated")));
    }
}
