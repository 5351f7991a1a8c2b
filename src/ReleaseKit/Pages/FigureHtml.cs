using System.Text;
using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages;

/// <summary>A figure as it stands on pages: heavy and light digits, the exact published value for machines, its margin, and the mark of a weak figure.</summary>
public static class FigureHtml
{
    /// <summary>The number in heavy and light digits; the whole number once for screen readers. Its value attribute holds the published value exactly.</summary>
    public static string Number(AppraisedFigure figure, ILanguage language)
    {
        var text = language.Number(figure.Printed);
        return Data(figure, figure.Main is { } range ? LightDigits.Of(text, range.Printed) : new(text, ""));
    }

    /// <summary>The margin, or the word that stands in its place for a figure without one: plain text.</summary>
    public static string Margin(AppraisedFigure figure, ILanguage language) => figure.Main is { } range
        ? language.Margin(range.Printed)
        : language.Text(figure.Reliability switch
        {
            Reliability.Exact => "figure.exact",
            Reliability.Public => "figure.public",
            _ => "figure.no-margin",
        });

    /// <summary>The lozenge of a weak figure with its word for screen readers; nothing for any other.</summary>
    public static string Lozenge(AppraisedFigure figure, ILanguage language) =>
        figure.Reliability == Reliability.Weak ? $"<span class=\"lz\"><span class=\"vh\">{HtmlText.Encode(language.Text("figure.weak"))}</span></span>" : "";

    /// <summary>The words of a cell without a number: hidden, not collected, cannot exist, not available, or below the level for publication.</summary>
    public static string Status(AppraisedFigure figure, ILanguage language) => language.Text(figure.Case.First == SpecialCase.NotPublishedBelow
        ? "figure.status.below-level"
        : figure.Status switch
        {
            'Q' => "figure.status.hidden",
            'L' => "figure.status.not-collected",
            'M' => "figure.status.cannot-exist",
            _ => "figure.status.not-available",
        });

    /// <summary>A number cut into digits, without a figure behind it (the key, sums).</summary>
    public static string Digits(LightDigits digits)
    {
        var html = new StringBuilder();
        if (digits.Heavy.Length > 0 && digits.Light.Length > 0)
            html.Append("<span aria-hidden=\"true\">").Append(Span("firm", digits.Heavy)).Append(Span("soft", digits.Light)).Append("</span>")
                .Append(Span("vh", digits.Heavy + digits.Light));
        else
            html.Append(digits.Light.Length > 0 ? Span("soft", digits.Light) : Span("firm", digits.Heavy));
        return html.ToString();
    }

    private static string Data(AppraisedFigure figure, LightDigits digits) => $"<data class=\"num\" value=\"{figure.Value}\">{Digits(digits)}</data>";

    private static string Span(string kind, string text) => $"<span class=\"{kind}\">{HtmlText.Encode(text)}</span>";
}
