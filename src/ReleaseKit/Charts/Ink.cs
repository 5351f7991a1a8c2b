namespace ReleaseKit.Charts;

/// <summary>A role of colour; what it looks like is the palette's and the style sheet's affair.</summary>
public enum Tint { None, Paper, Band, Ink, Soft, Accent, AccentMid, Hairline, Firmline }

/// <summary>How a mark looks: its class in the style sheet, and the same said for pictures that have none.</summary>
public sealed record Ink(string Class)
{
    public Tint Fill { get; init; }
    public Tint Stroke { get; init; }
    public double Weight { get; init; }

    /// <summary>Lengths drawn and left out in turn; empty for a full line.</summary>
    public IReadOnlyList<double> Dashes { get; init; } = [];

    public Face Face { get; init; }

    /// <summary>Height of letters in pixels; 0 for what is no text.</summary>
    public double Size { get; init; }
}
