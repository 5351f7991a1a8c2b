using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Losses;

/// <summary>What the lattice laws share: shifts counted in steps of the grid, and the curve of a law whose log ratio falls along the grid.</summary>
internal abstract class LatticeLoss(LatticeLaw law) : LawLoss
{
    // Of the law's own probabilities and of e^ε.
    private const double RelativeError = 1e-15;
    private const double AbsoluteError = 1e-18;

    internal override double Grid => law.Grid;

    /// <summary>Steps of an upper bound.</summary>
    private protected double StepsUp(double shift) => GridSteps.Up(shift, law.Grid);

    /// <summary>Steps of a lower bound.</summary>
    private protected double StepsDown(double shift) => GridSteps.Down(shift, law.Grid);

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
        return (here - there, ((here + there) * RelativeError * (1 + epsilon.Value)) + AbsoluteError);
    }
}
