using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Prose;

/// <summary>The generated texts of citations, as HTML. Numbers in running text stand whole, without light digits.</summary>
internal sealed class CitationText(ILanguage language)
{
    /// <summary>The text of a form that is generated, linked to the figure.</summary>
    public string Of(CitationForm form, AppraisedFigure figure, string href) => form == CitationForm.Reading
        ? Reading(figure, href)
        : $"<a class=\"cite\" href=\"{HtmlText.Encode(href)}\">{Generated(form, figure)}</a>";

    /// <summary>What follows the writer's own words: " (± 19)"; nothing for a figure without a margin.</summary>
    public string MarginAfter(AppraisedFigure figure) => figure.Main is { } range
        ? $" <span class=\"cite-margin\">({HtmlText.Encode(language.Margin(range.Printed))})</span>"
        : "";

    private string Generated(CitationForm form, AppraisedFigure figure) => form switch
    {
        _ when !figure.HasNumber => HtmlText.Encode(FigureHtml.Status(figure, language)),
        CitationForm.Value => Value(figure),
        CitationForm.Margin => HtmlText.Encode(FigureHtml.Margin(figure, language)),
        CitationForm.Range => Range(figure),
        _ => ValueAndMargin(figure),
    };

    private string Value(AppraisedFigure figure) =>
        $"<data value=\"{figure.Value}\">{HtmlText.Encode(language.NumberInProse(figure.Main?.Printed.Value ?? figure.Value))}</data>";

    private string ValueAndMargin(AppraisedFigure figure)
    {
        var margin = HtmlText.Encode(FigureHtml.Margin(figure, language));
        return figure.Main is null ? $"{Value(figure)} ({margin})" : $"{Value(figure)}&#160;{margin}";
    }

    private string Range(AppraisedFigure figure) => figure.Main is { } range
        ? HtmlText.Encode(language.Text(
            "prose.range",
            ("low", language.NumberInProse(range.Printed.Low)),
            ("high", language.NumberInProse(range.Printed.High))))
        : ValueAndMargin(figure);

    private string Reading(AppraisedFigure figure, string href)
    {
        var sentences = language.ReadingOf(figure).Sentences;
        var first = HtmlText.Encode(sentences[0].Text);
        var others = string.Concat(sentences.Skip(1).Select(sentence => " " + HtmlText.Encode(sentence.Text)));
        return $"<span class=\"reading\"><a class=\"cite\" href=\"{HtmlText.Encode(href)}\">{first}</a>{others}</span>";
    }
}
