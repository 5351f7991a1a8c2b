using ReleaseKit.Appraisal;
using ReleaseKit.Reading;
using ReleaseKit.Review;

namespace ReleaseKit.Cli;

/// <summary>A folder read, appraised and reviewed: what both commands begin with.</summary>
internal sealed record ReviewedFolder(IAppraisedRelease? Appraised, IReadOnlyList<Finding> Findings)
{
    public bool HasStops => Findings.Any(finding => finding.Level == FindingLevel.Stop);

    public static ReviewedFolder Of(string folder, Streams streams)
    {
        streams.Message($"Reading {folder}");
        var read = ReleaseFolder.Read(folder);
        var sound = read.Release is not null && read.Findings.All(finding => finding.Level != FindingLevel.Stop);
        var appraised = sound ? AppraisedRelease.Of(read.Release!) : null;
        return new ReviewedFolder(appraised, ReleaseReview.Of(read, appraised, SiteTemplates.LanguageOf(appraised)));
    }
}
