namespace ReleaseKit.Noise.Errors;

/// <summary>How a value is rounded to a multiple of a unit.</summary>
public enum RoundingHow
{
    /// <summary>To the nearest multiple; ties as <see cref="RoundingTies"/> says.</summary>
    Nearest,

    /// <summary>To the largest multiple not above the value.</summary>
    Down,

    /// <summary>To the smallest multiple not below the value.</summary>
    Up,

    /// <summary>To one of the two neighbouring multiples at random, without bias.</summary>
    AtRandom,
}

/// <summary>Which way a value goes that lies midway between two multiples.</summary>
public enum RoundingTies
{
    /// <summary>Away from zero.</summary>
    Away,

    /// <summary>Upward.</summary>
    Up,

    /// <summary>To the even multiple.</summary>
    Even,
}

/// <summary>A step applied to a noised value before it is published. Values are in the figure's unit.</summary>
public abstract record AfterStep
{
    private AfterStep()
    {
    }

    /// <summary>Rounding to a multiple of <paramref name="Unit"/> &gt; 0.</summary>
    /// <param name="Unit">The rounding unit, &gt; 0.</param>
    /// <param name="How">The direction.</param>
    /// <param name="Ties">Where ties go; used by <see cref="RoundingHow.Nearest"/> alone.</param>
    public sealed record RoundTo(double Unit, RoundingHow How = RoundingHow.Nearest, RoundingTies Ties = RoundingTies.Away) : AfterStep;

    /// <summary>Values below the bound are published as the bound; the value before noise respects it.</summary>
    /// <param name="Bound">The bound.</param>
    public sealed record NotBelow(double Bound) : AfterStep;

    /// <summary>Values above the bound are published as the bound; the value before noise respects it.</summary>
    /// <param name="Bound">The bound.</param>
    public sealed record NotAbove(double Bound) : AfterStep;

    /// <summary>Values below the threshold are published as 0.</summary>
    /// <param name="Threshold">The threshold, &gt; 0.</param>
    public sealed record ZeroBelow(double Threshold) : AfterStep;

    /// <summary>Only values from the threshold up are published at all.</summary>
    /// <param name="Threshold">The threshold.</param>
    public sealed record PublishedFrom(double Threshold) : AfterStep;
}
