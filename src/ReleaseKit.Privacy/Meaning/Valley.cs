namespace ReleaseKit.Privacy.Meaning;

/// <summary>The lowest value of a function that falls and then rises.</summary>
internal static class Valley
{
    private const int Steps = 60;
    private static readonly double Golden = (Math.Sqrt(5) - 1) / 2;

    /// <summary>The lowest of the places looked at by golden section between two ends, the ends included, and the height there.</summary>
    public static (double Place, double Height) Lowest(Func<double, double> height, double left, double right)
    {
        var lowest = (Place: right, Height: height(right));
        void Look(double place, double found) => lowest = found < lowest.Height ? (place, found) : lowest;
        if (!(left < right))
            return lowest;
        Look(left, height(left));
        for (var step = 0; step < Steps; step++)
        {
            var part = Golden * (right - left);
            var (onLeft, onRight) = (height(right - part), height(left + part));
            Look(right - part, onLeft);
            Look(left + part, onRight);
            (left, right) = onLeft <= onRight ? (left, left + part) : (right - part, right);
        }

        return lowest;
    }
}
