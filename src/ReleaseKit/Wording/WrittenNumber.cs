namespace ReleaseKit.Wording;

/// <summary>A number that stands in a text.</summary>
/// <param name="Text">As it is written, with its sign and its scale: "1,500", "minus 7", "± 36", "1.2 million", "twenty-five".</param>
/// <param name="Value">What it says; null if it is not written as the language writes numbers ("1.422,5").</param>
/// <param name="IsMargin">Whether a ± stands before it, or the words for it.</param>
public readonly record struct WrittenNumber(string Text, decimal? Value, bool IsMargin)
{
    /// <summary>To what it is rounded: its last decimal, or the zeros at its end; 100,000 for 1.2 million.</summary>
    public decimal Step { get; init; } = 1;

    /// <summary>The word of scale behind its digits, "million"; empty if there is none.</summary>
    public string ScaleWord { get; init; } = "";

    /// <summary>What the word of scale multiplies by.</summary>
    public decimal Scale { get; init; } = 1;

    /// <summary>Whether it is written in letters alone.</summary>
    public bool IsInLetters { get; init; }

    /// <summary>What the words by it make of it.</summary>
    public NumberBound Bound { get; init; }

    /// <summary>The words of a bound that stand before it, "more than ", and behind it, " or more"; empty if there are none.</summary>
    public string Before { get; init; } = "";
    public string Behind { get; init; } = "";

    /// <summary>As it is written, with the words of its bound.</summary>
    public string InFull => Before + Text + Behind;

    /// <summary>Where it begins in the text, and where it has ended with the words behind it.</summary>
    public int Start { get; init; }
    public int End { get; init; }

    /// <summary>"One", "a": an article as often as a number.</summary>
    public bool IsArticle => IsInLetters && Value == 1;
}
