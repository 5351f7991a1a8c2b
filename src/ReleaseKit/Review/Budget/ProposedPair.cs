using System.Globalization;
using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>The (epsilon, delta) that a mechanism without a pure loss is proposed: one that it meets, and that leaves the others their share of what is authorised.</summary>
internal sealed class ProposedPair(IReadOnlyList<MechanismSpending> spendings, NoiseAccount account)
{
    private const double IfNoneIsAuthorised = 1e-9;
    private static readonly Epsilon Farthest = Epsilon.Of(1e5);

    /// <summary>Whether no pair of its curve has a delta as small as the authorised one, so that none is worth pasting.</summary>
    public bool IsBeyondAuthorised(MechanismSpending spending) => FloorOf(spending) is var floor && (floor >= 1 || floor > (account.Authorised.Delta ?? 0));

    /// <summary>What to do instead.</summary>
    public string AnotherLaw(MechanismSpending spending)
    {
        var wider = spending.Mechanism.Law == LawName.TruncatedDiscreteLaplace ? ", or give this one a larger \"cutoff\"" : "";
        var authorised = account.Authorised.Delta is > 0 and var delta ? $"{BudgetText.Plain(delta)} is authorised" : "no delta is authorised";
        return $"noise its figures with a law that has no end, such as discrete-laplace{wider}: the delta of this one is at least {BudgetText.Paste(FloorOf(spending))} at every epsilon, and {authorised}";
    }

    /// <summary>"spent": { … }, to paste: at its floor where δ never falls to 0, else at its share of the authorised δ.</summary>
    public string For(MechanismSpending spending)
    {
        var delta = FloorOf(spending) is > 0 and var floor ? Math.Min(JustAbove(floor), account.Authorised.Delta ?? 1) : Share();
        var epsilon = spending.Loss!.EpsilonAt(Delta.AtMost(delta)).Upper.Value;
        return $"\"spent\": {{ \"epsilon\": {BudgetText.Paste(epsilon)}, \"delta\": {BudgetText.Plain(delta)} }}";
    }

    /// <summary>What δ does not fall below at any ε; 0 where it falls to 0.</summary>
    private static double FloorOf(MechanismSpending spending) => spending.Loss!.DeltaAt(Farthest).Upper.Value;

    // What the pairs that are declared leave of the authorised δ, in equal parts; in equal parts of all of it where they leave nothing.
    private double Share()
    {
        var authorised = account.Authorised.Delta is > 0 and var delta ? delta : IfNoneIsAuthorised;
        var needing = spendings.Where(spending => spending.Loss is { Pure.Upper.IsFinite: false }).ToList();
        var open = needing.Where(spending => spending.Mechanism.Spent is not { Delta: > 0 }).ToList();
        var taken = spendings.Sum(spending => spending.Mechanism.Spent?.Delta ?? 0) + open.Sum(FloorOf);
        var rest = authorised - taken;
        var count = Math.Max(1, rest > 0 ? open.Count(spending => FloorOf(spending) == 0) : needing.Count);
        return TwoDigitsDown((rest > 0 ? rest : authorised) / count);
    }

    private static double JustAbove(double floor) => double.Parse(BudgetText.Paste(floor * (1 + 1e-6)), CultureInfo.InvariantCulture);

    /// <summary>Rounded down, so that the parts do not add up to more than there is.</summary>
    private static double TwoDigitsDown(double share)
    {
        var unit = Math.Pow(10, Math.Floor(Math.Log10(share)) - 1);
        return double.Parse((Math.Floor(share / unit * (1 + 1e-12)) * unit).ToString("G2", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
    }
}
