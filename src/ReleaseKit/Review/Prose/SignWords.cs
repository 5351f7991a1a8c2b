using System.Text.RegularExpressions;
using Markdig.Syntax.Inlines;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Wording;

namespace ReleaseKit.Review.Prose;

/// <summary>The words that say of a number without its sign that it is one below zero: "a loss of 3", "fell by 3".</summary>
internal static class SignWords
{
    private const RegexOptions AsTyped = RegexOptions.IgnoreCase | RegexOptions.CultureInvariant;

    /// <summary>Whether such a word stands in the citation or in its sentence.</summary>
    public static bool StandBy(LinkInline citation, ILanguage language)
    {
        var words = ProseDocument.PlainText(citation);
        var says = $@"(?<!\w)(?:{NumberWords.AnyOf(language.Text("number.negative").Split('|'))})(?!\w)";
        return Sentences(citation).Where(sentence => sentence.Contains(words, StringComparison.Ordinal)).Append(words)
            .Any(sentence => Regex.IsMatch(sentence, says, AsTyped));
    }

    private static string[] Sentences(Inline citation)
    {
        var root = citation.Parent!;
        while (root.Parent is { } parent)
            root = parent;
        return Regex.Split(ProseDocument.PlainText(root), @"(?<=[.!?])\s+");
    }
}
