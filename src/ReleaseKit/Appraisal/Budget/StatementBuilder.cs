using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>Works the account of a release out, from its mechanisms to what the total means.</summary>
internal sealed class StatementBuilder
{
    /// <summary>Where only rho is authorised, statements in ε are made at this δ.</summary>
    private const double DeltaIfNoneIsAuthorised = 1e-9;

    private readonly Release release;
    private readonly Accountant accountant;
    private readonly IReadOnlyList<MechanismSpending> spendings;
    private readonly IReadOnlyList<LossTotal> losses;
    private readonly LossTotal total;
    private readonly ProvenBounds bounds;
    private readonly Delta delta;

    public StatementBuilder(Release release)
    {
        this.release = release;
        accountant = Accountant.Of(release.Noise.Accounting);
        spendings = MechanismSpending.Of(release.Noise, release);
        losses = [.. spendings.Select(accountant.Upper)];
        total = accountant.Sum(losses);
        bounds = ProvenBounds.Of(spendings);
        delta = DeltaOf(release.Noise, total);
    }

    public BudgetStatement Build()
    {
        var authorised = accountant.AuthorisedIn(release.Noise.Authorised);
        var mechanisms = spendings.Zip(losses, AccountOf).ToList();
        return new BudgetStatement
        {
            Account = release.Noise,
            Currency = accountant.Currency,
            Spent = accountant.AmountOf(total),
            Authorised = authorised,
            IsWithinAuthorised = bounds.Meets(release.Noise.Authorised),
            Promise = new LossTotal(release.Noise.Authorised.Epsilon, release.Noise.Authorised.Delta, release.Noise.Authorised.Rho, AccountRules.Authorised),
            Declared = Declared(),
            Recomputed = Recomputed(),
            SmallestBound = bounds.SmallestAt(delta),
            Lower = LargestLower(),
            Delta = delta.Value,
            Conversions = [.. Conversions().Select(step => new LossTotal(step.Result, delta.Value, null, step.Rule))],
            Meaning = Meanings.Of([.. bounds.Curves], delta),
            MeaningOfPromise = MeaningOfPromise(),
            Mechanisms = mechanisms,
            Pieces = [.. mechanisms.Select(PieceOf)],
            WithoutNoise = UnnoisedFigures.Of(release),
            Steps = Steps(authorised),
        };
    }

    // Under pure accounting nothing needs a δ; elsewhere the authorised one, unless the mechanisms' own add up to more.
    private static Delta DeltaOf(NoiseAccount account, LossTotal total) => account.Accounting switch
    {
        Accounting.Pure => Delta.Zero,
        Accounting.Approximate => Delta.AtMost(Math.Max(account.Authorised.Delta ?? 0, total.Delta ?? 0)),
        _ => Delta.AtMost(account.Authorised.Delta ?? DeltaIfNoneIsAuthorised),
    };

    private MechanismAccount AccountOf(MechanismSpending spending, LossTotal upper)
    {
        var (amount, spent) = (accountant.AmountOf(upper), accountant.AmountOf(total));
        return new MechanismAccount
        {
            Mechanism = spending.Mechanism,
            Declared = accountant.Declared(spending.Mechanism),
            Recomputed = upper,
            Lower = accountant.Lower(spending),
            Amount = amount,
            ShareOfSpent = amount == spent ? (spent > 0 ? 1 : 0) : double.IsInfinity(spent) ? (double.IsInfinity(amount) ? 1 : 0) : amount / spent,
            Measures = spending.Cells.Measures,
            Tables = spending.Cells.Tables,
            Cells = spending.Cells.Count,
            Published = spending.Cells.Published,
            Hidden = spending.Cells.Hidden,
            OnlyDeclared = spending.Loss is null,
        };
    }

    private BudgetPiece PieceOf(MechanismAccount account) => new(
        account.Mechanism.Id, account.Tables, account.Measures, account.Level?.In(release.MainLanguage) ?? "", account.Level, account.Amount);

    private LossTotal? Declared()
    {
        var declared = spendings.Select(spending => accountant.Declared(spending.Mechanism)).ToList();
        return declared.Contains(null) || declared.Count == 0 ? null : accountant.Sum([.. declared.OfType<LossTotal>()]) with { Rule = AccountRules.Declared };
    }

    private LossTotal Recomputed() => accountant.Currency == LossCurrency.Rho
        ? total with { Epsilon = ConcentratedConversion.EpsilonAt(Rho.Of(total.Rho!.Value), delta).Value, Delta = delta.Value }
        : total;

    // No unit is known to be counted in full by several mechanisms, so that the largest alone is proven.
    private LossTotal LargestLower() =>
        spendings.Select(accountant.Lower).MaxBy(lower => (accountant.AmountOf(lower), lower.Delta ?? 0)) ?? accountant.Sum([]) with { Rule = AccountRules.Pair };

    private IEnumerable<AccountStep> Conversions() =>
        accountant.Currency == LossCurrency.Rho ? TotalSteps.Conversions(Rho.Of(total.Rho!.Value), delta) : [];

    private MeaningForOne? MeaningOfPromise() => release.Noise.Authorised switch
    {
        { Rho: >= 0 and var rho } => Meanings.Of([new ConcentratedCurve(Rho.Of(rho))], Delta.Of(DeltaIfNoneIsAuthorised)),
        { Epsilon: >= 0 and var epsilon } promise => Meanings.Of(
            [new ApproximateCurve(new ApproximateLoss(Epsilon.Of(epsilon), Delta.AtMost(promise.Delta ?? 0)))], Delta.AtMost(promise.Delta ?? 0)),
        _ => null,
    };

    private List<AccountStep> Steps(double? authorised)
    {
        var (limit, beta) = Meanings.Limit([.. bounds.Curves], delta);
        return
        [
            .. spendings.SelectMany(accountant.StepsOf),
            TotalSteps.Sum(accountant, losses, total),
            .. Conversions(),
            .. TotalSteps.Authorised(release.Noise.Authorised, accountant.Currency == LossCurrency.Rho ? authorised : null),
            TotalSteps.Odds(limit, beta, bounds.Curves.FirstOrDefault(curve => curve.DeltaAt(limit.At) == limit.DeltaThere)),
        ];
    }
}
