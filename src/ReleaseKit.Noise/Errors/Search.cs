namespace ReleaseKit.Noise.Errors;

/// <summary>How far a condition that holds at a start keeps holding, when it holds up to some place and not beyond.</summary>
internal static class Search
{
    /// <summary>
    /// The place farthest from the start, in the direction of the stride's sign, where the condition still holds: a whole number of strides
    /// away if <paramref name="whole"/>, else the nearest place known to fail, within 1e-13 of the distance. ± ∞ if no end is found.
    /// </summary>
    public static double Farthest(double start, double stride, bool whole, Func<double, bool> holds)
    {
        var (works, fails) = (0.0, 1.0);
        while (holds(start + fails * stride))
        {
            (works, fails) = (fails, fails * 2);
            if (fails > Lattice.Exact)
                return stride * double.PositiveInfinity;
        }
        for (var halvings = 0; whole ? fails - works > 1 : halvings < 44; halvings++)
        {
            var middle = whole ? works + Math.Floor((fails - works) / 2) : works + (fails - works) / 2;
            (works, fails) = holds(start + middle * stride) ? (middle, fails) : (works, middle);
        }
        return start + stride * (whole ? works : fails);
    }

    /// <summary>The place nearest to where a condition begins to hold between two places, on the side where it fails.</summary>
    public static double Between(double fails, double works, Func<double, bool> holds)
    {
        for (var halvings = 0; halvings < 44; halvings++)
        {
            var middle = fails + (works - fails) / 2;
            (fails, works) = holds(middle) ? (fails, middle) : (middle, works);
        }
        return fails;
    }
}
