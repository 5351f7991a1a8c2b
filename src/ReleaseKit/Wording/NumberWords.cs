using System.Globalization;
using System.Text.RegularExpressions;

namespace ReleaseKit.Wording;

/// <summary>Numbers in letters of one language, from its words for numbers and for scales: "twenty-five thousand", "a hundred and ten".</summary>
internal sealed class NumberWords
{
    private const RegexOptions Words = RegexOptions.IgnoreCase | RegexOptions.CultureInvariant;

    // So short a word of scale is an abbreviation, and stands behind digits only: "1.2m".
    private const int LongestAbbreviation = 2;

    private readonly Dictionary<string, decimal> numbers;
    private readonly Dictionary<string, decimal> scales;
    private readonly Regex token;
    private readonly string and;

    public NumberWords(WordingTexts texts)
    {
        (numbers, scales) = (Values(texts, "number.words"), Values(texts, "number.scales"));
        foreach (var none in texts.Template("number.none").Split('|', StringSplitOptions.RemoveEmptyEntries))
            numbers.TryAdd(none, 0);
        var tokens = AnyOf([.. numbers.Keys, .. scales.Keys.Where(scale => scale.Length > LongestAbbreviation), .. texts.Template("number.fractions").Split('|')]);
        and = texts.Template("number.words.and");
        token = new($@"(?<and>\b{Regex.Escape(and)}\s+)?\b(?<word>{tokens})\b", Words);
        Run = $@"(?<![\w-])(?:{tokens})(?:(?:-|\s+(?:{Regex.Escape(and)}\s+)?)(?:{tokens})(?!\w))*(?!-?\w)";
        Scale = $@"[\s-]*(?<scale>{AnyOf(scales.Keys)})(?!\w)";
    }

    /// <summary>The pattern of words that follow each other and may be a number.</summary>
    public string Run { get; }

    /// <summary>The pattern of a word of scale behind digits.</summary>
    public string Scale { get; }

    public decimal ScaleOf(string word) => scales[word];

    /// <summary>The numbers that a run of words holds; none where it tells of fractions.</summary>
    public IReadOnlyList<decimal> In(string run)
    {
        var found = new List<decimal>();
        var sum = new WordSum();
        foreach (Match match in token.Matches(run))
            if (!Take(match.Groups["word"].Value, match.Groups["and"].Success, ref sum, found))
                return [];
        return [.. found, .. sum.Numbers];
    }

    private bool Take(string word, bool afterAnd, ref WordSum sum, List<decimal> found)
    {
        var isScale = scales.TryGetValue(word, out var value);
        if (!isScale && !numbers.TryGetValue(word, out value))
            return false;
        if (isScale ? sum.Times(value) : sum.Plus(value, afterAnd))
            return true;
        found.AddRange(sum.Numbers);
        sum = new WordSum();
        _ = !isScale && sum.Plus(value, afterAnd: false);
        return true;
    }

    /// <summary>The longest first, so that none hides one that it begins; nothing matches where there is none.</summary>
    public static string AnyOf(IEnumerable<string> words) => string.Join('|', words
        .Where(word => word.Length > 0)
        .OrderByDescending(word => word.Length)
        .Select(word => Regex.Escape(word).Replace(@"\ ", @"\s+", StringComparison.Ordinal))
        .DefaultIfEmpty("(?!)"));

    private static Dictionary<string, decimal> Values(WordingTexts texts, string key) => texts.Template(key)
        .Split('|', StringSplitOptions.RemoveEmptyEntries)
        .Select(entry => entry.Split('=') is [var word, var number] && decimal.TryParse(number, NumberStyles.None, CultureInfo.InvariantCulture, out var value)
            ? (word, value)
            : throw WordingException.NoNumberWord(texts.Tag, key, entry))
        .DistinctBy(entry => entry.word, StringComparer.OrdinalIgnoreCase)
        .ToDictionary(entry => entry.word, entry => entry.value, StringComparer.OrdinalIgnoreCase);
}
