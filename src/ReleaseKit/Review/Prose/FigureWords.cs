using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Review.Prose;

/// <summary>A figure as messages about prose name it.</summary>
internal sealed record FigureWords(AppraisedFigure Figure, ILanguage Language)
{
    /// <summary>"is 1,422 (± 36)", with its range.</summary>
    public string Is => Figure switch
    {
        { HasNumber: false } => "has no published number",
        { Main.Printed: { } range } => $"is {Number} ({Plain(Language.Margin(range))}); its range is {Plain(Language.NumberInProse(range.Low))} to {Plain(Language.NumberInProse(range.High))}",
        _ => $"is {Number}",
    };

    public string Number => Plain(Language.NumberInProse(Figure.Printed));

    private static string Plain(string text) => text.Replace(Numerals.NoBreak, ' ');
}
