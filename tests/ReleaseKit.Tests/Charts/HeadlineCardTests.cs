using ReleaseKit.Charts;
using ReleaseKit.Charts.Headlines;
using ReleaseKit.Releases;
using SkiaSharp;
using Xunit;

namespace ReleaseKit.Tests.Charts;

/// <summary>The picture of a headline that is passed on.</summary>
public sealed class HeadlineCardTests
{
    private const string Reading =
        "The published figure is 1,842 households. Noise of up to 410 either way was added in at least 95 of 100 cases. "
        + "So the count before noise is between 1,432 and 2,252 in at least 95 of 100 such cases. This figure is rough. "
        + "The range covers the added noise only, not late records or wrong answers.";

    [Fact]
    public void Whole_reading_stands_in_the_picture_above_the_source()
    {
        using var type = TextBoxes.Type();

        var drawing = HeadlineCard.Of(Words("Households behind on their heating bills, Norrvale, 31 December 2031"), Subject(1842, 205), type);

        var lines = drawing.Marks.OfType<Shape.Words>().Where(words => words.Mark == "reading").ToList();
        Assert.Equal(Reading, string.Join(' ', lines.Select(line => line.Text)));
        Assert.True(lines[^1].At.Y < HeadlineCard.Height - 60);
        TextBoxes.DemandNoOverlap(drawing, type);
        TextBoxes.DemandInside(drawing, type);
    }

    [Fact]
    public void Long_title_and_long_number_still_fit()
    {
        using var type = TextBoxes.Type();
        var words = Words(string.Join(' ', Enumerable.Repeat("Households behind on their heating bills", 4))) with { Heavy = "1,234,567,", Light = "890", Unit = "homes in each 100" };

        var drawing = HeadlineCard.Of(words, Subject(1_234_567_890, 300), type);

        TextBoxes.DemandNoOverlap(drawing, type);
        TextBoxes.DemandInside(drawing, type);
    }

    [Fact]
    public void Picture_is_1200_by_630_and_the_same_every_time()
    {
        using var type = TextBoxes.Type();
        var palette = Palette.Of(new Look(null, null));
        var drawing = HeadlineCard.Of(Words("A headline"), Subject(1842, 205), type);

        var first = PngPainter.Paint(drawing, 1, palette, type);

        using var bitmap = SKBitmap.Decode(first);
        Assert.Equal((1200, 630), (bitmap.Width, bitmap.Height));
        Assert.Equal(first, PngPainter.Paint(drawing, 1, palette, type));
    }

    private static HeadlineWords Words(string title) => new()
    {
        Title = title,
        Heavy = "1,",
        Light = "842",
        Margin = "± 410",
        Unit = "households",
        Ends = ("1,432", "2,252"),
        Reading = Reading,
        Source = "Source: An office.",
    };

    private static MarkSubject Subject(double value, double deviation) => new()
    {
        Value = value,
        Ranges = [.. new[] { 0.67, 2, 2.6 }.Select(times => new MarkRange(value - (times * deviation), value + (times * deviation)))],
        Density = offset => Math.Exp(-offset * offset / (2 * deviation * deviation)),
    };
}
