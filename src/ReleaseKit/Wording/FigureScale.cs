using ReleaseKit.Appraisal;

namespace ReleaseKit.Wording;

/// <summary>The scale that the unit of a figure brings along ("thousand crowns"), so that 4.62 million crowns can say 4,620.</summary>
internal sealed class FigureScale(AppraisedFigure figure, ILanguage language)
{
    private readonly IReadOnlyList<string> units = FigureTexts.Units(figure, language);

    /// <summary>What a number may say in the unit of the figure: one reading, mostly.</summary>
    public IEnumerable<WrittenNumber> Readings(WrittenNumber number)
    {
        var unit = units.Max(ScaleOf);
        if (unit == 1 || number.Scale != 1 || number.IsInLetters)
            yield return Divided(number, unit);
        else
            foreach (var by in new[] { 1, unit })
                yield return Divided(number, by);
        if (number.ScaleWord.Length > 0 && units.Any(form => form.StartsWith(number.ScaleWord, StringComparison.OrdinalIgnoreCase)))
            yield return Divided(number, number.Scale);
    }

    // The language reads the scale behind any number.
    private decimal ScaleOf(string unit) => language.NumbersIn($"1 {unit}") is [{ Start: 0, Scale: var scale }, ..] ? scale : 1;

    private static WrittenNumber Divided(WrittenNumber number, decimal by) => number with { Value = number.Value / by, Step = number.Step / by };
}
