using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Appraisal;

/// <summary>Which laws a sum of draws has, and how many of each, in any order: two sums with the same have one law.</summary>
internal sealed class SumKey(IReadOnlyDictionary<LatticeLaw, int> counted) : IEquatable<SumKey>
{
    private readonly int hash = counted.Aggregate(0, (mixed, pair) => mixed ^ HashCode.Combine(pair.Key, pair.Value));

    private IReadOnlyDictionary<LatticeLaw, int> Counted { get; } = counted;

    /// <summary>The law of the sum, or null where it cannot be worked out: the draws lie on different grids, or the sum is too wide.</summary>
    public LatticeLaw? TryMakeLaw()
    {
        try
        {
            // In a fixed order, so that the last digit does not hang on which of two like sums was asked for first.
            return IntegerSum.Of(Counted.OrderBy(pair => pair.Key.Variance).ThenBy(pair => pair.Key.GetType().Name, StringComparer.Ordinal).Select(pair => (pair.Key, pair.Value)));
        }
        catch (ArgumentException)
        {
            return null;
        }
    }

    public bool Equals(SumKey? other) => other is not null && Counted.Count == other.Counted.Count
        && Counted.All(pair => other.Counted.TryGetValue(pair.Key, out var count) && count == pair.Value);

    public override bool Equals(object? obj) => Equals(obj as SumKey);

    public override int GetHashCode() => hash;
}
