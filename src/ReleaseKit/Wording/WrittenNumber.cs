namespace ReleaseKit.Wording;

/// <summary>A number that stands in a text.</summary>
/// <param name="Text">As it is written, with its sign: "1,500", "minus 7", "± 36".</param>
/// <param name="Value">What it says; null if it is not written as the language writes numbers ("1.422,5").</param>
/// <param name="IsMargin">Whether a ± stands before it.</param>
public readonly record struct WrittenNumber(string Text, decimal? Value, bool IsMargin);
