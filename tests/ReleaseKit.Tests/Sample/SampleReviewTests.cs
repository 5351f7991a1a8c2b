using ReleaseKit.Appraisal;
using ReleaseKit.Reading;
using ReleaseKit.Review;
using Xunit;

namespace ReleaseKit.Tests.Sample;

/// <summary>The sample is a release that the review lets through without a word but notes.</summary>
public sealed class SampleReviewTests
{
    [Fact]
    public void Sample_has_neither_stops_nor_cautions()
    {
        var outcome = ReleaseFolder.Read(SampleRelease.Folder);
        var findings = ReleaseReview.Of(outcome, outcome.Release is { } release ? AppraisedRelease.Of(release) : null, Wording.English.Language);
        Assert.DoesNotContain(findings, finding => finding.Level != FindingLevel.Note);
    }

    [Fact]
    public void Most_ward_counts_can_be_used_alone_and_some_cannot()
    {
        var appraised = AppraisedRelease.Of(ReleaseFolder.Read(SampleRelease.Folder).Release!);
        var wards = appraised.Select("arrears/in_arrears").Concat(appraised.Select("arrears/went_cold")).Select(at => appraised.Figure(at).Reliability).ToList();
        Assert.True(wards.Count(word => word is Reliability.Close or Reliability.Rough) > wards.Count / 2);
        Assert.True(wards.Count(word => word is Reliability.Weak) >= 5);
    }
}
