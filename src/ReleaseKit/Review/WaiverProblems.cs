namespace ReleaseKit.Review;

/// <summary>What can be wrong with a waiver, one factory a failure.</summary>
internal static class WaiverProblems
{
    public static Finding CannotBeWaived(Place at, string slug, FindingOwner owner) => new(
        FindingLevel.Stop, "cannot-be-waived", owner, at,
        $"\"{slug}\" cannot be waived.",
        "what is wrong with the budget, a margin that is missing and a leak cannot be signed away.",
        "take the waiver out and mend what the finding names.");
}
