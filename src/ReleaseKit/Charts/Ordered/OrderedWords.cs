using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts.Ordered;

/// <summary>What is said about an ordered chart: its caption, sentence by sentence, and its description for those who do not see it.</summary>
/// <param name="Caption">The sentences under the picture.</param>
/// <param name="Description">The description of the picture alone.</param>
/// <param name="DescriptionInPage">The same where the table of its figures stands beside it.</param>
public sealed record OrderedWords(IReadOnlyList<string> Caption, string Description, string DescriptionInPage)
{
    public static OrderedWords Of(OrderedFigures figures, ILanguage language)
    {
        string[] caption = [.. Sentences(figures, language)];
        var description = language.Text("charts.ordered.description", ("count", Count(figures.Rows.Count, language)));
        return new OrderedWords(caption, description, $"{description} {language.Text("charts.ordered.description.table")}");
    }

    private static IEnumerable<string> Sentences(OrderedFigures figures, ILanguage language)
    {
        var withMargin = figures.Rows.Select(row => row.Figure.Main).OfType<FigureRange>().ToList();
        yield return language.Text("charts.ordered.order");
        if (withMargin.Count > 0)
        {
            yield return language.Text("charts.ordered.bar" + PromiseOf(figures), ("cases", language.Cases(withMargin[0].Coverage, IsMoreThanNominal(figures))));
            if (figures.Rows.Any(row => row.Figure is { Main: not null, Promise: RangePromise.ZeroForSmall }))
                yield return language.Text("charts.ordered.zero", ("cases", language.CasesOfZero(withMargin[0].Coverage)));
            yield return language.Text("charts.ordered.neighbours");
            yield return language.Text("charts.ordered.overlap");
        }

        if (figures.Rows.Any(row => row.Figure.Main is null))
            yield return language.Text("charts.ordered.stroke-alone");
        if (figures.Rows.Any(row => row.IsWeak))
            yield return language.Text("charts.ordered.weak");
        if (figures.Rows.Any(row => row.Subject is { IsStemAlone: false } subject && subject.Body.Low < subject.Lowest))
            yield return language.Text("charts.ordered.dashed");
        if (figures.WithoutNumber.Count > 0)
            yield return language.Text(figures.WithoutNumber.Count == 1 ? "charts.ordered.without-number.one" : "charts.ordered.without-number.other",
                ("count", Count(figures.WithoutNumber.Count, language)));
    }

    /// <summary>Whether the reading of some figure says "at least", so that a sentence about all of them does.</summary>
    public static bool IsMoreThanNominal(OrderedFigures figures) =>
        figures.Rows.Any(row => row.Figure.Main is { } range && row.Figure.HoldsAtLeast(range));

    /// <summary>What is put behind the key of a sentence about all of them: among which figures it holds.</summary>
    public static string PromiseOf(OrderedFigures figures) => PromiseKey.OfAll(figures.Rows.Select(row => row.Figure));

    private static string Count(int count, ILanguage language) => language.Number(new Releases.PublishedValue(count, 0));
}
