using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>
/// The authorised delta against 1 ÷ (number of units), where a figure of the release gives that number; and against what no release is too small for.
/// </summary>
internal sealed class DeltaCheck : IReviewCheck
{
    // Common practice, no source: a delta far below 1 ÷ (number of units), and a release of statistics has a thousand units at least.
    private const double LargestOfAny = 1e-3;

    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Noise is { Authorised.Delta: > 0 and var delta } account && Found(subject.Release, account, delta) is { } found
        ? [found]
        : [];

    private static Finding? Found(Release? release, NoiseAccount account, double delta)
    {
        var known = release is null ? 0 : LargestCount(release, rule => rule is NoiseRule.Public);
        if (delta * known >= 1)
            return TooLarge(account, $"Delta {BudgetText.Plain(delta)} is not below 1 divided by the {Units(known, account)} that a public figure counts.");
        var noised = release is null ? 0 : LargestCount(release, rule => rule is NoiseRule.FromMechanism or NoiseRule.SumOver);
        if (delta * noised >= 1)
            return TooLarge(account, $"Delta {BudgetText.Plain(delta)} is not below 1 divided by the {Units(noised, account)} that a figure with noise counts.");
        return delta > LargestOfAny ? TooLarge(account, $"Delta {BudgetText.Plain(delta)} is above 1 in 1,000.") : null;
    }

    private static string Units(double count, NoiseAccount account) => $"{count.ToString("#,##0", CultureInfo.InvariantCulture)} {BudgetText.Other(account)}";

    private static double LargestCount(Release release, Func<NoiseRule, bool> isMeant) => release.Tables.SelectMany(table => table.Measures)
        .Where(measure => measure.Kind == MeasureKind.Count && BudgetText.IsUnitOfPrivacy(measure.Unit, release.Noise))
        .SelectMany(measure => Enumerable.Range(0, measure.RuleOf.Length)
            .Where(row => isMeant(measure.RuleAt(row)) && measure.HasNumber(row))
            .Select(row => measure.ValueAt(row).ToDouble() * measure.Multiplier))
        .DefaultIfEmpty(0).Max();

    private static Finding TooLarge(NoiseAccount account, string found) => new(
        FindingLevel.Caution, "delta-too-large", FindingOwner.Noise, account.Authorised.At, found,
        $"a delta of that size allows the record of one {BudgetText.One(account)} to be published outright.",
        $"have a delta authorised that is far smaller than 1 divided by the number of {BudgetText.Other(account)}.");
}
