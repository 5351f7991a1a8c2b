using System.Text.RegularExpressions;

namespace ReleaseKit.Tests.Wording;

/// <summary>
/// Flesch–Kincaid grade: 0.39 words/sentences + 11.8 syllables/words − 15.59 (Kincaid, Fishburne, Rogers &amp; Chissom 1975, Derivation of new
/// readability formulas for Navy enlisted personnel, Research Branch Report 8-75). Words are told apart by spaces; each number is one word of one
/// syllable; our own words have the syllables of a fixed list; any other word is a unit or label of the folder and has two.
/// </summary>
internal static partial class Readability
{
    private static readonly string[] BySyllables =
    [
        "a an and apart reach rests run when then lay as at be break but by can close count do each ends for from got group here high hold in is it its just "
        + "known large late learned least leaves less lies low made marks may mean miss more most moved need no noise none not of "
        + "on or own parts per range rate read rest rough same share show small so some source still strike such sum sums tend "
        + "tends than that the their them there they this to told too touched up use was way weak were what with wrong yet add "
        + "are checked come make all think who knows whole raise odds guess times holds worst say says tests test yes find gives false used has sets two one "
        + "which get rows part set those does down ones far off",
        "about above added adds after allows alone amount amounts answers before below apply between cannot carried cases column counted "
        + "covers downward either event exist figure figures filled forecast further given hidden index instead larger level "
        + "become values fewer limits margin margins minus misses normal number numbers office only other outside pages people protect public published ranges "
        + "reaches records rounded rounding rules series special table total totals upward valid wider within without zero",
        "another average certainty exactly general collected estimate expected holiday median multiple possible quality together usual",
        "available definition provisional publication",
        "experimental",
    ];

    private static readonly Dictionary<string, int> Syllables = BySyllables
        .SelectMany((words, index) => words.Split(' ').Select(word => (word, index + 1)))
        .ToDictionary(pair => pair.word, pair => pair.Item2);

    public static bool IsOurs(string word) => Syllables.ContainsKey(word.ToLowerInvariant());

    public static double Grade(IReadOnlyCollection<string> sentences)
    {
        var words = sentences.SelectMany(Words).ToList();
        return 0.39 * words.Count / sentences.Count + 11.8 * words.Sum(SyllablesOf) / words.Count - 15.59;
    }

    /// <summary>The words of a sentence; a number with the minus before it is two.</summary>
    public static IReadOnlyList<string> Words(string sentence) => [.. Word().Matches(sentence).Select(match => match.Value)];

    private static int SyllablesOf(string word) =>
        char.IsAsciiDigit(word[0]) ? 1 : Syllables.GetValueOrDefault(word.ToLowerInvariant(), 2);

    [GeneratedRegex(@"[0-9][0-9,]*(\.[0-9]+)?|\p{L}[\p{L}'’-]*")]
    private static partial Regex Word();
}
