using CsCheck;
using ReleaseKit.Noise.Laws;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Losses;
using static ReleaseKit.Privacy.Losses.NeighbourRelation;

namespace ReleaseKit.Privacy.Tests.Losses;

public sealed class ManyCellsTests
{
    /// <summary>Δ₁ and Δ₂ of the design's table, read off from Laplace noise of scale 1 (ε = Δ₁) and Gaussian noise of σ 1 (2ρ = Δ₂²).</summary>
    [Theory]
    [InlineData(AddOrRemove, 3, 2.0, false, null, true, 10, 6, 12)]
    [InlineData(AddOrRemove, 3, 2.0, false, 5.0, true, 10, 5, 9)]
    [InlineData(AddOrRemove, 3, 2.0, true, null, true, 10, 6, 12)]
    [InlineData(Replace, 3, 2.0, false, null, true, 10, 12, 24)]
    [InlineData(Replace, 3, 2.0, false, null, true, 4, 8, 16)]
    [InlineData(Replace, 3, 2.0, true, null, true, 10, 12, 48)]
    [InlineData(Replace, 3, 2.0, false, null, false, 10, 6, 12)]
    [InlineData(AddOrRemove, 3, 2.0, false, null, true, 2, 4, 8)]
    [InlineData(Replace, 1, 1.0, false, null, true, 50, 2, 2)]
    public void Contribution_gives_the_sensitivities_of_the_table(
        NeighbourRelation relation, int cellsPerUnit, double perCell, bool signed, double? perUnit, bool moves, int cells, double l1, double l2Squared)
    {
        var unit = new UnitContribution.PerCell(cellsPerUnit, perCell, signed, perUnit, moves);
        var laplace = MechanismLoss.Of([new NoisedCells(LaplaceLaw.Of(1), cells)], unit, relation);
        var gaussian = MechanismLoss.Of([new NoisedCells(GaussianLaw.Of(1), cells)], unit, relation);
        Assert.Equal(l1, laplace.Pure.Upper.Value, 1e-12);
        Assert.Equal(l1, laplace.Pure.Lower.Value, 1e-12);
        Assert.Equal(l2Squared / 2, gaussian.Concentrated.Upper.Value, 1e-12);
        Assert.Equal(l2Squared / 2, gaussian.Concentrated.Lower.Value, 1e-12);
    }

    /// <summary>A unit that stays in its two cells can still shift its whole sum from one to the other.</summary>
    [Fact]
    public void Bound_on_a_units_sum_counts_twice_where_its_answer_changes_within_its_cells()
    {
        var unit = new UnitContribution.PerCell(2, 1, PerUnit: 1, Moves: false);
        Assert.Equal(2, MechanismLoss.Of([new NoisedCells(LaplaceLaw.Of(1), 10)], unit, Replace).Pure.Upper.Value, 1e-12);
    }

    [Fact]
    public void Bound_on_a_sum_of_signed_contributions_lowers_no_upper_bound()
    {
        var unit = new UnitContribution.PerCell(2, 1, Signed: true, PerUnit: 1);
        var loss = MechanismLoss.Of([new NoisedCells(LaplaceLaw.Of(1), 10)], unit, AddOrRemove);
        Assert.Equal(2, loss.Pure.Upper.Value, 1e-12);
        Assert.Equal(1, loss.Pure.Lower.Value, 1e-12);
    }

    /// <summary>rho 0.005540167 of the design's example: one cell a household, one a cell, sigma 9.5.</summary>
    [Fact]
    public void Discrete_Gaussian_of_the_example_costs_what_the_design_says() =>
        ReferenceRow.Near(0.00554016620498615, Count(DiscreteGaussianLaw.Of(9.5), 18).Concentrated.Upper.Value, "rho");

    [Fact]
    public void Varying_scales_are_charged_from_the_smallest()
    {
        NoisedCells[] cells = [new(LaplaceLaw.Of(4), 5), new(LaplaceLaw.Of(1), 1), new(LaplaceLaw.Of(2), 1)];
        var loss = MechanismLoss.Of(cells, new UnitContribution.PerCell(3, 1), AddOrRemove);
        Assert.Equal(1 + 0.5 + 0.25, loss.Pure.Upper.Value, 1e-12);
        Assert.Equal(1, loss.Pure.Lower.Value, 1e-12);
    }

    [Fact]
    public void Sum_over_cells_of_varying_scales_is_bounded_by_the_smallest_and_proven_by_the_largest()
    {
        NoisedCells[] cells = [new(LaplaceLaw.Of(1.5), 1), new(LaplaceLaw.Of(2.5), 1)];
        var loss = MechanismLoss.Of(cells, new UnitContribution.AbsoluteSum(0.14), AddOrRemove);
        Assert.Equal(0.14 / 1.5, loss.Pure.Upper.Value, 1e-12);
        Assert.Equal(0.14 / 2.5, loss.Pure.Lower.Value, 1e-12);
    }

    [Fact]
    public void Norms_convert_as_the_design_says()
    {
        var laplace = MechanismLoss.Of([new NoisedCells(LaplaceLaw.Of(2), 9)], new UnitContribution.Euclidean(1), AddOrRemove);
        Assert.Equal(3.0 / 2, laplace.Pure.Upper.Value, 1e-12);
        var gaussian = MechanismLoss.Of([new NoisedCells(GaussianLaw.Of(2), 9)], new UnitContribution.AbsoluteSum(1), AddOrRemove);
        Assert.Equal(1.0 / 8, gaussian.Concentrated.Upper.Value, 1e-12);
        var lattice = MechanismLoss.Of([new NoisedCells(DiscreteLaplaceLaw.Of(2), 100)], new UnitContribution.Euclidean(3), AddOrRemove);
        Assert.Equal(9 * 0.5, lattice.Pure.Upper.Value, 1e-12);
        Assert.Equal(9 * 0.5 * Math.Tanh(0.25), lattice.Concentrated.Upper.Value, 1e-12);
    }

    [Fact]
    public void Gaussian_curve_of_many_cells_is_that_of_their_distance()
    {
        var many = MechanismLoss.Of([new NoisedCells(GaussianLaw.Of(3), 8)], new UnitContribution.PerCell(4, 1), AddOrRemove);
        var exact = new GaussianCurve(2.0 / 3);
        ReferenceRow.Near(exact.DeltaAt(Epsilon.Of(1)).Value, many.DeltaAt(Epsilon.Of(1)).Upper.Value, "delta");
        ReferenceRow.Near(exact.EpsilonAt(Delta.Of(1e-6)).Value, many.EpsilonAt(Delta.Of(1e-6)).Upper.Value, "epsilon");
    }

    [Fact]
    public void Uniform_noise_on_two_cells_shows_the_shift_if_either_does() =>
        Assert.Equal(1 - (0.9 * 0.9), MechanismLoss.Of([new NoisedCells(UniformLaw.Of(5), 8)], new UnitContribution.PerCell(2, 1), AddOrRemove).DeltaAt(Epsilon.Of(3)).Upper.Value, 1e-12);

    /// <summary>From Σd/t on, the steps that one of the laws reaches and the other does not are all that is left, in one cell or the other.</summary>
    [Theory]
    [InlineData(AddOrRemove, 2, 1, 2)]
    [InlineData(AddOrRemove, 2, 2, 6)]
    [InlineData(AddOrRemove, 2, 1, 14)]
    [InlineData(Replace, 1, 1, 6)]
    public void Truncated_law_on_two_cells_shows_the_shift_where_either_ends(NeighbourRelation relation, int cellsPerUnit, long most, double cutoff)
    {
        var law = TruncatedDiscreteLaplaceLaw.Of(2, cutoff);
        var loss = MechanismLoss.Of([new NoisedCells(law, 4)], new UnitContribution.PerCell(cellsPerUnit, most), relation);
        var exact = Enumerated.OfTwo(law, most, most);
        foreach (var epsilon in new double[] { most, most + 0.3, 3, 50, 1e5, 1e12 })
            ReferenceRow.Near(exact.Delta(Math.Min(epsilon, 50)), loss.DeltaAt(Epsilon.Of(epsilon)).Upper.Value, $"delta at {epsilon}");
        Assert.InRange(exact.Delta(most / 4.0), 0, loss.DeltaAt(Epsilon.Of(most / 4.0)).Upper.Value);
        Assert.InRange(loss.EpsilonAt(Delta.Of(exact.Delta(50) * (1 + 1e-6))).Upper.Value, 0, most * (1 + 1e-9));
    }

    [Fact]
    public void Truncated_law_with_a_norm_shows_no_more_than_where_it_ends()
    {
        var law = TruncatedDiscreteLaplaceLaw.Of(2, 6);
        foreach (UnitContribution unit in new UnitContribution[] { new UnitContribution.AbsoluteSum(2), new UnitContribution.Euclidean(1.4143) })
            ReferenceRow.Near(Enumerated.Of(law, 2).Delta(50), MechanismLoss.Of([new NoisedCells(law, 2)], unit, AddOrRemove).DeltaAt(Epsilon.Of(1)).Upper.Value, unit.ToString());
    }

    /// <summary>A shift of a third of a step still crosses one: three small shifts cost as much as three large ones.</summary>
    [Fact]
    public void Bound_on_a_units_sum_spares_no_law_of_steps()
    {
        var unit = new UnitContribution.PerCell(3, 1, PerUnit: 1);
        var loss = MechanismLoss.Of([new NoisedCells(StaircaseLaw.Of(0.5, 1, 0.4), 10)], unit, AddOrRemove);
        Assert.Equal(1.5, loss.Pure.Upper.Value, 1e-12);
        Assert.Equal(0.5, loss.Pure.Lower.Value, 1e-12);
    }

    /// <summary>The curve of one cell bounds no spread over several: a norm alone leaves the pure loss and ρ.</summary>
    [Fact]
    public void Norm_alone_gives_no_more_than_its_pure_and_concentrated_losses()
    {
        var laplace = MechanismLoss.Of([new NoisedCells(LaplaceLaw.Of(2), 9)], new UnitContribution.AbsoluteSum(1), AddOrRemove);
        var binary = ApproximateCurve.OfPure(Epsilon.Of(0.5));
        Assert.Equal(binary.DeltaAt(Epsilon.Of(0.2)).Value, laplace.DeltaAt(Epsilon.Of(0.2)).Upper.Value, 1e-12);
        var lattice = MechanismLoss.Of([new NoisedCells(DiscreteGaussianLaw.Of(2), 9)], new UnitContribution.Euclidean(2), AddOrRemove);
        Assert.Equal(ConcentratedConversion.DeltaAt(Rho.Of(0.5), Epsilon.Of(2)).Value, lattice.DeltaAt(Epsilon.Of(2)).Upper.Value, 1e-12);
    }

    [Theory]
    [InlineData(AddOrRemove, 1)]
    [InlineData(AddOrRemove, 2)]
    [InlineData(Replace, 1)]
    [InlineData(Replace, 2)]
    public void No_pair_of_neighbours_on_two_cells_loses_more_than_the_upper_bound_nor_all_less_than_the_lower(NeighbourRelation relation, int cellsPerUnit)
    {
        foreach (LatticeLaw law in new LatticeLaw[] { DiscreteLaplaceLaw.Of(1.5), DiscreteGaussianLaw.Of(2), TruncatedDiscreteLaplaceLaw.Of(2, 6), DiscreteUniformLaw.Of(4) })
        {
            var loss = MechanismLoss.Of([new NoisedCells(law, 2)], new UnitContribution.PerCell(cellsPerUnit, 2), relation);
            var pairs = Pairs(relation, cellsPerUnit, most: 2).Select(pair => Enumerated.OfTwo(law, pair.First, pair.Second)).ToList();
            foreach (var epsilon in new[] { 0.1, 0.5, 1.2 })
            {
                var bounds = loss.DeltaAt(Epsilon.Of(epsilon));
                var exact = pairs.Max(pair => pair.Delta(epsilon));
                Assert.InRange(exact, bounds.Lower.Value - 1e-12, bounds.Upper.Value + 1e-12);
            }

            if (law is DiscreteLaplaceLaw)
                ReferenceRow.Near(pairs.Max(pair => pair.LargestLogRatio()), loss.Pure.Upper.Value, law.ToString());
        }
    }

    [Fact]
    public void Adding_cells_or_contribution_never_lowers_a_loss() =>
        Gen.Select(Gen.Int[1, 6], Gen.Double[0.5, 5], Gen.Double[0.3, 20], Gen.Bool, Gen.Int[1, 9]).Sample((cells, most, scale, replace, all) =>
        {
            var relation = replace ? Replace : AddOrRemove;
            foreach (NoiseLaw law in new NoiseLaw[] { LaplaceLaw.Of(scale), DiscreteLaplaceLaw.Of(scale), GaussianLaw.Of(scale), StaircaseLaw.Of(1, scale, 0.4) })
            {
                MechanismLoss At(int perUnit, double perCell, int count) =>
                    MechanismLoss.Of([new NoisedCells(law, count)], new UnitContribution.PerCell(perUnit, perCell), relation);
                var one = At(cells, most, all);
                foreach (var more in new[] { At(cells + 1, most, all), At(cells, most * 1.5, all), At(cells, most, all + 1) })
                {
                    Assert.True(one.Concentrated.Upper.Value <= more.Concentrated.Upper.Value * (1 + 1e-12));
                    Assert.True(one.Pure.Upper.Value <= more.Pure.Upper.Value * (1 + 1e-12));
                }
            }
        }, iter: 120, seed: "0000KOJ4fUr2");

    [Fact]
    public void Lower_bounds_never_exceed_upper_ones_nor_does_replacing_cost_less_than_adding() =>
        Gen.Select(Gen.Int[1, 5], Gen.Double[0.5, 4], Gen.Double[0.4, 12], Gen.Double[0.4, 12], Gen.Bool, Gen.Int[1, 5]).Sample((cells, most, scale, other, signed, count) =>
        {
            UnitContribution[] units = [new UnitContribution.PerCell(cells, most, signed, most * 1.5), new UnitContribution.AbsoluteSum(most), new UnitContribution.Euclidean(most)];
            foreach (var unit in units)
            {
                var replaced = Loss(unit, Replace, scale, other, count);
                var added = Loss(unit, AddOrRemove, scale, other, count);
                Assert.True(added.Concentrated.Upper.Value <= replaced.Concentrated.Upper.Value * (1 + 1e-12));
                Assert.True(replaced.Concentrated.Lower.Value <= replaced.Concentrated.Upper.Value * (1 + 1e-12));
                Assert.True(added.Pure.Lower.Value <= added.Pure.Upper.Value * (1 + 1e-12));
                Assert.True(added.DeltaAt(Epsilon.Of(0.5)).Lower <= added.DeltaAt(Epsilon.Of(0.5)).Upper);
            }
        }, iter: 80, seed: "0000KOJ4fUr2");

    private static MechanismLoss Loss(UnitContribution unit, NeighbourRelation relation, double scale, double other, int count) =>
        MechanismLoss.Of([new NoisedCells(DiscreteLaplaceLaw.Of(scale), count), new NoisedCells(DiscreteLaplaceLaw.Of(other), 2)], unit, relation);

    private static MechanismLoss Count(NoiseLaw law, long cells) => MechanismLoss.Of([new NoisedCells(law, cells)], new UnitContribution.PerCell(1, 1), AddOrRemove);

    // Every difference between neighbours on two cells: a unit counts 0..most in at most so many of them.
    private static IEnumerable<(long First, long Second)> Pairs(NeighbourRelation relation, int cellsPerUnit, long most)
    {
        var counts = Enumerable.Range(0, (int)most + 1).Select(value => (long)value).ToList();
        var records = counts.SelectMany(a => counts.Select(b => (First: a, Second: b)))
            .Where(record => (record.First > 0 ? 1 : 0) + (record.Second > 0 ? 1 : 0) <= cellsPerUnit).ToList();
        if (relation == AddOrRemove)
            return records.SelectMany(record => new[] { record, (-record.First, -record.Second) });
        return records.SelectMany(old => records.Select(other => (other.First - old.First, other.Second - old.Second)));
    }

    /// <summary>Every way to spend a norm of two steps over two cells, enumerated.</summary>
    [Fact]
    public void No_way_to_spend_a_norm_loses_more_than_its_bound()
    {
        foreach (LatticeLaw law in new LatticeLaw[] { DiscreteLaplaceLaw.Of(1.5), DiscreteGaussianLaw.Of(2), TruncatedDiscreteLaplaceLaw.Of(2, 6), DiscreteUniformLaw.Of(4) })
        {
            var sum = MechanismLoss.Of([new NoisedCells(law, 2)], new UnitContribution.AbsoluteSum(2), AddOrRemove);
            var distance = MechanismLoss.Of([new NoisedCells(law, 2)], new UnitContribution.Euclidean(2), AddOrRemove);
            foreach (var (first, second) in new (long, long)[] { (2, 0), (1, 1), (1, -1), (1, 0), (-2, 0) })
            {
                var pair = Enumerated.OfTwo(law, first, second);
                foreach (var epsilon in new[] { 0.1, 0.5, 1.4, 3 })
                {
                    Assert.InRange(pair.Delta(epsilon), 0, sum.DeltaAt(Epsilon.Of(epsilon)).Upper.Value + 1e-12);
                    Assert.InRange(pair.Delta(epsilon), 0, distance.DeltaAt(Epsilon.Of(epsilon)).Upper.Value + 1e-12);
                }
            }
        }
    }

    /// <summary>Noise on a grid of 1 or 5 moves by whole steps: every sensitivity above nothing costs at least what one step costs by enumeration.</summary>
    [Theory]
    [InlineData(1, 1e-12)]
    [InlineData(1, 0.5)]
    [InlineData(1, 0.99)]
    [InlineData(5, 4)]
    public void Sensitivity_below_a_step_costs_a_step_in_every_law_and_form(double grid, double most)
    {
        UnitContribution[] units =
        [
            new UnitContribution.PerCell(1, most), new UnitContribution.PerCell(1, 3 * grid, PerUnit: most), new UnitContribution.AbsoluteSum(most), new UnitContribution.Euclidean(most),
        ];
        foreach (var (law, unit, cells) in Lattice(grid).SelectMany(law => units.SelectMany(unit => new[] { (law, unit, 1L), (law, unit, 8L) })))
        {
            var loss = MechanismLoss.Of([new NoisedCells(law, cells)], unit, AddOrRemove);
            var step = Enumerated.Of(law, 1);
            foreach (var epsilon in new[] { 0, 0.1, 0.5 })
                Assert.InRange(loss.DeltaAt(Epsilon.Of(epsilon)).Upper.Value, step.Delta(epsilon) * (1 - 1e-9), 1);
            if (law is DiscreteLaplaceLaw or DiscreteGaussianLaw)
                Assert.InRange(loss.Concentrated.Upper.Value, step.Rho() * (1 - 1e-6), step.Rho() * (1 + 1e-3));
            if (law is DiscreteLaplaceLaw)
                ReferenceRow.Near(step.LargestLogRatio(), loss.Pure.Upper.Value, law.ToString());
        }
    }

    /// <summary>Squares of whole steps add up to whole numbers: 0.99² to 1, 1.2² to 2 (in one cell to 2²), 1.9² to 4; √2 to five digits is √2.</summary>
    [Theory]
    [InlineData(0.99, 8, 1)]
    [InlineData(1.2, 8, 2)]
    [InlineData(1.2, 1, 4)]
    [InlineData(1.9, 8, 4)]
    [InlineData(1.4142, 8, 2)]
    [InlineData(1.4143, 8, 2)]
    public void Distance_is_taken_up_to_what_whole_steps_can_give(double distance, int cells, int squares)
    {
        double RhoOf(NoiseLaw law) => MechanismLoss.Of([new NoisedCells(law, cells)], new UnitContribution.Euclidean(distance), AddOrRemove).Concentrated.Upper.Value;
        Assert.Equal(squares / 50.0, RhoOf(DiscreteGaussianLaw.Of(5)), 1e-12);
        Assert.InRange(RhoOf(DiscreteLaplaceLaw.Of(5)), 0.9 * squares * 0.2 * Math.Tanh(0.1), squares * 0.2 * Math.Tanh(0.1) * (1 + 1e-12));
    }

    private static IEnumerable<LatticeLaw> Lattice(double grid) =>
        [DiscreteLaplaceLaw.Of(4 * grid, grid), DiscreteGaussianLaw.Of(5 * grid, grid), TruncatedDiscreteLaplaceLaw.Of(4 * grid, 11 * grid, grid), DiscreteUniformLaw.Of(6 * grid, grid)];
}
