using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Privacy.Tests.Losses;

/// <summary>The exact loss between two laws on whole steps, by summing over every step that matters: the definition and nothing else.</summary>
internal sealed class Enumerated
{
    private readonly double[] here, there;

    private Enumerated(double[] here, double[] there) => (this.here, this.there) = (here, there);

    public static Enumerated Of(LatticeLaw law, long shift, long reach = 400)
    {
        double[] At(long moved) => [.. Range(-reach, reach).Select(step => law.Probability(step - moved))];
        return new Enumerated(At(0), At(shift));
    }

    /// <summary>Two independent cells, moved by two shifts.</summary>
    public static Enumerated OfTwo(LatticeLaw law, long first, long second, long reach = 45)
    {
        double[] At(long one, long two) =>
            [.. Range(-reach, reach).SelectMany(step => Range(-reach, reach).Select(other => law.Probability(step - one) * law.Probability(other - two)))];
        return new Enumerated(At(0, 0), At(first, second));
    }

    public double Delta(double epsilon) => Pairs().Sum(pair => Math.Max(0, pair.P - (Math.Exp(epsilon) * pair.Q)));

    /// <summary>The larger of both directions.</summary>
    public double LargestLogRatio() => Pairs().Where(pair => pair.P > 1e-250 && pair.Q > 1e-250).Max(pair => Math.Abs(Math.Log(pair.P / pair.Q)));

    /// <summary>D_α ÷ α, α &gt; 1.</summary>
    public double RenyiOverOrder(double order) =>
        Math.Log(Pairs().Where(pair => pair is { P: > 0, Q: > 0 }).Sum(pair => Math.Exp((order * Math.Log(pair.P)) + ((1 - order) * Math.Log(pair.Q))))) / (order - 1) / order;

    /// <summary>The largest D_α ÷ α over orders from near 1 to 5.</summary>
    public double Rho() => Enumerable.Range(0, 120).Max(i => RenyiOverOrder(1 + Math.Exp(-7 + (i * 0.07))));

    private IEnumerable<(double P, double Q)> Pairs() => here.Zip(there);

    private static IEnumerable<long> Range(long from, long to)
    {
        for (var step = from; step <= to; step++)
            yield return step;
    }
}
