namespace ReleaseKit.Charts;

/// <summary>What a shape of a mark means; painters give each ink its colour and dash.</summary>
public enum MarkInk
{
    /// <summary>The body out to the upper coverage: fill, the tails' colour.</summary>
    Tail,

    /// <summary>The body out to the main coverage: fill.</summary>
    Body,

    /// <summary>The dark middle out to the lower coverage: fill.</summary>
    Core,

    /// <summary>The body of a weak figure: paper with an outline.</summary>
    Hollow,

    /// <summary>The tail of a weak figure or of a mark without density: a line.</summary>
    TailLine,

    /// <summary>What lies where the value before noise cannot be: a dashed outline.</summary>
    Ghost,
    Stop,
    GhostStop,

    /// <summary>Paper under the stem.</summary>
    Halo,
    Stem,

    /// <summary>The dotted upright at the limit of the possible.</summary>
    ZeroLine,

    /// <summary>An arrow head: the mark goes on beyond the scale.</summary>
    Arrow,
}

public readonly record struct MarkPoint(double X, double Y);

/// <summary>One shape: a polygon if closed, else a line of the given thickness. Filled inks have no thickness.</summary>
public sealed record MarkShape(MarkInk Ink, IReadOnlyList<MarkPoint> Points, bool Closed, double Thickness);
