using System.Text.RegularExpressions;
using ReleaseKit.Reading.Keys;

namespace ReleaseKit.Review.Leaks;

/// <summary>A seed or a generator's state in a text: "seed 42", "seed=0x1F", "seeded with 20310904". How many bits of entropy there were gives nothing away.</summary>
internal static partial class SeedText
{
    /// <summary>Where such words stand in a text, and the words.</summary>
    public static IEnumerable<(int Index, string Words)> In(string text) => Given.Matches(text).Select(match => (match.Index, match.Value));

    public static Finding Found(FindingLevel level, FindingOwner owner, Place at, string words) => new(
        level, "seed-given", owner, at,
        $"\"{KeyProblems.Cut(words)}\" looks like the seed or the state that noise was drawn with.",
        "whoever has it can draw the noise again and take it off every figure.",
        level == FindingLevel.Stop
            ? "take the number out, here and wherever else it is published; if noise was drawn with a seed that others know, it protects nobody and has to be drawn anew."
            : "take the number out if it is one; if it is something else, let it stand.");

    [GeneratedRegex("""
        \b(?:seed(?:s|ed|\(\))?|(?:random|generator|rng)[ _]state)\b(?:\s+(?:is|was|with|of|at|value|number|no\.?))*[\s:=(#'"\[]*(?:0x[0-9a-f]+|[0-9][0-9a-f]*)\b(?!\s*-?\s*(?:bits?|bytes?)\b)
        """, RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Given { get; }
}
