using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Methods;

/// <summary>The technical page: terms, every noise law used with its formula and source, after-steps, rules of the account, and what cannot be checked from outside.</summary>
internal static class MethodsPage
{
    private const string LawRule = "law";
    private const string PublishedFrom = "methods.step.published-from";

    public static void Write(SiteContext context, SiteFolder site)
    {
        var head = new PageHead(PageMap.Methods, context.Language.Text("methods.title"), SiteSection.Methods);
        var model = context.Model();
        model["home"] = Link.From(head.Path, PageMap.Home);
        model["budget"] = Link.From(head.Path, PageMap.Budget);
        model["downloads"] = Link.From(head.Path, PageMap.Downloads);
        model["release_title"] = context.In(context.Release.Title);
        model["definition"] = new RawHtml(Formula.ToHtml(context.Language.Text("methods.definition.means")));
        model["odds"] = new RawHtml(Formula.ToHtml(context.Language.Text("methods.odds.means")));
        model["office"] = context.Release.Publisher.Name;
        AddGuarantee(model, context);
        AddCoverages(model, context);
        model["laws"] = new ScriptArray(context.Release.Noise.Mechanisms.GroupBy(mechanism => mechanism.Law).OrderBy(law => law.Key)
            .Select(law => LawModel.Of(context, law.Key, law)));
        model["steps"] = Steps(context);
        model["rules"] = Rules(context);
        context.Write(site, head, "methods.html", model);
    }

    private static void AddGuarantee(ScriptObject model, SiteContext context)
    {
        var account = context.Release.Noise;
        var unit = UnitText.One(account.Who, context.Language.Tag);
        model["unit"] = account.Over is { } over ? context.Language.Text("methods.unit.over", ("unit", unit), ("over", context.In(over))) : unit;
        model["one"] = unit;
        model["has_noise"] = context.HasNoise;
        model["covers"] = Covers(context);
        model["on_its_word"] = new ScriptArray(OnItsWord(context));
        model["neighbouring"] = account.Neighbouring == Neighbouring.Replace ? "methods.neighbouring.replace" : "methods.neighbouring.add-or-remove";
        model["accounting"] = account.Accounting switch
        {
            Accounting.Pure => "methods.accounting.pure",
            Accounting.Approximate => "methods.accounting.approximate",
            _ => "methods.accounting.concentrated",
        };
    }

    /// <summary>Which figures the guarantee covers, where it is not all of them; null where it is.</summary>
    private static string? Covers(SiteContext context) => context switch
    {
        { HasNoise: true, Budget.HasExactFigures: false } => null,
        { HasNoise: true } => context.Language.Text("methods.unit.beside-exact"),
        { Budget.HasExactFigures: true } => context.Language.Text("methods.unit.only-exact"),
        _ => context.Language.Text("methods.unit.only-public"),
    };

    /// <summary>What must be taken on the word of the office.</summary>
    private static IEnumerable<string> OnItsWord(SiteContext context) => context switch
    {
        { HasNoise: true } => ["drawn", "sensitivity", "rules", "source"],
        { Figures.Public: > 0 } => ["public", "source"],
        _ => ["source"],
    };

    private static void AddCoverages(ScriptObject model, SiteContext context)
    {
        var coverages = context.Release.Coverages;
        model["main"] = context.Language.Share(coverages.Main);
        model["also"] = context.Language.List([context.Language.Share(coverages.Lower), context.Language.Share(coverages.Upper)]);
    }

    private static ScriptArray Steps(SiteContext context)
    {
        var mechanisms = context.Release.Noise.Mechanisms;
        var keys = mechanisms.SelectMany(mechanism => mechanism.Afterwards).Select(KeyOf)
            .Concat(context.Release.Tables.Any(table => table.Measures.Any(measure => measure.PublishedFrom is not null)) ? [PublishedFrom] : [])
            .Concat(mechanisms.Any(mechanism => mechanism.Clipped is not null) ? ["methods.step.clipped"] : []);
        return new ScriptArray(keys.Distinct().Select(key => new ScriptObject
        {
            ["name"] = context.Language.Text(key),
            ["means"] = context.Language.Text(key + ".means"),
        }));
    }

    private static string KeyOf(AfterStep step) => step switch
    {
        AfterStep.RoundTo { How: RoundingHow.AtRandom } => "methods.step.rounded-at-random",
        AfterStep.RoundTo { How: RoundingHow.Up } => "methods.step.rounded-up",
        AfterStep.RoundTo { How: RoundingHow.Down } => "methods.step.rounded-down",
        AfterStep.RoundTo => "methods.step.rounded",
        AfterStep.NotBelow => "methods.step.not-below",
        AfterStep.NotAbove => "methods.step.not-above",
        AfterStep.ZeroBelow => "methods.step.zero-below",
        _ => PublishedFrom,
    };

    /// <summary>The rules of the account that stand on literature; a law's own are told with the law.</summary>
    private static ScriptArray Rules(SiteContext context)
    {
        var totals = new[] { context.Budget.Recomputed, context.Budget.SmallestBound }.Concat(context.Budget.Conversions).Select(total => total.Rule);
        var rules = context.Budget.Steps.Select(step => step.Rule).Concat(totals)
            .Where(rule => rule.Source.Length > 0 && rule.Key != LawRule).DistinctBy(rule => rule.Key);
        return new ScriptArray(rules.Select(rule => new ScriptObject
        {
            ["name"] = context.Language.Text("budget.rule." + rule.Key),
            ["source"] = rule == AccountRules.Odds ? context.Language.Text("methods.rules.odds") : rule.Source,
        }));
    }
}
