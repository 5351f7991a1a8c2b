using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>Every guarantee of the whole release that can be shown here, whatever accounting is declared: each holds, so the smallest may be used.</summary>
public sealed class ProvenBounds
{
    // Totals are compared as the design's losses are.
    private const double Tolerance = 1e-9;
    private const double AsGood = 1e-6;

    private readonly IReadOnlyList<(PrivacyCurve Curve, AccountRule Rule)> curves;
    private readonly double rho;

    private ProvenBounds(IReadOnlyList<(PrivacyCurve, AccountRule)> curves, double rho) => (this.curves, this.rho) = (curves, rho);

    public IEnumerable<PrivacyCurve> Curves => curves.Select(pair => pair.Curve);

    public static ProvenBounds Of(IReadOnlyList<MechanismSpending> spendings)
    {
        var curves = new List<(PrivacyCurve, AccountRule)>();
        foreach (var accountant in new Accountant[] { new PureAccountant(), new ConcentratedAccountant(), new ApproximateAccountant() })
        {
            if (accountant.CurveOf(Total(accountant, spendings)) is { } curve)
                curves.Add((curve, accountant is ConcentratedAccountant ? AccountRules.TightConversion : accountant.SumRule));
        }

        if (spendings is [{ Loss: { } only }])
            curves.Add((new MechanismCurve(only), AccountRules.CurveOf(only)));
        return new ProvenBounds(curves, Total(new ConcentratedAccountant(), spendings).Rho!.Value);
    }

    public static LossTotal Total(Accountant accountant, IReadOnlyList<MechanismSpending> spendings) => accountant.Sum([.. spendings.Select(accountant.Upper)]);

    /// <summary>
    /// The smallest ε at a δ, with its rule; infinite if nothing bounds it. A guarantee that holds at a smaller δ is given with that one,
    /// and preferred where it is as good to six digits.
    /// </summary>
    public LossTotal SmallestAt(Delta delta)
    {
        var at = curves.Select(pair => LossAt(pair.Curve, pair.Rule, delta)).OrderBy(loss => loss.Delta).ToList();
        return at.FirstOrDefault(loss => loss.Epsilon <= at.Min(other => other.Epsilon) * (1 + AsGood))
            ?? new LossTotal(double.PositiveInfinity, delta.Value, null, AccountRules.Declared);
    }

    /// <summary>Whether some bound meets what was authorised.</summary>
    public bool Meets(Authorised authorised) => authorised switch
    {
        { Rho: { } allowed } => rho <= allowed * (1 + Tolerance),
        { Epsilon: { } epsilon } => Curves.Any(curve => curve.EpsilonAt(Delta.AtMost((authorised.Delta ?? 0) * (1 + Tolerance))).Value <= epsilon * (1 + Tolerance)),
        _ => false,
    };

    private static LossTotal LossAt(PrivacyCurve curve, AccountRule rule, Delta delta) =>
        curve is ApproximateCurve { Loss: var loss } && loss.Delta <= delta
            ? new LossTotal(loss.Epsilon.Value, loss.Delta.Value, null, rule)
            : new LossTotal(curve.EpsilonAt(delta).Value, delta.Value, null, rule);
}
