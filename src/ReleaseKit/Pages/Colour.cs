using System.Globalization;

namespace ReleaseKit.Pages;

/// <summary>An sRGB colour of 8 bits a channel.</summary>
public readonly record struct Colour(byte Red, byte Green, byte Blue)
{
    public static Colour White { get; } = new(255, 255, 255);
    public static Colour Black { get; }

    /// <summary>Reads "#RRGGBB".</summary>
    /// <exception cref="FormatException">It is none.</exception>
    public static Colour Parse(string hex)
    {
        if (hex.Length != 7 || hex[0] != '#')
            throw new FormatException($"'{hex}' is no colour; write six hexadecimal digits after '#'.");
        var bytes = Convert.FromHexString(hex.AsSpan(1));
        return new Colour(bytes[0], bytes[1], bytes[2]);
    }

    /// <summary>Contrast ratio of two colours, 1 to 21 (WCAG 2.2, definition "contrast ratio").</summary>
    public double ContrastTo(Colour other)
    {
        var (one, two) = (Luminance(), other.Luminance());
        return (Math.Max(one, two) + 0.05) / (Math.Min(one, two) + 0.05);
    }

    /// <summary>This colour with so many hundredths of another.</summary>
    public Colour Mix(Colour other, int hundredths)
    {
        byte Channel(byte mine, byte theirs) => (byte)((mine * (100 - hundredths) + theirs * hundredths + 50) / 100);
        return new Colour(Channel(Red, other.Red), Channel(Green, other.Green), Channel(Blue, other.Blue));
    }

    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"#{Red:X2}{Green:X2}{Blue:X2}");

    /// <summary>Relative luminance, 0 to 1 (WCAG 2.2, definition "relative luminance").</summary>
    private double Luminance() => 0.2126 * Linear(Red) + 0.7152 * Linear(Green) + 0.0722 * Linear(Blue);

    private static double Linear(byte channel)
    {
        var share = channel / 255.0;
        return share <= 0.04045 ? share / 12.92 : Math.Pow((share + 0.055) / 1.055, 2.4);
    }
}
