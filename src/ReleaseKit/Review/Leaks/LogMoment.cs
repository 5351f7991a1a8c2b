using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Review.Leaks;

/// <summary>An upper bound on ln E e^(±λN) for a noise law or an error, either sign: ∞ where the law has no such moment or none is known.</summary>
internal static class LogMoment
{
    // A longer table would have to be gone through too often.
    private const int LongestTable = 10_000;

    /// <summary>
    /// Of the noise after floors and ceilings. Where the value before noise respects them, what is left of the noise lies between 0 and all of
    /// it, so that e^(λE) ≤ max(1, e^(λN)), for symmetric noise in the mean at most M + ½(1 − e^(−λE|N|)) (Jensen). Roundings are not in it.
    /// </summary>
    public static double Of(FigureError error, double rate)
    {
        var noise = Of(error.Law, rate);
        if (!error.Steps.Any(step => step is AfterStep.NotBelow or AfterStep.NotAbove))
            return noise;
        return error.Law is TabulatedLaw ? double.PositiveInfinity
            : noise + Math.Log(1 + 0.5 * (1 - Math.Exp(-rate * error.Law.MeanAbsoluteDeviation)) * Math.Exp(-noise));
    }

    /// <summary>Closed forms (textbook). A discrete Gaussian is sub-Gaussian with its sigma (Canonne, Kamath &amp; Steinke 2020); what is cut off at a step has smaller moments than before, and at most those of noise that is always at its ends.</summary>
    private static double Of(NoiseLaw law, double rate) => law switch
    {
        GaussianLaw gaussian => rate * rate * gaussian.Sigma * gaussian.Sigma / 2,
        DiscreteGaussianLaw gaussian => rate * rate * gaussian.Sigma * gaussian.Sigma / 2,
        LaplaceLaw laplace => rate * laplace.Scale < 1 ? -Math.Log(1 - rate * laplace.Scale * rate * laplace.Scale) : double.PositiveInfinity,
        DiscreteLaplaceLaw laplace => Geometric(laplace.Grid / laplace.Scale, rate * laplace.Grid),
        TruncatedDiscreteLaplaceLaw cut => Math.Min(Geometric(cut.Grid / cut.Scale, rate * cut.Grid), LogCosh(rate * cut.Cutoff)),
        UniformLaw uniform => LogSinhc(rate * uniform.HalfWidth),
        DiscreteUniformLaw uniform => Math.Min(LogSinhc(rate * (uniform.HalfWidth + uniform.Grid / 2)), LogCosh(rate * uniform.HalfWidth)),
        StaircaseLaw staircase => OfStaircase(staircase, rate),
        TabulatedLaw { Rows.Count: <= LongestTable } table => Math.Max(OfTable(table, rate), OfTable(table, -rate)),
        IntegerSum sum => sum.Parts.Sum(part => part.Count * Of(part.Law, rate)),
        _ => double.PositiveInfinity,
    };

    // (1 − q)² ÷ ((1 − q e^t)(1 − q e^−t)) with q = e^−fall, written so that no digits cancel.
    private static double Geometric(double fall, double step) =>
        step < fall ? -Math.Log(1 - Math.Pow(Math.Sinh(step / 2) / Math.Sinh(fall / 2), 2)) : double.PositiveInfinity;

    private static double LogCosh(double x) => x + Math.Log((1 + Math.Exp(-2 * x)) / 2);

    // ln(sinh x ÷ x); noise that is even on steps is even noise between them less an independent one of a step's width, of smaller moments.
    private static double LogSinhc(double x) => x < 1e-3 ? x * x / 6 : x + Math.Log((1 - Math.Exp(-2 * x)) / (2 * x));

    private static double OfStaircase(StaircaseLaw law, double rate)
    {
        if (rate * law.Sensitivity >= law.Epsilon)
            return double.PositiveInfinity;
        var (high, fall) = (law.Gamma * law.Sensitivity, Math.Exp(-law.Epsilon));
        var top = (1 - fall) / (2 * (high + fall * (law.Sensitivity - high)));
        double Side(double turn) => (Math.Exp(turn * high) - 1 + fall * (Math.Exp(turn * law.Sensitivity) - Math.Exp(turn * high))) / (turn * (1 - Math.Exp(turn * law.Sensitivity - law.Epsilon)));
        return Math.Log(top * (Side(rate) + Side(-rate)));
    }

    private static double OfTable(TabulatedLaw table, double rate)
    {
        var largest = table.Rows.Max(row => row.Step * rate * table.Grid);
        return largest + Math.Log(table.Rows.Sum(row => (double)row.Probability * Math.Exp(row.Step * rate * table.Grid - largest)));
    }
}
