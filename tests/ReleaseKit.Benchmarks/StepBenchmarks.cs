using BenchmarkDotNet.Attributes;
using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Benchmarks;

/// <summary>How long the first answer takes where after-steps act or parts are added: worked out once per law, steps and coverage, then
/// kept.</summary>
public class StepBenchmarks
{
    private static readonly Coverage Main = Coverage.OfShare(0.95);
    private static readonly FigureError Published = FigureError.Of(DiscreteGaussianLaw.Of(9.5), new AfterStep.PublishedFrom(30));

    [Params(5, 100, 1000)]
    public double Unit { get; set; }

    [Benchmark]
    public HalfWidth MarginAfterRounding() => FigureError.Of(DiscreteGaussianLaw.Of(9.5), new AfterStep.RoundTo(Unit)).MarginAt(Main);

    [Benchmark]
    public HalfWidth MarginAfterRandomRounding() =>
        FigureError.Of(DiscreteGaussianLaw.Of(1e4), new AfterStep.RoundTo(Unit, RoundingHow.AtRandom)).MarginAt(Main);

    [Benchmark]
    public ErrorRange RangeUnderThreshold() => Published.RangeAt(Unit + 40, Main, PossibleValues.Counts);

    [Benchmark]
    public HalfWidth SumOfParts() => IntegerSum.Of((DiscreteLaplaceLaw.Of(4), (int)Unit)).HalfWidthAt(Main);
}
