using SkiaSharp;

namespace ReleaseKit.Charts;

/// <summary>Paints a drawing as PNG, on paper of the light theme. The same drawing gives the same bytes.</summary>
public sealed class PngPainter : IDisposable
{
    // Zlib level 6 without row filters: smallest for pictures that are mostly flat paper and type.
    private const int Effort = 6;

    private readonly Palette palette;
    private readonly TypeCase type;
    private readonly SKCanvas canvas;

    private PngPainter(SKCanvas canvas, Palette palette, TypeCase type) => (this.canvas, this.palette, this.type) = (canvas, palette, type);

    /// <param name="drawing">What to paint.</param>
    /// <param name="scale">Pixels of the picture for one of the drawing.</param>
    /// <param name="palette">Colours.</param>
    /// <param name="type">Typefaces.</param>
    public static byte[] Paint(Drawing drawing, double scale, Palette palette, TypeCase type)
    {
        var info = new SKImageInfo((int)Math.Ceiling(drawing.Width * scale), (int)Math.Ceiling(drawing.Height * scale), SKColorType.Rgba8888, SKAlphaType.Opaque);
        using var bitmap = new SKBitmap(info);
        using var painter = new PngPainter(new SKCanvas(bitmap), palette, type);
        painter.canvas.Clear(painter.Colour(Tint.Paper));
        painter.canvas.Scale((float)scale);
        foreach (var shape in drawing.Marks)
            painter.Paint(shape);
        painter.canvas.Flush();
        using var pixels = bitmap.PeekPixels();
        using var data = pixels?.Encode(new SKPngEncoderOptions(SKPngEncoderFilterFlags.None, Effort));
        return data?.ToArray() ?? throw new InvalidOperationException("The picture could not be written as PNG.");
    }

    public void Dispose() => canvas.Dispose();

    private void Paint(Shape shape)
    {
        if (shape is Shape.Words words)
        {
            PaintWords(words);
            return;
        }

        using var path = PathOf(shape);
        Draw(path, shape.Ink, SKPaintStyle.Fill, shape.Ink.Fill);
        Draw(path, shape.Ink, SKPaintStyle.Stroke, shape.Ink.Stroke);
    }

    private void Draw(SKPath path, Ink ink, SKPaintStyle style, Tint tint)
    {
        if (tint == Tint.None)
            return;
        using var dashes = style == SKPaintStyle.Stroke && ink.Dashes.Count > 0 ? SKPathEffect.CreateDash([.. ink.Dashes.Select(dash => (float)dash)], 0) : null;
        using var paint = new SKPaint { Style = style, Color = Colour(tint), StrokeWidth = (float)ink.Weight, IsAntialias = true, PathEffect = dashes };
        canvas.DrawPath(path, paint);
    }

    private void PaintWords(Shape.Words words)
    {
        using var font = type.Font(words.Ink.Face, words.Ink.Size);
        using var paint = new SKPaint { Color = Colour(words.Ink.Fill), IsAntialias = true };
        var align = words.Anchor switch { Anchor.Middle => SKTextAlign.Center, Anchor.End => SKTextAlign.Right, _ => SKTextAlign.Left };
        canvas.DrawText(words.Text, (float)words.At.X, (float)words.At.Y, align, font, paint);
    }

    private static SKPath PathOf(Shape shape)
    {
        using var path = new SKPathBuilder();
        switch (shape)
        {
            case Shape.Box box:
                path.AddRect(new SKRect((float)box.X, (float)box.Y, (float)(box.X + box.Width), (float)(box.Y + box.Height)));
                break;
            case Shape.Line line:
                Add(path, [line.From, line.To], false);
                break;
            case Shape.Strokes strokes:
                foreach (var (from, to) in strokes.Parts)
                    Add(path, [from, to], false);
                break;
            case Shape.Outline outline:
                Add(path, outline.Corners, outline.Closed);
                break;
        }

        return path.Detach();
    }

    private static void Add(SKPathBuilder path, IReadOnlyList<Spot> corners, bool closed)
    {
        path.MoveTo((float)corners[0].X, (float)corners[0].Y);
        foreach (var corner in corners.Skip(1))
            path.LineTo((float)corner.X, (float)corner.Y);
        if (closed)
            path.Close();
    }

    private SKColor Colour(Tint tint) => SKColor.Parse(palette[tint]);
}
