using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Privacy.Meaning;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>The steps of the whole account: the sum, its conversions, what is authorised in the currency, and the odds.</summary>
internal static class TotalSteps
{
    public static AccountStep Sum(Accountant accountant, IReadOnlyList<LossTotal> losses, LossTotal total)
    {
        var sign = accountant.Currency == LossCurrency.Rho ? "ρ" : "ε";
        var parts = Signs.Plus(losses.Select(loss => Signs.Of(accountant.AmountOf(loss))));
        var delta = total.Delta > 0 ? $"; δ = {Signs.Plus(losses.Select(loss => Signs.Of(loss.Delta ?? 0)))} = {Signs.Of(total.Delta.Value)}" : "";
        var amount = accountant.AmountOf(total);
        var sum = losses.Count == 0 ? "" : $"{parts} = ";
        return new AccountStep(AccountSteps.Sum, $"{sign} = {sum}{Signs.Of(amount)}{delta}", amount, total.Rule);
    }

    /// <summary>ρ to ε at δ by both rules, the tighter first.</summary>
    public static IEnumerable<AccountStep> Conversions(Rho rho, Delta delta)
    {
        if (rho is not { IsFinite: true, Value: > 0 } || delta == Delta.Zero)
            yield break;
        var (tight, simple) = (ConcentratedConversion.EpsilonAt(rho, delta), ConcentratedConversion.SimpleEpsilonAt(rho, delta));
        yield return new AccountStep(AccountSteps.TightConversion, Tight(rho, delta, tight), tight.Value, AccountRules.TightConversion);
        yield return new AccountStep(
            AccountSteps.SimpleConversion,
            $"ε = {Signs.Of(rho.Value)} + 2 × √({Signs.Of(rho.Value)} × ln(1 ÷ {Signs.Of(delta.Value)})) = {Signs.Of(simple.Value)}",
            simple.Value,
            AccountRules.SimpleConversion);
    }

    public static IEnumerable<AccountStep> Authorised(Releases.Authorised authorised, double? inCurrency)
    {
        if (authorised is not { Epsilon: { } epsilon, Delta: { } delta, Rho: null } || inCurrency is not { } rho || !double.IsFinite(rho) || rho <= 0)
            return [];
        var arithmetic = $"ρ = {Signs.Of(rho)}: {Tight(Rho.Of(rho), Delta.AtMost(delta), Epsilon.Of(epsilon))}";
        return [new AccountStep(AccountSteps.AuthorisedInCurrency, arithmetic, rho, AccountRules.TightConversion)];
    }

    public static AccountStep Odds(OddsLimit limit, double? beta, PrivacyCurve? curve)
    {
        var odds = Math.Exp(limit.EpsilonPrime.Value);
        var prime = Signs.Of(limit.EpsilonPrime.Value);
        var arithmetic = beta is { } share && limit.EpsilonPrime.IsFinite
            ? $"ε₀ = {Signs.Of(limit.At.Value)}, δ(ε₀) = {DeltaThere(limit, curve)}{Signs.Of(limit.DeltaThere.Value)}, β = {Signs.Of(share)}: ε′ = ε₀ − ln(1 − δ(ε₀) ÷ β) = {prime}; e^{prime} = {Signs.Of(odds)}"
            : limit.EpsilonPrime.IsFinite ? $"ε′ = {prime}; e^{prime} = {Signs.Of(odds)}" : $"ε′ = {prime}";
        return new AccountStep(AccountSteps.Odds, arithmetic, odds, AccountRules.Odds);
    }

    /// <summary>How δ(ε₀) follows from the curve the limit was found on: "… = "; empty where it is that of a law itself.</summary>
    private static string DeltaThere(OddsLimit limit, PrivacyCurve? curve)
    {
        var at = Signs.Of(limit.At.Value);
        if (curve is ConcentratedCurve { Rho: { IsFinite: true, Value: > 0 } rho } && limit.At.IsFinite)
        {
            var order = Signs.Of(ConcentratedConversion.OrderAt(rho, limit.At));
            return $"e^(({order} − 1) × ({order} × {Signs.Of(rho.Value)} − {at})) ÷ ({order} − 1) × (1 − 1 ÷ {order})^{order} = ";
        }

        if (curve is not ApproximateCurve { Loss: var loss } || limit.At >= loss.Epsilon)
            return "";
        var (epsilon, delta) = (Signs.Of(loss.Epsilon.Value), Signs.Of(loss.Delta.Value));
        return $"{delta} + (1 − {delta}) × (e^{epsilon} − e^{at}) ÷ (e^{epsilon} + 1) = ";
    }

    private static string Tight(Rho rho, Delta delta, Epsilon epsilon)
    {
        var (order, sign) = (Signs.Of(ConcentratedConversion.OrderAt(rho, epsilon)), Signs.Of(rho.Value));
        return $"α = {order}: ε = {order} × {sign} + (ln(1 ÷ {Signs.Of(delta.Value)}) − ln({order} − 1) + {order} × ln(1 − 1 ÷ {order})) ÷ ({order} − 1) = {Signs.Of(epsilon.Value)}";
    }
}
