using ReleaseKit.Releases;

namespace ReleaseKit.Charts;

/// <summary>Round numbers on a scale: multiples of 1, 2, 2.5 or 5 times a power of ten, held exactly so that they print without a rounding of their own.</summary>
public static class Ticks
{
    private const double Slack = 1e-9;
    private static readonly (long Unscaled, byte Decimals)[] Steps = [(1, 0), (2, 0), (25, 1), (5, 0)];

    /// <summary>The multiples of the smallest round step that gives at most the wanted number between the ends, both included.</summary>
    public static IReadOnlyList<PublishedValue> Between(double from, double to, int atMost)
    {
        var step = RoundSteps((to - from) / atMost).First(step => First(from, step) + atMost > Last(to, step));
        var first = First(from, step);
        return [.. Enumerable.Range(0, (int)Math.Max(0, Last(to, step) - first + 1)).Select(index => Times(step, first + index))];
    }

    /// <summary>The nearest round numbers outside the ends, with a step that cuts the stretch in at most the wanted number of parts.</summary>
    public static (PublishedValue From, PublishedValue To) Around(double from, double to, int parts)
    {
        var step = RoundSteps((to - from) / parts).First();
        var low = (long)Math.Floor((from / step.ToDouble()) + Slack);
        var high = (long)Math.Ceiling((to / step.ToDouble()) - Slack);
        return (Times(step, low), Times(step, Math.Max(high, low + 1)));
    }

    private static long First(double from, PublishedValue step) => (long)Math.Ceiling((from / step.ToDouble()) - Slack);

    private static long Last(double to, PublishedValue step) => (long)Math.Floor((to / step.ToDouble()) + Slack);

    // From the first that is not smaller than the least, upward.
    private static IEnumerable<PublishedValue> RoundSteps(double least)
    {
        var power = (int)Math.Floor(Math.Log10(Math.Max(least, 1e-9))) - 1;
        return Enumerable.Range(power, 5)
            .SelectMany(exponent => Steps.Select(step => Power(step.Unscaled, step.Decimals, exponent)))
            .Where(step => step.ToDouble() >= least * (1 - Slack));
    }

    private static PublishedValue Power(long unscaled, int decimals, int exponent)
    {
        var left = decimals - exponent;
        return left >= 0 ? new(unscaled, (byte)left) : new(unscaled * (long)PublishedValue.PowerOfTen(-left), 0);
    }

    private static PublishedValue Times(PublishedValue step, long times) => new(step.Unscaled * times, step.Decimals);
}
