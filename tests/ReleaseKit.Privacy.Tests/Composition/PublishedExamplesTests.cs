using ReleaseKit.Noise.Laws;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Losses;
using ReleaseKit.Privacy.Meaning;

namespace ReleaseKit.Privacy.Tests.Composition;

/// <summary>Worked examples of published texts; where a text was not at hand this is said.</summary>
public sealed class PublishedExamplesTests
{
    /// <summary>Bun &amp; Steinke 2016, Propositions 1.6 and 1.3 (from memory): σ = 8, Δ = 1 gives ρ = 1/128; ρ = 0.1 at 1e-6 gives 2.4507880004767996.</summary>
    [Fact]
    public void Gaussian_and_its_conversion_cost_what_the_formula_prints()
    {
        var loss = MechanismLoss.Of([new NoisedCells(GaussianLaw.Of(8), 1)], new UnitContribution.PerCell(1, 1), NeighbourRelation.AddOrRemove);
        Assert.Equal(0.0078125, loss.Concentrated.Upper.Value, 1e-15);
        Assert.Equal(2.4507880004767996, ConcentratedConversion.SimpleEpsilonAt(Rho.Of(0.1), Delta.Of(1e-6)).Value, 1e-12);
    }

    /// <summary>A histogram of disjoint cells: one unit more or less moves one count by 1, one in place of another moves two (Dwork &amp; Roth 2014, section 3.3; from memory).</summary>
    [Fact]
    public void Histogram_costs_twice_as_much_where_a_unit_is_replaced()
    {
        MechanismLoss Under(NeighbourRelation relation) => MechanismLoss.Of([new NoisedCells(LaplaceLaw.Of(10), 40)], new UnitContribution.PerCell(1, 1), relation);
        Assert.Equal(0.1, Under(NeighbourRelation.AddOrRemove).Pure.Upper.Value, 1e-15);
        Assert.Equal(0.2, Under(NeighbourRelation.Replace).Pure.Upper.Value, 1e-15);
    }

    /// <summary>Odds text after Wood et al. 2018 (its table from memory, recomputed): ε = 1 lets 50 in 100 become 73 in 100, and 1 in 100 become 2.7.</summary>
    [Theory]
    [InlineData(1, 0.5, 0.731)]
    [InlineData(1, 0.01, 0.027)]
    [InlineData(2, 0.5, 0.881)]
    [InlineData(5, 0.01, 0.600)]
    public void Belief_rises_as_far_as_the_table_says(double epsilon, double prior, double printed) =>
        Assert.Equal(printed, BeliefBound.Highest(prior, Epsilon.Of(epsilon)), 5e-4);

    /// <summary>The simple and the smallest form of "pure is concentrated" differ as ε²/2 and ε·tanh(ε/2) do.</summary>
    [Fact]
    public void Smallest_rho_of_a_pure_loss_never_exceeds_the_quadratic_one() => Assert.All(
        new[] { 0.0, 0.01, 0.5, 1, 3, 20 },
        epsilon => Assert.True(PureConversion.SmallestRho(Epsilon.Of(epsilon)) <= PureConversion.QuadraticRho(Epsilon.Of(epsilon))));
}
