namespace ReleaseKit.Tests.Sample;

/// <summary>The law of how many of many independent ranges miss, each with a chance of its own (the Poisson binomial law), by its recursion.</summary>
internal static class MissCount
{
    /// <summary>P(at least so many misses); each chance is from 0 to 1.</summary>
    public static double AtLeast(IEnumerable<double> chances, int misses) => misses == 0 ? 1 : Law(chances, misses - 1)[misses];

    /// <summary>P(at most so many misses).</summary>
    public static double AtMost(IEnumerable<double> chances, int misses) => Law(chances, misses)[..(misses + 1)].Sum();

    // Entry k is the chance of k misses; the last entry, that of more than the most counted.
    private static double[] Law(IEnumerable<double> chances, int most)
    {
        var law = new double[most + 2];
        law[0] = 1;
        foreach (var chance in chances)
        {
            law[^1] += law[most] * chance;
            for (var k = most; k > 0; k--)
                law[k] += (law[k - 1] - law[k]) * chance;
            law[0] -= law[0] * chance;
        }
        return law;
    }
}
