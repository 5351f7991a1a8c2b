using ReleaseKit.Appraisal;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Prose;

/// <summary>The generated texts of citations, as HTML. Numbers in running text stand whole, without light digits.</summary>
internal sealed class CitationText(Release release, ILanguage language)
{
    /// <summary>The text of a form that is generated, linked to the figure.</summary>
    /// <param name="form">What is asked for.</param>
    /// <param name="figure">The figure.</param>
    /// <param name="href">Where it stands.</param>
    /// <param name="place">The words that its place asks for.</param>
    public string Of(CitationForm form, AppraisedFigure figure, string href, CitationPlace place) => form == CitationForm.Reading
        ? Reading(figure, href)
        : $"<a class=\"cite\" href=\"{HtmlText.Encode(href)}\">{Generated(form, figure, place.About)}{InEach(form, figure, place)}</a>";

    /// <summary>
    /// What follows the writer's own words: " (1,240 ± 19)" wherever they round the figure, else " (± 19)" at its first mention; nothing for a figure that
    /// needs neither.
    /// </summary>
    public string After(string words, AppraisedFigure figure, bool isFirst)
    {
        var isRounded = SaidNumbers.In(words, figure, release, language).Any(number => number.IsRounded);
        if (!isRounded && !isFirst)
            return "";
        var margin = figure.Main is { } range ? HtmlText.Encode(language.Margin(range.Printed)) : "";
        var text = (isRounded, margin) switch
        {
            (true, "") => Value(figure, about: ""),
            (true, _) => $"{Value(figure, about: "")}&#160;{margin}",
            (false, _) => margin,
        };
        return text.Length == 0 ? "" : $" <span class=\"cite-margin\">({text})</span>";
    }

    private static string InEach(CitationForm form, AppraisedFigure figure, CitationPlace place) =>
        figure is { HasNumber: true, Measure.Kind: MeasureKind.Share } && form != CitationForm.Margin && place.InEach.Length > 0 ? " " + HtmlText.Encode(place.InEach) : "";

    private string Generated(CitationForm form, AppraisedFigure figure, string about) => form switch
    {
        _ when !figure.HasNumber => HtmlText.Encode(FigureHtml.Status(figure, language)),
        CitationForm.Value => Value(figure, about),
        CitationForm.Margin => HtmlText.Encode(FigureHtml.Margin(figure, language)),
        CitationForm.Range => Range(figure, about),
        _ => ValueAndMargin(figure, about),
    };

    private string Value(AppraisedFigure figure, string about)
    {
        var before = figure.IsRoundedForPrint && about.Length > 0 ? HtmlText.Encode(about) + " " : "";
        return $"{before}<data value=\"{figure.Value}\">{HtmlText.Encode(language.NumberInProse(figure.Printed))}</data>";
    }

    private string ValueAndMargin(AppraisedFigure figure, string about)
    {
        var margin = HtmlText.Encode(FigureHtml.Margin(figure, language));
        return figure.Main is null ? $"{Value(figure, about)} ({margin})" : $"{Value(figure, about)}&#160;{margin}";
    }

    private string Range(AppraisedFigure figure, string about) => figure.Main is { } range
        ? HtmlText.Encode(language.Text(
            "prose.range",
            ("low", language.NumberInProse(range.Printed.Low)),
            ("high", language.NumberInProse(range.Printed.High))))
        : ValueAndMargin(figure, about);

    private string Reading(AppraisedFigure figure, string href)
    {
        var sentences = language.ReadingOf(figure).Sentences;
        var first = HtmlText.Encode(sentences[0].Text);
        var others = string.Concat(sentences.Skip(1).Select(sentence => " " + HtmlText.Encode(sentence.Text)));
        return $"<span class=\"reading\"><a class=\"cite\" href=\"{HtmlText.Encode(href)}\">{first}</a>{others}</span>";
    }
}
