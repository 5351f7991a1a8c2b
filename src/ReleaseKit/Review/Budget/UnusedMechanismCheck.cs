using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A mechanism that no figure carries, unless its use says why; and one that is said not to be published, and is.</summary>
internal sealed class UnusedMechanismCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release is null || !subject.Read.RulesAreWhole
        ? []
        : subject.Spendings.Where(spending => spending is { Mechanism.Use: MechanismUse.Figures, Cells.Measures.Count: 0 } && !IsNamedByColumn(subject.Release, spending))
            .Select(spending => Unused(spending.Mechanism))
            .Concat(subject.Spendings.Where(spending => spending is { Mechanism.Use: MechanismUse.NotPublished, Cells.Published: > 0 }).Select(spending => Published(spending, subject.Release)));

    private static bool IsNamedByColumn(Release release, MechanismSpending spending) =>
        release.Tables.SelectMany(table => table.SideColumns).Any(side => side.Mechanism == spending.Mechanism.Id);

    private static Finding Unused(Mechanism mechanism) => new(
        FindingLevel.Stop, "mechanism-unused", FindingOwner.Noise, mechanism.At,
        $"No figure carries the noise of \"{mechanism.Id}\".",
        "either a figure is published without the noise that was meant for it, or the budget counts what was never published.",
        "name it in the \"noise\" of its figures, or say what it was for: \"use\": \"not-published\", \"choice-of-rows\" or \"choice-of-bounds\".");

    private static Finding Published(MechanismSpending spending, Release release)
    {
        var (mechanism, at) = (spending.Mechanism, spending.Cells.Measures[0]);
        var table = release.Tables[at.Table];
        return new(
            FindingLevel.Stop, "not-published-used", FindingOwner.Noise, BudgetText.PlaceOf(mechanism, "use"),
            $"\"{mechanism.Id}\" has \"use\": \"not-published\", but {spending.Cells.Published} published {(spending.Cells.Published == 1 ? "figure carries" : "figures carry")} it, in column \"{table.Measures[at.Measure].Column}\" of table \"{table.Id}\".",
            "the budget page would say of one mechanism that its answer is published and that it is not.",
            "take \"use\": \"not-published\" out, or name in the \"noise\" of these figures the mechanism that they carry.");
    }
}
