namespace ReleaseKit.Wording;

/// <summary>What the words by a number make of it: itself, or a bound that the figure keeps.</summary>
public enum NumberBound
{
    /// <summary>The number itself.</summary>
    None,

    /// <summary>"More than 60".</summary>
    Over,

    /// <summary>"At least 60", "60 or more".</summary>
    AtLeast,

    /// <summary>"Fewer than 60".</summary>
    Under,

    /// <summary>"Up to 60", "60 or fewer".</summary>
    AtMost,

    /// <summary>"Nearly 60": rounded up.</summary>
    Nearly,

    /// <summary>"Just over 60": rounded down.</summary>
    JustOver,
}
