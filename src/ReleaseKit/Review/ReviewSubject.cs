using ReleaseKit.Appraisal;
using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Reading;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Review;

/// <summary>What a check can look at. Any part is null if it could not be formed; a check says nothing about what is not there.</summary>
public sealed record ReviewSubject(ReadOutcome Read, IAppraisedRelease? Appraised)
{
    /// <summary>The language of the pages, as prose is read in it.</summary>
    public ILanguage? Language { get; init; }

    public Release? Release => Read.Release;

    public NoiseAccount? Noise => Read.Noise;

    /// <summary>What each mechanism spends, worked out once for all checks; empty without mechanisms.json.</summary>
    public IReadOnlyList<MechanismSpending> Spendings => field ??= Noise is { } account ? MechanismSpending.Of(account, Release) : [];

    /// <summary>The errors of the figures as declared, for checks that hold the figures against them; null without a release.</summary>
    internal FigureOrigins? Origins => field ??= Release is { } release ? new FigureOrigins(release) : null;
}
