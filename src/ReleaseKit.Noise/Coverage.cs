using System.Globalization;

namespace ReleaseKit.Noise;

/// <summary>
/// A coverage: in what share of repetitions a range holds the value before noise. A pure number strictly between 0 and 1.
/// </summary>
public readonly record struct Coverage : IComparable<Coverage>
{
    private Coverage(double share) => Share = share;

    /// <summary>The coverage as a share, 0 &lt; share &lt; 1.</summary>
    public double Share { get; }

    /// <summary>The chance that is left over, 1 − share.</summary>
    public double Rest => 1 - Share;

    /// <summary>The coverage of the given share.</summary>
    /// <param name="share">A pure number, 0 &lt; share &lt; 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The share is not strictly between 0 and 1.</exception>
    public static Coverage OfShare(double share) => share is > 0 and < 1
        ? new Coverage(share)
        : throw new ArgumentOutOfRangeException(nameof(share), share, "A coverage lies strictly between 0 and 1.");

    /// <inheritdoc/>
    public int CompareTo(Coverage other) => Share.CompareTo(other.Share);

    /// <summary>Whether the left coverage is the smaller.</summary>
    public static bool operator <(Coverage left, Coverage right) => left.Share < right.Share;

    /// <summary>Whether the left coverage is the larger.</summary>
    public static bool operator >(Coverage left, Coverage right) => left.Share > right.Share;

    /// <summary>Whether the left coverage is the smaller, or both are equal.</summary>
    public static bool operator <=(Coverage left, Coverage right) => left.Share <= right.Share;

    /// <summary>Whether the left coverage is the larger, or both are equal.</summary>
    public static bool operator >=(Coverage left, Coverage right) => left.Share >= right.Share;

    /// <summary>The share in invariant digits.</summary>
    public override string ToString() => Share.ToString("R", CultureInfo.InvariantCulture);
}
