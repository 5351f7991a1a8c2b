using System.Text.RegularExpressions;

namespace ReleaseKit.Wording;

/// <summary>"Between 6,000 and 6,100" names two bounds, "between 1.2 and 1.3 million" with one scale.</summary>
internal static class EnclosingNumbers
{
    private const RegexOptions AsTyped = RegexOptions.IgnoreCase | RegexOptions.CultureInvariant;

    public static IReadOnlyList<WrittenNumber> In(IReadOnlyList<WrittenNumber> numbers, string text, ILanguage language)
    {
        var read = numbers.ToArray();
        for (var at = 0; at + 1 < read.Length; at++)
            if (Encloses(read[at], read[at + 1], text, language))
                (read[at], read[at + 1]) = (InScaleOf(read[at + 1], read[at]) with { Bound = NumberBound.AtLeast }, read[at + 1] with { Bound = NumberBound.AtMost });
        return read;
    }

    private static bool Encloses(WrittenNumber low, WrittenNumber high, string text, ILanguage language) =>
        IsPlain(low) && IsPlain(high) && high.Start > low.End
        && Regex.IsMatch(text[..low.Start], $@"(?<!\w)(?:{NumberWords.AnyOf(language.Text("number.between").Split('|'))})\s+(?:\p{{Sc}}\s*)?$", AsTyped)
        && Regex.IsMatch(text[low.End..high.Start], $@"^(?:\s+\p{{L}}+)?\s+{Regex.Escape(language.Text("number.words.and"))}\s+(?:\p{{Sc}}\s*)?$", AsTyped);

    private static bool IsPlain(WrittenNumber number) => number is { IsInLetters: false, IsMargin: false, Bound: NumberBound.None };

    private static WrittenNumber InScaleOf(WrittenNumber high, WrittenNumber low) => low.Scale != 1 ? low : low with
    {
        Value = low.Value * high.Scale,
        Step = low.Step * high.Scale,
        Scale = high.Scale,
        ScaleWord = high.ScaleWord,
    };
}
