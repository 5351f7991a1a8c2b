namespace ReleaseKit.Appraisal;

/// <summary>The currency in which the losses of a release add: epsilon (pure, approximate) or rho (concentrated).</summary>
public enum LossCurrency { Epsilon, Rho }

/// <summary>
/// One total of privacy loss: what it has of epsilon, delta and rho (a pure number each; infinite where the rule bounds nothing),
/// and the rule that shows it.
/// </summary>
public sealed record LossTotal(double? Epsilon, double? Delta, double? Rho, AccountRule Rule);

/// <summary>A rule of the account: a stable key, which pages put into words ("budget.rule." + key), and the literature it stands on.</summary>
public sealed record AccountRule(string Key, string Source);

/// <summary>
/// One step of the account. <c>Arithmetic</c> is the step in signs and numbers, to be followed with a calculator
/// ("ρ = 1 × 1² ÷ (2 × 9.5²) = 0.00554016620499"); <c>Key</c> names it for the words around it ("budget.step." + key).
/// </summary>
public sealed record AccountStep(string Key, string Arithmetic, double Result, AccountRule Rule)
{
    /// <summary>The mechanism it belongs to, or null for a step of the whole release.</summary>
    public string? Mechanism { get; init; }
}
