namespace ReleaseKit.Privacy.Meaning;

/// <summary>The lowest value of a function that falls and then rises.</summary>
internal static class Valley
{
    private const int Steps = 60;
    private static readonly double Golden = (Math.Sqrt(5) - 1) / 2;

    /// <summary>The lowest of the values looked at by golden section between two ends, the ends included.</summary>
    public static double Lowest(Func<double, double> height, double left, double right)
    {
        var lowest = height(right);
        if (!(left < right))
            return lowest;
        lowest = Math.Min(lowest, height(left));
        for (var step = 0; step < Steps; step++)
        {
            var part = Golden * (right - left);
            var (onLeft, onRight) = (height(right - part), height(left + part));
            lowest = Math.Min(lowest, Math.Min(onLeft, onRight));
            (left, right) = onLeft <= onRight ? (left, left + part) : (right - part, right);
        }

        return lowest;
    }
}
