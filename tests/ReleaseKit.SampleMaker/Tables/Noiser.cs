using ReleaseKit.SampleMaker.Chance;

namespace ReleaseKit.SampleMaker.Tables;

/// <summary>Adds the noise of each mechanism to whole numbers of steps; one stream a mechanism, its draws in the order of the cells.</summary>
public sealed class Noiser(ulong seed)
{
    public long[] DiscreteLaplace(string mechanism, int scale, IEnumerable<long> before) =>
        Noised(mechanism, before, stream => ExactNoise.DiscreteLaplace(stream, scale));

    public long[] DiscreteGaussian(string mechanism, int sigma, IEnumerable<long> before) =>
        Noised(mechanism, before, stream => ExactNoise.DiscreteGaussian(stream, sigma));

    /// <summary>Laplace noise on a grid so fine that the printed digits cannot tell it from the continuous law; a scale of its own for each cell, in steps.</summary>
    public long[] Laplace(string mechanism, IReadOnlyList<int> scales, IEnumerable<long> before)
    {
        var stream = UniformStream.Named(seed, mechanism);
        return [.. before.Select((value, cell) => value + ExactNoise.DiscreteLaplace(stream, scales[cell]))];
    }

    /// <summary>Staircase noise with epsilon a quarter; sensitivity and upper tread in steps.</summary>
    public long[] StaircaseAtQuarter(string mechanism, int sensitivity, int upper, IEnumerable<long> before) =>
        Noised(mechanism, before, stream => ExactNoise.Staircase(stream, 1, 4, sensitivity, upper));

    private long[] Noised(string mechanism, IEnumerable<long> before, Func<UniformStream, long> noise)
    {
        var stream = UniformStream.Named(seed, mechanism);
        return [.. before.Select(value => value + noise(stream))];
    }
}
