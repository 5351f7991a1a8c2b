using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts.Ordered;

/// <summary>What is said about an ordered chart: its caption, sentence by sentence, and its description for those who do not see it.</summary>
public sealed record OrderedWords(IReadOnlyList<string> Caption, string Description)
{
    public static OrderedWords Of(OrderedFigures figures, ILanguage language)
    {
        string[] caption = [.. Sentences(figures, language)];
        var description = language.Text("charts.ordered.description", ("count", Count(figures.Rows.Count, language)));
        return new OrderedWords(caption, description);
    }

    private static IEnumerable<string> Sentences(OrderedFigures figures, ILanguage language)
    {
        var withMargin = figures.Rows.Select(row => row.Figure.Main).OfType<FigureRange>().ToList();
        yield return language.Text("charts.ordered.order");
        if (withMargin.Count > 0)
        {
            yield return language.Text(IsMoreThanNominal(figures) ? "charts.ordered.bar-at-least" : "charts.ordered.bar", ("share", language.Share(withMargin[0].Coverage)));
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

    /// <summary>Whether some range attains more than its nominal coverage, so that words say "at least".</summary>
    public static bool IsMoreThanNominal(OrderedFigures figures) =>
        figures.Rows.Any(row => row.Figure.Main is { } range && range.Attained > range.Coverage.Share + Tie);

    // The tie rule of the margins.
    private const double Tie = 1e-12;

    private static string Count(int count, ILanguage language) => language.Number(new Releases.PublishedValue(count, 0));
}
