using System.Globalization;

namespace ReleaseKit.Privacy;

/// <summary>A privacy loss ε in natural logarithms: the largest change of log odds. A pure number from 0; infinite where nothing is bounded.</summary>
public readonly record struct Epsilon : IComparable<Epsilon>
{
    private Epsilon(double value) => Value = value;

    /// <summary>The number itself, 0 ≤ ε ≤ ∞.</summary>
    public double Value { get; }

    /// <summary>ε = 0.</summary>
    public static Epsilon Zero { get; }

    /// <summary>The ε of the given value.</summary>
    /// <param name="value">A pure number, 0 ≤ value ≤ ∞.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is negative, or no number.</exception>
    public static Epsilon Of(double value) => value >= 0
        ? new Epsilon(value)
        : throw new ArgumentOutOfRangeException(nameof(value), value, "An epsilon is a number from 0 up.");

    /// <summary>No bound: ε = ∞.</summary>
    public static Epsilon Infinite { get; } = new(double.PositiveInfinity);

    /// <summary>Whether ε is bounded.</summary>
    public bool IsFinite => double.IsFinite(Value);

    /// <summary>The larger of two.</summary>
    public static Epsilon Max(Epsilon left, Epsilon right) => left.Value >= right.Value ? left : right;

    /// <summary>The smaller of two.</summary>
    public static Epsilon Min(Epsilon left, Epsilon right) => left.Value <= right.Value ? left : right;

    /// <inheritdoc/>
    public int CompareTo(Epsilon other) => Value.CompareTo(other.Value);

    /// <summary>Sum of two losses.</summary>
    public static Epsilon operator +(Epsilon left, Epsilon right) => new(left.Value + right.Value);

    /// <summary>The loss of <paramref name="times"/> independent runs alike, times ≥ 0; 0 runs cost 0, whatever one costs.</summary>
    public static Epsilon operator *(long times, Epsilon one) => times == 0 ? Zero : new(times * one.Value);

    /// <summary>Whether the left is the smaller.</summary>
    public static bool operator <(Epsilon left, Epsilon right) => left.Value < right.Value;

    /// <summary>Whether the left is the larger.</summary>
    public static bool operator >(Epsilon left, Epsilon right) => left.Value > right.Value;

    /// <summary>Whether the left is not the larger.</summary>
    public static bool operator <=(Epsilon left, Epsilon right) => left.Value <= right.Value;

    /// <summary>Whether the left is not the smaller.</summary>
    public static bool operator >=(Epsilon left, Epsilon right) => left.Value >= right.Value;

    /// <summary>The number in invariant digits.</summary>
    public override string ToString() => Value.ToString("R", CultureInfo.InvariantCulture);
}
