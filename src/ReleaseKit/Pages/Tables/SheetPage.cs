using ReleaseKit.Charts;

namespace ReleaseKit.Pages.Tables;

/// <summary>One page of a table: what stands above, the sheet with its readings, what stands below, the notes for paper, and the drawings that marks use.</summary>
internal static class SheetPage
{
    public static void Write(Sheet sheet, TablePage page, int firstNumber, SiteFolder site)
    {
        var head = HeadOf(sheet, page);
        var drawings = new PageDrawings();
        var notes = new PrintNotes(sheet);
        var rows = sheet.Stub.Rows(page.Rows, firstNumber).ToList();
        using var html = sheet.Site.Open(site, head);
        html.Raw(sheet.Site.Templates.Render("table-head.html", SheetHeadModel.Of(sheet, page)));
        new SheetWriter(sheet, page, PageScales.Of(sheet, rows), drawings, notes, html).Write(rows);
        html.Raw(sheet.Site.Templates.Render("table-foot.html", SheetFootModel.Of(sheet, page, notes)));
        drawings.Write(html);
    }

    private static PageHead HeadOf(Sheet sheet, TablePage page) =>
        new(page.Path, SheetHeadModel.TitleOf(sheet, page), SiteSection.Tables) { Table = sheet.Index };
}

/// <summary>The drawings of one page that its marks and curves use, written once at its end.</summary>
internal sealed class PageDrawings
{
    private readonly MarkSymbols marks = CellMark.SymbolsOfPage();
    private readonly MarkSymbols curves = CurveMark.SymbolsOfPage();

    public PageDrawings() => (Cells, Curves) = (new(marks), new(curves));

    public CellMark Cells { get; }

    public CurveMark Curves { get; }

    public void Write(HtmlWriter html) => html
        .Raw("<svg class=\"defs\" width=\"0\" height=\"0\" aria-hidden=\"true\"><defs>"u8)
        .Raw(CellMark.Common).Raw(marks.Definitions()).Raw(curves.Definitions())
        .Raw("</defs></svg>"u8);
}
