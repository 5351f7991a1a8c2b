using ReleaseKit.Appraisal;
using ReleaseKit.Charts;
using ReleaseKit.Releases;
using ReleaseKit.Wording;
using Scriban.Runtime;

namespace ReleaseKit.Pages.Home;

/// <summary>A headline as the home page's template sees it.</summary>
internal static class HeadlineModel
{
    // Printed characters up to which a number is set at full size, and up to which at the middle size.
    private const int Short = 7;
    private const int Middle = 11;

    public static ScriptObject Of(SiteContext context, Headline headline, bool isLeading)
    {
        var language = context.Language;
        var figure = context.Appraised.FigureAt(headline.Address);
        return new ScriptObject
        {
            ["title"] = headline.Title is { } title ? context.In(title) : FigureName.Of(figure, language),
            ["meaning"] = headline.Meaning is { } meaning ? context.In(meaning) : null,
            ["href"] = Link.From(PageMap.Home, context.Pages.Of(figure.Ref)),
            ["number"] = new RawHtml(figure.HasNumber ? FigureHtml.Number(figure, language) : HtmlText.Encode(FigureHtml.Status(figure, language))),
            ["size"] = SizeOf(language.Number(figure.Printed)),
            ["unit"] = figure.HasNumber ? language.UnitOf(figure.Measure, figure.Printed) : "",
            ["margin"] = figure.HasNumber ? FigureHtml.Margin(figure, language) : "",
            ["lozenge"] = new RawHtml(FigureHtml.Lozenge(figure, language)),
            ["mark"] = new RawHtml(!figure.HasNumber ? "" : isLeading ? Marks.Hero(figure, language) : Marks.Line(figure, language)),
            ["sentences"] = Sentences(language.ReadingOf(figure), figure),
        };
    }

    /// <summary>Long numbers are set smaller, so that they stay in their column and on a phone.</summary>
    private static string SizeOf(string number) => number.Length switch
    {
        <= Short => "",
        <= Middle => " is-long",
        _ => " is-longest",
    };

    /// <summary>The value stands in large digits beside; where it was rounded for them, or there is nothing else to say, its sentence says it.</summary>
    private static string Sentences(Wording.Reading reading, AppraisedFigure figure)
    {
        var rest = reading.Sentences.Where(sentence => sentence.Part != ReadingPart.Value || figure.IsRoundedForPrint).Select(sentence => sentence.Text).ToList();
        return rest.Count > 0 && figure.HasNumber ? string.Join(' ', rest) : reading.Text;
    }
}
