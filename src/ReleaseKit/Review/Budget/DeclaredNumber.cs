using System.Globalization;
using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>A declared loss beside the bounds that can be shown for it; its name is "rho", "epsilon", or "epsilon at delta 1e-9".</summary>
internal sealed record DeclaredNumber(string Name, double Declared, double Lower, double Upper)
{
    private const double Tolerance = 1e-9;
    private const double FurthestRounding = 0.05;

    /// <summary>The delta that an epsilon is declared with; null without one.</summary>
    public double? Delta { get; init; }

    /// <summary>The upper bound as it can be pasted: a number, or the pair that "spent" is to hold.</summary>
    public string Pasted => Delta is { } delta ? $"\"spent\": {{ \"epsilon\": {BudgetText.Paste(Upper)}, \"delta\": {BudgetText.Plain(delta)} }}" : BudgetText.Paste(Upper);

    public bool IsEnough => Declared >= Upper * (1 - Tolerance);

    public bool IsBelowLower => Declared < Lower * (1 - Tolerance);

    /// <summary>Whether the upper bound, rounded to the digits that were declared, is what was declared.</summary>
    public bool IsRounded => RoundsTo(Upper);

    public static IEnumerable<DeclaredNumber> Of(DeclaredLoss declared, MechanismLoss loss)
    {
        if (declared.Rho is { } rho)
            yield return new DeclaredNumber("rho", rho, loss.Concentrated.Lower.Value, loss.Concentrated.Upper.Value);
        if (declared.Epsilon is not { } epsilon)
            yield break;
        var bounds = DeclaredDelta.EpsilonAt(loss, declared.Delta);
        var name = declared.Delta is > 0 and var delta ? $"epsilon at delta {BudgetText.Plain(delta)}" : "epsilon";
        yield return new DeclaredNumber(name, epsilon, bounds.Lower.Value, bounds.Upper.Value) { Delta = declared.Delta is > 0 ? declared.Delta : null };
    }

    /// <summary>Whether a number, rounded to the declared digits and not far from it, is the declared one.</summary>
    public bool RoundsTo(double value)
    {
        if (!(Declared > 0) || !double.IsFinite(value) || Math.Abs(value - Declared) > FurthestRounding * value)
            return false;
        var digits = Declared.ToString("R", CultureInfo.InvariantCulture);
        var decimals = digits.Contains('E', StringComparison.Ordinal) || !digits.Contains('.', StringComparison.Ordinal) ? 0 : digits.Length - digits.IndexOf('.', StringComparison.Ordinal) - 1;
        return decimals is > 0 and <= 15
            ? Math.Round(value, decimals, MidpointRounding.AwayFromZero) == Declared
            : Math.Abs(value - Declared) <= Tolerance * Declared;
    }
}
