using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>
/// Approximate accounting by basic composition: ε and δ add. A law without pure ε is taken at the δ that the office declares for it, with
/// the smallest ε that its curve gives there.
/// </summary>
public sealed class ApproximateAccountant : Accountant
{
    public override LossCurrency Currency => LossCurrency.Epsilon;

    public override AccountRule SumRule => AccountRules.BasicSum;

    public override LossTotal Upper(MechanismSpending spending)
    {
        if (spending.Loss is not { } loss)
            return AsStated(spending.Mechanism);
        var delta = DeclaredDelta.Taken(loss, DeltaOf(spending.Mechanism.Spent?.Delta));
        var rule = delta == Delta.Zero ? AccountRules.Law(loss.PureTerms[0].Loss.Source) : AccountRules.CurveOf(loss);
        return Of(DeclaredDelta.EpsilonAt(loss, delta.Value).Upper, delta, rule);
    }

    // At that ε the curve may lie below the declared δ: then no more than the curve is shown.
    public override LossTotal Lower(MechanismSpending spending)
    {
        if (spending.Loss is not { } loss)
            return Of(Epsilon.Zero, Delta.Zero, AccountRules.Pair);
        var delta = DeclaredDelta.Taken(loss, DeltaOf(spending.Mechanism.Spent?.Delta));
        var epsilon = DeclaredDelta.EpsilonAt(loss, delta.Value).Lower;
        return Of(epsilon, epsilon.IsFinite ? DeclaredDelta.Shown(loss, epsilon, delta) : delta, AccountRules.Pair);
    }

    public override LossTotal? Declared(Mechanism mechanism) =>
        mechanism.Spent is { Epsilon: { } epsilon } spent ? new LossTotal(epsilon, spent.Delta ?? 0, null, AccountRules.Declared) : null;

    public override LossTotal Sum(IReadOnlyList<LossTotal> losses)
    {
        var sum = BasicComposition.Sum(losses.Select(loss => new ApproximateLoss(Epsilon.Of(loss.Epsilon ?? double.PositiveInfinity), DeltaOf(loss.Delta))));
        return Of(sum.Epsilon, sum.Delta, SumRule);
    }

    public override PrivacyCurve? CurveOf(LossTotal total) => total.Epsilon is { } epsilon && double.IsFinite(epsilon)
        ? new ApproximateCurve(new ApproximateLoss(Epsilon.Of(epsilon), DeltaOf(total.Delta)))
        : null;

    public override double? AuthorisedIn(Authorised authorised) => authorised.Epsilon;

    public override IEnumerable<AccountStep> StepsOf(MechanismSpending spending) => LossSteps.Of(spending, Upper(spending), this);

    private LossTotal AsStated(Mechanism mechanism) => mechanism.Law == LawName.Declared && Declared(mechanism) is { } declared
        ? declared
        : Of(Epsilon.Infinite, Delta.Zero, AccountRules.Declared);

    private static LossTotal Of(Epsilon epsilon, Delta delta, AccountRule rule) => new(epsilon.Value, delta.Value, null, rule);
}
