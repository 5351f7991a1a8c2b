using System.Globalization;
using ReleaseKit.Noise;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Benchmarks;

/// <summary>
/// The processor time of every question to every law at scales from 0.01 to 1e6, in microseconds, as a table; the median of nine batches.
/// Processor time, unlike the clock's, hardly depends on what else the machine does.
/// </summary>
public static class QuestionTable
{
    private static readonly double[] Scales = [0.01, 1, 1e3, 1e6];

    private static readonly (string Name, Func<double, NoiseLaw?> Of)[] Laws =
    [
        ("laplace", LaplaceLaw.Of),
        ("gaussian", GaussianLaw.Of),
        ("uniform", UniformLaw.Of),
        ("staircase, short steps", scale => StaircaseLaw.Of(1 / scale, 1, 0.4)),
        ("staircase, long steps", scale => StaircaseLaw.Of(1, scale, 0.4)),
        ("discrete laplace", scale => DiscreteLaplaceLaw.Of(scale)),
        ("discrete gaussian", scale => DiscreteGaussianLaw.Of(scale)),
        ("truncated discrete laplace", scale => TruncatedDiscreteLaplaceLaw.Of(scale, Math.Ceiling(20 * scale))),
        ("discrete uniform", scale => DiscreteUniformLaw.Of(Math.Ceiling(scale))),
        ("table of 2001 rows", scale => TabulatedLaw.Of(Enumerable.Range(-1000, 2001).Select(Row), scale / 300)),
        ("sum of 4 discrete laplace", scale => scale > 1e4 ? null : IntegerSum.Of((DiscreteLaplaceLaw.Of(scale), 4))),
    ];

    public static void Print(TextWriter to)
    {
        to.WriteLine($"{"µs of processor time at scale",-78}{string.Concat(Scales.Select(scale => Cell(scale, "G")))}");
        foreach (var question in Question.All)
        {
            foreach (var (name, of) in Laws)
            {
                var cells = Scales.Select(scale => of(scale) is { } law && question.Of(law, scale) is { } ask ? Cell(Median(ask), "F2") : Cell(null, ""));
                to.WriteLine($"{question.Name,-50}{name,-28}{string.Concat(cells)}");
            }
        }
    }

    private static (long, decimal) Row(int step) => (step, step == 0 ? 0.2m : 0.0004m);

    private static string Cell(double? number, string format) => (number?.ToString(format, CultureInfo.InvariantCulture) ?? "-").PadLeft(12);

    private static double Median(Action<Coverage> ask)
    {
        var calls = 1;
        while (calls < 1 << 16 && Batch(ask, calls) * calls < 4000)
            calls *= 2;
        return Enumerable.Range(0, 9).Select(_ => Batch(ask, calls)).Order().ElementAt(4);
    }

    private static double Batch(Action<Coverage> ask, int calls)
    {
        var before = Environment.CpuUsage.UserTime;
        for (var call = 0; call < calls; call++)
            ask(NextCoverage());
        return (Environment.CpuUsage.UserTime - before).TotalMicroseconds / calls;
    }

    private static Coverage NextCoverage() => Coverage.OfShare(0.95 - 1e-9 * asked++);

    private static int asked;
}
