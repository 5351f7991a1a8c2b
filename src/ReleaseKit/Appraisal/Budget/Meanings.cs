using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Meaning;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>What guarantees mean for one unit: of several that hold, the one that says most.</summary>
internal static class Meanings
{
    private static readonly double[] Priors = [0.001, 0.01, 0.1, 0.5];
    private static readonly double[] FalseAlarms = [0.01, 0.05, 0.1];

    public static MeaningForOne Of(IReadOnlyList<PrivacyCurve> curves, Delta delta)
    {
        var (limit, beta) = Limit(curves, delta);
        return new MeaningForOne
        {
            EpsilonPrime = limit.EpsilonPrime.Value,
            Beta = beta,
            Odds = Math.Exp(limit.EpsilonPrime.Value),
            Beliefs = [.. Priors.Select(prior => new Belief(prior, BeliefBound.Highest(prior, limit.EpsilonPrime), BeliefBound.Lowest(prior, limit.EpsilonPrime)))],
            Tests = [.. FalseAlarms.Select(alarms => new MembershipTest(alarms, Success(curves, alarms)))],
        };
    }

    /// <summary>The smallest ε′, and its β; a guarantee without δ has none.</summary>
    public static (OddsLimit Limit, double? Beta) Limit(IReadOnlyList<PrivacyCurve> curves, Delta delta)
    {
        var beta = OddsBound.UsualBeta(delta);
        var limits = curves.Select(curve => curve is ApproximateCurve { Loss.Delta: { Value: 0 } } pure
            ? (new OddsLimit(pure.Loss.Epsilon, pure.Loss.Epsilon, Delta.Zero), (double?)null)
            : (OddsBound.Of(curve, beta), beta.Value));
        return limits.DefaultIfEmpty((new OddsLimit(Epsilon.Infinite, Epsilon.Infinite, Delta.One), beta.Value)).MinBy(pair => pair.Item1.EpsilonPrime);
    }

    private static double Success(IReadOnlyList<PrivacyCurve> curves, double falseAlarms) =>
        curves.Select(curve => TestBound.LargestSuccess(curve, falseAlarms)).DefaultIfEmpty(1).Min();
}
