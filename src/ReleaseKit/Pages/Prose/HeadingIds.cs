using System.Globalization;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Prose;

/// <summary>Ids of headings on one page: the slug of their words, no two alike.</summary>
internal sealed class HeadingIds(params IEnumerable<string> taken)
{
    private readonly HashSet<string> taken = [.. taken];

    public string Next(string words)
    {
        var slug = Slug.Of(words);
        var stem = slug.Length == 0 ? "part" : slug;
        var id = stem;
        for (var number = 2; !taken.Add(id); number++)
            id = stem + "-" + number.ToString(CultureInfo.InvariantCulture);
        return id;
    }
}
