using ReleaseKit.Noise;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// Laplace noise with scale b, one cell moved by d: ε = d/b; ρ = ε − 1 + e^−ε, its Kullback–Leibler divergence, which D_α/α never exceeds
/// (tested over α); δ(ε) = 1 − e^((ε − d/b)/2) below d/b, 0 from there on. Derived from the law of Dwork, McSherry, Nissim &amp; Smith 2006.
/// </summary>
internal sealed class LaplaceLoss(LaplaceLaw law) : LawLoss
{
    public override string Source => "Dwork, McSherry, Nissim & Smith 2006";

    public override Bounds<Epsilon> Pure(double shift) => Exactly(Epsilon.Of(shift / law.Scale));

    public override Bounds<Rho> Concentrated(double shift) => Exactly(Rho.Of(Divergence(shift / law.Scale)));

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift) =>
        Exactly(Delta.AtMost(-Elementary.ExpM1(Math.Min(0, (epsilon.Value - (shift / law.Scale)) / 2))));

    public override string PureArithmetic(double shift) => $"{Signs.Of(shift)} ÷ {Signs.Of(law.Scale)}";

    public override string ConcentratedArithmetic(double shift)
    {
        var epsilon = Signs.Of(shift / law.Scale);
        return $"({epsilon} − 1 + e^−{epsilon})";
    }

    // ε − 1 + e^−ε; its series ε²/2 − ε³/6 + ε⁴/24 − ε⁵/120 where the terms would cancel (cut off above the next term).
    private static double Divergence(double epsilon) => epsilon < 1e-3
        ? epsilon * epsilon * (0.5 - (epsilon * ((1.0 / 6) - (epsilon * ((1.0 / 24) - (epsilon / 120))))))
        : epsilon + Elementary.ExpM1(-epsilon);
}
