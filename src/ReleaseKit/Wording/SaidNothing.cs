using System.Text.RegularExpressions;
using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>Words for nothing: "no visitors" says 0, and "no wonder" says no number.</summary>
internal static class SaidNothing
{
    public static bool Is(WrittenNumber number) => number is { IsInLetters: true, Value: 0, Bound: NumberBound.None };

    /// <summary>Whether it stands alone, or before the unit of the figure.</summary>
    public static bool OfTheUnit(WrittenNumber number, string text, AppraisedFigure figure, ILanguage language) =>
        text.Trim().Length == number.Text.Trim().Length
        || Regex.IsMatch(text[number.End..], $@"^\s+(?:{NumberWords.AnyOf(FigureTexts.Units(figure, language))})(?!\w)", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant);

    public static bool IsSurelyFalse(WrittenNumber number, string text, AppraisedFigure figure, ILanguage language) =>
        Is(number) && figure.HasNumber && !FigureSpan.Of(figure).Holds(0) && OfTheUnit(number, text, figure, language);
}
