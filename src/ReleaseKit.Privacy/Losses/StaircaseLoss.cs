using ReleaseKit.Noise.Laws;
using ReleaseKit.Privacy.Composition;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// Staircase noise with steps of length Δ, one cell moved by d: its density falls by e^−ε at places Δ apart, so a shift of d crosses at most
/// ⌈d/Δ⌉ of them. ρ from the pure loss. Lower bounds from the shift d itself, whose loss takes whole multiples of ε.
/// Derived from Geng &amp; Viswanath 2014.
/// </summary>
internal sealed class StaircaseLoss(StaircaseLaw law) : LawLoss
{
    private const double Negligible = 1e-18;

    public override string Source => "Geng & Viswanath 2014";

    internal override bool GrowsWithShift => false;

    internal override bool IsExactForOneCell => false;

    public override Bounds<Epsilon> Pure(double shift) => Exactly(Epsilon.Of(Crossed(shift) * law.Epsilon));

    public override Bounds<Rho> Concentrated(double shift)
    {
        var divergence = MassByCrossed(shift).Sum(pair => pair.Mass * pair.Crossed * law.Epsilon);
        return new(Rho.Of(Math.Max(0, divergence - 1e-12)), PureConversion.SmallestRho(Pure(shift).Upper));
    }

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift)
    {
        var shown = MassByCrossed(shift).Sum(pair => pair.Mass * Math.Max(0, 1 - Math.Exp(epsilon.Value - (pair.Crossed * law.Epsilon))));
        return new(Delta.AtMost(shown - 1e-14), ApproximateCurve.OfPure(Pure(shift).Upper).DeltaAt(epsilon));
    }

    public override string PureArithmetic(double shift) => $"⌈{Signs.Of(shift)} ÷ {Signs.Of(law.Sensitivity)}⌉ × {Signs.Of(law.Epsilon)}";

    public override string ConcentratedArithmetic(double shift)
    {
        var epsilon = Signs.Of(Pure(shift).Upper.Value);
        return $"{epsilon} × tanh({epsilon} ÷ 2)";
    }

    // However small, a shift can cross a step: every cell may be charged, each at most by the whole norm.
    internal override ShiftRun RunOfAbsoluteSum(double sum, long cells) => new(sum, cells);

    internal override ShiftRun RunOfDistance(double distance, long cells) => new(distance, cells);

    private double Crossed(double shift) => GridSteps.Up(shift, law.Sensitivity);

    // Stretches between the places where the law or its moved copy steps; how many more steps down the copy is there.
    private IEnumerable<(double Mass, double Crossed)> MassByCrossed(double shift)
    {
        var reach = Math.Ceiling(-Math.Log(Negligible) / law.Epsilon) + 2;
        var places = Enumerable.Range(0, (int)Math.Min(reach, 100_000)).Select(k => (k + law.Gamma) * law.Sensitivity).SelectMany(place => new[] { place, -place });
        var edges = places.SelectMany(place => new[] { place, place + shift }).Distinct().Order().ToList();
        return edges.Zip(edges.Skip(1)).Select(pair => Stretch(pair.First, pair.Second, shift));
    }

    private (double Mass, double Crossed) Stretch(double from, double to, double shift)
    {
        var middle = (from + to) / 2;
        return ((to - from) * law.Density(middle), Level(Math.Abs(middle - shift)) - Level(Math.Abs(middle)));
    }

    private double Level(double distance) => Math.Max(0, Math.Floor((distance / law.Sensitivity) - law.Gamma) + 1);
}
