using ReleaseKit.Appraisal;
using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>The total against what was authorised: it is met if any bound that can be shown meets it.</summary>
internal sealed class AuthorisedCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject)
    {
        if (subject.Noise is not { Authorised: { } authorised } account || authorised is { Epsilon: null, Rho: null })
            return [];
        var accountant = Accountant.Of(account.Accounting);
        var total = ProvenBounds.Total(accountant, subject.Spendings);
        var bounds = ProvenBounds.Of(subject.Spendings);
        return double.IsInfinity(accountant.AmountOf(total)) || bounds.Meets(authorised)
            ? []
            : [Exceeded(account, total, AtBest(authorised, account.Accounting, bounds, subject.Spendings), accountant)];
    }

    private static Finding Exceeded(NoiseAccount account, LossTotal total, string atBest, Accountant accountant) => new(
        FindingLevel.Stop, "authorised-exceeded", FindingOwner.Noise, account.Authorised.At,
        $"Authorised is {BudgetText.Authorised(account.Authorised)}.\nThe mechanisms spend {BudgetText.Spent(total)} in {BudgetText.Written(account.Accounting)} accounting{atBest}.",
        "the release would cost more than the office allowed.",
        accountant.AuthorisedIn(account.Authorised) is > 0 and var allowed
            ? $"add noise until the mechanisms spend at most {Limit(account, allowed, accountant.Currency)} together, publish less, or have more authorised."
            : "give \"authorised\" in numbers that this accounting can meet: epsilon and delta, or rho.");

    private static string Limit(NoiseAccount account, double allowed, LossCurrency currency) => currency == LossCurrency.Rho
        ? $"rho {BudgetText.Down(allowed)}"
        : $"epsilon {BudgetText.Down(allowed)}{(account is { Accounting: Accounting.Approximate, Authorised.Delta: > 0 and var delta } ? $" and delta {BudgetText.Plain(delta)}" : "")}";

    // In the terms of what was authorised: no delta is spoken of where none was given.
    private static string AtBest(Authorised authorised, Accounting accounting, ProvenBounds bounds, IReadOnlyList<MechanismSpending> spendings) => authorised.Rho is null
        ? Smallest(bounds.SmallestAt(Delta.AtMost(authorised.Delta ?? 0)))
        : accounting == Accounting.Concentrated ? "" : InRho(ProvenBounds.Total(new ConcentratedAccountant(), spendings));

    private static string Smallest(LossTotal smallest) => double.IsFinite(smallest.Epsilon!.Value)
        ? $"; no rule known here brings that below epsilon {BudgetText.Paste(smallest.Epsilon.Value)} {AtDelta(smallest)}"
        : $"; no rule known here gives an epsilon {AtDelta(smallest)}";

    private static string AtDelta(LossTotal total) => total.Delta is > 0 and var delta ? $"at delta {BudgetText.Plain(delta)}" : "without a delta";

    private static string InRho(LossTotal total) => double.IsFinite(total.Rho!.Value)
        ? $"; no rule known here brings that below {BudgetText.Spent(total)}"
        : "; no rule known here gives a rho";
}
