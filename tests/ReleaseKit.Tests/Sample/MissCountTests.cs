using Xunit;

namespace ReleaseKit.Tests.Sample;

/// <summary>The helper that judges coverage, against hand-worked cases.</summary>
public sealed class MissCountTests
{
    // Two coins of 0.5 and one of 0.1: P(0) = 0.225, P(1) = 0.475, P(2) = 0.275, P(3) = 0.025.
    [Theory]
    [InlineData(0, 1, 0.225)]
    [InlineData(1, 0.775, 0.7)]
    [InlineData(2, 0.3, 0.975)]
    [InlineData(3, 0.025, 1)]
    public void Tails_of_three_unequal_chances(int misses, double atLeast, double atMost)
    {
        double[] chances = [0.5, 0.1, 0.5];
        Assert.Equal(atLeast, MissCount.AtLeast(chances, misses), 12);
        Assert.Equal(atMost, MissCount.AtMost(chances, misses), 12);
    }

    // The binomial law with n = 100000 and 0.01: at least 1154 misses have chance 1e-6 or less, at least 1153 more
    // (acceptance limits of a simulated coverage of 0.99, one-sided level 1e-6: at least 98847 hits; worked out with 50 digits).
    [Fact]
    public void Binomial_limit_of_a_hundred_thousand_trials()
    {
        var chances = Enumerable.Repeat(0.01, 100_000).ToArray();
        Assert.True(MissCount.AtLeast(chances, 1154) <= 1e-6);
        Assert.True(MissCount.AtLeast(chances, 1153) > 1e-6);
    }
}
