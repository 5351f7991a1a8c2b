using ReleaseKit.Noise.Errors;
using ReleaseKit.Noise.Laws;

namespace ReleaseKit.Noise.Tests.Simulation;

/// <summary>How often ranges hold one value before noise, worked out by going through every noise step: the oracle for lattice
/// laws.</summary>
internal sealed class ExactCoverage(LatticeLaw law, AfterStep[] steps)
{
    private readonly long farthest = law.StepsBeyondWhich(1e-14);

    /// <summary>P(published value satisfies a condition) for one value before noise; null is "not published".</summary>
    public double Chance(double valueBeforeNoise, Func<double?, bool> of)
    {
        var sum = 0.0;
        for (var step = -farthest; step <= farthest; step++)
        {
            foreach (var (published, chance) in Publisher.Outcomes(steps, valueBeforeNoise + step * law.Grid))
                sum += of(published) ? chance * law.Probability(step) : 0;
        }
        return sum;
    }
}
