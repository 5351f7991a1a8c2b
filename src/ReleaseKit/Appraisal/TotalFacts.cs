using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>Why the parts of a measure may not add up: what its totals are made of, and which figures were set to a bound. Empty for a measure that does not add up, as a mean.</summary>
public sealed record TotalFacts
{
    public static TotalFacts None { get; } = new();

    /// <summary>The levels at which some totals have noise of their own.</summary>
    public IReadOnlyList<TotalLevel> OwnNoise { get; init; } = [];

    /// <summary>The levels at which some totals are the sums of the published parts.</summary>
    public IReadOnlyList<TotalLevel> Sums { get; init; } = [];

    /// <summary>Whether some total that the release says is added up from parts is published without noise, and some of its parts with noise.</summary>
    public bool HasTotalsWithoutNoise { get; init; }

    public IReadOnlyList<BoundOfFigures> Bounds { get; init; } = [];
}

/// <summary>Totals of one level: the columns they are told apart by, as the file has them; none for the total of everything.</summary>
public sealed record TotalLevel(IReadOnlyList<StubColumn> By)
{
    public bool Equals(TotalLevel? other) => other is not null && By.SequenceEqual(other.By);

    public override int GetHashCode() => By.Aggregate(0, (code, column) => HashCode.Combine(code, column.Column));
}

/// <summary>A bound, in the figure's unit, to which numbers beyond it were set after the noise: below it or above it, in every row with noise or in some.</summary>
public sealed record BoundOfFigures(double Bound, bool IsLower, bool IsEveryRow);
