using ReleaseKit.Pages.Budget;
using ReleaseKit.Wording;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Home;

/// <summary>When, what span, what it spent, what comes next: the short list beside the title.</summary>
internal static class Particulars
{
    public static ScriptArray Of(SiteContext context)
    {
        var release = context.Release;
        var rows = new ScriptArray { Row(context, "home.published", MomentText.Of(release.Published, context.Language)) };
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

    /// <summary>Spent of authorised, as the budget page prints them; only a link where the two cannot be put side by side.</summary>
    private static string Loss(SiteContext context)
    {
        var words = new BudgetWords(context);
        return context.Budget.Authorised is { } authorised
            ? context.Language.Text(
                !context.HasNoise ? "home.loss.of.no-noise" : context.Budget.HasExactFigures ? "home.loss.of.beside-exact" : "home.loss.of",
                ("spent", words.Amount(context.Budget.Spent)), ("authorised", words.Allowance(authorised)), ("currency", words.Currency))
            : context.Language.Text("home.loss.see");
    }
}
