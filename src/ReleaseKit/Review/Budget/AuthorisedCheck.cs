using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>The total against what was authorised: it is met if any bound that can be shown meets it.</summary>
internal sealed class AuthorisedCheck : IReviewCheck
{
    private const double DeltaForWords = 1e-9;

    public IEnumerable<Finding> Check(ReviewSubject subject)
    {
        if (subject.Noise is not { Authorised: { } authorised } account || authorised is { Epsilon: null, Rho: null })
            return [];
        var accountant = Accountant.Of(account.Accounting);
        var total = ProvenBounds.Total(accountant, subject.Spendings);
        var bounds = ProvenBounds.Of(subject.Spendings);
        return double.IsInfinity(accountant.AmountOf(total)) || bounds.Meets(authorised)
            ? []
            : [Exceeded(account, total, bounds.SmallestAt(Delta.AtMost(authorised.Delta ?? (authorised.Rho is null ? 0 : DeltaForWords))), accountant)];
    }

    private static Finding Exceeded(NoiseAccount account, Appraisal.LossTotal total, Appraisal.LossTotal smallest, Accountant accountant) => new(
        FindingLevel.Stop, "authorised-exceeded", FindingOwner.Noise, account.Authorised.At,
        $"Authorised is {BudgetText.Authorised(account.Authorised)}.\nThe mechanisms spend {BudgetText.Spent(total)} in {BudgetText.Written(account.Accounting)} accounting{Smallest(smallest)}.",
        "the release would cost more than the office allowed.",
        accountant.AuthorisedIn(account.Authorised) is > 0 and var allowed
            ? $"add noise until the mechanisms spend at most {BudgetText.Down(allowed)} together, publish less, or have more authorised."
            : "give \"authorised\" in numbers that this accounting can meet: epsilon and delta, or rho.");

    private static string Smallest(Appraisal.LossTotal smallest) => double.IsFinite(smallest.Epsilon!.Value)
        ? $"; no rule known here brings that below epsilon {BudgetText.Paste(smallest.Epsilon.Value)} at delta {BudgetText.Plain(smallest.Delta!.Value)}"
        : $"; no rule known here gives an epsilon at delta {BudgetText.Plain(smallest.Delta!.Value)}";
}
