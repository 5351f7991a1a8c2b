using System.Globalization;
using ReleaseKit.Charts;
using ReleaseKit.Releases;

namespace ReleaseKit.Pages.Tables;

/// <summary>The boxhead: each measure with its unit, below it figure, margin and the ticks of the scale that its parts share.</summary>
internal static class SheetBoxhead
{
    private const int MostTicks = 5;
    private const int FewTicks = 3;
    private const int ShortLabel = 4;

    /// <summary>In per cent of the column: a label further to the right ends at its tick.</summary>
    private const double NearEdge = 85;

    public static void Write(Sheet sheet, PageScales scales, HtmlWriter html)
    {
        html.Raw("<thead><tr>"u8);
        foreach (var head in sheet.Stub.Heads)
            html.Raw("<th scope=\"col\" rowspan=\"2\" class=\"stub\">"u8).Text(head).Raw("</th>"u8);
        for (var column = 1; column <= sheet.Shown.Count; column++)
            WriteMeasure(sheet, html, sheet.Table.Measures[sheet.Shown[column - 1]], column);
        html.Raw("</tr>\n<tr class=\"heads\">"u8);
        for (var column = 1; column <= sheet.Shown.Count; column++)
            WriteParts(sheet, html, scales.HeadOf(sheet.Shown[column - 1]), column);
        html.Raw("</tr></thead>\n"u8);
    }

    private static void WriteMeasure(Sheet sheet, HtmlWriter html, Measure measure, int column) => html
        .Raw("<th scope=\"colgroup\" colspan=\"3\" class=\"meas k"u8).Raw(Number(column)).Raw("\"><a href=\"#"u8).Raw(Sheet.AboutId(measure)).Raw("\">"u8)
        .Text(measure.Title.In(sheet.Language.Tag)).Raw("</a><span class=\"u\">"u8).Text(MeasureUnit.Of(measure, sheet.Language)).Raw("</span></th>"u8);

    private static void WriteParts(Sheet sheet, HtmlWriter html, Scale scale, int column)
    {
        var key = " k" + Number(column);
        html.Raw("<th scope=\"col\" class=\"v"u8).Raw(key).Raw("\">"u8).Text(sheet.Text("tables.figure"))
            .Raw("</th><th scope=\"col\" class=\"mg"u8).Raw(key).Raw("\">"u8).Text(sheet.Text("tables.margin"))
            .Raw("</th><th scope=\"col\" class=\"b"u8).Raw(key).Raw("\"><span class=\"vh\">"u8).Text(sheet.Text("tables.bar")).Raw("</span>"u8);
        WriteAxis(sheet, html, scale);
        html.Raw("</th>"u8);
    }

    // Where columns are narrow the ticks between are left out: every second one, of four both in the middle, so that the outermost always stay.
    private static bool IsKept(int index, int count) => count == 4 ? index is 0 or 3 : count < 3 || index % 2 == 0;

    private static void WriteAxis(Sheet sheet, HtmlWriter html, Scale scale)
    {
        html.Raw("<svg class=\"bar axis\" aria-hidden=\"true\">"u8);
        var ticks = TicksOf(sheet, scale);
        for (var index = 0; index < ticks.Count; index++)
        {
            var place = scale.At(ticks[index].ToDouble());
            var x = CellMark.Percent(place);
            html.Raw(IsKept(index, ticks.Count) ? "<g>"u8 : "<g class=\"odd\">"u8)
                .Raw("<line class=\"axtick\" x1=\""u8).Raw(x).Raw("\" x2=\""u8).Raw(x).Raw("\" y1=\"16\" y2=\"22\"/><text class=\"axlab"u8).Raw(place > NearEdge ? " end\" x=\""u8 : "\" x=\""u8).Raw(x).Raw("\" y=\"12\">"u8)
                .Text(sheet.Language.Number(ticks[index])).Raw("</text></g>"u8);
        }
        html.Raw("</svg>"u8);
    }

    // Long labels leave room for few, but one alone would give no scale.
    private static IReadOnlyList<PublishedValue> TicksOf(Sheet sheet, Scale scale)
    {
        var ticks = Ticks.Between(scale.From, scale.To, MostTicks);
        if (ticks.Max(tick => sheet.Language.Number(tick).Length) <= ShortLabel)
            return ticks;
        var few = Ticks.Between(scale.From, scale.To, FewTicks);
        return few.Count > 1 ? few : ticks;
    }

    private static string Number(int number) => number.ToString(CultureInfo.InvariantCulture);
}
