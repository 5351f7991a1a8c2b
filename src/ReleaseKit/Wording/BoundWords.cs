using System.Text.RegularExpressions;

namespace ReleaseKit.Wording;

/// <summary>The words of one language that make a bound of a number, before it or behind it, as patterns; and the signs that every language has.</summary>
internal sealed class BoundWords(WordingTexts texts)
{
    private static readonly (NumberBound Bound, string Key)[] Keys =
    [
        (NumberBound.Over, "number.over"),
        (NumberBound.AtLeast, "number.at-least"),
        (NumberBound.Under, "number.under"),
        (NumberBound.AtMost, "number.at-most"),
        (NumberBound.Nearly, "number.nearly"),
        (NumberBound.JustOver, "number.just-over"),
    ];

    private static readonly string Signs = string.Join('|',
        Pattern(NumberBound.AtLeast, "≥|>="), Pattern(NumberBound.AtMost, "≤|<="), Pattern(NumberBound.Over, ">"), Pattern(NumberBound.Under, "<"));

    /// <summary>"More than ", "at least about ", "> ", perhaps with the sign of a currency.</summary>
    public string Before { get; } =
        $@"(?:(?<![\w-])(?:{string.Join('|', Keys.Select(pair => Pattern(pair.Bound, texts.Template(pair.Key))))})\s+|(?:{Signs})\s*)"
        + $@"(?:(?:{NumberWords.AnyOf(texts.Template("number.bound-about").Split('|'))})\s+)?(?:\p{{Sc}}\s*)?";

    /// <summary>" or more", perhaps behind a word for what is counted.</summary>
    public string Behind { get; } =
        $@"(?:\s+\p{{L}}+)?\s+(?:{Pattern(NumberBound.AtLeast, texts.Template("number.at-least.behind"))}|{Pattern(NumberBound.AtMost, texts.Template("number.at-most.behind"))})(?!\w|-)";

    public static NumberBound In(Match match) => Keys.Select(pair => pair.Bound).FirstOrDefault(bound => match.Groups[bound.ToString()].Success);

    private static string Pattern(NumberBound bound, string words) => $"(?<{bound}>{NumberWords.AnyOf(words.Split('|'))})";
}
