using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Meaning;

/// <summary>
/// The largest success of any test whether one unit's record was used, at a chance α of a false alarm: the least over ε of
/// e^ε·α + δ(ε) and 1 − e^−ε(1 − α − δ(ε)). Wasserman &amp; Zhou 2010, Theorem 2.4; Kairouz, Oh &amp; Viswanath 2015, Theorem 2.1 (from memory).
/// Every ε gives a valid bound.
/// </summary>
public static class TestBound
{
    /// <summary>The bound, from α to 1.</summary>
    /// <param name="curve">The guarantee.</param>
    /// <param name="falseAlarms">α, a chance from 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">α is no chance.</exception>
    public static double LargestSuccess(PrivacyCurve curve, double falseAlarms)
    {
        if (falseAlarms is not (>= 0 and <= 1))
            throw new ArgumentOutOfRangeException(nameof(falseAlarms), falseAlarms, "A chance lies from 0 to 1.");
        if (!curve.LastUseful.IsFinite)
            return 1;
        double Few(double epsilon) => (Math.Exp(epsilon) * falseAlarms) + curve.DeltaAt(Epsilon.Of(epsilon)).Value;
        double Many(double epsilon) => 1 - (Math.Exp(-epsilon) * (1 - falseAlarms - curve.DeltaAt(Epsilon.Of(epsilon)).Value));
        var last = curve.LastUseful.Value;
        return Math.Clamp(Math.Min(Valley.Lowest(Few, 0, last).Height, Valley.Lowest(Many, 0, last).Height), falseAlarms, 1);
    }
}
