using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>What the lattice laws share: shifts counted in steps of the grid, and the curve of a law whose log ratio falls along the grid.</summary>
internal abstract class LatticeLoss(LatticeLaw law) : LawLoss
{
    // Of the law's own probabilities, and of e^ε times ε: where a law ends, nothing is left for e^ε to multiply.
    private const double RelativeError = 1e-15;
    private const double AbsoluteError = 1e-18;

    // In squared steps: a norm that was rounded up in its fifth digit, 1.4143 for √2, is not taken up to the next one.
    private const double RoundedNorm = 1e-3;

    internal override double Grid => law.Grid;

    // Σ|k| ≤ Σk² for whole steps k, so as many single steps bound every way.
    internal override ShiftRun RunOfDistance(double distance, long cells) =>
        cells > 1 && SquaredSteps(distance) is var squares && squares <= cells ? new(law.Grid, (long)squares) : base.RunOfDistance(distance, cells);

    /// <summary>Steps of an upper bound.</summary>
    private protected double StepsUp(double shift) => GridSteps.Up(shift, law.Grid);

    /// <summary>Steps of a lower bound.</summary>
    private protected double StepsDown(double shift) => GridSteps.Down(shift, law.Grid);

    /// <summary>
    /// Single steps whose ρ bounds that of every way in which a distance can be spread, where ρ of k steps is at most k² that of one; one cell is
    /// moved by all of them. Null for more than can be counted.
    /// </summary>
    private protected ShiftRun? RunOfSquaredSteps(double distance, long cells) => cells == 1 ? new(StepsUp(distance) * law.Grid, 1)
        : SquaredSteps(distance) is < long.MaxValue / 2 and var squares ? new(law.Grid, (long)squares)
        : null;

    /// <summary>Σk² of whole steps: what a distance over several cells is taken up to. Never nothing.</summary>
    private double SquaredSteps(double distance) => Math.Max(1, Math.Ceiling((distance / law.Grid * (distance / law.Grid)) - RoundedNorm));

    private protected Bounds<T> InSteps<T>(double shift, Func<double, T> loss)
        where T : struct => new(loss(StepsDown(shift)), loss(StepsUp(shift)));

    /// <summary>
    /// δ(ε) = P(K ≤ k) − e^ε P(K ≤ k − s), k the last step at which the log ratio of the law to its copy moved by s steps is above ε.
    /// </summary>
    private protected Bounds<Delta> HalfLine(Epsilon epsilon, double shift, Func<double, double> lastAbove)
    {
        var (low, high) = (At(epsilon, StepsDown(shift), lastAbove), At(epsilon, StepsUp(shift), lastAbove));
        return new Bounds<Delta>(Delta.AtMost(low.Value - low.Error), Delta.AtMost(high.Value + high.Error));
    }

    private (double Value, double Error) At(Epsilon epsilon, double steps, Func<double, double> lastAbove)
    {
        var last = lastAbove(steps);
        if (steps == 0 || double.IsNegativeInfinity(last))
            return (0, 0);
        var here = law.AtMost(last * law.Grid);
        var there = Math.Min(here, Math.Exp(epsilon.Value + Math.Log(law.AtMost((last - steps) * law.Grid))));
        return (here - there, ((here + (there * (1 + epsilon.Value))) * RelativeError) + AbsoluteError);
    }
}
