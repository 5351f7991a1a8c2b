namespace ReleaseKit.Charts.Headlines;

/// <summary>A headline as one picture, 1200 by 630, that is complete wherever it is passed on.</summary>
public static class HeadlineCard
{
    public const double Width = 1200;
    public const double Height = 630;

    private const double Border = 64;
    private const double Room = Width - (2 * Border);
    private const double TitleTop = 84;
    private const double TitleLine = 42;
    private const double MostValue = 132;
    private const double SourceLine = Height - 40;
    private static readonly double[] ReadingSizes = [30, 28, 26, 24, 22, 20, 18, 16];

    private static readonly MarkSize Mark = new() { Peak = 40, StemHeight = 54, StemWidth = 3, StopHeight = 22, StopWidth = 2.4, Middle = 30, PointsASide = 48, Hair = 1.4, Halo = 1 };

    public static Drawing Of(HeadlineWords words, MarkSubject subject, TypeCase type)
    {
        var titles = type.Wrap(words.Title, Inks.CardTitle, Room);
        var value = TitleTop + ((titles.Count - 1) * TitleLine) + 132;
        var mark = value + 26;
        var reading = mark + (2 * Mark.Middle) + 58;
        return new Drawing(Width, Height,
        [
            new Shape.Box(Inks.Ground, 0, 0, Width, Height),
            .. titles.Select((line, index) => new Shape.Words(Inks.CardTitle, new Spot(Border, TitleTop + (index * TitleLine)), line)),
            .. Value(words, value, type),
            .. Rule(words, subject, mark, type),
            .. Reading(words.Reading, reading, type),
            new Shape.Words(Inks.CardSource, new Spot(Border, SourceLine), words.Source),
        ]);
    }

    private static IEnumerable<Shape> Value(HeadlineWords words, double y, TypeCase type)
    {
        var beside = type.Width(words.Margin, Inks.CardMargin) + 24;
        var natural = type.Width(words.Heavy, Face.Bold, MostValue) + type.Width(words.Light, Face.Light, MostValue);
        var size = Math.Min(MostValue, MostValue * (Room - Math.Max(beside, type.Width(words.Unit, Inks.CardUnit) + 24)) / natural);
        var (heavy, light) = (Inks.Figure with { Size = size }, Inks.FigureLight with { Size = size });
        var lightLeft = Border + type.Width(words.Heavy, heavy);
        var right = lightLeft + type.Width(words.Light, light) + 24;
        yield return new Shape.Words(heavy, new Spot(Border, y), words.Heavy) { Mark = "heavy" };
        yield return new Shape.Words(light, new Spot(lightLeft, y), words.Light) { Mark = "light" };
        yield return new Shape.Words(Inks.CardUnit, new Spot(right, y - 46), words.Unit) { Mark = "unit" };
        yield return new Shape.Words(Inks.CardMargin, new Spot(right, y), words.Margin) { Mark = "margin" };
    }

    private static IEnumerable<Shape> Rule(HeadlineWords words, MarkSubject subject, double top, TypeCase type)
    {
        var scale = subject.IsStemAlone
            ? new Scale(subject.Value - 1, subject.Value + 1, Border, Width - Border)
            : new Scale(subject.Tail.Low, subject.Tail.High, Border + 40, Width - Border - 40);
        // Without noise there is no scale to show.
        if (!subject.IsStemAlone)
            yield return new Shape.Line(Inks.AxisTick, new Spot(Border, top + Mark.Middle), new Spot(Width - Border, top + Mark.Middle));
        var rule = SwelledRule.Of(subject, scale, Mark);
        foreach (var shape in rule.Shapes)
            yield return MarkInks.Of(shape, top);
        if (words.Ends is not { } ends || rule.Stops is null)
            yield break;
        foreach (var label in Ends(ends, scale, subject, top + (2 * Mark.Middle) + 26, type))
            yield return label;
    }

    // The printed ends are cut to the possible, so they stand where the cut range ends, not where the mark does.
    private static IEnumerable<Shape> Ends((string Low, string High) ends, Scale scale, MarkSubject subject, double y, TypeCase type)
    {
        var (low, high) = (scale.At(Math.Max(subject.Body.Low, subject.Lowest)), scale.At(Math.Min(subject.Body.High, subject.Highest)));
        var apart = (type.Width(ends.Low, Inks.CardEnd) + type.Width(ends.High, Inks.CardEnd)) / 2 + 16;
        var push = Math.Max(0, (apart - (high - low)) / 2);
        yield return new Shape.Words(Inks.CardEnd, new Spot(low - push, y), ends.Low, Anchor.Middle) { Mark = "low" };
        yield return new Shape.Words(Inks.CardEnd, new Spot(high + push, y), ends.High, Anchor.Middle) { Mark = "high" };
    }

    // The largest size in which the whole reading fits above the source; a reading is never cut.
    private static IEnumerable<Shape> Reading(string text, double top, TypeCase type)
    {
        var room = SourceLine - 36 - top;
        var set = ReadingSizes.Select(size => Inks.CardReading with { Size = size })
            .Select(ink => (Ink: ink, Lines: type.Wrap(text, ink, Room)))
            .ToList();
        var (ink, lines) = set.FirstOrDefault(choice => choice.Lines.Count * choice.Ink.Size * LineHeight <= room, set[^1]);
        return lines.Select((line, index) => new Shape.Words(ink, new Spot(Border, top + ink.Size + (index * ink.Size * LineHeight)), line) { Mark = "reading" });
    }

    private const double LineHeight = 1.34;
}
