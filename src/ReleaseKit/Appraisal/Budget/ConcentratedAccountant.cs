using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>Concentrated accounting: ρ adds. A declared pure ε enters as ε·tanh(ε/2).</summary>
public sealed class ConcentratedAccountant : Accountant
{
    public override LossCurrency Currency => LossCurrency.Rho;

    public override AccountRule SumRule => AccountRules.ConcentratedSum;

    public override LossTotal Upper(MechanismSpending spending) => spending.Loss is { } loss
        ? Of(loss.Concentrated.Upper, AccountRules.Law(loss.ConcentratedTerms[0].Loss.Source))
        : AsStated(spending.Mechanism);

    public override LossTotal Lower(MechanismSpending spending) =>
        Of(spending.Loss?.Concentrated.Lower ?? Rho.Zero, AccountRules.Pair);

    public override LossTotal? Declared(Mechanism mechanism) => mechanism.Spent switch
    {
        { Rho: { } rho } => new LossTotal(null, null, rho, AccountRules.Declared),
        { Epsilon: >= 0 and var epsilon, Delta: null or 0 } =>
            new LossTotal(epsilon, null, PureConversion.SmallestRho(Epsilon.Of(epsilon)).Value, AccountRules.PureAsConcentrated),
        _ => null,
    };

    public override LossTotal Sum(IReadOnlyList<LossTotal> losses) =>
        Of(BasicComposition.Sum(losses.Select(loss => Rho.Of(loss.Rho ?? double.PositiveInfinity))), SumRule);

    public override PrivacyCurve? CurveOf(LossTotal total) =>
        total.Rho is { } rho && double.IsFinite(rho) ? new ConcentratedCurve(Rho.Of(rho)) : null;

    public override double? AuthorisedIn(Authorised authorised) => authorised switch
    {
        { Rho: { } rho } => rho,
        { Epsilon: >= 0 and var epsilon, Delta: > 0 and var delta } => ConcentratedConversion.LargestRho(Epsilon.Of(epsilon), DeltaOf(delta)).Value,
        _ => null,
    };

    public override IEnumerable<AccountStep> StepsOf(MechanismSpending spending) => LossSteps.Of(spending, Upper(spending), this);

    private LossTotal AsStated(Mechanism mechanism) =>
        mechanism.Law == LawName.Declared && Declared(mechanism) is { } declared ? declared : Of(Rho.Infinite, AccountRules.Declared);

    private static LossTotal Of(Rho rho, AccountRule rule) => new(null, null, rho.Value, rule);
}
