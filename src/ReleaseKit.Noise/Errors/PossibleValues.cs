namespace ReleaseKit.Noise.Errors;

/// <summary>What the value before noise can be: public bounds, and whether it is a whole number.</summary>
/// <param name="Lowest">The smallest possible value, −∞ if there is none.</param>
/// <param name="Highest">The largest possible value, +∞ if there is none.</param>
/// <param name="Whole">Whether only whole numbers are possible (counts).</param>
public readonly record struct PossibleValues(double Lowest, double Highest, bool Whole)
{
    /// <summary>Every real number.</summary>
    public static PossibleValues Any { get; } = new(double.NegativeInfinity, double.PositiveInfinity, false);

    /// <summary>Whole numbers from 0.</summary>
    public static PossibleValues Counts { get; } = new(0, double.PositiveInfinity, true);

    /// <summary>
    /// A range cut to the possible values. Whole numbers are taken inward, which loses none of them; a range that would hold nothing is
    /// taken outward, or shrinks to the nearest possible value.
    /// </summary>
    internal ErrorRange Cut(double low, double high, double attained)
    {
        var (cutLow, cutHigh) = (Math.Clamp(low, Lowest, Highest), Math.Clamp(high, Lowest, Highest));
        if (!Whole)
            return new ErrorRange(cutLow, cutHigh, low, high, attained);
        var (wholeLow, wholeHigh) = (Lattice.Ceiling(cutLow), Lattice.Floor(cutHigh));
        return wholeLow <= wholeHigh
            ? new ErrorRange(wholeLow, wholeHigh, low, high, attained)
            : new ErrorRange(Math.Floor(cutLow), Math.Ceiling(cutHigh), low, high, attained);
    }
}
