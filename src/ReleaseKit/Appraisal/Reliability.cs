namespace ReleaseKit.Appraisal;

/// <summary>How far a figure can be used alone: margin ÷ figure against the release's two thresholds, or why there is no margin.</summary>
public enum Reliability
{
    Close,
    Rough,
    Weak,
    Exact,
    Public,
    NotStated,
}
