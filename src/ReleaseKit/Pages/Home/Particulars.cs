using ReleaseKit.Wording;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Home;

/// <summary>When, what span, what it spent, what comes next: the short list beside the title.</summary>
internal static class Particulars
{
    public static ScriptArray Of(SiteContext context)
    {
        var release = context.Release;
        var rows = new ScriptArray { Row(context, "home.published", context.Language.Date(DateOnly.FromDateTime(release.Published.DateTime))) };
        if (release.ReferencePeriod is { } period)
            rows.Add(Row(context, "home.covers", PeriodText.Of(period, context.Language)));
        rows.Add(Row(context, "home.loss", Loss(context), PageMap.Budget));
        if (release.Next is { } next)
            rows.Add(Row(context, "home.next", PeriodText.Of(next, context.Language)));
        return rows;
    }

    private static ScriptObject Row(SiteContext context, string key, string text, string? href = null) => new()
    {
        ["term"] = context.Language.Text(key),
        ["text"] = text,
        ["href"] = href,
    };

    /// <summary>Spent of authorised, in the terms of what was authorised; only the spent where the two cannot be put side by side.</summary>
    private static string Loss(SiteContext context)
    {
        var budget = context.Budget;
        var (spent, authorised) = budget.Promise.Epsilon is not null
            ? (budget.Recomputed.Epsilon, budget.Promise.Epsilon)
            : (budget.Recomputed.Rho, budget.Promise.Rho);
        string Number(double amount) => context.Language.Number(LossNumber.Up(amount, LossNumber.DecimalsFor(Math.Max(amount, 1)) - 1));
        return spent is { } loss && authorised is { } limit
            ? context.Language.Text("home.loss.of", ("spent", Number(loss)), ("authorised", Plain(limit, context.Language)))
            : context.Language.Text("home.loss.see");
    }

    private static string Plain(double limit, ILanguage language) => language.Number(Releases.PublishedValue.Shortest((decimal)limit));
}
