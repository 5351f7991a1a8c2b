namespace ReleaseKit.Charts;

/// <summary>
/// The error bar of one figure on one scale: its shapes, back to front, and the places that labels hang on. Its thickness at a place is the density of the
/// noise there ÷ the peak; it never shows anything else. Immutable; painted as SVG and as PNG.
/// </summary>
public sealed record SwelledRule
{
    public required IReadOnlyList<MarkShape> Shapes { get; init; }

    /// <summary>Where the published figure stands; null if it lies outside the scale.</summary>
    public required double? Stem { get; init; }

    /// <summary>The ends of the main range on the scale, cut to it; null for a stem alone.</summary>
    public required (double Left, double Right)? Stops { get; init; }

    public static SwelledRule Of(MarkSubject subject, Scale scale, MarkSize size) => new RuleDrawing(subject, scale, size).Draw();
}
