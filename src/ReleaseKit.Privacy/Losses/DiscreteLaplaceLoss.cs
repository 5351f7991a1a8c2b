using ReleaseKit.Noise;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// Two-sided geometric noise with scale t, one cell moved by d: ε = d/t. For one step ρ = ε·tanh(ε/2); for more the supremum of D_α/α over α,
/// with D_α in closed form, never above ε·tanh(ε/2). Derived from the law of Ghosh, Roughgarden &amp; Sundararajan 2012.
/// </summary>
internal sealed class DiscreteLaplaceLoss(DiscreteLaplaceLaw law) : LatticeLoss(law)
{
    private const int Orders = 64;

    public override string Source => "Ghosh, Roughgarden & Sundararajan 2012";

    private double PerStep => law.Grid / law.Scale;

    public override Bounds<Epsilon> Pure(double shift) => InSteps(shift, steps => Epsilon.Of(steps * PerStep));

    public override Bounds<Rho> Concentrated(double shift) => new(Rho.Of(Largest(StepsDown(shift))), Upper(StepsUp(shift)));

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift) => HalfLine(epsilon, shift, steps => LastAbove(epsilon, steps));

    public override string PureArithmetic(double shift) => $"{Signs.Of(StepsUp(shift) * law.Grid)} ÷ {Signs.Of(law.Scale)}";

    public override string ConcentratedArithmetic(double shift)
    {
        var epsilon = Signs.Of(StepsUp(shift) * PerStep);
        return StepsUp(shift) <= 1 ? $"{epsilon} × tanh({epsilon} ÷ 2)" : $"sup D_α ÷ α = {Signs.Of(Concentrated(shift).Upper.Value)}";
    }

    // Group privacy, Bun & Steinke 2016, Proposition 1.9 (from memory): ρ of k steps is at most k² that of one.
    internal override ShiftRun RunOfDistanceConcentrated(double distance, long cells) =>
        RunOfSquaredSteps(distance, cells) ?? base.RunOfDistanceConcentrated(distance, cells);

    // The supremum lies at α = 1 as far as is seen; the search over α and the cap do not rest on it.
    private Rho Upper(double steps)
    {
        var cap = PureConversion.SmallestRho(Epsilon.Of(steps * PerStep));
        return steps <= 1 ? cap : Rho.Min(cap, Rho.Of(Largest(steps) * (1 + 1e-12)));
    }

    private double Largest(double steps)
    {
        if (steps == 0)
            return 0;
        var largest = Divergence(steps);
        for (var i = 0; i < Orders; i++)
        {
            var order = 1 + Math.Exp(-7 + (i * 14.0 / Orders));
            largest = Math.Max(largest, Renyi(order, steps) / order);
        }

        return largest;
    }

    // α → 1: Σ P ln(P/Q) = (1/t)·(s − 2a(1 − a^s)/(1 − a²)), a = e^(−1/t).
    private double Divergence(double steps)
    {
        var ratio = Math.Exp(-PerStep);
        var squareFall = -Elementary.ExpM1(-2 * PerStep);
        return PerStep * (steps + (2 * ratio * Elementary.ExpM1(-steps * PerStep) / squareFall));
    }

    // D_α = ln(A·a^((1−α)s) + B·a^(αs)) ÷ (α − 1), A = (1 + (1 − a)r/(1 − r))/(1 + a), B = (a − (1 − a)r/(1 − r))/(1 + a), r = a^(2α−1).
    private double Renyi(double order, double steps)
    {
        var ratio = Math.Exp(-PerStep);
        var fall = -Elementary.ExpM1(-PerStep);
        var power = Math.Exp(-((2 * order) - 1) * PerStep);
        var middle = fall * power / -Elementary.ExpM1(-((2 * order) - 1) * PerStep);
        var (up, down) = ((1 + middle) / (1 + ratio), (ratio - middle) / (1 + ratio));
        var climb = (order - 1) * steps * PerStep;
        var log = climb + Math.Log(up + (down * Math.Exp(-((2 * order) - 1) * steps * PerStep)));
        return log / (order - 1);
    }

    private double LastAbove(Epsilon epsilon, double steps) => steps * PerStep <= epsilon.Value
        ? double.NegativeInfinity
        : Math.Ceiling((steps - (epsilon.Value / PerStep)) / 2) - 1;
}
