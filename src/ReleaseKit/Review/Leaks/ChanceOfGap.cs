using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Review.Leaks;

/// <summary>An upper bound on the chance that independent errors add up, to either side, to a gap of a width or more.</summary>
internal static class ChanceOfGap
{
    // Convolution is right to 1e-14. It says more than the bound only where the bound is near what is looked for.
    private const double Exactness = 1e-14;
    private const double WorthTheExact = 1e-4;

    /// <param name="errors">Those of the total and of its parts; null where one is not known.</param>
    /// <param name="width">In the figure's unit, above 0.</param>
    public static double Of(IReadOnlyList<FigureError?> errors, double width)
    {
        if (errors.Count == 0 || errors.Any(error => error is null or { DependsOnPublished: true }))
            return 1;
        var spread = Math.Sqrt(errors.Sum(error => error!.Law.Variance));
        var left = width - errors.Sum(error => Rounded(error!));
        // Within one spread of noise no bound says anything.
        if (left <= spread)
            return 1;
        var bound = Chernoff([.. errors.GroupBy(error => error!).Select(same => (same.Key, same.Count()))], left, spread);
        return bound < WorthTheExact && GapLaw.Of(errors) is { } law
            ? Math.Min(bound, 2 * law.AtLeast(width) + GapLaw.Lost(law) + Exactness)
            : bound;
    }

    // How far the roundings after the noise can move a figure.
    private static double Rounded(FigureError error) =>
        error.Steps.OfType<AfterStep.RoundTo>().Sum(rounding => rounding.How is RoundingHow.Nearest ? rounding.Unit / 2 : rounding.Unit);

    /// <summary>P(|S| ≥ w) ≤ 2 e^(Σ ln M(λ) − λw) for every λ > 0 (Chernoff, textbook); what tabulated laws lack counts in full. The exponent is convex in λ: thirds find its least value, and any other is a bound too.</summary>
    private static double Chernoff(IReadOnlyList<(FigureError Error, int Count)> errors, double width, double spread)
    {
        double Exponent(double logRate) => errors.Sum(error => error.Count * LogMoment.Of(error.Error, Math.Exp(logRate))) - Math.Exp(logRate) * width;
        var (low, high) = (Math.Log(0.01 / spread), Math.Log(1e6 / spread));
        for (var round = 0; round < 50; round++)
        {
            var third = (high - low) / 3;
            (low, high) = Exponent(low + third) <= Exponent(high - third) ? (low, high - third) : (low + third, high);
        }

        var missing = errors.Sum(error => error.Count * Missing(error.Error.Law));
        return Math.Min(1, 2 * Math.Exp(Exponent(low)) + missing);
    }

    private static double Missing(NoiseLaw law) => law switch
    {
        TabulatedLaw table => (double)table.MissingMass,
        IntegerSum sum => sum.LostMass,
        _ => 0,
    };
}
