using ReleaseKit.Appraisal;
using ReleaseKit.Charts;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages.Tables;

/// <summary>
/// A figure unfolded: its sentences, its ranges, the curve of its noise, its own link. It stands in a folded row under the figure's row, in a details element whose
/// content bears the figure's id, so that going to that address opens it; what has been opened stays open.
/// </summary>
internal sealed class ReadingPanel(Sheet sheet, CurveMark curves, HtmlWriter html)
{
    private const int MostDecimals = 8;

    // What figures alike have in common stands together and what differs last, so that a page of readings stays small on its way to the reader.
    public void Write(AppraisedFigure figure, SheetRow row)
    {
        html.Raw("<details><summary><b>"u8).Text(row.Name).Raw("</b> <span>"u8).Text(figure.Measure.Title.In(sheet.Language.Tag))
            .Raw("</span></summary><div class=\"panel\" id=\""u8).Raw(figure.Id).Raw("\"><p class=\"panel-links\"><a href=\"#"u8).Raw(figure.Id).Raw("\">"u8)
            .Text(sheet.Text("tables.permalink")).Raw("</a> <a href=\"#"u8).Raw(Sheet.AboutId(figure.Measure)).Raw("\">"u8).Text(sheet.Text("tables.about")).Raw("</a></p>"u8);
        WriteSentences(sheet.Language.ReadingOf(figure));
        if (figure.Ranges.Count > 0)
            WriteRanges(figure);
        if (figure.Main is not null && MarkSubject.Of(figure) is { Density: not null } subject)
            html.Raw("<figure><figcaption>"u8).Text(sheet.Text("tables.curve")).Raw("</figcaption>"u8).Raw(curves.Draw(figure, subject, sheet.Language)).Raw("</figure>"u8);
        html.Raw("</div></details>"u8);
    }

    private void WriteSentences(Wording.Reading reading)
    {
        WriteParagraph("<p class=\"say\">"u8, Joined(reading, part => part <= ReadingPart.Noise));
        WriteParagraph("<p>"u8, Joined(reading, part => part > ReadingPart.Noise));
    }

    private void WriteParagraph(ReadOnlySpan<byte> start, string text)
    {
        if (text.Length > 0)
            html.Raw(start).Text(text).Raw("</p>"u8);
    }

    private static string Joined(Wording.Reading reading, Func<ReadingPart, bool> isWanted) =>
        string.Join(' ', reading.Sentences.Where(sentence => isWanted(sentence.Part)).Select(sentence => sentence.Text));

    // What HTML lets one leave out is left out here, where it would stand a thousand times a page: end tags, and scopes that follow from the table's form.
    private void WriteRanges(AppraisedFigure figure)
    {
        var standsForSmall = figure.Promise is RangePromise.ZeroForSmall;
        html.Raw("<table class=\"ranges\"><tr><th>"u8).Text(sheet.Text(standsForSmall ? "tables.ranges.zero" : "tables.ranges"));
        foreach (var range in figure.Ranges)
            html.Raw("<th>"u8).Text(sheet.Language.Share(range.Coverage));
        if (standsForSmall)
            WriteRangeRow(figure, "tables.ranges.zeroed", range => sheet.Language.Number(RestInHundred(range)));
        else
        {
            WriteRangeRow(figure, "tables.margin", range => sheet.Language.Margin(range.Printed));
            WriteRangeRow(figure, "tables.ranges.attained" + PromiseKey.Of(figure.Promise), range => sheet.Language.Number(AttainedInHundred(range)));
        }
        WriteRangeRow(figure, "tables.ranges.from", range => sheet.Language.Number(range.Printed.Low));
        WriteRangeRow(figure, "tables.ranges.to", range => sheet.Language.Number(range.Printed.High));
        html.Raw("</table>"u8);
    }

    private void WriteRangeRow(AppraisedFigure figure, string key, Func<FigureRange, string> text)
    {
        html.Raw("<tr><th>"u8).Text(sheet.Text(key));
        foreach (var range in figure.Ranges)
            html.Raw("<td>"u8).Text(text(range));
    }

    /// <summary>Of 100 values above the range of a 0, how many at most become 0; rounded up.</summary>
    private static PublishedValue RestInHundred(FigureRange range) => PublishedValue.Of(100 - AttainedInHundred(range).ToDecimal());

    /// <summary>The attained coverage of 100 cases, rounded down, with as many decimals as it takes not to fall below the one that is named.</summary>
    private static PublishedValue AttainedInHundred(FigureRange range)
    {
        var named = Math.Min((decimal)range.Coverage.Share, (decimal)range.Attained);
        for (byte decimals = 1; ; decimals++)
        {
            var attained = new PublishedValue((long)Math.Floor(Math.Round(range.Attained * 100 * PublishedValue.PowerOfTen(decimals), 9 - decimals)), decimals);
            if (decimals == MostDecimals || attained.ToDecimal() >= named * 100)
                return attained;
        }
    }
}
