using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Why the parts of a measure may not add up: what its totals are made of, and which steps after the noise lean to one side. Empty for a measure that does not add up, as a mean.</summary>
public sealed record TotalFacts
{
    public static TotalFacts None { get; } = new();

    /// <summary>The levels at which some totals have noise of their own.</summary>
    public IReadOnlyList<TotalLevel> OwnNoise { get; init; } = [];

    /// <summary>The levels at which some totals are the sums of the published parts.</summary>
    public IReadOnlyList<TotalLevel> Sums { get; init; } = [];

    /// <summary>Whether some total that the release says is added up from parts is published without noise, and some of its parts with noise.</summary>
    public bool HasTotalsWithoutNoise { get; init; }

    public IReadOnlyList<StepOfFigures> Steps { get; init; } = [];
}

/// <summary>Totals of one level: the columns they are told apart by, as the file has them; none for the total of everything.</summary>
public sealed record TotalLevel(IReadOnlyList<StubColumn> By)
{
    public bool Equals(TotalLevel? other) => other is not null && By.SequenceEqual(other.By);

    public override int GetHashCode() => By.Aggregate(0, (code, column) => HashCode.Combine(code, column.Column));
}

/// <summary>A step after the noise whose errors do not cancel in sums: a bound, a threshold, rounding up or down; of every row with noise or of some.</summary>
public sealed record StepOfFigures(AfterStep Step, bool IsEveryRow);
