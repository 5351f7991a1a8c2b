using ReleaseKit.Releases;

namespace ReleaseKit.Review.Budget;

/// <summary>What a unit that goes takes out of the cells that count it, and what the one that comes in its place puts into its own.</summary>
internal readonly record struct Exchange(double Taken, double Put)
{
    /// <summary>Of units that are counted in different cells, those that move most; where contributions end at 0, one that puts nothing in moves no more than one cell.</summary>
    public static IEnumerable<Exchange> OfOthers(ClippedTo clipped) => clipped is { From: 0 } or { To: 0 }
        ? [new(clipped.Outermost, clipped.Outermost)]
        : [new(clipped.Outermost, clipped.Outermost), new(clipped.To, clipped.From), new(clipped.From, clipped.To)];

    public double InBoth => Math.Abs(Put - Taken);

    public double Larger => Math.Max(Math.Abs(Taken), Math.Abs(Put));

    public double Smaller => Math.Min(Math.Abs(Taken), Math.Abs(Put));

    /// <summary>How far a cell moves that counts the one, the other or both.</summary>
    public double In(bool leaving, bool entered) => leaving && entered ? InBoth : Math.Abs(leaving ? Taken : Put);
}
