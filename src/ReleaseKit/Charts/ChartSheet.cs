using ReleaseKit.Charts.Ordered;

namespace ReleaseKit.Charts;

/// <summary>A chart as a picture that stands alone: title above it, caption and source below, everything drawn in.</summary>
internal static class ChartSheet
{
    private const double Border = 40;
    private const double TitleLine = 31;
    private const double NoteLine = 20;
    private const double NoteGap = 14;

    public static Drawing Of(OrderedChart chart, string title, IReadOnlyList<string> caption, string source, TypeCase type)
    {
        var width = chart.Drawing.Width;
        var titles = type.Wrap(title, Inks.Heading, width);
        var chartTop = Border + (titles.Count * TitleLine) + 8;
        var captionTop = chartTop + chart.Drawing.Height + NoteGap;
        var notes = type.Wrap(string.Join(' ', caption), Inks.Note, width);
        var sources = type.Wrap(source, Inks.Note, width);
        var sourceTop = captionTop + (notes.Count * NoteLine) + 6;
        return new Drawing(width + (2 * Border), sourceTop + (sources.Count * NoteLine) + Border - 12,
        [
            new Shape.Box(Inks.Ground, 0, 0, width + (2 * Border), sourceTop + (sources.Count * NoteLine) + Border - 12),
            .. Lines(titles, Inks.Heading, Border + 22, TitleLine),
            .. chart.Drawing.Shapes.Select(shape => shape.Moved(Border, chartTop)),
            .. Lines(notes, Inks.Note, captionTop + 14, NoteLine),
            .. Lines(sources, Inks.Note, sourceTop + 14, NoteLine),
        ]);
    }

    private static IEnumerable<Shape> Lines(IReadOnlyList<string> lines, Ink ink, double baseline, double step) =>
        lines.Select((line, index) => new Shape.Words(ink, new Spot(Border, baseline + (index * step)), line));
}
