namespace ReleaseKit.Charts.Headlines;

/// <summary>What stands in the picture of a headline: its title, its number in heavy and light digits, margin and unit, the ends of its range, its reading, its source.</summary>
public sealed record HeadlineWords
{
    public required string Title { get; init; }
    public required string Heavy { get; init; }
    public required string Light { get; init; }
    public required string Margin { get; init; }
    public required string Unit { get; init; }

    /// <summary>Ends of the main range in print; null without a margin.</summary>
    public required (string Low, string High)? Ends { get; init; }
    public required string Reading { get; init; }
    public required string Source { get; init; }
}
