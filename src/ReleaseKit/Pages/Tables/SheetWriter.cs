using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Charts;

namespace ReleaseKit.Pages.Tables;

/// <summary>Writes the sheet of one page: boxhead, rows, and under each row the folded readings of its figures.</summary>
internal sealed class SheetWriter(Sheet sheet, TablePage page, PageScales scales, PageDrawings drawings, PrintNotes notes, HtmlWriter html)
{
    private readonly IReadOnlyList<SheetAxis> axes = [.. sheet.Shown.Select(measure => SheetAxis.Of(sheet, scales.HeadOf(measure)))];
    private readonly List<string> bars = [];
    private readonly ReadingPanel panels = new(sheet, drawings.Curves, html);

    private int Columns => sheet.Stub.Width + (3 * sheet.Shown.Count);

    public void Write(IReadOnlyList<SheetRow> rows)
    {
        html.Raw("<div class=\"scroll sheet-scroll"u8).Raw(SheetBreadth.Of(sheet)).Raw(sheet.Shown.Count == 1 ? " one"u8 : ""u8).Raw("\" role=\"region\" aria-labelledby=\"cap\" tabindex=\"0\">\n<table class=\"sheet"u8)
            .Raw(sheet.Stub.IsHierarchy ? " tree"u8 : ""u8).Raw("\"><caption id=\"cap\">"u8)
            .Raw("<span class=\"vh\">"u8).Text(SheetHeadModel.TitleOf(sheet, page)).Raw("</span></caption>\n"u8);
        bars.AddRange(axes.Select((axis, index) => SheetBreadth.BarsOf(sheet, index + 1, axis)));
        WriteColumns();
        SheetBoxhead.Write(sheet, axes, html);
        WriteRows(rows);
        html.Raw("</table></div>\n"u8);
    }

    private void WriteColumns()
    {
        for (var column = 0; column < sheet.Stub.Width; column++)
            html.Raw("<col class=\"c-stub\">"u8);
        for (var column = 1; column <= sheet.Shown.Count; column++)
            html.Raw("<col class=\"c-v"u8).Raw(KeyOf(column)).Raw(sheet.Widths[column - 1].FigureClass)
                .Raw("\"><col class=\"c-mg"u8).Raw(KeyOf(column)).Raw(sheet.Widths[column - 1].MarginClass)
                .Raw("\"><col class=\"c-b"u8).Raw(KeyOf(column)).Raw(axes[column - 1].WidthClass).Raw(bars[column - 1]).Raw("\">"u8);
        html.Raw("\n"u8);
    }

    private void WriteRows(IReadOnlyList<SheetRow> rows)
    {
        int? before = null;
        foreach (var row in rows)
        {
            if (sheet.Stub.BeginsGroup(row.Row, before))
                html.Raw(before is null ? "<tbody>\n"u8 : "</tbody><tbody>\n"u8);
            if (before is null && sheet.Stub.GroupOf(row) is { } group)
                WriteContinued(group);
            WriteRow(row, before);
            before = row.Row;
        }
        html.Raw(before is null ? ""u8 : "</tbody>"u8);
    }

    /// <summary>Over a page that begins within a group, whose own row stands on the page before.</summary>
    private void WriteContinued(string group) => html
        .Raw("<tr class=\"band\"><th scope=\"rowgroup\" class=\"stub\" colspan=\""u8).Raw(Number(Columns)).Raw("\"><span class=\"rn\"></span><span class=\"nm\">"u8)
        .Text(sheet.Text("tables.part.continued", ("heading", group))).Raw("</span></th></tr>\n"u8);

    private void WriteRow(SheetRow row, int? before)
    {
        var figures = sheet.Shown.Select(measure => sheet.Figure(measure, row.Row)).ToList();
        html.Raw(row.Kind switch { RowKind.Item => "<tr>"u8, RowKind.Group => "<tr class=\"band\">"u8, _ => "<tr class=\"band total\">"u8 });
        WriteHeadings(row, before);
        for (var column = 1; column <= figures.Count; column++)
            WriteFigure(figures[column - 1], column, row);
        html.Raw("</tr>\n<tr class=\"unfold\"><td colspan=\""u8).Raw(Number(Columns)).Raw("\">"u8);
        foreach (var figure in figures)
            panels.Write(figure, row);
        html.Raw("</td></tr>\n"u8);
    }

    private void WriteHeadings(SheetRow row, int? before)
    {
        var isRepeated = before is { } previous && !sheet.Stub.IsHierarchy;
        for (var index = 0; index < row.Headings.Count; index++)
        {
            isRepeated = isRepeated && sheet.Table.Stub[index].Codes[row.Row] == sheet.Table.Stub[index].Codes[before!.Value];
            html.Raw("<th scope=\""u8).Raw(row.Kind != RowKind.Item && sheet.Stub.IsHierarchy ? "rowgroup"u8 : "row"u8).Raw("\" class=\"stub"u8)
                .Raw(isRepeated && index < row.Headings.Count - 1 ? " again"u8 : ""u8).Raw("\">"u8);
            if (index == 0)
                html.Raw("<span class=\"rn\">"u8).Raw(Number(row.Number)).Raw("</span>"u8);
            html.Raw("<span class=\"nm\">"u8).Text(row.Headings[index]);
            if (index == row.Headings.Count - 1)
                WriteNoteMark(sheet.Notes.OfRow(row.Row));
            html.Raw("</span></th>"u8);
        }
    }

    private void WriteFigure(AppraisedFigure figure, int column, SheetRow row)
    {
        var key = KeyOf(column);
        var note = notes.NumberFor(figure, row);
        if (!figure.HasNumber)
        {
            html.Raw("<td class=\"none"u8).Raw(key).Raw("\" colspan=\"3\"><a class=\"fig\" href=\"#"u8).Raw(figure.Id).Raw("\">"u8).Text(FigureHtml.Status(figure, sheet.Language)).Raw("</a>"u8);
            WriteMarks(figure, note);
            html.Raw("</td>"u8);
            return;
        }
        html.Raw("<td class=\"v"u8).Raw(key).Raw("\"><a class=\"fig\" href=\"#"u8).Raw(figure.Id).Raw("\">"u8).Raw(FigureHtml.Number(figure, sheet.Language)).Raw("</a></td><td class=\"mg"u8)
            .Raw(key).Raw("\">"u8).Text(FigureHtml.Margin(figure, sheet.Language)).Raw(FigureHtml.Lozenge(figure, sheet.Language));
        WriteMarks(figure, note);
        html.Raw("</td><td class=\"b"u8).Raw(key).Raw(bars[column - 1]).Raw("\">"u8);
        WriteBar(figure);
        html.Raw("</td>"u8);
    }

    private void WriteMarks(AppraisedFigure figure, int? printNote)
    {
        WriteNoteMark(sheet.Notes.OfFigure(figure.Ref.Measure, figure.Row));
        if (printNote is { } number)
            html.Raw("<sup class=\"pn\">"u8).Raw(Number(number)).Raw("</sup>"u8);
    }

    private void WriteNoteMark(string mark)
    {
        if (mark.Length > 0)
            html.Raw("<sup class=\"nt\">"u8).Text(mark).Raw("</sup>"u8);
    }

    private void WriteBar(AppraisedFigure figure)
    {
        var scale = scales.Of(figure.Ref.Measure, figure.Row);
        var mark = drawings.Cells.Draw(MarkSubject.Of(figure), scale.Scale);
        if (scale.IsOwn)
            html.Raw("<span class=\"own\" aria-hidden=\"true\"><svg class=\"bar\"><use href=\"#ow\"/>"u8).Raw(mark).Raw("</svg><i>"u8)
                .Text(sheet.Language.Number(scale.FromLabel!.Value)).Raw("</i><i>"u8).Text(sheet.Language.Number(scale.ToLabel!.Value)).Raw("</i></span>"u8);
        else
            html.Raw("<svg class=\"bar\" aria-hidden=\"true\">"u8).Raw(mark).Raw("</svg>"u8);
    }

    /// <summary>The class by which a narrow screen shows one measure at a time.</summary>
    private static string KeyOf(int column) => " k" + Number(column);

    private static string Number(int number) => number.ToString(CultureInfo.InvariantCulture);
}
