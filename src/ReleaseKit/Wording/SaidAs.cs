namespace ReleaseKit.Wording;

/// <summary>What a number in a writer's words is to the figure that they cite; the later, the nearer to it.</summary>
internal enum SaidAs
{
    /// <summary>Another number.</summary>
    Other,

    /// <summary>A bound that lies within its range, so that it may be false: the figure itself must stand beside it.</summary>
    DoubtfulBound,

    /// <summary>The figure, rounded by the writer so far that it may say another thing: the figure itself must stand beside it.</summary>
    RoundedFar,

    /// <summary>Its margin without a ±, or an end of its range: the figure or its other end must stand with it.</summary>
    Beside,

    /// <summary>A bound that its whole range keeps: the figure itself must stand beside it.</summary>
    Bound,

    /// <summary>The figure without its sign, exact or rounded: the figure itself must stand beside it.</summary>
    Unsigned,

    /// <summary>The figure, rounded by the writer: the figure itself must stand beside it.</summary>
    Rounded,

    /// <summary>The figure as published or printed, or its margin with a ±.</summary>
    AsIs,
}
