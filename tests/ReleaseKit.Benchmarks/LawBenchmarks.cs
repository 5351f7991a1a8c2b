using BenchmarkDotNet.Attributes;
using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Benchmarks;

/// <summary>
/// How long one answer takes once a law is built, for scales from 0.01 to 1e6; each must stay under a millisecond.
/// <c>dotnet run -c Release --project tests/ReleaseKit.Benchmarks -- --filter "*LawBenchmarks*" --job short</c>
/// </summary>
public class LawBenchmarks
{
    private static readonly Coverage Main = Coverage.OfShare(0.95);

    private NoiseLaw law = GaussianLaw.Of(1);
    private FigureError error = FigureError.Of(GaussianLaw.Of(1));

    [Params("laplace", "gaussian", "staircase", "discrete-laplace", "discrete-gaussian", "truncated-discrete-laplace", "discrete-uniform")]
    public string Law { get; set; } = "";

    [Params(0.01, 9.5, 1e6)]
    public double Scale { get; set; }

    [GlobalSetup]
    public void Build()
    {
        law = Law switch
        {
            "laplace" => LaplaceLaw.Of(Scale),
            "gaussian" => GaussianLaw.Of(Scale),
            "staircase" => StaircaseLaw.Of(1 / Scale, 1, 0.4),
            "discrete-laplace" => DiscreteLaplaceLaw.Of(Scale),
            "discrete-gaussian" => DiscreteGaussianLaw.Of(Scale),
            "truncated-discrete-laplace" => TruncatedDiscreteLaplaceLaw.Of(Scale, Math.Ceiling(20 * Scale)),
            _ => DiscreteUniformLaw.Of(Math.Ceiling(Scale)),
        };
        error = FigureError.Of(law);
    }

    [Benchmark]
    public HalfWidth HalfWidth() => law.HalfWidthAt(Main);

    [Benchmark]
    public ErrorRange Range() => error.RangeAt(1240, Main, PossibleValues.Counts);

    [Benchmark]
    public ErrorRange RangeBelowZero() => error.RangeAt(-Math.Ceiling(Scale), Main, PossibleValues.Counts);
}
