using CsCheck;
using MathNet.Numerics.Distributions;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Laws;

/// <summary>What holds for every law and every parameter, over generated cases; and the laws that MathNet.Numerics has, against
/// it.</summary>
public sealed class LawPropertyTests
{
    private static readonly Gen<double> Scale = Gen.Double[-2, 6].Select(exponent => Math.Pow(10, exponent));

    private static readonly Gen<NoiseLaw> Law = Gen.OneOf(
        Scale.Select(NoiseLaw (s) => LaplaceLaw.Of(s)),
        Scale.Select(NoiseLaw (s) => GaussianLaw.Of(s)),
        Scale.Select(NoiseLaw (s) => UniformLaw.Of(s)),
        Gen.Select(Gen.Double[0.01, 5], Scale, Gen.Double[0.01, 0.99]).Select(NoiseLaw (p) => StaircaseLaw.Of(p.Item1, p.Item2, p.Item3)),
        Scale.Select(NoiseLaw (s) => DiscreteLaplaceLaw.Of(s)),
        Scale.Select(NoiseLaw (s) => DiscreteGaussianLaw.Of(s)),
        Gen.Long[0, 1_000_000].Select(NoiseLaw (h) => DiscreteUniformLaw.Of(h)),
        Gen.Select(Scale, Gen.Long[0, 1_000_000]).Select(NoiseLaw (p) => TruncatedDiscreteLaplaceLaw.Of(p.Item1, p.Item2)));

    private static readonly Gen<Coverage> Share = Gen.Double[0.001, 0.9999].Select(Coverage.OfShare);

    [Fact]
    public void Half_width_grows_with_coverage() => Gen.Select(Law, Share, Share).Sample((law, one, other) =>
        law.HalfWidthAt(one < other ? one : other).Width <= law.HalfWidthAt(one < other ? other : one).Width);

    [Fact]
    public void Half_width_is_the_smallest_that_attains() => Gen.Select(Law, Share).Sample((law, coverage) =>
    {
        var half = law.HalfWidthAt(coverage);
        var smaller = law is LatticeLaw lattice ? half.Width - lattice.Grid : half.Width * (1 - 1e-9);
        return Math.Abs(law.Within(half.Width) - half.Attained) < 1e-12
            && half.Attained >= coverage.Share - 1e-12 && (half.Width == 0 || law.Within(smaller) < coverage.Share);
    });

    [Fact]
    public void Noise_is_as_likely_upward_as_downward() => Gen.Select(Law, Gen.Double[-3, 3]).Sample((law, deviations) =>
    {
        var x = Math.Round(deviations * Math.Sqrt(law.Variance));
        return Math.Abs(law.AtLeast(x) - law.AtMost(-x)) <= 1e-14 && Math.Abs(law.RelativeDensity(x) - law.RelativeDensity(-x)) <= 1e-14;
    });

    [Fact]
    public void Distribution_function_rises() => Gen.Select(Law, Gen.Double[-4, 4], Gen.Double[-4, 4]).Sample((law, one, other) =>
    {
        var deviation = Math.Sqrt(law.Variance);
        return law.AtMost(Math.Min(one, other) * deviation) <= law.AtMost(Math.Max(one, other) * deviation) + 1e-15;
    });

    [Fact]
    public void Lattice_probabilities_are_steps_of_the_distribution_function() => Gen.Select(Law, Gen.Double[-3, 3]).Sample((law, deviations) =>
    {
        if (law is not LatticeLaw lattice)
            return true;
        var step = (long)Math.Round(deviations * Math.Sqrt(law.Variance));
        return Math.Abs(lattice.AtMostStep(step) - lattice.AtMostStep(step - 1) - lattice.Probability(step)) <= 1e-14;
    });

    [Fact]
    public void Law_on_another_grid_is_the_law_in_another_unit() => Gen.Select(Scale, Gen.Double[0.01, 100], Share).Sample((scale, grid, coverage) =>
        Same(DiscreteLaplaceLaw.Of(scale), DiscreteLaplaceLaw.Of(scale * grid, grid), grid, coverage)
        && Same(DiscreteGaussianLaw.Of(scale), DiscreteGaussianLaw.Of(scale * grid, grid), grid, coverage)
        && Same(LaplaceLaw.Of(scale), LaplaceLaw.Of(scale * grid), grid, coverage)
        && Same(GaussianLaw.Of(scale), GaussianLaw.Of(scale * grid), grid, coverage));

    [Fact]
    public void Steps_beyond_which_little_is_left_are_the_least() => Gen.Select(Law, Gen.Double[1e-9, 0.9]).Sample((law, chance) =>
    {
        if (law is not LatticeLaw lattice)
            return true;
        var steps = lattice.StepsBeyondWhich(chance);
        double Beyond(long s) => lattice.AtMostStep(-s - 1) + lattice.AtLeastStep(s + 1);
        return Beyond(steps) <= chance && (steps == 0 || Beyond(steps - 1) > chance);
    });

    [Fact]
    public void Range_grows_with_coverage_and_holds_the_published_value_where_possible() =>
        Gen.Select(Law, Share, Share, Gen.Int[-1000, 1_000_000]).Sample((law, one, other, published) =>
        {
            var error = FigureError.Of(law);
            var narrow = error.RangeAt(published, one < other ? one : other, PossibleValues.Counts);
            var wide = error.RangeAt(published, one < other ? other : one, PossibleValues.Counts);
            return wide.Low <= narrow.Low && narrow.High <= wide.High && narrow.Low <= narrow.High
                && (published < 0 || (narrow.Low <= published && published <= narrow.High));
        });

    [Fact]
    public void Continuous_laws_agree_with_MathNet() => Gen.Select(Scale, Gen.Double[-8, 8]).Sample((scale, deviations) =>
    {
        var x = deviations * scale;
        return Near(Normal.CDF(0, scale, x), GaussianLaw.Of(scale).AtMost(x))
            && Near(Normal.PDF(0, scale, x), GaussianLaw.Of(scale).Density(x))
            && Near(Laplace.CDF(0, scale, x), LaplaceLaw.Of(scale).AtMost(x))
            && Near(Laplace.PDF(0, scale, x), LaplaceLaw.Of(scale).Density(x))
            && Near(ContinuousUniform.CDF(-scale, scale, x), UniformLaw.Of(scale).AtMost(x));
    });

    [Fact]
    public void Discrete_uniform_law_agrees_with_MathNet() => Gen.Select(Gen.Int[0, 1000], Gen.Int[-1200, 1200]).Sample((half, step) =>
        Near(DiscreteUniform.CDF(-half, half, step), DiscreteUniformLaw.Of(half).AtMostStep(step)));

    private static bool Near(double expected, double actual) => Math.Abs(actual - expected) <= 1e-12 * Math.Abs(expected) + 1e-15;

    private static bool Same(NoiseLaw law, NoiseLaw scaled, double factor, Coverage coverage)
    {
        var (half, other) = (law.HalfWidthAt(coverage), scaled.HalfWidthAt(coverage));
        return Math.Abs(half.Width * factor - other.Width) <= 1e-11 * other.Width && Math.Abs(half.Attained - other.Attained) <= 1e-11
            && Math.Abs(law.Variance * factor * factor - scaled.Variance) <= 1e-11 * scaled.Variance;
    }
}
