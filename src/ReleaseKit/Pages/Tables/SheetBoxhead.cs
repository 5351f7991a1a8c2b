using ReleaseKit.Charts;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Tables;

/// <summary>The boxhead: each measure with its unit, below it figure, margin and the ticks of the scale that its parts share.</summary>
internal static class SheetBoxhead
{
    private const double PixelsOfRem = 16;
    private const double NarrowestColumn = PixelsOfRem;
    private const int MostRem = 24;

    public static void Write(Sheet sheet, IReadOnlyList<SheetAxis> axes, HtmlWriter html)
    {
        html.Raw("<thead><tr>"u8);
        foreach (var head in sheet.Stub.Heads)
            html.Raw("<th scope=\"col\" rowspan=\"2\" class=\"stub\">"u8).Text(head).Raw("</th>"u8);
        for (var column = 1; column <= sheet.Shown.Count; column++)
            WriteMeasure(sheet, html, sheet.Table.Measures[sheet.Shown[column - 1]], column);
        html.Raw("</tr>\n<tr class=\"heads\">"u8);
        for (var column = 1; column <= sheet.Shown.Count; column++)
            WriteParts(sheet, html, axes[column - 1], column);
        html.Raw("</tr></thead>\n"u8);
    }

    private static void WriteMeasure(Sheet sheet, HtmlWriter html, Measure measure, int column) => html
        .Raw("<th scope=\"colgroup\" colspan=\"3\" class=\"meas k"u8).Raw(Sheet.Digits(column)).Raw("\"><a href=\"#"u8).Raw(Sheet.AboutId(measure)).Raw("\">"u8)
        .Text(measure.Title.In(sheet.Language.Tag)).Raw("</a><span class=\"u\">"u8).Text(UnitWords.Many(measure, sheet.Language)).Raw("</span></th>"u8);

    private static void WriteParts(Sheet sheet, HtmlWriter html, SheetAxis axis, int column)
    {
        var key = " k" + Sheet.Digits(column);
        html.Raw("<th scope=\"col\" class=\"v"u8).Raw(key).Raw("\">"u8).Text(sheet.Text("tables.figure"))
            .Raw("</th><th scope=\"col\" class=\"mg"u8).Raw(key).Raw("\">"u8).Text(sheet.Text("tables.margin"))
            .Raw("</th><th scope=\"col\" class=\"b"u8).Raw(key).Raw(SheetBreadth.BarsOf(sheet, column, axis)).Raw("\"><span class=\"vh\">"u8).Text(sheet.Text("tables.bar")).Raw("</span>"u8);
        WriteAxis(html, axis);
        html.Raw("</th>"u8);
    }

    private static void WriteAxis(HtmlWriter html, SheetAxis axis)
    {
        html.Raw("<span class=\"ax\"><svg class=\"bar axis\" aria-hidden=\"true\">"u8);
        foreach (var tick in axis.Ticks)
            WriteTick(html, tick);
        html.Raw("</svg></span>"u8);
    }

    private static void WriteTick(HtmlWriter html, SheetTick tick)
    {
        var x = CellMark.Percent(tick.Place);
        html.Raw("<g"u8).Raw(ClassOf(tick)).Raw("><line class=\"axtick\" x1=\""u8).Raw(x).Raw("\" x2=\""u8).Raw(x).Raw("\" y1=\"16\" y2=\"22\"/><text class=\"axlab"u8)
            .Raw(tick.Anchor).Raw("\" x=\""u8).Raw(x).Raw("\" y=\"12\">"u8).Text(tick.Label).Raw("</text></g>"u8);
    }

    /// <summary>The class by which a tick goes where its column is too narrow, in steps that the style sheet knows.</summary>
    private static string ClassOf(SheetTick tick) => tick.Room <= NarrowestColumn
        ? ""
        : $" class=\"t{Sheet.Digits(Math.Min(MostRem, (int)Math.Ceiling(tick.Room / PixelsOfRem)))}\"";
}
