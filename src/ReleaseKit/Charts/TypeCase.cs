using System.Globalization;
using SkiaSharp;

namespace ReleaseKit.Charts;

/// <summary>The cuts of type that pictures are set in, all of Asap.</summary>
public enum Face { Light, Plain, Bold }

/// <summary>The typefaces, loaded from the site's own fonts; measures and wraps text. Nothing is ever taken from the machine.</summary>
public sealed class TypeCase : IDisposable
{
    private static readonly Dictionary<Face, string> Files = new()
    {
        [Face.Light] = "asap-320.ttf",
        [Face.Plain] = "asap-400.ttf",
        [Face.Bold] = "asap-700.ttf",
    };

    private readonly Dictionary<Face, SKTypeface> typefaces;

    private TypeCase(Dictionary<Face, SKTypeface> typefaces) => this.typefaces = typefaces;

    /// <exception cref="FileNotFoundException">A font is missing or cannot be read; Skia itself would set no text at all and say nothing.</exception>
    public static TypeCase Load(string fontsFolder) =>
        new(Files.ToDictionary(file => file.Key, file => LoadOne(Path.Combine(fontsFolder, file.Value))));

    /// <summary>A font at a size in pixels. The caller disposes it.</summary>
    public SKFont Font(Face face, double size) =>
        new(typefaces[face], (float)size) { Subpixel = true, Hinting = SKFontHinting.None, Edging = SKFontEdging.Antialias };

    /// <summary>Width of a line of text in pixels.</summary>
    public double Width(string text, Ink ink) => Width(text, ink.Face, ink.Size);

    public double Width(string text, Face face, double size)
    {
        using var font = Font(face, size);
        return font.MeasureText(text);
    }

    /// <summary>The text in lines no wider than a width, broken between words; a word that is wider is broken between letters.</summary>
    public IReadOnlyList<string> Wrap(string text, Ink ink, double width)
    {
        var lines = new List<string>();
        foreach (var word in text.Split(' ', StringSplitOptions.RemoveEmptyEntries).SelectMany(word => Pieces(word, ink, width)))
            if (lines.Count > 0 && Width($"{lines[^1]} {word}", ink) <= width)
                lines[^1] = $"{lines[^1]} {word}";
            else
                lines.Add(word);
        return lines;
    }

    private IEnumerable<string> Pieces(string word, Ink ink, double width)
    {
        var piece = "";
        var letters = Width(word, ink) <= width ? [word] : Letters(word);
        foreach (var letter in letters)
        {
            if (piece.Length > 0 && Width(piece + letter, ink) > width)
            {
                yield return piece;
                piece = "";
            }
            piece += letter;
        }
        yield return piece;
    }

    /// <summary>The letters of a word, each with the accents that stand on it.</summary>
    private static IEnumerable<string> Letters(string word)
    {
        var letters = StringInfo.GetTextElementEnumerator(word);
        while (letters.MoveNext())
            yield return letters.GetTextElement();
    }

    public double WidestOf(IEnumerable<string> lines, Ink ink) => lines.Select(line => Width(line, ink)).DefaultIfEmpty().Max();

    public void Dispose()
    {
        foreach (var typeface in typefaces.Values)
            typeface.Dispose();
    }

    private static SKTypeface LoadOne(string file) =>
        SKTypeface.FromFile(file) ?? throw new FileNotFoundException($"The font {Path.GetFileName(file)} is missing or cannot be read.", file);
}
