namespace ReleaseKit.Charts.Ordered;

/// <summary>The measures of an ordered chart at one width, in pixels.</summary>
internal sealed record OrderedForm
{
    public required double Width { get; init; }

    /// <summary>Whether the mark stands beside the name and the figure, or under them.</summary>
    public required bool MarkBeside { get; init; }
    public required int Ticks { get; init; }

    public static OrderedForm Wide { get; } = new() { Width = 720, MarkBeside = true, Ticks = 6 };
    public static OrderedForm Narrow { get; } = new() { Width = 340, MarkBeside = false, Ticks = 4 };

    /// <summary>Space for a name beside the mark, at most; longer names are wrapped.</summary>
    public const double MostName = 230;

    public const double Line = 18;
    public const double ColumnGap = 16;
    public const double ValueGap = 9;
    public const double LozengeWidth = 18;

    /// <summary>Left free at both ends of the scale, for arrows.</summary>
    public const double Inset = 10;
    public const double HeadHeight = 40;

    /// <summary>As the marks of tables, a little larger.</summary>
    public static MarkSize Mark { get; } = new() { Peak = 13, StemHeight = 20, StemWidth = 2, StopHeight = 10, StopWidth = 1.6, Middle = 13, PointsASide = 18 };
    public const double MarkHeight = 26;
}
