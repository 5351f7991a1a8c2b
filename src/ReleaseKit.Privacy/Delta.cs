using System.Globalization;

namespace ReleaseKit.Privacy;

/// <summary>The δ of (ε, δ)-differential privacy: the part of all outcomes for which ε need not hold. A pure number from 0 to 1.</summary>
public readonly record struct Delta : IComparable<Delta>
{
    private Delta(double value) => Value = value;

    /// <summary>The number itself, 0 ≤ δ ≤ 1.</summary>
    public double Value { get; }

    /// <summary>δ = 0.</summary>
    public static Delta Zero { get; }

    /// <summary>The δ of the given value.</summary>
    /// <param name="value">A pure number, 0 ≤ value ≤ 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is negative, above 1 or no number.</exception>
    public static Delta Of(double value) => value is >= 0 and <= 1
        ? new Delta(value)
        : throw new ArgumentOutOfRangeException(nameof(value), value, "A delta is a number from 0 to 1.");

    /// <summary>δ = 1: no guarantee.</summary>
    public static Delta One { get; } = new(1);

    /// <summary>A bound that came out of a sum or a formula, cut to [0, 1].</summary>
    /// <exception cref="ArgumentOutOfRangeException">The bound is no number.</exception>
    public static Delta AtMost(double bound) => Of(Math.Clamp(bound, 0, 1));

    /// <summary>The larger of two.</summary>
    public static Delta Max(Delta left, Delta right) => left.Value >= right.Value ? left : right;

    /// <summary>The smaller of two.</summary>
    public static Delta Min(Delta left, Delta right) => left.Value <= right.Value ? left : right;

    /// <inheritdoc/>
    public int CompareTo(Delta other) => Value.CompareTo(other.Value);

    /// <summary>Sum of two, at most 1.</summary>
    public static Delta operator +(Delta left, Delta right) => new(Math.Min(1, left.Value + right.Value));

    /// <summary>Whether the left is the smaller.</summary>
    public static bool operator <(Delta left, Delta right) => left.Value < right.Value;

    /// <summary>Whether the left is the larger.</summary>
    public static bool operator >(Delta left, Delta right) => left.Value > right.Value;

    /// <summary>Whether the left is not the larger.</summary>
    public static bool operator <=(Delta left, Delta right) => left.Value <= right.Value;

    /// <summary>Whether the left is not the smaller.</summary>
    public static bool operator >=(Delta left, Delta right) => left.Value >= right.Value;

    /// <summary>The number in invariant digits.</summary>
    public override string ToString() => Value.ToString("R", CultureInfo.InvariantCulture);
}
