using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Review.Leaks;

/// <summary>How likely noise makes multiples of a number that is several of its steps, at most, whatever the values before noise are.</summary>
internal static class ResidueChance
{
    // Beyond this the noise is left out of the sums, and counted with every remainder.
    private const double Rest = 1e-12;

    // A number of more steps is not told from one of so many: no noise goes around it.
    private const double Farthest = 1e15;

    // Noise wider than this in steps is bounded and not added up.
    private const long MostSteps = 10_000;

    /// <summary>The largest chance that one figure is published at a given remainder.</summary>
    /// <param name="law">Of the noise.</param>
    /// <param name="step">The step between published values, in the figure's unit.</param>
    /// <param name="factor">Of how many such steps the number is.</param>
    public static double Most(NoiseLaw law, decimal step, decimal factor) => Math.Min(1, law switch
    {
        TabulatedLaw table => MostListed(table, StepsOf(table, step * factor)),
        LatticeLaw lattice => MostOf(lattice, StepsOf(lattice, step * factor)),
        // Of noise that falls off to both sides, an interval in every period holds no more than its share, and once more the interval about 0.
        _ => 1 / (double)factor + law.Within((double)step / 2),
    });

    /// <summary>
    /// The chance that as many figures as are given are all multiples. Figures left aside because a bound may have made them, or nothing was published,
    /// could have been any of the whole number; and every number of steps could have been the one, each with its share 6/(π factor)² of the chance.
    /// </summary>
    public static double Together(IReadOnlyList<(double Chance, int Count)> figures, int others, decimal factor)
    {
        var count = figures.Sum(figure => figure.Count);
        var log = others == 0
            ? figures.Sum(figure => figure.Count * Math.Log(figure.Chance))
            : count * Math.Log(figures.Max(figure => figure.Chance)) + LogChoices(count + others, Math.Min(count, others));
        return Math.Min(1, Math.Exp(log) * Math.Pow(Math.PI * (double)factor, 2) / 6);
    }

    private static long StepsOf(LatticeLaw law, decimal number) => (long)Math.Min(Farthest, Math.Round((double)number / law.Grid));

    private static double MostListed(TabulatedLaw table, long factor) =>
        table.Rows.GroupBy(row => ((row.Step % factor) + factor) % factor).Max(remainder => (double)remainder.Sum(row => row.Probability)) + (double)table.MissingMass;

    private static double MostOf(LatticeLaw law, long factor)
    {
        var reach = law.StepsBeyondWhich(Rest);
        return reach > MostSteps
            ? 1 / (double)factor + law.Probability(0)
            : Rest + Enumerable.Range(0, (int)Math.Min(factor, 2 * reach + 1)).Max(remainder => Sum(law, remainder - reach, reach, factor));
    }

    private static double Sum(LatticeLaw law, long from, long to, long factor)
    {
        var sum = 0.0;
        for (var step = from; step <= to; step += factor)
            sum += law.Probability(step);
        return sum;
    }

    private static double LogChoices(int all, int some)
    {
        var log = 0.0;
        for (var one = 1; one <= some; one++)
            log += Math.Log((all - some + one) / (double)one);
        return log;
    }
}
