using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>Pure accounting: ε adds.</summary>
public sealed class PureAccountant : Accountant
{
    public override LossCurrency Currency => LossCurrency.Epsilon;

    public override AccountRule SumRule => AccountRules.PureSum;

    public override LossTotal Upper(MechanismSpending spending) => spending.Loss is { } loss
        ? Of(loss.Pure.Upper, AccountRules.Law(loss.PureTerms[0].Loss.Source))
        : AsStated(spending.Mechanism);

    public override LossTotal Lower(MechanismSpending spending) =>
        Of(spending.Loss?.Pure.Lower ?? Epsilon.Zero, AccountRules.Pair);

    public override LossTotal? Declared(Mechanism mechanism) =>
        mechanism.Spent is { Epsilon: { } epsilon, Delta: null or 0 } ? new LossTotal(epsilon, null, null, AccountRules.Declared) : null;

    public override LossTotal Sum(IReadOnlyList<LossTotal> losses) =>
        Of(BasicComposition.Sum(losses.Select(loss => Epsilon.Of(loss.Epsilon ?? double.PositiveInfinity))), SumRule);

    public override PrivacyCurve? CurveOf(LossTotal total) =>
        total.Epsilon is { } epsilon && double.IsFinite(epsilon) ? ApproximateCurve.OfPure(Epsilon.Of(epsilon)) : null;

    public override double? AuthorisedIn(Authorised authorised) => authorised.Epsilon;

    public override IEnumerable<AccountStep> StepsOf(MechanismSpending spending) => LossSteps.Of(spending, Upper(spending), this);

    private LossTotal AsStated(Mechanism mechanism) =>
        mechanism.Law == LawName.Declared && Declared(mechanism) is { } declared ? declared : Of(Epsilon.Infinite, AccountRules.Declared);

    private static LossTotal Of(Epsilon epsilon, AccountRule rule) => new(epsilon.Value, null, null, rule);
}
