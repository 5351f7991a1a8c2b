using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A denominator that the mechanism calls public, in a column that is said to come from the confidential records without noise.</summary>
internal sealed class DenominatorCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release is { } release
        ? subject.Spendings.Select(spending => CheckMechanism(spending, release)).OfType<Finding>()
        : [];

    private static Finding? CheckMechanism(MechanismSpending spending, Release release) => spending.Cells.Tables.Select(table => release.Tables[table])
        .Where(table => table.SideColumns.Any(side => side is { From: SideColumnOrigin.Confidential, Mechanism: null } && side.Column == spending.Mechanism.DenominatorColumn))
        .Select(table => NotPublic(spending.Mechanism, table)).FirstOrDefault();

    private static Finding NotPublic(Mechanism mechanism, Table table) => new(
        FindingLevel.Stop, "denominator-not-public", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "denominator"),
        $"\"{mechanism.Id}\" calls the denominator \"{mechanism.DenominatorColumn}\" public, but table \"{table.Id}\" says that this column is \"from\": \"confidential\".",
        "a denominator from the records changes with a unit too: the sensitivity would be larger than declared, and the numbers are published exactly.",
        $"if the numbers are known from elsewhere, write \"{mechanism.DenominatorColumn}\": {{ \"from\": \"public\" }} in release.json; if they come from the records, publish the sum and the count, each with a mechanism of its own.");
}
