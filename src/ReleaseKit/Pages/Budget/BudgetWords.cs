using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Budget;

/// <summary>What all parts of the budget page need: the release, the account, the unit in words, and how amounts are printed.</summary>
internal sealed class BudgetWords
{
    private const int DigitsOfTotal = 4;
    private const int DigitsOfSmallest = 2;
    private const int MostDecimals = 12;

    /// <summary>What is far smaller than the total does not give every amount its decimals: rounded up, it stands in the last place.</summary>
    private const int MostBeyondTotal = 2;

    public BudgetWords(SiteContext context)
    {
        Context = context;
        Statement = context.Budget;
        Decimals = DecimalsOf(Statement);
    }

    public SiteContext Context { get; }
    public BudgetStatement Statement { get; }
    public ILanguage Language => Context.Language;
    public Release Release => Context.Release;

    /// <summary>Decimals of every amount in the columns of the account, so that they can be added by eye.</summary>
    public int Decimals { get; }

    /// <summary>"household".</summary>
    public string One => FormsOfUnit?.One ?? Statement.Account.Who.Key;

    /// <summary>"households".</summary>
    public string Other => FormsOfUnit?.Other ?? Statement.Account.Who.Key;

    /// <summary>"epsilon (ε)" or "rho (ρ)".</summary>
    public string Currency => Say(Statement.Currency == LossCurrency.Rho ? "budget.currency.rho" : "budget.currency.epsilon");

    /// <summary>An amount that was spent, rounded up.</summary>
    public string Amount(double amount) => LossPrint.OrNoBound(amount, number => LossPrint.Up(number, Decimals), Language);

    /// <summary>An amount that stands in no column, with digits of its own if it is far smaller than the total.</summary>
    public string AmountAlone(double amount) =>
        LossPrint.OrNoBound(amount, number => LossPrint.Up(number, Math.Max(Decimals, LossPrint.DecimalsFor(number, DigitsOfSmallest))), Language);

    /// <summary>An amount that may be spent, rounded down.</summary>
    public string Allowance(double amount) => LossPrint.OrNoBound(amount, number => LossPrint.Down(number, Decimals), Language);

    /// <summary>What is left, as printed: the printed allowance less the printed amount, so that the eye can check it.</summary>
    public PublishedValue? Left => Statement.Authorised is not { } authorised || !double.IsFinite(Statement.Spent) || !double.IsFinite(authorised)
        ? null
        : Less(LossPrint.Down(authorised, Decimals), LossPrint.Up(Statement.Spent, Decimals));

    /// <summary>Whether no part of the release has a loss in the currency; what it lost may be delta alone.</summary>
    public bool SpentNothing => Statement.Spent <= 0;

    /// <summary>What was lost where nothing was spent in the currency, in a sentence.</summary>
    /// <remarks>A delta beside rho is only where its conversion is read off; beside epsilon it is spent.</remarks>
    public string WithoutSpending => Statement.Currency == LossCurrency.Epsilon && Statement.Recomputed.Delta is { } delta and > 0
        ? Say("budget.spent.delta-only", ("currency", Currency), ("delta", Language.Number(LossPrint.Delta(delta))))
        : Say("budget.spent.nothing", ("currency", Currency));

    public string Say(string key, params (string Name, string Value)[] fill) => Language.Text(key, fill);

    public string TableName(int table) => Say("budget.table-number", ("number", TableNumber(table)));

    public string TableNumber(int table) => Language.Number(new PublishedValue(table + 1, 0));

    public string Level(BudgetPiece piece) => piece.Level is { } level ? Context.In(level) : Say("budget.level.none");

    /// <summary>A rule in words, then the literature it stands on.</summary>
    public string Rule(AccountRule rule) => Say($"budget.rule.{rule.Key}");

    private UnitForms? FormsOfUnit => Statement.Account.Who.Forms.GetValueOrDefault(Language.Tag);

    private static PublishedValue Less(PublishedValue authorised, PublishedValue spent) =>
        authorised with { Unscaled = Math.Max(0, authorised.Unscaled - spent.Unscaled) };

    private static int DecimalsOf(BudgetStatement statement)
    {
        double[] amounts = [.. statement.Pieces.Select(piece => piece.Amount).Where(amount => amount > 0 && double.IsFinite(amount))];
        if (amounts.Length == 0 || !double.IsFinite(statement.Spent))
            return DigitsOfTotal;
        var ofTotal = LossPrint.DecimalsFor(statement.Spent, DigitsOfTotal);
        return Math.Min(MostDecimals, Math.Clamp(LossPrint.DecimalsFor(amounts.Min(), DigitsOfSmallest), ofTotal, ofTotal + MostBeyondTotal));
    }
}
