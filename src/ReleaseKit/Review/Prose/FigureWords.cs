using ReleaseKit.Appraisal;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Review.Prose;

/// <summary>A figure as messages about prose name it.</summary>
internal sealed record FigureWords(AppraisedFigure Figure, ILanguage Language)
{
    /// <summary>"arrears/in_arrears?ward=All is 1,422 (± 36)", with its range.</summary>
    public string NameIs => $"{KeyProblems.Cut(Figure.Address)} {Is}";

    /// <summary>"is 1,422 (± 36)", with its range.</summary>
    public string Is => Figure switch
    {
        { HasNumber: false } => "has no published number",
        { Main.Printed: { } range } => $"is {Number} ({Plain(Language.Margin(range))}); its range is {Plain(Language.NumberInProse(range.Low))} to {Plain(Language.NumberInProse(range.High))}",
        _ => $"is {Number}",
    };

    public string Number => Plain(Language.NumberInProse(Figure.Printed));

    /// <summary>The bounds that the whole range keeps, with the unit: "at least 1,386 households or at most 1,458 households"; empty without a range.</summary>
    public string Bounds => Figure.Main is { Printed: var range } ? $"at least {WithUnit(range.Low)} or at most {WithUnit(range.High)}" : "";

    private string WithUnit(PublishedValue value) => Plain(Language.WithUnit(value, Figure.Measure));

    /// <summary>A number with every mark that the language writes in numbers: "1,234.5".</summary>
    public string Marks => Plain(Language.NumberInProse(new(12345, 1)));

    private static string Plain(string text) => text.Replace(Numerals.NoBreak, ' ');
}
