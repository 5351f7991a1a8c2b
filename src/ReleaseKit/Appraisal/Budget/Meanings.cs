using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Meaning;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>What guarantees mean for one unit: of several that hold, the one that says most.</summary>
internal static class Meanings
{
    // A limit that leaves out more than half of all outcomes is none; one that leaves out more than 1 in 100 is worth less than one that holds for all.
    private const double Largest = 0.5;
    private const double LargestBesidePure = 0.01;

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

    /// <summary>
    /// The smallest ε′, and its β; a guarantee without δ has none. Where δ is so large that β leaves out what matters, only a guarantee without δ
    /// says anything; infinite, and without β, where there is none.
    /// </summary>
    public static (OddsLimit Limit, double? Beta) Limit(IReadOnlyList<PrivacyCurve> curves, Delta delta)
    {
        var beta = OddsBound.UsualBeta(delta);
        var pure = curves.OfType<ApproximateCurve>().Where(IsPure).Select(curve => (new OddsLimit(curve.Loss.Epsilon, curve.Loss.Epsilon, Delta.Zero), (double?)null)).ToList();
        var others = beta.Value <= (pure.Count > 0 ? LargestBesidePure : Largest) ? curves.Where(curve => !IsPure(curve)) : [];
        // Of two that are as small, the one that holds for all outcomes.
        return pure.Concat(others.Select(curve => (OddsBound.Of(curve, beta), (double?)beta.Value)).Where(pair => pair.Item1.EpsilonPrime.IsFinite))
            .DefaultIfEmpty((new OddsLimit(Epsilon.Infinite, Epsilon.Infinite, Delta.One), null)).MinBy(pair => pair.Item1.EpsilonPrime);
    }

    private static bool IsPure(PrivacyCurve curve) => curve is ApproximateCurve { Loss: { Delta: { Value: 0 }, Epsilon: { IsFinite: true } } };

    private static double Success(IReadOnlyList<PrivacyCurve> curves, double falseAlarms) =>
        curves.Select(curve => TestBound.LargestSuccess(curve, falseAlarms)).DefaultIfEmpty(1).Min();
}
