namespace ReleaseKit.Charts;

/// <summary>Every ink that pictures use. Classes stand in styles/chart.css and styles/budget.css.</summary>
public static class Inks
{
    public static Ink None { get; } = new("");

    // Ground and lines of a chart.
    public static Ink Ground { get; } = new("ch-ground") { Fill = Tint.Paper };
    public static Ink Grid { get; } = new("ch-grid") { Stroke = Tint.Hairline, Weight = 1 };
    public static Ink RowRule { get; } = new("ch-row") { Stroke = Tint.Hairline, Weight = 1 };
    public static Ink AxisTick { get; } = new("ch-axtick") { Stroke = Tint.Firmline, Weight = 1 };
    public static Ink Zero { get; } = new("ch-zero") { Stroke = Tint.Firmline, Weight = 1.2, Dashes = [1, 2] };

    // What the tables' marks do not have.
    public static Ink Lozenge { get; } = new("ch-weak") { Stroke = Tint.Accent, Weight = 1.5 };

    // Text of a chart. Skia sets no lining figures, and Vollkorn's own are old-style, so drawn text with numbers in it is set in Asap.
    public static Ink AxisText { get; } = new("ch-axis") { Fill = Tint.Soft, Face = Face.Plain, Size = 13 };
    public static Ink Name { get; } = new("ch-name") { Fill = Tint.Ink, Face = Face.Plain, Size = 14 };
    public static Ink Figure { get; } = new("ch-num") { Fill = Tint.Ink, Face = Face.Bold, Size = 14 };
    public static Ink FigureLight { get; } = new("ch-soft") { Fill = Tint.Soft, Face = Face.Light, Size = 14 };
    public static Ink Margin { get; } = new("ch-margin") { Fill = Tint.Ink, Face = Face.Plain, Size = 14 };
    public static Ink OffScale { get; } = new("ch-off") { Fill = Tint.Ink, Face = Face.Plain, Size = 12 };
    public static Ink Heading { get; } = new("ch-title") { Fill = Tint.Ink, Face = Face.Bold, Size = 22 };
    public static Ink Note { get; } = new("ch-note") { Fill = Tint.Soft, Face = Face.Plain, Size = 14 };

    // The picture of a headline.
    public static Ink CardTitle { get; } = new("cd-title") { Fill = Tint.Ink, Face = Face.Plain, Size = 32 };
    public static Ink CardMargin { get; } = new("cd-margin") { Fill = Tint.Ink, Face = Face.Plain, Size = 40 };
    public static Ink CardUnit { get; } = new("cd-unit") { Fill = Tint.Soft, Face = Face.Plain, Size = 28 };
    public static Ink CardEnd { get; } = new("cd-end") { Fill = Tint.Ink, Face = Face.Plain, Size = 22 };
    public static Ink CardReading { get; } = new("cd-reading") { Fill = Tint.Ink, Face = Face.Plain, Size = 28 };
    public static Ink CardSource { get; } = new("cd-source") { Fill = Tint.Soft, Face = Face.Plain, Size = 20 };

    // The split tally.
    public static Ink Solid { get; } = new("tl-solid") { Fill = Tint.Accent };
    public static Ink HatchGround { get; } = new("tl-ground") { Fill = Tint.Band };
    public static Ink Hatch { get; } = new("tl-hatch") { Stroke = Tint.Accent, Weight = 2.4 };
    public static Ink Notch { get; } = new("tl-notch") { Fill = Tint.Paper };
    public static Ink Rest { get; } = new("tl-rest") { Stroke = Tint.Firmline, Weight = 1.2, Dashes = [4, 3] };
    public static Ink Leader { get; } = new("tl-lead") { Stroke = Tint.Firmline, Weight = 1 };
    public static Ink TallyAxis { get; } = new("tl-tick") { Stroke = Tint.Firmline, Weight = 1 };
    public static Ink TallyAxisText { get; } = new("tl-axis") { Fill = Tint.Soft, Face = Face.Plain, Size = 13 };
    public static Ink TallyKey { get; } = new("tl-k") { Fill = Tint.Ink, Face = Face.Bold, Size = 15 };
    public static Ink TallyName { get; } = new("tl-t") { Fill = Tint.Soft, Face = Face.Plain, Size = 14 };
    public static Ink TallyValue { get; } = new("tl-v") { Fill = Tint.Ink, Face = Face.Plain, Size = 15 };
    public static Ink TallyKeySmall { get; } = TallyKey with { Class = "tl-k tl-s", Size = 14 };
    public static Ink TallyNameSmall { get; } = TallyName with { Class = "tl-t tl-s", Size = 14 };
    public static Ink TallyValueSmall { get; } = TallyValue with { Class = "tl-v tl-s", Size = 14 };
}
