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
        $"Authorised is {Words(account.Authorised)}.\nThe mechanisms spend {Spent(total)} in {BudgetText.Written(account.Accounting)} accounting{Smallest(smallest)}.",
        "the release would cost more than the office allowed.",
        accountant.AuthorisedIn(account.Authorised) is > 0 and var allowed
            ? $"add noise until the mechanisms spend at most {Down(allowed)} together, publish less, or have more authorised."
            : "give \"authorised\" in numbers that this accounting can meet: epsilon and delta, or rho.");

    private static string Words(Authorised authorised) => authorised switch
    {
        { Rho: { } rho } => $"rho {BudgetText.Plain(rho)}",
        { Delta: > 0 and var delta } => $"epsilon {BudgetText.Plain(authorised.Epsilon!.Value)} at delta {BudgetText.Plain(delta)}",
        _ => $"epsilon {BudgetText.Plain(authorised.Epsilon!.Value)} without delta",
    };

    private static string Spent(Appraisal.LossTotal total) => total switch
    {
        { Rho: { } rho } => $"rho {BudgetText.Paste(rho)}",
        { Delta: > 0 and var delta } => $"epsilon {BudgetText.Paste(total.Epsilon!.Value)} and delta {BudgetText.Paste(delta)}",
        _ => $"epsilon {BudgetText.Paste(total.Epsilon!.Value)}",
    };

    private static string Smallest(Appraisal.LossTotal smallest) => double.IsFinite(smallest.Epsilon!.Value)
        ? $"; no rule known here brings that below epsilon {BudgetText.Paste(smallest.Epsilon.Value)} at delta {BudgetText.Plain(smallest.Delta!.Value)}"
        : $"; no rule known here gives an epsilon at delta {BudgetText.Plain(smallest.Delta!.Value)}";

    private static string Down(double allowed) => BudgetText.Plain(Math.Floor(allowed * 1e6) / 1e6);
}
