using System.Globalization;

namespace ReleaseKit.Noise;

/// <summary>
/// A coverage: in what share of repetitions a range holds the value before noise. A pure number strictly between 0 and 1.
/// </summary>
public readonly record struct Coverage : IComparable<Coverage>
{
    /// <summary>How far below the share a probability still counts as reaching it; a pure number.</summary>
    internal const double Slack = 1e-12;

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

    /// <summary>
    /// Whether a probability reaches this coverage: P ≥ share − 1e-12, so that a tie is decided alike by everyone who works it out in
    /// doubles.
    /// </summary>
    /// <param name="probability">The lower end of what the probability can be, in [0, 1].</param>
    public bool IsReachedBy(double probability) => probability >= Share - Slack;

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
