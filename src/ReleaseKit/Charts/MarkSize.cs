namespace ReleaseKit.Charts;

/// <summary>The measures of one size of the swelled rule, in pixels; Middle is the height at which its axis runs.</summary>
public sealed record MarkSize
{
    public required double Peak { get; init; }
    public required double StemHeight { get; init; }
    public required double StemWidth { get; init; }
    public required double StopHeight { get; init; }
    public required double StopWidth { get; init; }
    public required double Middle { get; init; }

    /// <summary>Outline points on each side of the figure.</summary>
    public required int PointsASide { get; init; }

    /// <summary>The body is never thinner, and the tails are as thick.</summary>
    public double Hair { get; init; } = 1;

    /// <summary>Paper left free on either side of the stem, so that it stands out from the body.</summary>
    public double Halo { get; init; } = 0.6;

    public double StemTop => Middle - (StemHeight / 2);

    /// <summary>In a cell of a table: canvas 26 high.</summary>
    public static MarkSize Cell { get; } = new() { Peak = 12, StemHeight = 19, StemWidth = 1.8, StopHeight = 9, StopWidth = 1.4, Middle = 13, PointsASide = 14 };

    /// <summary>Beside a headline figure: canvas 62 high with its labels.</summary>
    public static MarkSize Line { get; } = new() { Peak = 30, StemHeight = 40, StemWidth = 2.2, StopHeight = 16, StopWidth = 1.8, Middle = 24, PointsASide = 36 };

    /// <summary>Under the leading figure of a release.</summary>
    public static MarkSize Lead { get; } = new() { Peak = 104, StemHeight = 124, StemWidth = 3, StopHeight = 36, StopWidth = 2, Middle = 66, PointsASide = 60, Halo = 1 };

    /// <summary>The same on a narrow screen.</summary>
    public static MarkSize LeadNarrow { get; } = new() { Peak = 76, StemHeight = 92, StemWidth = 2.5, StopHeight = 28, StopWidth = 2, Middle = 48, PointsASide = 40, Halo = 0.8 };

    /// <summary>In the key of marks.</summary>
    public static MarkSize Key { get; } = new() { Peak = 26, StemHeight = 34, StemWidth = 2, StopHeight = 16, StopWidth = 1.5, Middle = 22, PointsASide = 28 };
}
