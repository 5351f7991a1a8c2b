using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Tables;

/// <summary>From where to where a scale goes, in the unit in which figures are printed; with its ends as numbers where they are round.</summary>
internal sealed record Reach(double From, double To)
{
    public PublishedValue? FromLabel { get; init; }
    public PublishedValue? ToLabel { get; init; }
}
