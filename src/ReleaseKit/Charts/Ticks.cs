using ReleaseKit.Releases;

namespace ReleaseKit.Charts;

/// <summary>Round numbers on a scale: multiples of 1, 2, 2.5 or 5 times a power of ten, held exactly so that they print without a rounding of their own.</summary>
public static class Ticks
{
    private static readonly (long Unscaled, byte Decimals)[] Steps = [(1, 0), (2, 0), (25, 1), (5, 0)];

    /// <summary>The multiples of the smallest round step that gives at most the wanted number between the ends, both included.</summary>
    public static IReadOnlyList<PublishedValue> Between(double from, double to, int atMost)
    {
        var step = StepFor(to - from, atMost);
        var first = (long)Math.Ceiling((from / step.ToDouble()) - 1e-9);
        var last = (long)Math.Floor((to / step.ToDouble()) + 1e-9);
        return [.. Enumerable.Range(0, (int)Math.Max(0, last - first + 1)).Select(index => Times(step, first + index))];
    }

    /// <summary>The nearest round numbers outside the ends, with a step that cuts the stretch in about the wanted number of parts.</summary>
    public static (PublishedValue From, PublishedValue To) Around(double from, double to, int parts)
    {
        var step = StepFor(to - from, parts);
        var low = (long)Math.Floor((from / step.ToDouble()) + 1e-9);
        var high = (long)Math.Ceiling((to / step.ToDouble()) - 1e-9);
        return (Times(step, low), Times(step, Math.Max(high, low + 1)));
    }

    private static PublishedValue StepFor(double span, int atMost)
    {
        var least = Math.Max(span, 1e-9) / Math.Max(atMost, 1);
        var power = (int)Math.Floor(Math.Log10(least)) - 1;
        return Enumerable.Range(power, 4)
            .SelectMany(exponent => Steps.Select(step => Power(step.Unscaled, step.Decimals, exponent)))
            .First(step => step.ToDouble() >= least * (1 - 1e-9));
    }

    private static PublishedValue Power(long unscaled, int decimals, int exponent)
    {
        var left = decimals - exponent;
        return left >= 0 ? new(unscaled, (byte)left) : new(unscaled * (long)PublishedValue.PowerOfTen(-left), 0);
    }

    private static PublishedValue Times(PublishedValue step, long times) => new(step.Unscaled * times, step.Decimals);
}
