using ReleaseKit.Charts;
using ReleaseKit.Pages.Budget;
using Scriban.Runtime;

namespace ReleaseKit.Pages;

/// <summary>The page that shows how the privacy loss was spent and what that means for one unit.</summary>
public static class BudgetPage
{
    public static void Write(SiteContext context, SiteFolder site)
    {
        var words = new BudgetWords(context);
        context.Write(site, new PageHead(PageMap.Budget, words.Say("budget.title"), SiteSection.Budget), "budget.html", Model(words));
    }

    private static ScriptObject Model(BudgetWords words)
    {
        using var type = TypeCase.Load(words.Context.Templates.FontsFolder);
        var (tally, hasUnlabelled) = TallyPicture.Of(words, type);
        var statement = words.Statement;
        var model = words.Context.Model();
        model["release_title"] = words.Context.In(words.Release.Title);
        model["home"] = PageMap.Home;
        model["one"] = words.One;
        model["other"] = words.Other;
        model["currency"] = words.Currency;
        model["spent"] = words.Amount(statement.Spent);
        model["authorised"] = statement.Authorised is { } authorised ? words.Allowance(authorised) : null;
        model["beside"] = AuthorityModel.Beside(words);
        model["has_noise"] = words.Context.HasNoise;
        model["meaning"] = MeaningModel.Of(words);
        model["tally"] = tally;
        model["nothing_spent"] = words.SpentNothing ? words.WithoutSpending : null;
        model["tally_unlabelled"] = hasUnlabelled;
        model["ledger"] = LedgerModel.Of(words);
        model["totals"] = TotalsModel.Of(words);
        model["steps"] = StepsModel.Of(words);
        model["mechanisms"] = MechanismsModel.Of(words);
        model["any_only_declared"] = statement.Mechanisms.Any(account => account.OnlyDeclared);
        model["without"] = WithoutNoiseModel.Of(words);
        model["authority"] = AuthorityModel.Of(words);
        model["disclosures"] = DisclosuresModel.Of(words);
        return model;
    }
}
