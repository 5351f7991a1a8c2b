using ReleaseKit.Releases;

namespace ReleaseKit.Review;

/// <summary>
/// What an office may let stand in signoff.json. Only what is named here: a finding that is not, above all about the budget, a missing margin or a
/// leak, cannot be waived.
/// </summary>
public static class Waivers
{
    /// <summary>Slugs of findings that may be waived.</summary>
    public static IReadOnlySet<string> Waivable { get; } = new HashSet<string>
    {
        "formula-cell", "kind-not-given", "label-unused", "looks-like-period", "looks-like-total", "no-address", "no-licence", "prose-heading", "prose-html", "prose-may-disagree", "prose-rounded-far", "seed-given", "total-far-from-parts",
        "undeclared-unit",
    };

    /// <summary>The findings, those that are waived turned into notes that say by whom and why; a waiver without effect is a caution of its own.</summary>
    public static IEnumerable<Finding> Apply(IReadOnlyList<Finding> findings, Release? release)
    {
        var waivers = release?.SignOff.Waivers ?? [];
        var inForce = waivers.Where(waiver => !HasEnded(waiver, release!)).ToList();
        return findings.Select(finding => inForce.FirstOrDefault(waiver => Covers(waiver, finding)) is { } waiver ? Waived(finding, waiver) : WithWaiver(finding, release))
            .Concat(waivers.Where(waiver => HasEnded(waiver, release!)).Select(WaiverProblems.HasEnded))
            .Concat(inForce.Where(waiver => !findings.Any(finding => Covers(waiver, finding))).Select(WaiverProblems.CoversNothing));
    }

    /// <summary>"until" is compared with the moment of publication; it holds on its last day.</summary>
    private static bool HasEnded(Waiver waiver, Release release) => waiver.Until < DateOnly.FromDateTime(release.Published.Date);

    private static bool Covers(Waiver waiver, Finding finding) => waiver.Finding == finding.Slug && finding.Level != FindingLevel.Stop
        && (waiver.At is null || waiver.At == finding.At.File || waiver.At == finding.At.ToString() || waiver.At == finding.Address);

    private static Finding Waived(Finding finding, Waiver waiver) => finding with
    {
        Level = FindingLevel.Note,
        Found = FormattableString.Invariant($"{finding.Found}\nWaived by {waiver.By} on {waiver.On:yyyy-MM-dd}: {waiver.Reason}"),
    };

    /// <summary>A caution says with which waiver it may stand, ready to paste; the day is to be put right by whoever signs.</summary>
    private static Finding WithWaiver(Finding finding, Release? release) => release is not null && finding.Level == FindingLevel.Caution && Waivable.Contains(finding.Slug)
        ? finding with { Do = FormattableString.Invariant($$"""{{finding.Do}} If it may stand, write in signoff.json, with words of your own for the dots: { "waivers": [ { "finding": "{{finding.Slug}}", "at": "{{finding.Address ?? finding.At.ToString()}}", "reason": "…", "by": "…", "on": "{{release.Published.Date:yyyy-MM-dd}}" } ] }""") }
        : finding;
}
