using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Review;

/// <summary>What can be wrong with a waiver, one factory a failure.</summary>
internal static class WaiverProblems
{
    public static Finding CannotBeWaived(Place at, string slug, FindingOwner owner) => new(
        FindingLevel.Stop, "cannot-be-waived", owner, at,
        $"\"{KeyProblems.Cut(slug)}\" is none of the findings that can be waived.",
        $"what is wrong with the budget, a margin that is missing and a leak cannot be signed away; these can: {string.Join(", ", Waivers.Waivable)}.",
        Nearest.Of(slug, Waivers.Waivable) is { } near
            ? $"write \"{near}\" if that is meant; else take the waiver out, and if there is such a finding, mend what the finding names."
            : "take the waiver out, and if there is such a finding, mend what the finding names.");

    public static Finding NotFilledIn(Place at, string key, FindingOwner owner) => new(
        FindingLevel.Stop, "waiver-not-filled-in", owner, at,
        $"\"{key}\" of this waiver still holds the dots of the pattern.",
        "a waiver is the record of who let a finding stand, and why; nobody has signed this one.",
        key == "by" ? "write the name or office of whoever takes it upon themselves, or take the waiver out." : "write why the finding may stand, or take the waiver out.");

    public static Finding HasEnded(Waiver waiver) => new(
        FindingLevel.Caution, "waiver-without-effect", FindingOwner.SignOff, waiver.Place,
        FormattableString.Invariant($"The waiver of \"{KeyProblems.Cut(waiver.Finding)}\" ended on {waiver.Until:yyyy-MM-dd}, before this release is published."),
        "the finding stands again.",
        "renew the waiver, or take it out.");

    public static Finding CoversNothing(Waiver waiver) => new(
        FindingLevel.Caution, "waiver-without-effect", FindingOwner.SignOff, waiver.Place,
        $"There is no finding \"{KeyProblems.Cut(waiver.Finding)}\"{(waiver.At is null ? "" : $" at {KeyProblems.Cut(waiver.At)}")} to waive.",
        "the record would list a waiver of nothing.",
        "take it out, or correct \"at\": a file, a place as it is printed, or a figure address.");
}
