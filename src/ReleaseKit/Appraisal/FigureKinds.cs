using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>How many published numbers carry noise, come from the records without noise, and are known from elsewhere.</summary>
public sealed record FigureKinds(long Noised, long Exact, long Public)
{
    public static FigureKinds None { get; } = new(0, 0, 0);

    public long All => Noised + Exact + Public;

    public static FigureKinds operator +(FigureKinds left, FigureKinds right) =>
        new(left.Noised + right.Noised, left.Exact + right.Exact, left.Public + right.Public);

    /// <summary>The same with one more; a sum has the rule that its parts lead to.</summary>
    public FigureKinds With(NoiseRule rule) => rule switch
    {
        NoiseRule.Exact => this with { Exact = Exact + 1 },
        NoiseRule.Public => this with { Public = Public + 1 },
        _ => this with { Noised = Noised + 1 },
    };
}
