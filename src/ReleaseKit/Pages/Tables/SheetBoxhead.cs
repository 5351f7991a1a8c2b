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

    /// <summary>In per cent of the column: a label further out than this ends, or begins, at its tick.</summary>
    private const double NearStart = 5;
    private const double NearEnd = 85;

    /// <summary>In pixels, as the styles set them: the narrowest column of bars beside others, its labels, and the least gap between two of them.</summary>
    private const double NarrowColumn = 84;
    private const double LabelSize = 13;
    private const double LabelGap = 4;

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
        .Text(measure.Title.In(sheet.Language.Tag)).Raw("</a><span class=\"u\">"u8).Text(UnitWords.Many(measure, sheet.Language)).Raw("</span></th>"u8);

    private static void WriteParts(Sheet sheet, HtmlWriter html, HeadScale head, int column)
    {
        var key = " k" + Number(column);
        html.Raw("<th scope=\"col\" class=\"v"u8).Raw(key).Raw("\">"u8).Text(sheet.Text("tables.figure"))
            .Raw("</th><th scope=\"col\" class=\"mg"u8).Raw(key).Raw("\">"u8).Text(sheet.Text("tables.margin"))
            .Raw("</th><th scope=\"col\" class=\"b"u8).Raw(key).Raw("\"><span class=\"vh\">"u8).Text(sheet.Text("tables.bar")).Raw("</span>"u8);
        WriteAxis(sheet, html, head);
        html.Raw("</th>"u8);
    }

    private static void WriteAxis(Sheet sheet, HtmlWriter html, HeadScale head)
    {
        html.Raw("<svg class=\"bar axis\" aria-hidden=\"true\">"u8);
        var ticks = head.Ends ?? TicksOf(sheet, head.Scale);
        var labels = ticks.Select(tick => new AxisLabel(sheet.Language.Number(tick), head.Scale.At(tick.ToDouble()))).ToList();
        var step = StepOf(labels);
        for (var index = 0; index < labels.Count; index++)
            WriteTick(html, labels[index], index == 0 || index == labels.Count - 1 ? ""u8 : index % step == 0 ? " class=\"mid\""u8 : " class=\"odd\""u8);
        html.Raw("</svg>"u8);
    }

    private static void WriteTick(HtmlWriter html, AxisLabel label, ReadOnlySpan<byte> rank)
    {
        var x = CellMark.Percent(label.Place);
        html.Raw("<g"u8).Raw(rank).Raw("><line class=\"axtick\" x1=\""u8).Raw(x).Raw("\" x2=\""u8).Raw(x).Raw("\" y1=\"16\" y2=\"22\"/><text class=\"axlab"u8)
            .Raw(label.Place > NearEnd ? " end"u8 : label.Place < NearStart ? " start"u8 : ""u8).Raw("\" x=\""u8).Raw(x).Raw("\" y=\"12\">"u8).Text(label.Text).Raw("</text></g>"u8);
    }

    /// <summary>Which ticks stay where columns are narrow: at the least even step between the outermost, which always stay, that leaves room for the labels.</summary>
    private static int StepOf(IReadOnlyList<AxisLabel> labels)
    {
        var last = labels.Count - 1;
        return Enumerable.Range(1, Math.Max(1, last)).First(step => step >= last || (last % step == 0 && HaveRoom([.. labels.Where((_, index) => index % step == 0)])));
    }

    private static bool HaveRoom(IReadOnlyList<AxisLabel> labels) => labels.Zip(labels.Skip(1)).All(pair => pair.Second.Start >= pair.First.End + LabelGap);

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

    /// <summary>A label at its place in per cent of the column, with where it starts and ends in pixels where the column is narrow.</summary>
    private sealed record AxisLabel(string Text, double Place)
    {
        private double Width => LabelWidth.Of(Text, LabelSize);
        public double Start => (NarrowColumn * Place / 100) - (Place > NearEnd ? Width : Place < NearStart ? 0 : Width / 2);
        public double End => Start + Width;
    }
}
