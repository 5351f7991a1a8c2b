using ReleaseKit.Noise.Laws;
using ReleaseKit.SampleMaker.Chance;
using Xunit;

namespace ReleaseKit.Tests.Sample;

/// <summary>
/// The samplers of the sample follow the laws they are declared as: shares within several half-widths against the laws' own distribution functions,
/// by normal limits of a binomial at 5 standard deviations (chance of a false alarm below 1e-6 a comparison).
/// </summary>
public sealed class ExactNoiseTests
{
    private const int Trials = 60_000;

    [Fact]
    public void DiscreteLaplace_follows_its_law() =>
        Follows(DiscreteLaplaceLaw.Of(5), stream => ExactNoise.DiscreteLaplace(stream, 5), 0, 2, 5, 15, 25);

    [Fact]
    public void DiscreteGaussian_follows_its_law() =>
        Follows(DiscreteGaussianLaw.Of(7), stream => ExactNoise.DiscreteGaussian(stream, 7), 0, 3, 7, 14, 21);

    [Fact]
    public void DiscreteGaussian_on_a_fine_grid_follows_the_continuous_law() =>
        Follows(GaussianLaw.Of(6), stream => ExactNoise.DiscreteGaussian(stream, 6000) / 1000.0, 1, 6, 12, 18);

    [Fact]
    public void DiscreteLaplace_on_a_fine_grid_follows_the_continuous_law() =>
        Follows(LaplaceLaw.Of(0.8), stream => ExactNoise.DiscreteLaplace(stream, 8000) / 10_000.0, 0.1, 0.8, 2.4, 4);

    // Half-widths inside both treads and on the edges between them: 112.8 and 240 crowns.
    [Fact]
    public void Staircase_follows_its_law() =>
        Follows(StaircaseLaw.Of(0.25, 240, 0.47), stream => ExactNoise.Staircase(stream, 1, 4, 24_000, 11_280) / 100.0, 50, 112.8, 180, 240, 352.8, 1000, 2900);

    [Theory]
    [InlineData(1)]
    [InlineData(3)]
    [InlineData(1000)]
    public void Stream_below_a_limit_reaches_every_number_alike(int limit)
    {
        var stream = UniformStream.Named(7, "limits");
        var lower = Enumerable.Range(0, Trials).Count(_ => stream.Below(limit) < (limit + 1) / 2);
        AssertShare((limit + 1) / 2 / (double)limit, lower);
    }

    // The first words of SplitMix64 from state 1234567, as widely printed with its C version (from memory).
    [Fact]
    public void Stream_is_SplitMix64()
    {
        var stream = new UniformStream(1234567);
        Assert.Equal([6457827717110365317UL, 3203168211198807973UL, 9817491932198370423UL], [stream.Next(), stream.Next(), stream.Next()]);
    }

    private static void Follows(NoiseLaw law, Func<UniformStream, double> sample, params double[] halfWidths)
    {
        var stream = UniformStream.Named(2031, law.GetType().Name);
        var noise = Enumerable.Range(0, Trials).Select(_ => sample(stream)).ToArray();
        foreach (var halfWidth in halfWidths)
            AssertShare(law.Within(halfWidth), noise.Count(drawn => Math.Abs(drawn) <= halfWidth));
        AssertShare((1 - law.Within(0)) / 2, noise.Count(drawn => drawn > 0));
    }

    private static void AssertShare(double expected, int hits)
    {
        var limit = (5 * Math.Sqrt(Trials * expected * (1 - expected))) + 1;
        Assert.InRange(hits, (Trials * expected) - limit, (Trials * expected) + limit);
    }
}
