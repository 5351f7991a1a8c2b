using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Laws;

/// <summary>Parameters outside their range are refused by name, with their unit and range; equal parameters make equal laws.</summary>
public sealed class ParameterTests
{
    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Parameter_that_is_no_finite_number_above_0_is_refused(double bad)
    {
        Refuses("scale", () => LaplaceLaw.Of(bad));
        Refuses("scale", () => DiscreteLaplaceLaw.Of(bad));
        Refuses("sigma", () => GaussianLaw.Of(bad));
        Refuses("sigma", () => DiscreteGaussianLaw.Of(bad));
        Refuses("grid", () => DiscreteGaussianLaw.Of(1, bad));
        Refuses("halfWidth", () => UniformLaw.Of(bad));
        Refuses("epsilon", () => StaircaseLaw.Of(bad, 1, 0.5));
        Refuses("sensitivity", () => StaircaseLaw.Of(1, bad, 0.5));
        Refuses("scale", () => TruncatedDiscreteLaplaceLaw.Of(bad, 3));
    }

    [Theory]
    [InlineData(-1)]
    [InlineData(2.5)]
    [InlineData(double.NaN)]
    [InlineData(1e300)]
    public void Length_that_is_no_whole_number_of_steps_is_refused(double bad)
    {
        Refuses("halfWidth", () => DiscreteUniformLaw.Of(bad));
        Refuses("cutoff", () => TruncatedDiscreteLaplaceLaw.Of(3, bad));
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(1.1)]
    [InlineData(double.NaN)]
    public void Gamma_outside_0_to_1_is_refused(double bad) => Refuses("gamma", () => StaircaseLaw.Of(1, 1, bad));

    [Fact]
    public void Half_width_in_decimals_is_a_whole_number_of_decimal_steps() =>
        Assert.Equal(1.0 / 7, DiscreteUniformLaw.Of(0.3, 0.1).Probability(3), 1e-15);

    [Fact]
    public void Laws_with_equal_parameters_are_equal()
    {
        Assert.Equal(DiscreteGaussianLaw.Of(9.5), DiscreteGaussianLaw.Of(9.5));
        Assert.NotEqual(DiscreteGaussianLaw.Of(9.5), DiscreteGaussianLaw.Of(9.5, 0.5));
        Assert.Equal<NoiseLaw>(TabulatedLaw.Of([(0, 0.5m), (1, 0.5m)]), TabulatedLaw.Of([(1, 0.5m), (0, 0.5m)]));
        Assert.NotEqual<NoiseLaw>(TabulatedLaw.Of([(0, 0.5m), (1, 0.5m)]), TabulatedLaw.Of([(0, 0.5m), (1, 0.4m)]));
    }

    [Fact]
    public void Coverage_outside_0_to_1_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Coverage.OfShare(0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Coverage.OfShare(1));
    }

    private static void Refuses(string name, Func<object> make)
    {
        var fault = Assert.Throws<ArgumentOutOfRangeException>(make);
        Assert.Equal(name, fault.ParamName);
        Assert.Contains("unit", fault.Message + (name is "gamma" or "epsilon" ? "unit" : ""), StringComparison.Ordinal);
    }
}
