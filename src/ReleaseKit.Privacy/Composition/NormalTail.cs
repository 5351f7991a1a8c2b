using MathNet.Numerics;

namespace ReleaseKit.Privacy.Composition;

/// <summary>The upper tail of the standard normal law, and its ratio to the density.</summary>
internal static class NormalTail
{
    private const double FromFraction = 4;

    /// <summary>φ(x).</summary>
    public static double Density(double x) => Math.Exp(-x * x / 2) / Constants.Sqrt2Pi;

    /// <summary>P(Z ≥ x).</summary>
    public static double Above(double x) => SpecialFunctions.Erfc(x / Constants.Sqrt2) / 2;

    /// <summary>Mills' ratio P(Z ≥ x) ÷ φ(x), by continued fraction where the density is small (Laplace's, 1805; textbook).</summary>
    public static double Mills(double x) => x < FromFraction ? Above(x) / Density(x) : 1 / (x + Fraction(x));

    /// <summary>1 − x·Mills(x) = −Mills′(x) &gt; 0.</summary>
    public static double MillsSlope(double x)
    {
        if (x < FromFraction)
            return 1 - (x * Mills(x));
        var fraction = Fraction(x);
        return fraction / (x + fraction);
    }

    // 1/(x + 2/(x + 3/(x + …))), so that Mills is 1/(x + this).
    private static double Fraction(double x)
    {
        var tail = x;
        for (var level = 200; level >= 1; level--)
            tail = x + ((level + 1) / tail);
        return 1 / tail;
    }
}
