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
}
