using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>How losses are counted and added in one kind of accounting. Where it bounds nothing, numbers are infinite.</summary>
public abstract class Accountant
{
    private protected Accountant()
    {
    }

    public abstract LossCurrency Currency { get; }

    public abstract AccountRule SumRule { get; }

    public static Accountant Of(Accounting accounting) => accounting switch
    {
        Accounting.Pure => new PureAccountant(),
        Accounting.Approximate => new ApproximateAccountant(),
        _ => new ConcentratedAccountant(),
    };

    /// <summary>The upper bound that enters the totals.</summary>
    public abstract LossTotal Upper(MechanismSpending spending);

    /// <summary>The lower bound from a named pair of neighbours; 0 for what is only stated.</summary>
    public abstract LossTotal Lower(MechanismSpending spending);

    /// <summary>What the office declares, in this accounting; null where it declares nothing that can be expressed in it.</summary>
    public abstract LossTotal? Declared(Mechanism mechanism);

    public abstract LossTotal Sum(IReadOnlyList<LossTotal> losses);

    /// <summary>The guarantee that a total gives; null where it gives none.</summary>
    public abstract PrivacyCurve? CurveOf(LossTotal total);

    /// <summary>What is authorised in the currency; null if it cannot be expressed in it.</summary>
    public abstract double? AuthorisedIn(Authorised authorised);

    /// <summary>How the upper bound was reached.</summary>
    public abstract IEnumerable<AccountStep> StepsOf(MechanismSpending spending);

    public double AmountOf(LossTotal total) => (Currency == LossCurrency.Rho ? total.Rho : total.Epsilon) ?? double.PositiveInfinity;

    private protected static Delta DeltaOf(double? delta) => Delta.AtMost(delta ?? 0);
}
