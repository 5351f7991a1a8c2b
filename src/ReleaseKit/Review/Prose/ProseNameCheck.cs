using ReleaseKit.Releases;

namespace ReleaseKit.Review.Prose;

/// <summary>Each prose file after the first becomes STEM.html: no page or folder of the publication may have that name already.</summary>
internal sealed class ProseNameCheck : IReviewCheck
{
    /// <summary>Pages and folders at the top of a publication.</summary>
    private static readonly HashSet<string> Taken = new(StringComparer.OrdinalIgnoreCase)
    {
        "index", "tables", "places", "derived", "adding", "budget", "reading", "methods", "downloads", "changes", "record", "404", "print", "images",
        "data", "feed", "sitemap", "dataset", "serving", "assets", "styles", "fonts", "scripts", "en", "es", "fr",
    };

    public IEnumerable<Finding> Check(ReviewSubject subject)
    {
        var first = new Dictionary<string, string>(StringComparer.OrdinalIgnoreCase);
        foreach (var page in subject.Release?.Narrative.Skip(1) ?? [])
        {
            var (stem, at) = (Path.GetFileNameWithoutExtension(page.File), page.At);
            if (!Slug.IsOne(stem))
                yield return ProseProblems.StemForm(at, stem, FindingOwner.Writer);
            else if (Taken.Contains(stem))
                yield return ProseProblems.StemTaken(at, stem, "a page or folder of every publication", FindingOwner.Writer);
            else if (!first.TryAdd(stem, page.File))
                yield return ProseProblems.StemTaken(at, stem, $"that of {first[stem]} too", FindingOwner.Writer);
        }
    }
}
