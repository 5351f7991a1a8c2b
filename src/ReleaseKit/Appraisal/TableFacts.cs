using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>What can be said once of all ranges of a table (of its shown measures).</summary>
public sealed record TableFacts
{
    public required Table Table { get; init; }

    /// <summary>Its published numbers by where they come from.</summary>
    public required FigureKinds Figures { get; init; }

    /// <summary>How many figures have a range.</summary>
    public required int Ranges { get; init; }

    /// <summary>An upper bound on the expected number of ranges that miss: the sum of 1 − attained coverage.</summary>
    public required double ExpectedMisses { get; init; }

    /// <summary>Whether some figures rest on the same noise: then misses can come together.</summary>
    public required bool SharesDraws { get; init; }

    /// <summary>Whether some totals have noise of their own, so that parts need not add up to them.</summary>
    public required bool HasTotalsOfOwnNoise { get; init; }

    /// <summary>Whether some totals are the sums of the published parts.</summary>
    public required bool HasSums { get; init; }

    /// <summary>One for each measure, in the order of the table.</summary>
    public required IReadOnlyList<MeasureFacts> Measures { get; init; }
}

/// <summary>What can be said once of the ranges of one measure.</summary>
public sealed record MeasureFacts
{
    public required Measure Measure { get; init; }

    /// <summary>The smallest and largest margin at the main coverage, as printed; null where no figure has one, or margins depend on the figure (thresholds).</summary>
    public PublishedValue? SmallestMargin { get; init; }
    public PublishedValue? LargestMargin { get; init; }

    /// <summary>Whether some figures have ranges whose reach depends on the figure.</summary>
    public required bool HasThreshold { get; init; }

    /// <summary>What the coverage of its ranges is a promise about, zeros that stand for small values apart.</summary>
    public RangePromise Promise { get; init; }

    /// <summary>Whether some totals of this measure are the sums of the published parts.</summary>
    public required bool HasSums { get; init; }

    /// <summary>Whether some of its totals have noise of their own; never for a measure that does not add up, as a mean.</summary>
    public required bool HasTotalsOfOwnNoise { get; init; }

    /// <summary>Why its parts may not add up.</summary>
    public TotalFacts Totals { get; init; } = TotalFacts.None;

    /// <summary>Whether the margins of some figures hold a rounding after the noise: one on purpose, or that of continuous noise to the decimals of the file.</summary>
    public required bool IsRounded { get; init; }
    public required Noise.Coverage Coverage { get; init; }

    /// <summary>The distance that the noise stays within in 999 of 1,000 cases, for the figure where it is largest, as printed.</summary>
    public PublishedValue? Distance999 { get; init; }
}
