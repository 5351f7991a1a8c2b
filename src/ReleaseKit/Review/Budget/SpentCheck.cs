using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>Each declared loss against the bounds that can be shown: too low, too low by rounding alone, or lower than can be shown here.</summary>
internal sealed class SpentCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Noise is { } account
        ? subject.Spendings.SelectMany(spending => CheckMechanism(spending, account))
        : [];

    private static IEnumerable<Finding> CheckMechanism(MechanismSpending spending, NoiseAccount account) => spending is { Loss: { } loss, Mechanism.Spent: { } spent }
        ? DeclaredNumber.Of(spent, loss).Where(number => !number.IsEnough && !IsSaidAsNeeded(number, account)).Select(number => Found(spending, number, account))
        : [];

    // A pair that the law never meets is told by the check of the accounting, with one that it meets.
    private static bool IsSaidAsNeeded(DeclaredNumber number, NoiseAccount account) =>
        account.Accounting == Accounting.Approximate && double.IsInfinity(number.Upper) && number.Name != "rho";

    private static Finding Found(MechanismSpending spending, DeclaredNumber number, NoiseAccount account)
    {
        if (number.UnroundedDelta is { } delta)
            return SpentProblems.RoundedDelta(spending.Mechanism, number, delta);
        if (number.IsRounded)
            return SpentProblems.Rounded(spending.Mechanism, number);
        return number.IsBelowLower
            ? SpentProblems.TooLow(spending.Mechanism, number, account, LikelyMistake.Of(spending, number, account))
            : SpentProblems.BelowProof(spending.Mechanism, number, account);
    }
}
