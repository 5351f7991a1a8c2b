using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Losses;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>The ε of a mechanism at the δ that the office declares for it.</summary>
internal static class DeclaredDelta
{
    private const double Tolerance = 1e-9;
    private static readonly Epsilon Farthest = Epsilon.Of(1e5);

    /// <summary>The δ that a loss is taken at: as declared; where the law never comes as low, and the lowest that it comes to was declared rounded down, that one.</summary>
    public static Delta Taken(MechanismLoss loss, Delta declared) =>
        !EpsilonAt(loss, declared.Value).Upper.IsFinite && loss.DeltaAt(Farthest).Upper is var lowest && RoundedNumber.Is(declared.Value, lowest.Value) ? lowest : declared;

    /// <summary>The δ that a loss is shown to have at an ε, at most the declared one; that one where the curve meets it to a billionth, as it does where ε was worked out from it.</summary>
    public static Delta Shown(MechanismLoss loss, Epsilon epsilon, Delta declared) =>
        loss.DeltaAt(epsilon).Lower is var lower && lower.Value >= declared.Value * (1 - Tolerance) ? declared : lower;

    /// <summary>
    /// The smallest ε at a δ. Where the law never comes below a δ by no more than a billionth of it (the sum of a table's tail, worked out in
    /// binary), that δ is met.
    /// </summary>
    public static Bounds<Epsilon> EpsilonAt(MechanismLoss loss, double? declared)
    {
        var delta = declared ?? 0;
        var exact = loss.EpsilonAt(Delta.AtMost(delta));
        return delta == 0 || exact.Upper.IsFinite ? exact : loss.EpsilonAt(Delta.AtMost(delta * (1 + Tolerance)));
    }
}
