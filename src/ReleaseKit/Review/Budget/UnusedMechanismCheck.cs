using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A mechanism that no figure carries, unless its use says why.</summary>
internal sealed class UnusedMechanismCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) => subject.Release is null || !subject.Read.RulesAreWhole
        ? []
        : subject.Spendings.Where(spending => spending is { Mechanism.Use: MechanismUse.Figures, Cells.Measures.Count: 0 } && !IsNamedByColumn(subject.Release, spending))
            .Select(spending => Unused(spending.Mechanism));

    private static bool IsNamedByColumn(Release release, MechanismSpending spending) =>
        release.Tables.SelectMany(table => table.SideColumns).Any(side => side.Mechanism == spending.Mechanism.Id);

    private static Finding Unused(Mechanism mechanism) => new(
        FindingLevel.Stop, "mechanism-unused", FindingOwner.Noise, mechanism.At,
        $"No figure carries the noise of \"{mechanism.Id}\".",
        "either a figure is published without the noise that was meant for it, or the budget counts what was never published.",
        "name it in the \"noise\" of its figures, or say what it was for: \"use\": \"not-published\", \"choice-of-rows\" or \"choice-of-bounds\".");
}
