using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>The account of the privacy loss of a release: promise, declared, recomputed, what it means for one unit, and each step.</summary>
public sealed record BudgetStatement
{
    public required NoiseAccount Account { get; init; }
    public required LossCurrency Currency { get; init; }

    /// <summary>Recomputed loss in the currency; infinite if a mechanism has no finite loss in this accounting (a stop of the review).</summary>
    public required double Spent { get; init; }

    /// <summary>
    /// Authorised loss in the currency; for an authorised (epsilon, delta) under concentrated accounting the largest rho whose tight
    /// conversion at delta meets epsilon. Null if what is authorised cannot be expressed in the currency.
    /// </summary>
    public double? Authorised { get; init; }

    /// <summary>Authorised − spent, never below 0; null without Authorised.</summary>
    public double? Unspent => Authorised is { } authorised ? Math.Max(0, authorised - Spent) : null;

    /// <summary>Whether some bound shown here meets what was authorised.</summary>
    public required bool IsWithinAuthorised { get; init; }

    /// <summary>What was authorised, as written.</summary>
    public required LossTotal Promise { get; init; }

    /// <summary>Sum of the declared losses where every mechanism declares one, else null.</summary>
    public LossTotal? Declared { get; init; }

    /// <summary>Total in the declared accounting, with epsilon at Delta where it is converted.</summary>
    public required LossTotal Recomputed { get; init; }

    /// <summary>The smallest upper bound this program can prove, as (epsilon, delta).</summary>
    public required LossTotal SmallestBound { get; init; }

    /// <summary>A lower bound beside it, from named pairs of neighbouring data, in the declared accounting.</summary>
    public required LossTotal Lower { get; init; }

    /// <summary>The delta at which (epsilon, delta) statements are made; 0 under pure accounting.</summary>
    public required double Delta { get; init; }

    /// <summary>The total in rho turned into (epsilon, Delta) by each rule, the tighter one first; empty where nothing is converted.</summary>
    public required IReadOnlyList<LossTotal> Conversions { get; init; }

    /// <summary>For what was spent.</summary>
    public required MeaningForOne Meaning { get; init; }

    /// <summary>Had all that is authorised been spent; null if that cannot be said.</summary>
    public MeaningForOne? MeaningOfPromise { get; init; }
    public required IReadOnlyList<MechanismAccount> Mechanisms { get; init; }
    public required IReadOnlyList<BudgetPiece> Pieces { get; init; }

    /// <summary>All figures without noise, exact ones first, in the order of the release.</summary>
    public required IReadOnlyList<FiguresWithoutNoise> WithoutNoise { get; init; }

    /// <summary>Whether exact figures stand beside the guarantee: then the meaning opens with the two sentences about them.</summary>
    public bool HasExactFigures => WithoutNoise.Any(figures => figures.Kind != WithoutNoiseKind.Public);

    /// <summary>How the total was reached: one or more steps a mechanism, then the sum, then conversions.</summary>
    public required IReadOnlyList<AccountStep> Steps { get; init; }

    /// <summary>The account of a release.</summary>
    public static BudgetStatement Of(Release release) => new StatementBuilder(release).Build();
}
