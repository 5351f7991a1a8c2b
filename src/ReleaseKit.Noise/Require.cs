using System.Globalization;

namespace ReleaseKit.Noise;

/// <summary>Checks of parameters; every message names the parameter, what was found and the range that is meant.</summary>
internal static class Require
{
    public static double Positive(double value, string name, string unit) => double.IsFinite(value) && value > 0
        ? value
        : throw OutOfRange(value, name, $"is in {unit} and must be a finite number above 0");

    public static double Share(double value, string name) => value is >= 0 and <= 1
        ? value
        : throw OutOfRange(value, name, "is a pure number from 0 to 1");

    public static double Finite(double value, string name, string unit) => double.IsFinite(value)
        ? value
        : throw OutOfRange(value, name, $"is in {unit} and must be finite");

    /// <summary>The number of grid steps in a length, which must be a whole number of them, 0 to 2⁵².</summary>
    public static long WholeSteps(double value, double grid, string name)
    {
        var steps = Math.Round(value / grid);
        return steps is >= 0 and <= Lattice.Exact && Lattice.IsWhole(value / grid)
            ? (long)steps
            : throw OutOfRange(value, name, string.Create(
                CultureInfo.InvariantCulture, $"is in the unit of the figure and must be 0 or a multiple of the grid {grid:R}"));
    }

    private static ArgumentOutOfRangeException OutOfRange(double value, string name, string rule) =>
        new(name, value, string.Create(CultureInfo.InvariantCulture, $"'{name}' {rule}; it is {value:R}."));
}
