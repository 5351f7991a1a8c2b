using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>
/// The upper end of the likelihood-ratio range for a value before noise that cannot be below a bound. Feldman &amp; Cousins 1998, Unified
/// approach to the classical statistical analysis of small signals, Phys. Rev. D 57.
/// </summary>
/// <remarks>
/// x belongs to the range of a value v if the values Y whose ratio R(Y, x) = p(Y | x) ÷ p(Y | best possible x) is above R(v, x) have less
/// than the coverage together. The law is symmetric and log-concave, so R rises with Y up to x and falls after it: those values are one run
/// from a to b.
/// </remarks>
internal sealed class LikelihoodRatioRange(NoiseLaw law)
{
    // Ratios this close are equal: laws with flat stretches must not depend on the last digit.
    private const double Equal = 1 + 1e-11;

    // On a lattice the set of values can have gaps of a step or two near its end; the farthest value beyond them counts.
    private const int Gap = 16;

    private readonly LatticeLaw? lattice = law as LatticeLaw;
    private readonly double unit = (law as LatticeLaw)?.Grid ?? 1;
    private readonly double stride = law is LatticeLaw ? 1 : Math.Sqrt(law.Variance);
    private readonly double peak = law is LatticeLaw l ? l.Probability(0) : ((ContinuousLaw)law).Density(0);

    /// <summary>
    /// The largest x ≥ lowest in the range of a value; NaN if the law gives the value no chance that a double can hold even at the lowest
    /// x. All in the figure's unit.
    /// </summary>
    public double UpperEnd(double value, double lowest, Coverage coverage)
    {
        var (v, least) = lattice is null ? (value, lowest) : (Lattice.Floor(value / unit), Lattice.Ceiling(lowest / unit));
        if (Density(Math.Min(0, v - least)) == 0)
            return double.NaN;
        var end = Search.Farthest(least, stride, lattice is not null, x => Holds(x, v, least, coverage));
        for (var beyond = end + Gap; lattice is not null && beyond > end; beyond--)
            end = Holds(beyond, v, least, coverage) ? beyond : end;
        return end * unit;
    }

    private bool Holds(double x, double value, double lowest, Coverage coverage)
    {
        var ratio = Ratio(value, x, lowest) * Equal;
        bool IsAbove(double y) => Ratio(y, x, lowest) > ratio;
        if (!IsAbove(x))
            return true;
        var from = Search.Farthest(x, -stride, lattice is not null, IsAbove);
        var to = Search.Farthest(x, stride, lattice is not null, IsAbove);
        return !coverage.IsReachedBy(law.AtMost((to - x) * unit) - law.AtMost((from - x - (lattice is null ? 0 : 1)) * unit));
    }

    private double Ratio(double y, double x, double lowest) => Density(y - x) / (y < lowest ? Density(y - lowest) : peak);

    private double Density(double offset) => lattice is null
        ? ((ContinuousLaw)law).Density(offset)
        : lattice.Probability(Lattice.ToStep(offset));
}
