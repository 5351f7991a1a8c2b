using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Budget;

/// <summary>
/// The mechanisms' shares of what was spent, in 100 to one decimal, so printed that they add up to 100.0 (method of the largest remainder);
/// a mechanism that spent anything never has a share of 0.0. What each of them spent stands beside it, rounded up.
/// </summary>
internal static class PrintedShares
{
    private const int Decimals = 1;
    private const int Whole = 1000;
    private const double Slack = 1e-9;

    public static PublishedValue Of(MechanismAccount account, BudgetStatement statement)
    {
        var shares = statement.Mechanisms.Select(mechanism => mechanism.ShareOfSpent).ToArray();
        // Where the shares are no parts of one whole (nothing was spent, or without bound), each stands for itself.
        if (Math.Abs(shares.Sum() - 1) > Slack || shares.Length > Whole)
            return LossPrint.Up(100 * account.ShareOfSpent, Decimals);
        var index = statement.Mechanisms.TakeWhile(mechanism => mechanism.Mechanism.Id != account.Mechanism.Id).Count();
        return new(Apportioned(shares)[index], Decimals);
    }

    private static int[] Apportioned(double[] shares)
    {
        var exact = shares.Select(share => Math.Round(share * Whole, 9)).ToArray();
        var printed = exact.Select(share => share > 0 ? Math.Max(1, (int)share) : 0).ToArray();
        for (var left = Whole - printed.Sum(); left != 0; left -= Math.Sign(left))
        {
            var next = Enumerable.Range(0, printed.Length).Where(at => left > 0 || printed[at] > 1).MaxBy(at => (exact[at] - printed[at]) * Math.Sign(left));
            printed[next] += Math.Sign(left);
        }
        return printed;
    }
}
