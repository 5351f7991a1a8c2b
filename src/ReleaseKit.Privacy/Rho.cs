using System.Globalization;

namespace ReleaseKit.Privacy;

/// <summary>A privacy loss ρ of zero-concentrated differential privacy (Bun &amp; Steinke 2016): D_α ≤ ρα for every order α &gt; 1. A pure number from 0; infinite where nothing is bounded.</summary>
public readonly record struct Rho : IComparable<Rho>
{
    private Rho(double value) => Value = value;

    /// <summary>The number itself, 0 ≤ ρ ≤ ∞.</summary>
    public double Value { get; }

    /// <summary>ρ = 0.</summary>
    public static Rho Zero { get; }

    /// <summary>The ρ of the given value.</summary>
    /// <param name="value">A pure number, 0 ≤ value ≤ ∞.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is negative, or no number.</exception>
    public static Rho Of(double value) => value >= 0
        ? new Rho(value)
        : throw new ArgumentOutOfRangeException(nameof(value), value, "A rho is a number from 0 up.");

    /// <summary>No bound: ρ = ∞.</summary>
    public static Rho Infinite { get; } = new(double.PositiveInfinity);

    /// <summary>Whether ρ is bounded.</summary>
    public bool IsFinite => double.IsFinite(Value);

    /// <summary>The larger of two.</summary>
    public static Rho Max(Rho left, Rho right) => left.Value >= right.Value ? left : right;

    /// <summary>The smaller of two.</summary>
    public static Rho Min(Rho left, Rho right) => left.Value <= right.Value ? left : right;

    /// <inheritdoc/>
    public int CompareTo(Rho other) => Value.CompareTo(other.Value);

    /// <summary>Sum of two losses.</summary>
    public static Rho operator +(Rho left, Rho right) => new(left.Value + right.Value);

    /// <summary>The loss of <paramref name="times"/> independent runs alike, times ≥ 0; 0 runs cost 0, whatever one costs.</summary>
    public static Rho operator *(long times, Rho one) => times == 0 ? Zero : new(times * one.Value);

    /// <summary>Whether the left is the smaller.</summary>
    public static bool operator <(Rho left, Rho right) => left.Value < right.Value;

    /// <summary>Whether the left is the larger.</summary>
    public static bool operator >(Rho left, Rho right) => left.Value > right.Value;

    /// <summary>Whether the left is not the larger.</summary>
    public static bool operator <=(Rho left, Rho right) => left.Value <= right.Value;

    /// <summary>Whether the left is not the smaller.</summary>
    public static bool operator >=(Rho left, Rho right) => left.Value >= right.Value;

    /// <summary>The number in invariant digits.</summary>
    public override string ToString() => Value.ToString("R", CultureInfo.InvariantCulture);
}
