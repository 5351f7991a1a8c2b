using ReleaseKit.Appraisal;
using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>What the mechanisms declare together, against what was authorised: an office that says it spent more than it allowed has one of the two wrong.</summary>
internal sealed class DeclaredTotalCheck : IReviewCheck
{
    private const double Tolerance = 1e-9;

    // A loss may be declared rounded up, and its total be met by a bound in another currency only.
    private const double FurthestRounding = 0.05;

    public IEnumerable<Finding> Check(ReviewSubject subject)
    {
        if (subject.Noise is not { Authorised: { } authorised } account || authorised is { Epsilon: null, Rho: null })
            return [];
        var accountant = Accountant.Of(account.Accounting);
        var declared = accountant.Sum([.. subject.Spendings.Select(spending => accountant.Declared(spending.Mechanism) ?? accountant.Upper(spending))]);
        var total = ProvenBounds.Total(accountant, subject.Spendings);
        return !ProvenBounds.Of(subject.Spendings).Meets(authorised) || Meets(accountant, declared, authorised)
            || accountant.AmountOf(declared) <= accountant.AmountOf(total) * (1 + (Meets(accountant, total, authorised) ? 0 : FurthestRounding))
            ? []
            : [Found(subject.Spendings, account, declared, total, accountant)];
    }

    private static bool Meets(Accountant accountant, LossTotal total, Authorised authorised) => authorised switch
    {
        { Rho: { } allowed } => total.Rho <= allowed * (1 + Tolerance),
        { Epsilon: { } allowed } => accountant.CurveOf(total)?.EpsilonAt(Delta.AtMost((authorised.Delta ?? 0) * (1 + Tolerance))).Value <= allowed * (1 + Tolerance),
        _ => false,
    };

    private static Finding Found(IReadOnlyList<MechanismSpending> spendings, NoiseAccount account, LossTotal declared, LossTotal total, Accountant accountant)
    {
        var largest = spendings.Where(spending => spending.Mechanism.Spent is not null)
            .MaxBy(spending => accountant.Declared(spending.Mechanism) is { } own ? accountant.AmountOf(own) : 0)?.Mechanism;
        return new(
            FindingLevel.Stop, "declared-above-authorised", FindingOwner.Noise, largest is null ? account.Authorised.At : BudgetText.PlaceOf(largest, "spent"),
            $"The mechanisms declare {BudgetText.Spent(declared)} together.\nAuthorised is {BudgetText.Authorised(account.Authorised)}{InCurrency(account, accountant)}.",
            "by its own numbers the release would cost more than the office allowed; one of the two is wrong, and the budget page shows both.",
            $"correct \"spent\" where it says too much, or leave it out ({BudgetText.Spent(total)} is worked out for all together), or have more authorised.");
    }

    private static string InCurrency(NoiseAccount account, Accountant accountant) =>
        account.Authorised.Rho is null && accountant.Currency == LossCurrency.Rho && accountant.AuthorisedIn(account.Authorised) is { } rho ? $", which is rho {BudgetText.Down(rho)}" : "";
}
