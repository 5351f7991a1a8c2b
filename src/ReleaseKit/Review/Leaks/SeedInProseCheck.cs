using ReleaseKit.Review.Prose;

namespace ReleaseKit.Review.Leaks;

/// <summary>A seed in the prose. In words for readers it can be something else ("seed 12 of the trial"), so it is a caution there.</summary>
internal sealed class SeedInProseCheck : IReviewCheck
{
    public IEnumerable<Finding> Check(ReviewSubject subject) =>
        from page in subject.Release?.Narrative ?? []
        let lines = new ProseLines(page)
        from seed in SeedText.In(page.Markdown)
        select SeedText.Found(FindingLevel.Caution, FindingOwner.Writer, lines.PlaceOf(seed.Index), seed.Words);
}
