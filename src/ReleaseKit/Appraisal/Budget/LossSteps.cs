using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Losses;

namespace ReleaseKit.Appraisal.Budget;

/// <summary>How the loss of one mechanism was reached: what one unit moves, then what the law spends on that.</summary>
internal static class LossSteps
{
    private const double Close = 1e-9;

    public static IEnumerable<AccountStep> Of(MechanismSpending spending, LossTotal upper, Accountant accountant)
    {
        var amount = accountant.AmountOf(upper);
        var sign = accountant.Currency == LossCurrency.Rho ? "ρ" : "ε";
        if (spending.Loss is not { } loss)
            return [Named(spending, new AccountStep(double.IsInfinity(amount) ? AccountSteps.Unbounded : AccountSteps.Stated, $"{sign} = {Signs.Of(amount)}", amount, upper.Rule))];
        var terms = accountant.Currency == LossCurrency.Rho ? loss.ConcentratedTerms : loss.PureTerms;
        return new[] { Moved(spending, loss, terms), Lost(spending, amount, upper, terms, accountant) }.Select(step => Named(spending, step));
    }

    private static AccountStep Moved(MechanismSpending spending, MechanismLoss loss, IReadOnlyList<LossTerm> terms) => spending.Mechanism.Sensitivity switch
    {
        { CellsPerUnit: >= 1, PerCell: > 0 } => Cells(spending, loss, terms),
        { L1: { } sum } => new AccountStep(AccountSteps.AbsoluteSum, $"Δ₁ = {Taken(sum, terms.Sum(term => term.Cells * InSteps(term)), terms)}", sum, AccountRules.Declared),
        { L2: var distance } => new AccountStep(
            AccountSteps.Distance, $"Δ₂ = {Taken(distance ?? 0, Math.Sqrt(terms.Sum(term => term.Cells * InSteps(term) * InSteps(term))), terms)}", distance ?? 0, AccountRules.Declared),
    };

    /// <summary>"0.99 ≤ 1" where noise on a grid moves by whole steps alone; "0.99" elsewhere.</summary>
    private static string Taken(double declared, double inSteps, IReadOnlyList<LossTerm> terms) =>
        terms.All(term => term.Loss is { Grid: > 0, GrowsWithShift: true }) && inSteps > declared * (1 + Close) ? $"{Signs.Of(declared)} ≤ {Signs.Of(inSteps)}" : Signs.Of(declared);

    private static double InSteps(LossTerm term) => term.Loss.Grid is > 0 and var grid ? GridSteps.Up(term.Shift, grid) * grid : term.Shift;

    private static AccountStep Cells(MechanismSpending spending, MechanismLoss loss, IReadOnlyList<LossTerm> terms)
    {
        var moved = terms.Sum(term => term.Cells);
        var key = loss.Relation == NeighbourRelation.Replace ? AccountSteps.MovedByReplacing : AccountSteps.MovedByAdding;
        var (declared, most) = (spending.Mechanism.Sensitivity, spending.Mechanism.Sensitivity.PerCell ?? 0);
        var (count, rule) = MovedCells.Of(declared, loss.Relation, spending.Cells.Count, moved);
        var largest = Taken(loss.LargestShift, terms.Max(InSteps), terms);
        if (largest == Signs.Of(most))
            return new AccountStep(key, count, moved, rule);
        // From the lowest signed contribution to the highest.
        var isTwice = loss.Relation == NeighbourRelation.Replace && loss.LargestShift == 2 * most;
        return new AccountStep(key, $"{count}, by {(isTwice ? $"2 × {Signs.Of(most)} = " : "")}{largest}", moved, isTwice ? AccountRules.BothRecords : rule);
    }

    private static AccountStep Lost(MechanismSpending spending, double amount, LossTotal upper, IReadOnlyList<LossTerm> terms, Accountant accountant)
    {
        var sign = accountant.Currency == LossCurrency.Rho ? "ρ" : "ε";
        if (double.IsInfinity(amount))
            return new AccountStep(AccountSteps.Unbounded, $"{sign} = ∞", amount, upper.Rule);
        if (upper.Rule == AccountRules.ExactCurve || upper.Rule == AccountRules.CurveBound)
            return new AccountStep(AccountSteps.Curve, $"δ({Signs.Of(amount)}) {OnCurve(spending, amount, upper)}", amount, upper.Rule);
        var parts = terms.Select(term => Part(term, accountant.Currency));
        var key = spending.Mechanism.Parameters.Values.Any(parameter => parameter.Column is not null) ? AccountSteps.LossByRow : AccountSteps.Loss;
        return new AccountStep(key, $"{Divisions(terms, accountant.Currency)}{sign} = {Signs.Plus(parts)} = {Signs.Of(amount)}", amount, upper.Rule);
    }

    /// <summary>"= 0.047619047619 ≤ 0.0477": what an exact curve gives there, where it lies below the δ that the office declares.</summary>
    private static string OnCurve(MechanismSpending spending, double epsilon, LossTotal upper)
    {
        var declared = Signs.Of(upper.Delta ?? 0);
        if (upper.Rule != AccountRules.ExactCurve || spending.Loss is not { } loss)
            return $"≤ {declared}";
        var exact = loss.DeltaAt(Epsilon.Of(epsilon)).Upper.Value;
        return exact < upper.Delta * (1 - Close) ? $"= {Signs.Of(exact)} ≤ {declared}" : $"= {declared}";
    }

    /// <summary>"ε = 1 ÷ 0.7 = 1.42857142857; " before a calculation in ρ that goes on from the pure loss of a cell.</summary>
    private static string Divisions(IReadOnlyList<LossTerm> terms, LossCurrency currency) => currency == LossCurrency.Epsilon ? "" : string.Concat(
        terms.Select(term => (Calculation: term.Loss.PureArithmetic(term.Shift), Loss: term.Loss.Pure(term.Shift).Upper)).Distinct()
            .Where(pure => pure.Loss.IsFinite && pure.Calculation != Signs.Of(pure.Loss.Value))
            .Select(pure => $"ε = {pure.Calculation} = {Signs.Of(pure.Loss.Value)}; "));

    private static string Part(LossTerm term, LossCurrency currency)
    {
        var one = currency == LossCurrency.Rho ? term.Loss.ConcentratedArithmetic(term.Shift) : term.Loss.PureArithmetic(term.Shift);
        return term.Cells == 1 ? one : $"{term.Cells} × {one}";
    }

    private static AccountStep Named(MechanismSpending spending, AccountStep step) => step with { Mechanism = spending.Mechanism.Id };
}
