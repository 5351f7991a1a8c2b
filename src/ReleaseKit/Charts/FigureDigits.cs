using ReleaseKit.Appraisal;
using ReleaseKit.Wording;

namespace ReleaseKit.Charts;

/// <summary>A figure in print for pictures: heavy digits, light digits, and its margin or why it has none.</summary>
internal static class FigureDigits
{
    public static (string Heavy, string Light, string Margin) Of(AppraisedFigure figure, ILanguage language)
    {
        if (figure.Main?.Printed is not { } printed)
            return (language.Number(figure.Printed), "", WithoutMargin(figure, language));
        var digits = LightDigits.Of(language.Number(printed.Value), printed);
        return (digits.Heavy, digits.Light, language.Margin(printed));
    }

    private static string WithoutMargin(AppraisedFigure figure, ILanguage language) => language.Text(figure.Reliability switch
    {
        Reliability.Exact => "charts.exact",
        Reliability.Public => "charts.public",
        _ => "charts.no-margin",
    });
}
