using ReleaseKit.Noise.Errors;

namespace ReleaseKit.Releases;

public enum Neighbouring { AddOrRemove, Replace }

public enum Accounting { Pure, Approximate, Concentrated }

/// <summary>mechanisms.json: whom the guarantee protects, what was allowed, and each mechanism.</summary>
public sealed record NoiseAccount
{
    /// <summary>Whom the guarantee protects: forms by language, and over what span.</summary>
    public required Unit Who { get; init; }
    public ReaderText? Over { get; init; }
    public required Neighbouring Neighbouring { get; init; }
    public required Accounting Accounting { get; init; }
    public required Authorised Authorised { get; init; }
    public required IReadOnlyList<Mechanism> Mechanisms { get; init; }
    public required Practice Practice { get; init; }
}

/// <summary>What the office allowed: epsilon and delta, or rho.</summary>
public sealed record Authorised
{
    public double? Epsilon { get; init; }
    public double? Delta { get; init; }
    public double? Rho { get; init; }
    public string? By { get; init; }
    public DateOnly? On { get; init; }
    public string? Paper { get; init; }
    public string? Unspent { get; init; }
    public string? Over { get; init; }
    public required Review.Place At { get; init; }
}

/// <summary>Statements of the office about how it works; null where it says nothing.</summary>
public sealed record Practice(string? HeldBy, string? Sampler, string? Rows, string? Corrections, string? Tuned, string? Span, string? Renewal);

/// <summary>A number, or the name of a column that gives it row by row.</summary>
public readonly record struct NumberOrColumn(double? Number, string? Column)
{
    public static NumberOrColumn Of(double number) => new(number, null);
    public static NumberOrColumn From(string column) => new(null, column);
}

public enum LawName
{
    Laplace, DiscreteLaplace, Gaussian, DiscreteGaussian, Uniform, DiscreteUniform, Staircase, TruncatedDiscreteLaplace, Tabulated, Declared,
}

public enum MechanismUse { Figures, ChoiceOfRows, ChoiceOfBounds, NotPublished }

/// <summary>One run of a randomised query.</summary>
public sealed record Mechanism
{
    public required string Id { get; init; }
    public required LawName Law { get; init; }

    /// <summary>
    /// Parameters by key: scale, sigma, halfWidth, epsilon, sensitivity, gamma, cutoff, grid. The staircase law's "sensitivity" (the width of a stair)
    /// shares its key with the mechanism's sensitivity object, so it is taken from there: perCell, or l1 where that is what is given.
    /// </summary>
    public required IReadOnlyDictionary<string, NumberOrColumn> Parameters { get; init; }

    /// <summary>For a tabulated law: steps (multiples of the grid) and their chances, read in decimal.</summary>
    public IReadOnlyList<(long Step, decimal Probability)>? Tabulated { get; init; }
    public double Grid { get; init; } = 1;
    public required Sensitivity Sensitivity { get; init; }
    public DeclaredLoss? Spent { get; init; }
    /// <summary>The steps after the noise, in order, but for "adjusted".</summary>
    public required IReadOnlyList<AfterStep> Afterwards { get; init; }

    /// <summary>True if the figures were made consistent afterwards ("adjusted").</summary>
    public bool Adjusted { get; init; }
    public ReaderText? Answers { get; init; }
    public ReaderText? Level { get; init; }
    public ClippedTo? Clipped { get; init; }

    /// <summary>The public column that a mean's denominator is known from, if said.</summary>
    public string? DenominatorColumn { get; init; }
    public MechanismUse Use { get; init; } = MechanismUse.Figures;
    public string? DescribedAt { get; init; }
    public required Review.Place At { get; init; }

    /// <summary>Place of a key inside the mechanism's object ("spent", "sigma" …), for messages.</summary>
    public required IReadOnlyDictionary<string, Review.Place> KeyPlaces { get; init; }
}

/// <summary>How much one unit can move the answers of a mechanism; see design of sensitivity keys in the schema.</summary>
public sealed record Sensitivity
{
    public int? CellsPerUnit { get; init; }
    public double? PerCell { get; init; }
    public bool Signed { get; init; }
    public double? PerUnit { get; init; }

    /// <summary>False if a unit cannot change cells (under "replace" its answer changes within its cells).</summary>
    public bool Moves { get; init; } = true;
    public double? L1 { get; init; }
    public double? L2 { get; init; }
    public int? L1Levels { get; init; }
}

/// <summary>Loss as declared: any of epsilon, delta, rho.</summary>
public sealed record DeclaredLoss(double? Epsilon, double? Delta, double? Rho);

public sealed record ClippedTo(double From, double To)
{
    /// <summary>How far from 0 a contribution can lie.</summary>
    public double Outermost => Math.Max(Math.Abs(From), Math.Abs(To));
}
