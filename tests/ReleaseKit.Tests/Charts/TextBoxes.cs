using ReleaseKit.Charts;
using Xunit;

namespace ReleaseKit.Tests.Charts;

/// <summary>Where the lines of text of a drawing stand, measured with the fonts they are set in.</summary>
internal static class TextBoxes
{
    public sealed record Box(string Text, double Left, double Top, double Right, double Bottom)
    {
        public bool Meets(Box other) => Left < other.Right && other.Left < Right && Top < other.Bottom && other.Top < Bottom;
    }

    public static TypeCase Type() => TypeCase.Load(Path.Combine(AppContext.BaseDirectory, "site-templates", "fonts"));

    public static IReadOnlyList<Box> Of(Drawing drawing, TypeCase type) =>
        [.. drawing.Marks.OfType<Shape.Words>().Where(words => words.Text.Length > 0).Select(words => BoxOf(words, type))];

    public static void DemandNoOverlap(Drawing drawing, TypeCase type)
    {
        var boxes = Of(drawing, type);
        Assert.NotEmpty(boxes);
        for (var first = 0; first < boxes.Count; first++)
            for (var second = first + 1; second < boxes.Count; second++)
                Assert.False(boxes[first].Meets(boxes[second]), $"\"{boxes[first]}\" meets \"{boxes[second]}\"");
    }

    public static void DemandInside(Drawing drawing, TypeCase type) => Assert.All(Of(drawing, type), box =>
        Assert.True(box.Left > -0.5 && box.Right < drawing.Width + 0.5 && box.Top > -0.5 && box.Bottom < drawing.Height + 0.5, $"{box} leaves the drawing"));

    // From the height of capitals to the baseline: what must never be covered; descenders may touch the line below by a pixel.
    private static Box BoxOf(Shape.Words words, TypeCase type)
    {
        var width = type.Width(words.Text, words.Ink);
        var left = words.Anchor switch { Anchor.Middle => words.At.X - (width / 2), Anchor.End => words.At.X - width, _ => words.At.X };
        return new Box(words.Text, left, words.At.Y - (0.72 * words.Ink.Size), left + width, words.At.Y + (0.2 * words.Ink.Size));
    }
}
