using ReleaseKit.Appraisal;
using ReleaseKit.Reading;
using ReleaseKit.Releases;

namespace ReleaseKit.Review;

/// <summary>What a check can look at. Any part is null if it could not be formed; a check says nothing about what is not there.</summary>
public sealed record ReviewSubject(ReadOutcome Read, IAppraisedRelease? Appraised)
{
    public Release? Release => Read.Release;

    public NoiseAccount? Noise => Read.Noise;
}
