using System.Globalization;
using ReleaseKit.Pages.Budget;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Home;

/// <summary>The contents list: each table, its measures with their margins, its rows, and what it spent.</summary>
internal static class Contents
{
    public static ScriptObject Of(SiteContext context)
    {
        var losses = TableLosses.Of(context.Budget);
        var words = new BudgetWords(context);
        return new ScriptObject
        {
            ["tables"] = new ScriptArray(context.Release.Tables.Select((_, index) => Row(context, index, words.Amount(losses.Of(index))))),
            ["shared"] = losses.Shared > 0 ? words.Amount(losses.Shared) : null,
            ["total"] = words.Amount(context.Budget.Spent),
            ["total_name"] = context.Language.Text(TotalName(context)),
            ["notes"] = new ScriptArray(Notes(context)),
            ["currency"] = context.Language.Text("home.loss.in", ("currency", words.Currency)),
        };
    }

    private static string TotalName(SiteContext context) => context switch
    {
        { HasNoise: false, Budget.HasExactFigures: true } => "home.loss.total.no-noise",
        { Budget.HasExactFigures: true } => "home.loss.total.beside-exact",
        _ => "home.loss.total",
    };

    private static IEnumerable<string> Notes(SiteContext context)
    {
        if (context.Budget.Spent > 0)
            yield return context.Language.Text("home.loss.note");
        if (context.Budget.HasExactFigures)
            yield return context.Language.Text("home.loss.note.exact");
    }

    private static ScriptObject Row(SiteContext context, int index, string loss)
    {
        var table = context.Release.Tables[index];
        var shown = Enumerable.Range(0, table.Measures.Count).Where(measure => table.Measures[measure].Shown);
        return new ScriptObject
        {
            ["number"] = (index + 1).ToString(CultureInfo.InvariantCulture),
            ["title"] = context.In(table.Title),
            ["href"] = context.Pages.FirstPageOf(index),
            ["rows"] = context.Language.Text("home.rows", ("by", ByStub(context, table)), ("rows", Count(context, table.RowCount))),
            ["loss"] = loss,
            ["measures"] = new ScriptArray(shown.Select(measure => new ScriptObject
            {
                ["title"] = context.In(table.Measures[measure].Title),
                ["margins"] = MeasureMargins.Of(context.Appraised, index, measure).InWords(context.Language),
            })),
        };
    }

    private static string ByStub(SiteContext context, Releases.Table table) =>
        context.Language.List([.. table.Stub.Select(column => context.In(column.Title))]);

    private static string Count(SiteContext context, int rows) => context.Language.Number(new Releases.PublishedValue(rows, 0));
}
