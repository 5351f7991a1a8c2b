using ReleaseKit.Releases;

namespace ReleaseKit.Review.Prose;

/// <summary>From a character of a page's text to its line and column.</summary>
internal sealed class ProseLines
{
    private readonly string file;
    private readonly List<int> starts = [0];

    public ProseLines(ProsePage page)
    {
        file = page.File;
        for (var index = page.Markdown.IndexOf('\n'); index >= 0; index = page.Markdown.IndexOf('\n', index + 1))
            starts.Add(index + 1);
    }

    public Place PlaceOf(int index)
    {
        var found = starts.BinarySearch(index);
        var line = found < 0 ? ~found - 1 : found;
        return new Place(file, line + 1, index - starts[line] + 1);
    }
}
