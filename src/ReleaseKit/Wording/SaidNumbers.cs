using System.Text.RegularExpressions;
using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Wording;

/// <summary>The numbers in a writer's words that can be meant for the figure that the words cite.</summary>
internal static class SaidNumbers
{
    private const decimal InEach = 100;
    private const double MostInEach = 1e9;

    public static IReadOnlyList<SaidNumber> In(string words, AppraisedFigure figure, Release release, ILanguage language)
    {
        if (language.NumbersIn(words).All(number => number.IsArticle))
            return [];
        var scale = new FigureScale(figure, language);
        var said = Compared(words, figure, scale, language);
        if (said.Any(number => number.As < SaidAs.Rounded))
        {
            // Only now: what the table says itself takes much longer to leave out.
            var own = new FigureTexts(figure, release, language);
            var text = own.Without(words);
            said = [.. Compared(text, figure, scale, language).Select(number => number with { IsSure = number.IsSure && !own.MayHold(number.Number, text) })];
        }
        return said.Any(number => number.SaysTheFigure) ? [.. said.Where(number => !number.Number.IsInLetters)] : [.. Alone(said, words, language)];
    }

    private static IReadOnlyList<SaidNumber> Compared(string text, AppraisedFigure figure, FigureScale scale, ILanguage language) =>
    [
        .. EnclosingNumbers.In([.. Ratios(language.NumbersIn(text), text, figure, language)], text, language)
            .Where(number => !number.IsArticle && (figure.HasNumber || !SaidNothing.Is(number) || SaidNothing.OfTheUnit(number, text, figure, language)))
            .Select(number => SaidNumber.Of(number, figure, scale, !number.IsInLetters || SaidNothing.IsSurelyFalse(number, text, figure, language))),
    ];

    /// <summary>An end of the range that stands alone, or a margin that is not called so, reads as the figure.</summary>
    private static IEnumerable<SaidNumber> Alone(IReadOnlyList<SaidNumber> said, string words, ILanguage language) =>
        said is [{ As: SaidAs.Beside } one] && !words.Contains(language.Text("prose.word.margin"), StringComparison.OrdinalIgnoreCase)
            ? [one with { As = SaidAs.Other, IsSure = false }]
            : said;

    /// <summary>For a share or a rate, "7 in each 100" is one number, not two.</summary>
    private static IEnumerable<WrittenNumber> Ratios(IReadOnlyList<WrittenNumber> numbers, string text, AppraisedFigure figure, ILanguage language)
    {
        for (var at = 0; at < numbers.Count; at++)
            yield return at + 1 < numbers.Count && Base(figure) is { } inEach && IsOf(text[numbers[at].End..Math.Max(numbers[at].End, numbers[at + 1].Start)], language)
                ? Ratio(numbers[at], numbers[++at], inEach, text)
                : numbers[at];
    }

    private static decimal? Base(AppraisedFigure figure) => figure.Measure switch
    {
        { Kind: MeasureKind.Share } => InEach,
        { Kind: MeasureKind.Rate, Per: { } per } when per <= MostInEach => (decimal)per,
        _ => null,
    };

    /// <summary>"In each", "out of", perhaps behind a word for what is counted.</summary>
    private static bool IsOf(string between, ILanguage language) =>
        Regex.IsMatch(between, $@"^(?:\s+\p{{L}}+)?\s+(?:{NumberWords.AnyOf(language.Text("number.of").Split('|'))})\s+$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant);

    private static WrittenNumber Ratio(WrittenNumber part, WrittenNumber whole, decimal inEach, string text) => part with
    {
        Text = text[part.Start..whole.End],
        Value = whole.Value is >= 1 ? part.Value / whole.Value * inEach : null,
        Step = whole.Value is >= 1 ? StepOf(part, whole.Value.Value, whole.Step) * inEach : 1,
        IsInLetters = part.IsInLetters && whole.IsInLetters,
        Bound = part.Bound == NumberBound.None ? whole.Bound : part.Bound,
        Behind = "",
        End = whole.End,
    };

    /// <summary>"7 in 100" rounds the 7; "1 in 3" rounds the 3 as well, for "1 in 4" is the next that can be said.</summary>
    private static decimal StepOf(WrittenNumber part, decimal whole, decimal wholeStep)
    {
        var step = part.Step / whole;
        var isRound = whole == wholeStep;
        return isRound || part.Value is not { } value ? step : Math.Min(step, Math.Abs((value / whole) - (value / (whole + 1))));
    }
}
