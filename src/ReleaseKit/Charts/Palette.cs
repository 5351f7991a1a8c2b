using ReleaseKit.Releases;

namespace ReleaseKit.Charts;

/// <summary>The colours of pictures that stand alone, by role: the light theme of the pages.</summary>
public sealed class Palette
{
    private const string DefaultAccent = "#7A1D4E";
    private const string DefaultAccentMid = "#B0608C";

    private readonly Dictionary<Tint, string> hex;

    private Palette(string accent, string accentMid) => hex = new Dictionary<Tint, string>
    {
        [Tint.None] = "none",
        [Tint.Paper] = "#F4F6F3",
        [Tint.Band] = "#E8ECE7",
        [Tint.Ink] = "#1A2023",
        [Tint.Soft] = "#525C62",
        [Tint.Accent] = accent,
        [Tint.AccentMid] = accentMid,
        [Tint.Hairline] = "#C3CAC4",
        [Tint.Firmline] = "#7D878A",
    };

    /// <summary>The palette of a release; an accent of its own is mixed with the paper for the lighter half of a mark.</summary>
    public static Palette Of(Look look) => look.Accent is { } accent && !accent.Equals(DefaultAccent, StringComparison.OrdinalIgnoreCase)
        ? new Palette(accent, Mix(accent, "#F4F6F3", MidShare))
        : new Palette(DefaultAccent, DefaultAccentMid);

    /// <summary>The colour as "#RRGGBB", or "none".</summary>
    public string this[Tint tint] => hex[tint];

    // As far from the accent to the paper as the default pair is.
    private const double MidShare = 0.43;

    private static string Mix(string from, string to, double share) =>
        "#" + string.Concat(Enumerable.Range(0, 3).Select(part => Mixed(Part(from, part), Part(to, part), share)));

    private static string Mixed(int from, int to, double share) => ((int)Math.Round(from + ((to - from) * share))).ToString("X2", null);

    private static int Part(string hex, int part) => Convert.ToInt32(hex.Substring(1 + (2 * part), 2), 16);
}
