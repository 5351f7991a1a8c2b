using System.Numerics;
using MathNet.Numerics.IntegralTransforms;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Errors;

/// <summary>The chances of a run of steps, and a bound on the chance of all steps outside the run.</summary>
internal sealed record StepChances(long First, double[] Chances, double Lost)
{
    /// <summary>The longest run that is kept: above it a convolution takes seconds and hundreds of megabytes.</summary>
    public const int Longest = 1 << 19;

    // Up to this many products the plain double sum is as fast as the transform and exact to the last digits in the tails too.
    private const long PlainProducts = 1L << 28;

    /// <summary>The chances of a law, but for tails of at most the given chance.</summary>
    public static StepChances Of(LatticeLaw law, double tail)
    {
        var farthest = law.StepsBeyondWhich(tail);
        if (farthest > Longest / 2)
            throw TooWide();
        var chances = new double[2 * farthest + 1];
        for (var i = 0; i < chances.Length; i++)
            chances[i] = law.Probability(i - farthest);
        var missing = law is TabulatedLaw table ? (double)table.MissingMass : 0;
        return new StepChances(-farthest, chances, missing + tail).Trimmed(tail);
    }

    /// <summary>The sum of n independent copies, by repeated squaring.</summary>
    public StepChances Times(int count, double tail)
    {
        StepChances? sum = null;
        for (var power = this; ; power = power.Plus(power, tail))
        {
            if (count % 2 == 1)
                sum = sum is null ? power : sum.Plus(power, tail);
            if ((count /= 2) == 0)
                return sum!;
        }
    }

    /// <summary>The sum of two independent draws, its tails trimmed by at most the given chance on each side.</summary>
    public StepChances Plus(StepChances other, double tail)
    {
        var length = Chances.Length + other.Chances.Length - 1;
        if (length > 2 * Longest)
            throw TooWide();
        var plain = (long)Chances.Length * other.Chances.Length <= PlainProducts;
        var sum = plain ? Convolved(Chances, other.Chances) : Transformed(Chances, other.Chances, length);
        return new StepChances(First + other.First, sum, Lost + other.Lost).Trimmed(plain ? tail : Math.Max(tail, 1e-16));
    }

    private StepChances Trimmed(double tail)
    {
        var (from, to) = (0, Chances.Length - 1);
        var (below, above) = (0.0, 0.0);
        while (from < to && below + Chances[from] <= tail)
            below += Chances[from++];
        while (to > from && above + Chances[to] <= tail)
            above += Chances[to--];
        var kept = new StepChances(First + from, Chances[from..(to + 1)], Lost + below + above);
        return kept.Chances.Length <= Longest ? kept : throw TooWide();
    }

    private static double[] Convolved(double[] left, double[] right)
    {
        var sum = new double[left.Length + right.Length - 1];
        for (var i = 0; i < left.Length; i++)
            AddScaled(sum.AsSpan(i, right.Length), right, left[i]);
        return sum;
    }

    private static void AddScaled(Span<double> target, ReadOnlySpan<double> source, double factor)
    {
        var width = Vector<double>.Count;
        var i = 0;
        for (; i <= source.Length - width; i += width)
            (new Vector<double>(target[i..]) + new Vector<double>(source[i..]) * factor).CopyTo(target[i..]);
        for (; i < source.Length; i++)
            target[i] += source[i] * factor;
    }

    // (a + ib)² = a² − b² + 2i·ab: one transform there and one back. Errors are about 1e-16 of the largest chance.
    private static double[] Transformed(double[] left, double[] right, int length)
    {
        var packed = new Complex[BitOperations.RoundUpToPowerOf2((uint)length)];
        for (var i = 0; i < packed.Length; i++)
            packed[i] = new Complex(i < left.Length ? left[i] : 0, i < right.Length ? right[i] : 0);
        Fourier.Forward(packed, FourierOptions.Matlab);
        for (var i = 0; i < packed.Length; i++)
            packed[i] *= packed[i];
        Fourier.Inverse(packed, FourierOptions.Matlab);
        return [.. packed.Take(length).Select(value => Math.Max(0, value.Imaginary / 2))];
    }

    private static ArgumentException TooWide() =>
        new($"The sum spreads over more than {Longest} grid steps, too wide to be worked out by convolution.");
}
