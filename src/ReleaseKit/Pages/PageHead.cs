namespace ReleaseKit.Pages;

/// <summary>The parts of the publication that the head of a page leads to.</summary>
public enum SiteSection
{
    Release,
    Tables,
    Budget,
    Reading,
    Methods,
    Downloads,
}

/// <summary>What the frame of a page needs to know about it.</summary>
/// <param name="Path">Path in the site.</param>
/// <param name="Title">Its own title, without the release's; null for the home page.</param>
/// <param name="Section">The part of the publication it belongs to.</param>
public sealed record PageHead(string Path, string? Title, SiteSection Section)
{
    /// <summary>Index of the table that the page belongs to, or null.</summary>
    public int? Table { get; init; }

    /// <summary>Whether a server shows it under addresses of any depth, where relative links lead nowhere.</summary>
    public bool IsShownAnywhere { get; init; }

    /// <summary>The link to another page or file of the site; null on a page that is shown anywhere, if it is not known where the site stands.</summary>
    /// <param name="target">Its path in the site.</param>
    /// <param name="address">Where the site stands, if that is said.</param>
    public string? LinkTo(string target, string? address) => !IsShownAnywhere ? Link.From(Path, target)
        : WebAddress.PathOf(address) is { } root ? root + target
        : null;
}
