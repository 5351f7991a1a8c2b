using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A declared loss beside the bounds that can be shown for it; its name is "rho", "epsilon", or "epsilon at delta 1e-9".</summary>
internal sealed record DeclaredNumber(string Name, double Declared, double Lower, double Upper)
{
    private const double Tolerance = 1e-9;

    /// <summary>The delta that an epsilon is declared with, or that the law comes down to where it was declared rounded; null without one.</summary>
    public double? Delta { get; init; }

    /// <summary>The delta at the declared epsilon, where what was declared is that rounded down; else null.</summary>
    public double? UnroundedDelta { get; init; }

    /// <summary>The upper bound as it can be pasted: a number, or the pair that "spent" is to hold.</summary>
    public string Pasted => Delta is { } delta ? $"\"spent\": {{ \"epsilon\": {BudgetText.Paste(Upper)}, \"delta\": {BudgetText.Paste(delta)} }}" : BudgetText.Paste(Upper);

    public bool IsEnough => UnroundedDelta is null && Declared >= Upper * (1 - Tolerance);

    public bool IsBelowLower => Declared < Lower * (1 - Tolerance);

    /// <summary>Whether the upper bound, rounded to the digits that were declared, is what was declared.</summary>
    public bool IsRounded => RoundsTo(Upper);

    public static IEnumerable<DeclaredNumber> Of(DeclaredLoss declared, MechanismLoss loss)
    {
        if (declared.Rho is { } rho)
            yield return new DeclaredNumber("rho", rho, loss.Concentrated.Lower.Value, loss.Concentrated.Upper.Value);
        if (declared.Epsilon is not { } epsilon)
            yield break;
        yield return declared.Delta is > 0 and var delta ? Pair(epsilon, Privacy.Delta.AtMost(delta), loss)
            : new DeclaredNumber("epsilon", epsilon, loss.Pure.Lower.Value, loss.Pure.Upper.Value);
    }

    /// <summary>Whether a number, rounded to the declared digits and not far from it, is the declared one.</summary>
    public bool RoundsTo(double value) => RoundedNumber.Is(Declared, value);

    private static DeclaredNumber Pair(double epsilon, Delta delta, MechanismLoss loss)
    {
        var taken = DeclaredDelta.Taken(loss, delta);
        var bounds = DeclaredDelta.EpsilonAt(loss, taken.Value);
        var isMet = taken == delta && epsilon >= bounds.Upper.Value * (1 - Tolerance);
        return new DeclaredNumber($"epsilon at delta {BudgetText.Plain(delta.Value)}", epsilon, bounds.Lower.Value, bounds.Upper.Value)
        {
            Delta = taken.Value,
            UnroundedDelta = !isMet && loss.DeltaAt(Epsilon.Of(epsilon)).Upper.Value is var exact && RoundedNumber.Is(delta.Value, exact) ? exact : null,
        };
    }
}
