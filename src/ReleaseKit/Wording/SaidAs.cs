namespace ReleaseKit.Wording;

/// <summary>What a number in a writer's words is to the figure that they cite; the later, the nearer to it.</summary>
internal enum SaidAs
{
    /// <summary>Another number.</summary>
    Other,

    /// <summary>The figure, rounded by the writer so far that it may say another thing: the figure itself must stand beside it.</summary>
    RoundedFar,

    /// <summary>Its margin without a ±, or an end of its range: the figure or its other end must stand with it.</summary>
    Beside,

    /// <summary>The figure, rounded by the writer or without its sign: the figure itself must stand beside it.</summary>
    Rounded,

    /// <summary>The figure as published or printed, or its margin with a ±.</summary>
    AsIs,
}
