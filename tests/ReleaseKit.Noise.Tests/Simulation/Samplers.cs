using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>Draws from each law by a construction that does not use its distribution function.</summary>
internal static class Samplers
{
    public static double Draw(NoiseLaw law, Random random) => law switch
    {
        LaplaceLaw laplace => Sign(random) * Exponential(laplace.Scale, random),
        GaussianLaw gaussian => gaussian.Sigma * Normal(random),
        UniformLaw uniform => uniform.HalfWidth * (2 * random.NextDouble() - 1),
        StaircaseLaw staircase => Staircase(staircase, random),
        DiscreteLaplaceLaw discrete => discrete.Grid * TwoSidedGeometric(discrete.Grid / discrete.Scale, random),
        DiscreteGaussianLaw discrete => discrete.Grid * DiscreteGaussian(discrete.Sigma / discrete.Grid, random),
        DiscreteUniformLaw uniform => uniform.Grid * random.NextInt64(-Steps(uniform.HalfWidth, uniform), Steps(uniform.HalfWidth, uniform) + 1),
        TruncatedDiscreteLaplaceLaw truncated => truncated.Grid * Truncated(truncated, random),
        TabulatedLaw table => table.Grid * Tabulated(table, random),
        _ => throw new ArgumentException($"No sampler for {law}."),
    };

    private static long Steps(double length, LatticeLaw law) => (long)Math.Round(length / law.Grid);

    private static int Sign(Random random) => random.Next(2) == 0 ? -1 : 1;

    private static double Exponential(double scale, Random random) => -scale * Math.Log(1 - random.NextDouble());

    /// <summary>Box &amp; Muller 1958 (from memory).</summary>
    private static double Normal(Random random) =>
        Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());

    /// <summary>Number of failures before a success of chance 1 − e^−rate.</summary>
    private static long Geometric(double rate, Random random) => (long)Math.Floor(Exponential(1 / rate, random));

    /// <summary>The difference of two independent geometric numbers is two-sided geometric (from the generating functions).</summary>
    private static long TwoSidedGeometric(double rate, Random random) => Geometric(rate, random) - Geometric(rate, random);

    /// <summary>Rejection from the discrete Laplace law: Canonne, Kamath &amp; Steinke 2020, Algorithm 3 (numbering from memory).</summary>
    private static long DiscreteGaussian(double sigma, Random random)
    {
        var scale = Math.Floor(sigma) + 1;
        while (true)
        {
            var candidate = TwoSidedGeometric(1 / scale, random);
            var excess = Math.Abs(candidate) - sigma * sigma / scale;
            if (random.NextDouble() < Math.Exp(-excess * excess / (2 * sigma * sigma)))
                return candidate;
        }
    }

    private static long Truncated(TruncatedDiscreteLaplaceLaw law, Random random)
    {
        while (true)
        {
            var candidate = TwoSidedGeometric(law.Grid / law.Scale, random);
            if (Math.Abs(candidate) <= Steps(law.Cutoff, law))
                return candidate;
        }
    }

    /// <summary>Geng &amp; Viswanath 2014, Algorithm 1 (from memory): a sign, a geometric step, a part of the step, a place in the
    /// part.</summary>
    private static double Staircase(StaircaseLaw law, Random random)
    {
        var ratio = Math.Exp(-law.Epsilon);
        var step = Geometric(law.Epsilon, random);
        var place = random.NextDouble();
        var inHigherPart = random.NextDouble() < law.Gamma / (law.Gamma + (1 - law.Gamma) * ratio);
        var within = inHigherPart ? law.Gamma * place : law.Gamma + (1 - law.Gamma) * place;
        return Sign(random) * (step + within) * law.Sensitivity;
    }

    // What the table lacks is drawn far outside: it counts as outside every range.
    private static double Tabulated(TabulatedLaw law, Random random)
    {
        var left = (decimal)random.NextDouble();
        foreach (var (step, probability) in law.Rows)
        {
            left -= probability;
            if (left < 0)
                return step;
        }
        return 1_000_000;
    }
}
