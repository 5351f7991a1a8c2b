using System.Globalization;
using ReleaseKit.Charts;
using ReleaseKit.Pages.Budget;
using ReleaseKit.Pages.Methods;
using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Tables;

/// <summary>What is said once for a measure: where the error of its figures comes from, what that cost, and how to cite one of its figures.</summary>
internal static class MeasureFootModel
{
    public static ScriptObject Of(Sheet sheet, TablePage page, int index)
    {
        var measure = sheet.Table.Measures[index];
        return new()
        {
            ["id"] = Sheet.AboutId(measure),
            ["title"] = measure.Title.In(sheet.Language.Tag),
            ["unit"] = UnitWords.Many(measure, sheet.Language),
            ["sentences"] = new ScriptArray(sheet.Language.NotesOf(sheet.Facts.Measures[index], sheet.IsCut)),
            ["rules"] = new ScriptArray(measure.Rules.Where((_, rule) => measure.RuleOf.AsSpan().Contains((byte)rule)).Select(rule => RuleOf(sheet, page, rule))),
            ["cite"] = Cite(sheet, page, measure),
        };
    }

    private static ScriptObject RuleOf(Sheet sheet, TablePage page, NoiseRule rule) => rule switch
    {
        NoiseRule.FromMechanism own => OfMechanism(sheet, page, own.Mechanism),
        NoiseRule.SumOver sum => Plain(
            sheet.Text("tables.rule.sum", ("over", sheet.Table.Stub[sum.StubColumn].Title.In(sheet.Language.Tag))), sheet.Text("tables.rule.sum.means")),
        NoiseRule.Exact exact => Plain(sheet.Text("tables.rule.exact"), sheet.Text("tables.rule.exact.means", ("why", sheet.Site.In(exact.Reason)))),
        NoiseRule.Public known => Plain(sheet.Text("tables.rule.public"), sheet.Text("tables.rule.public.means", ("source", sheet.Site.In(known.Source)))),
        _ => throw new InvalidOperationException($"No words for {rule}."),
    };

    private static ScriptObject Plain(string name, string means) => new() { ["name"] = name, ["means"] = means, ["law"] = null };

    private static ScriptObject OfMechanism(Sheet sheet, TablePage page, Mechanism mechanism) => new()
    {
        ["name"] = mechanism.Answers is { } answers ? sheet.Site.In(answers) : mechanism.Id,
        ["means"] = Cost(sheet, mechanism),
        ["law"] = sheet.Text("tables.rule.law", ("law", sheet.Text("methods.law." + LawModel.KeyOf(mechanism.Law)))),
        ["methods"] = Link.From(page.Path, $"{PageMap.Methods}#mechanism-{mechanism.Id}"),
    };

    /// <summary>The mechanism's share of what the release spent, in 100, as on the budget page; empty for a mechanism that the account does not know.</summary>
    private static string Cost(Sheet sheet, Mechanism mechanism)
    {
        var accounts = sheet.Site.Budget.Mechanisms;
        return accounts.FirstOrDefault(account => account.Mechanism.Id == mechanism.Id) is not { } account ? ""
            : accounts.Count == 1 && account.ShareOfSpent == 1 ? sheet.Text("tables.rule.cost.all")
            : sheet.Text("tables.rule.cost", ("share", sheet.Language.Number(PrintedShares.Of(account, sheet.Site.Budget))));
    }

    private static string Cite(Sheet sheet, TablePage page, Measure measure)
    {
        var release = sheet.Site.Release;
        var address = WebAddress.Of(release.Address) is { } web ? web + page.Path : release.Identifier;
        return sheet.Text(
            "tables.cite.as",
            ("office", release.Publisher.Name),
            ("year", release.Published.Year.ToString(CultureInfo.InvariantCulture)),
            ("release", sheet.Site.In(release.Title)),
            ("edition", EditionLine.Of(sheet.Site)),
            ("title", SheetHeadModel.TitleOf(sheet, page)),
            ("measure", measure.Title.In(sheet.Language.Tag)),
            ("address", address));
    }
}
