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
        : $"<a class=\"cite\" href=\"{HtmlText.Encode(href)}\">{Generated(form, figure, place.About)}{Base(form, figure, place)}</a>";

    /// <summary>
    /// What follows the writer's own words: " (± 19)" at the first mention if they say the figure, " (1,240 ± 19)" there if they do not, and wherever they
    /// round it or bound it; nothing for a figure that needs neither.
    /// </summary>
    public string After(string words, AppraisedFigure figure, bool isFirst, CitationPlace place)
    {
        var said = SaidNumbers.In(words, figure, release, language);
        var text = (IsThere: said.Any(number => number.IsTheFigure) && !said.Any(number => number.IsRoundedMargin), IsNeeded: said.Any(number => number.NeedsTheFigure), isFirst) switch
        {
            (IsThere: true, _, isFirst: true) => said.Any(number => number.IsTheMargin) ? "" : MarginAlone(figure),
            (IsThere: false, IsNeeded: true, _) => WithMargin(figure, place),
            (IsThere: false, _, isFirst: true) when figure.Main is not null => WithMargin(figure, place),
            _ => "",
        };
        return text.Length == 0 ? "" : $" <span class=\"cite-margin\">({text})</span>";
    }

    private string MarginAlone(AppraisedFigure figure) => figure.Main switch
    {
        null => "",
        { Printed.IsUneven: true } => Range(figure, about: ""),
        var range => HtmlText.Encode(language.Margin(range.Printed)),
    };

    private string WithMargin(AppraisedFigure figure, CitationPlace place) => figure.Main switch
    {
        null => Value(figure, about: ""),
        { Printed.IsUneven: true } => $"{Value(figure, about: "")}, {Range(figure, about: "")}",
        _ => ValueAndMargin(figure, about: ""),
    } + Base(CitationForm.ValueAndMargin, figure, place);

    private static string Base(CitationForm form, AppraisedFigure figure, CitationPlace place) =>
        figure.HasNumber && form != CitationForm.Margin && place.Base.Length > 0 ? " " + HtmlText.Encode(place.Base) : "";

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

    /// <summary>An uneven margin is said by its range: "31 (0 to 45)".</summary>
    private string ValueAndMargin(AppraisedFigure figure, string about) => figure.Main switch
    {
        null => $"{Value(figure, about)} ({HtmlText.Encode(FigureHtml.Margin(figure, language))})",
        { Printed.IsUneven: true } => $"{Value(figure, about)} ({Range(figure, about)})",
        _ => $"{Value(figure, about)}&#160;{HtmlText.Encode(FigureHtml.Margin(figure, language))}",
    };

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
