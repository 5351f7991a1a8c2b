using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>The authorised delta against 1 ÷ (number of units), where a public figure of the release gives that number.</summary>
internal sealed class DeltaCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        subject.Release is { Noise.Authorised: { Delta: > 0 and var delta } } release && LargestPublicCount(release) is > 0 and var units && delta * units >= 1
            ? [TooLarge(release, delta, units)]
            : [];

    private static double LargestPublicCount(Release release) => release.Tables.SelectMany(table => table.Measures)
        .Where(measure => measure.Kind == MeasureKind.Count && measure.Unit.Key == release.Noise.Who.Key)
        .SelectMany(measure => Enumerable.Range(0, measure.RuleOf.Length)
            .Where(row => measure.RuleAt(row) is NoiseRule.Public && measure.HasNumber(row))
            .Select(row => measure.ValueAt(row).ToDouble() * measure.Multiplier))
        .DefaultIfEmpty(0).Max();

    private static Finding TooLarge(Release release, double delta, double units) => new(
        FindingLevel.Caution, "delta-too-large", FindingOwner.Noise, release.Noise.Authorised.At,
        $"Delta {BudgetText.Plain(delta)} is not below 1 divided by the {units.ToString("#,##0", CultureInfo.InvariantCulture)} {BudgetText.Other(release.Noise)} that a public figure counts.",
        $"a delta of that size allows the record of one {BudgetText.One(release.Noise)} to be published outright.",
        "have a delta authorised that is far smaller than that.");
}
