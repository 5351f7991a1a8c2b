namespace ReleaseKit.Charts;

/// <summary>A straight scale: the values From to To, in the figure's unit, lie at Start to End (pixels or per cent, as the drawing counts).</summary>
public readonly record struct Scale(double From, double To, double Start, double End)
{
    public double PerUnit => (End - Start) / (To - From);

    public double At(double value) => Start + ((value - From) * PerUnit);

    public double ValueAt(double place) => From + ((place - Start) / PerUnit);

    public bool Holds(double value) => value >= From && value <= To;

    /// <summary>The same values on another stretch of the drawing.</summary>
    public Scale Between(double start, double end) => this with { Start = start, End = end };
}
