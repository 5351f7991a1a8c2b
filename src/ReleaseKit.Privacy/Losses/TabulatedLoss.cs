using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>
/// A tabulated law, one cell moved by d: the largest log ratio in both directions over all shifts on the grid from −d to d. Where the law has
/// mass and its moved copy has none, as at the ends of every table, the ratio is infinite. ρ from the pure loss; δ(ε) is the largest over
/// the shifts, and what the table lacks counts in full. Derived.
/// </summary>
internal sealed class TabulatedLoss(TabulatedLaw law) : LatticeLoss(law)
{
    public override string Source => "derived";

    private double Missing => (double)law.MissingMass;

    internal override bool GrowsWithShift => false;

    internal override bool IsExactForOneCell => Missing == 0;

    public override Bounds<Epsilon> Pure(double shift)
    {
        var ratio = Shifts(StepsDown(shift)).SelectMany(LogRatios).Where(IsKnown).DefaultIfEmpty(0).Max();
        return new(Epsilon.Of(ratio), StepsUp(shift) == 0 ? Epsilon.Zero : Epsilon.Infinite);
    }

    public override Bounds<Rho> Concentrated(double shift)
    {
        var upper = StepsUp(shift) == 0 ? Rho.Zero : Rho.Infinite;
        return new(Missing == 0 && StepsDown(shift) > 0 ? upper : Rho.Zero, upper);
    }

    public override Bounds<Delta> DeltaAt(Epsilon epsilon, double shift)
    {
        double Largest(double steps) => Shifts(steps).Select(step => Shown(epsilon, step)).DefaultIfEmpty(0).Max();
        return new(Delta.AtMost(Largest(StepsDown(shift)) - Missing - 1e-15), Delta.AtMost(Largest(StepsUp(shift)) + Missing + 1e-15));
    }

    public override string PureArithmetic(double shift) => "∞";

    public override string ConcentratedArithmetic(double shift) => "∞";

    internal override ShiftRun RunOfAbsoluteSum(double sum, long cells) => new(sum, Math.Min(cells, (long)StepsUp(sum)));

    internal override ShiftRun RunOfDistance(double distance, long cells) =>
        new(distance, Math.Min(cells, (long)GridSteps.Up(distance * distance, law.Grid * law.Grid)));

    internal override Delta NormDeltaAt(Epsilon epsilon, LossTerm term) => JointDeltaAt(epsilon, [term]);

    // A shift beyond the length of the table leaves nothing in common, as that length plus one does.
    private IEnumerable<long> Shifts(double steps)
    {
        var most = (long)Math.Min(steps, law.Rows[^1].Step - law.Rows[0].Step + 1);
        return Enumerable.Range(1, (int)Math.Min(most, int.MaxValue / 2)).SelectMany(step => new long[] { step, -step });
    }

    private IEnumerable<double> LogRatios(long steps) => law.Rows
        .Where(row => row.Probability > 0)
        .Select(row => Math.Log((double)row.Probability / law.Probability(row.Step - steps)));

    // With mass missing from the table, a step that is not listed may still be possible.
    private bool IsKnown(double logRatio) => Missing == 0 || !double.IsInfinity(logRatio);

    private double Shown(Epsilon epsilon, long steps) =>
        law.Rows.Sum(row => Math.Max(0, (double)row.Probability - Copy(epsilon, law.Probability(row.Step - steps))));

    private static double Copy(Epsilon epsilon, double probability) => probability == 0 ? 0 : Math.Exp(epsilon.Value) * probability;
}
