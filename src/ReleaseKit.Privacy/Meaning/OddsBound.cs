using ReleaseKit.Noise;
using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Meaning;

/// <summary>
/// By how much odds about one unit can change: at most e^ε′, but for a share β of all outcomes. With δ = 0 every outcome is bound.
/// δ itself is not the chance that the loss exceeds ε; this bound is: if δ(ε₀) ≤ β(1 − e^−t), the loss exceeds ε₀ + t with
/// chance at most β. Derived.
/// </summary>
public static class OddsBound
{
    /// <summary>β is ten times δ unless said otherwise …</summary>
    public const double TimesDelta = 10;

    /// <summary>… and at least this.</summary>
    public const double SmallestBeta = 1e-9;

    /// <summary>The β that is used where none is given: ten times δ, at least 1e-9, at most 1.</summary>
    public static Delta UsualBeta(Delta delta) => Delta.AtMost(Math.Max(TimesDelta * delta.Value, SmallestBeta));

    /// <summary>
    /// ε′ = min over ε₀ of ε₀ + t with δ(ε₀) ≤ β(1 − e^−t), so t = −ln(1 − δ(ε₀)/β). Every ε₀ gives a valid bound, so an inexact minimum
    /// errs upward. Infinite if δ never falls below β.
    /// </summary>
    /// <param name="curve">The guarantee.</param>
    /// <param name="beta">β &gt; 0: the share of outcomes that may break the bound.</param>
    public static OddsLimit Of(PrivacyCurve curve, Delta beta)
    {
        double Bound(double epsilon)
        {
            var share = curve.DeltaAt(Epsilon.Of(epsilon)).Value / beta.Value;
            return share >= 1 ? double.PositiveInfinity : epsilon - Elementary.Log1P(-share);
        }

        if (!curve.LastUseful.IsFinite)
            return new OddsLimit(Epsilon.Infinite, Epsilon.Infinite, Delta.One);
        var (place, height) = Valley.Lowest(Bound, curve.EpsilonAt(beta).Value, curve.LastUseful.Value);
        return new OddsLimit(Epsilon.Of(height), Epsilon.Of(place), curve.DeltaAt(Epsilon.Of(place)));
    }
}

/// <summary>By how much odds can change, and where on the curve that was found.</summary>
/// <param name="EpsilonPrime">ε′; odds change by e^ε′ at most.</param>
/// <param name="At">ε₀, where the minimum was found.</param>
/// <param name="DeltaThere">δ(ε₀).</param>
public readonly record struct OddsLimit(Epsilon EpsilonPrime, Epsilon At, Delta DeltaThere);
