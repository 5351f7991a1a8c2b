using System.Globalization;
using System.Text.RegularExpressions;
using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>The accent must be readable as text on both grounds of a page, paper and band: 4.5 to 1 (WCAG 2.2, 1.4.3), by relative luminance as WCAG defines it.</summary>
internal static partial class AccentCheck
{
    private const double Least = 4.5;

    /// <summary>The two grounds of the light theme. The dark theme lightens the accent until it reads; no colour reads on grounds of both themes.</summary>
    private static readonly string[] Grounds = ["#F4F6F3", "#E8ECE7"];

    public static Finding? Problem(string accent, Place at, FindingOwner owner)
    {
        if (!Form.IsMatch(accent))
            return ReleaseProblems.AccentForm(at, accent, owner);
        var lowest = Grounds.Min(ground => Contrast(accent, ground));
        return lowest >= Least ? null : ReleaseProblems.AccentContrast(at, accent, lowest, owner);
    }

    public static double Contrast(string one, string other)
    {
        var (left, right) = (Luminance(one), Luminance(other));
        return (Math.Max(left, right) + 0.05) / (Math.Min(left, right) + 0.05);
    }

    private static double Luminance(string colour) => 0.2126 * Channel(colour, 1) + 0.7152 * Channel(colour, 3) + 0.0722 * Channel(colour, 5);

    private static double Channel(string colour, int at)
    {
        var share = byte.Parse(colour.AsSpan(at, 2), NumberStyles.HexNumber, CultureInfo.InvariantCulture) / 255.0;
        return share <= 0.04045 ? share / 12.92 : Math.Pow((share + 0.055) / 1.055, 2.4);
    }

    [GeneratedRegex("^#[0-9A-Fa-f]{6}$")]
    private static partial Regex Form { get; }
}
