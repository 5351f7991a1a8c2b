using ReleaseKit.Noise.Laws;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Losses;

namespace ReleaseKit.Privacy.Tests.Losses;

public sealed class OneCellTests
{
    private static readonly double[] Epsilons = [0, 0.05, 0.2, 0.5, 1, 2];

    public static TheoryData<string> LatticeLaws => [.. Lattice.Keys];

    private static Dictionary<string, LatticeLaw> Lattice { get; } = new()
    {
        ["discrete Laplace 2"] = DiscreteLaplaceLaw.Of(2),
        ["discrete Laplace 0.4"] = DiscreteLaplaceLaw.Of(0.4),
        ["discrete Laplace 9"] = DiscreteLaplaceLaw.Of(9),
        ["discrete Gaussian 0.6"] = DiscreteGaussianLaw.Of(0.6),
        ["discrete Gaussian 3"] = DiscreteGaussianLaw.Of(3),
        ["discrete uniform 5"] = DiscreteUniformLaw.Of(5),
        ["truncated 2, 10"] = TruncatedDiscreteLaplaceLaw.Of(2, 10),
        ["truncated 6, 4"] = TruncatedDiscreteLaplaceLaw.Of(6, 4),
        ["tabulated"] = TabulatedLaw.Of([(-2, 0.1m), (-1, 0.2m), (0, 0.45m), (1, 0.15m), (3, 0.1m)]),
    };

    [Theory]
    [MemberData(nameof(LatticeLaws))]
    public void Curve_lies_between_its_bounds_at_every_shift(string name)
    {
        var loss = LawLoss.Of(Lattice[name]);
        foreach (var shift in new[] { 1, 2, 3, 6 })
        {
            foreach (var epsilon in Epsilons)
            {
                var exact = ShiftsUpTo(shift).Max(step => Enumerated.Of(Lattice[name], step).Delta(epsilon));
                var bounds = loss.DeltaAt(Epsilon.Of(epsilon), shift);
                Assert.InRange(exact, bounds.Lower.Value - 1e-12, bounds.Upper.Value + 1e-12);
                Assert.InRange(bounds.Upper.Value - bounds.Lower.Value, 0, 1e-11);
            }
        }
    }

    [Theory]
    [InlineData("discrete Laplace 2")]
    [InlineData("discrete Laplace 0.4")]
    [InlineData("discrete Laplace 9")]
    [InlineData("discrete Gaussian 3")]
    public void Rho_lies_between_its_bounds_at_every_shift(string name)
    {
        foreach (var shift in new[] { 1, 2, 3, 6 })
        {
            var exact = ShiftsUpTo(shift).Max(step => Enumerated.Of(Lattice[name], step, reach: name.Contains("Gaussian", StringComparison.Ordinal) ? 110 : 400).Rho());
            var bounds = LawLoss.Of(Lattice[name]).Concentrated(shift);
            Assert.True(exact <= bounds.Upper.Value * (1 + 1e-9), $"{name} by {shift}: {exact:R} is above the upper bound {bounds.Upper}");
            Assert.True(bounds.Lower.Value <= bounds.Upper.Value * (1 + 1e-12));
            ReferenceRow.Near(exact, bounds.Lower.Value, $"{name} by {shift}", 1e-3);
        }
    }

    [Theory]
    [InlineData("discrete Laplace 2")]
    [InlineData("discrete Laplace 0.4")]
    [InlineData("discrete Laplace 9")]
    public void Pure_loss_is_the_largest_log_ratio(string name)
    {
        foreach (var shift in new[] { 1, 2, 3, 6 })
        {
            var bounds = LawLoss.Of(Lattice[name]).Pure(shift);
            var exact = ShiftsUpTo(shift).Max(step => Enumerated.Of(Lattice[name], step, reach: 80).LargestLogRatio());
            ReferenceRow.Near(exact, bounds.Upper.Value, $"{name} by {shift}");
            ReferenceRow.Near(exact, bounds.Lower.Value, $"{name} by {shift}");
        }
    }

    [Theory]
    [InlineData("discrete Gaussian 3")]
    [InlineData("discrete uniform 5")]
    [InlineData("truncated 2, 10")]
    [InlineData("tabulated")]
    public void Law_without_a_largest_log_ratio_has_no_pure_loss(string name) =>
        Assert.False(LawLoss.Of(Lattice[name]).Pure(1).Upper.IsFinite);

    [Fact]
    public void Curve_of_one_cell_equals_the_reference()
    {
        var rows = ReferenceRow.Of("exact-delta.csv");
        Assert.NotEmpty(rows);
        foreach (var row in rows)
        {
            var part = row["mechanisms"].Split(':');
            double Number(int index) => double.Parse(part[index], System.Globalization.CultureInfo.InvariantCulture);
            LatticeLaw law = part[1] switch
            {
                "discrete-laplace" => DiscreteLaplaceLaw.Of(Number(2)),
                "discrete-gaussian" => DiscreteGaussianLaw.Of(Number(2)),
                _ => TruncatedDiscreteLaplaceLaw.Of(Number(2), Number(3)),
            };
            var bounds = LawLoss.Of(law).DeltaAt(Epsilon.Of(row.Number("eps")), Number(part.Length - 1));
            var tolerance = (1e-9 * row.Number("delta")) + 3e-15;
            Assert.InRange(bounds.Upper.Value, row.Number("delta") - tolerance, row.Number("delta") + tolerance);
            Assert.InRange(bounds.Lower.Value, row.Number("delta") - tolerance, row.Number("delta") + tolerance);
        }
    }

    [Fact]
    public void Laplace_divergence_of_no_order_exceeds_its_rho()
    {
        foreach (var epsilon in new[] { 1e-4, 0.01, 0.1, 0.5, 1, 2, 5, 12 })
        {
            var rho = LawLoss.Of(LaplaceLaw.Of(1 / epsilon)).Concentrated(1).Upper.Value;
            for (var log = -4.0; log < 5; log += 0.05)
                Assert.True(LaplaceRenyi(1 + Math.Exp(log), epsilon) / (1 + Math.Exp(log)) <= (rho * (1 + 1e-9)) + (1e-15 / Math.Exp(log)));
        }
    }

    /// <summary>ε − 1 + e^−ε to 17 digits (40-digit arithmetic), also where its terms cancel.</summary>
    [Theory]
    [InlineData(1e-5, 4.9999833333749999e-11)]
    [InlineData(0.0005, 1.2497916927057294e-7)]
    [InlineData(0.05, 0.0012294245007140091)]
    [InlineData(0.5, 0.10653065971263342)]
    [InlineData(3, 2.0497870683678639)]
    public void Laplace_rho_keeps_its_digits(double epsilon, double rho) =>
        ReferenceRow.Near(rho, LawLoss.Of(LaplaceLaw.Of(1)).Concentrated(epsilon).Upper.Value, $"rho of {epsilon}", 1e-13);

    [Theory]
    [InlineData(0.7, 1)]
    [InlineData(1.0, 1)]
    [InlineData(1.2, 2)]
    [InlineData(2.5, 3)]
    public void Staircase_charges_each_step_that_a_shift_can_cross(double shift, int crossed)
    {
        var bounds = LawLoss.Of(StaircaseLaw.Of(0.8, 1, 0.4)).Pure(shift);
        ReferenceRow.Near(0.8 * crossed, bounds.Upper.Value, "pure");
    }

    [Fact]
    public void Staircase_bounds_hold_for_quadrature_of_its_density()
    {
        var law = StaircaseLaw.Of(0.8, 1, 0.4);
        foreach (var shift in new[] { 0.3, 1, 1.7 })
        {
            var concentrated = LawLoss.Of(law).Concentrated(shift);
            var divergence = Midpoints().Sum(x => 1e-3 * law.Density(x) * Math.Log(law.Density(x) / law.Density(x - shift)));
            ReferenceRow.Near(divergence, concentrated.Lower.Value, $"Kullback–Leibler at {shift}", 1e-6);
            Assert.True(concentrated.Lower < concentrated.Upper);
            var delta = Midpoints().Sum(x => 1e-3 * Math.Max(0, law.Density(x) - (Math.Exp(0.5) * law.Density(x - shift))));
            var bounds = LawLoss.Of(law).DeltaAt(Epsilon.Of(0.5), shift);
            Assert.InRange(delta, bounds.Lower.Value - 1e-9, bounds.Upper.Value);
        }
    }

    [Fact]
    public void Uniform_noise_shows_a_shift_with_the_same_chance_at_every_epsilon()
    {
        var loss = LawLoss.Of(UniformLaw.Of(5));
        Assert.Equal(0.1, loss.DeltaAt(Epsilon.Zero, 1).Upper.Value, 1e-15);
        Assert.Equal(0.1, loss.DeltaAt(Epsilon.Of(20), 1).Lower.Value, 1e-15);
        Assert.Equal(1, loss.DeltaAt(Epsilon.Of(20), 11).Lower.Value);
        Assert.False(loss.Concentrated(1).Lower.IsFinite);
    }

    [Fact]
    public void Pure_to_concentrated_bounds_randomised_response_at_every_order()
    {
        foreach (var epsilon in new[] { 0.01, 0.3, 1, 3, 9 })
        {
            var share = 1 / (1 + Math.Exp(-epsilon));
            for (var log = -4.0; log < 4; log += 0.1)
            {
                var order = 1 + Math.Exp(log);
                var sum = (Math.Pow(share, order) * Math.Pow(1 - share, 1 - order)) + (Math.Pow(1 - share, order) * Math.Pow(share, 1 - order));
                Assert.True(Math.Log(sum) / (order - 1) / order <= PureConversion.SmallestRho(Epsilon.Of(epsilon)).Value * (1 + 1e-9));
            }
        }
    }

    // D_α of Laplace noise: ln(α/(2α−1)·e^((α−1)ε) + (α−1)/(2α−1)·e^(−αε)) ÷ (α−1) (Mironov 2017, from memory; derived by integration).
    private static double LaplaceRenyi(double order, double epsilon)
    {
        var (up, down) = (order / ((2 * order) - 1), (order - 1) / ((2 * order) - 1));
        return (((order - 1) * epsilon) + Math.Log(up + (down * Math.Exp(-((2 * order) - 1) * epsilon)))) / (order - 1);
    }

    private static IEnumerable<double> Midpoints() => Enumerable.Range(-60_000, 120_000).Select(i => (i + 0.5) * 1e-3);

    private static IEnumerable<long> ShiftsUpTo(long most) => Enumerable.Range(1, (int)most).SelectMany(step => new long[] { step, -step });
}
