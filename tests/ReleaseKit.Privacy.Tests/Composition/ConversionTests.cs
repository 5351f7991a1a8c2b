using CsCheck;
using ReleaseKit.Privacy.Composition;
using ReleaseKit.Privacy.Meaning;

namespace ReleaseKit.Privacy.Tests.Composition;

public sealed class ConversionTests
{
    private const string Seed = "0000KOJ4fUr2";
    private static readonly Gen<double> Rhos = Gen.Double[-7, 2].Select(power => Math.Pow(10, power));
    private static readonly Gen<double> Deltas = Gen.Double[-14, -2].Select(power => Math.Pow(10, power));

    [Fact]
    public void Tight_conversion_is_never_above_the_simple_one() => Gen.Select(Rhos, Deltas).Sample(
        (rho, delta) => ConcentratedConversion.EpsilonAt(Rho.Of(rho), Delta.Of(delta)) <= ConcentratedConversion.SimpleEpsilonAt(Rho.Of(rho), Delta.Of(delta)), seed: Seed, iter: 100);

    /// <summary>Gaussian noise has the curve of Balle &amp; Wang: no conversion of its ρ may claim less.</summary>
    [Fact]
    public void Tight_conversion_is_never_below_the_exact_curve_of_Gaussian_noise() => Gen.Select(Rhos, Deltas).Sample(
        (rho, delta) => new GaussianCurve(Math.Sqrt(2 * rho)).EpsilonAt(Delta.Of(delta)).Value <= ConcentratedConversion.EpsilonAt(Rho.Of(rho), Delta.Of(delta)).Value * (1 + 1e-9), seed: Seed, iter: 100);

    [Fact]
    public void Largest_rho_meets_its_epsilon_and_no_more_would() => Gen.Select(Gen.Double[0.01, 20], Deltas).Sample((epsilon, delta) =>
    {
        var rho = ConcentratedConversion.LargestRho(Epsilon.Of(epsilon), Delta.Of(delta));
        ReferenceRow.Near(epsilon, ConcentratedConversion.EpsilonAt(rho, Delta.Of(delta)).Value, $"{epsilon} {delta}");
        Assert.True(ConcentratedConversion.EpsilonAt(Rho.Of(rho.Value * (1 + 1e-6)), Delta.Of(delta)).Value > epsilon);
        var simple = ConcentratedConversion.SimpleLargestRho(Epsilon.Of(epsilon), Delta.Of(delta));
        ReferenceRow.Near(epsilon, ConcentratedConversion.SimpleEpsilonAt(simple, Delta.Of(delta)).Value, $"simple {epsilon} {delta}");
        Assert.True(simple <= rho);
    }, seed: Seed, iter: 100);

    [Fact]
    public void Largest_epsilon_of_a_rho_leads_back_to_it() => Rhos.Sample(
        rho => ReferenceRow.Near(rho, PureConversion.SmallestRho(PureConversion.LargestEpsilon(Rho.Of(rho))).Value, $"{rho}"), seed: Seed, iter: 100);

    [Fact]
    public void Adding_a_loss_never_lowers_a_total_and_order_changes_no_more_than_digits() => Gen.Double[0, 5].List[1, 20].Sample(losses =>
    {
        var epsilons = losses.ConvertAll(Epsilon.Of);
        var total = BasicComposition.Sum(epsilons).Value;
        ReferenceRow.Near(total, BasicComposition.Sum(Enumerable.Reverse(epsilons)).Value, "reversed", 1e-14);
        Assert.True(BasicComposition.Sum(epsilons.Append(Epsilon.Of(0.1))).Value >= total);
        Assert.True(BasicComposition.Sum(losses.ConvertAll(Rho.Of).Append(Rho.Of(0.1))).Value >= total);
    }, seed: Seed, iter: 100);

    [Theory]
    [InlineData(0, 1e-9, 0)]
    [InlineData(0, 0, 0)]
    [InlineData(1, 0, double.PositiveInfinity)]
    [InlineData(1, 1, 0)]
    [InlineData(double.PositiveInfinity, 1e-9, double.PositiveInfinity)]
    public void Ends_of_the_conversion_are_what_they_must_be(double rho, double delta, double epsilon) =>
        Assert.Equal(epsilon, ConcentratedConversion.EpsilonAt(Rho.Of(rho), Delta.Of(delta)).Value);

    [Fact]
    public void Curve_of_one_pair_turns_back_on_itself() => Gen.Select(Gen.Double[0.01, 8], Gen.Double[0, 0.2], Gen.Double[0, 0.6]).Sample((epsilon, own, delta) =>
    {
        var curve = new ApproximateCurve(new ApproximateLoss(Epsilon.Of(epsilon), Delta.Of(own)));
        var at = curve.EpsilonAt(Delta.Of(delta));
        Assert.True(at.IsFinite ? curve.DeltaAt(at).Value <= delta + 1e-12 : delta < own);
    }, seed: Seed, iter: 100);

    /// <summary>The loss of Gaussian noise exceeds ε′ with chance at most β: its law is normal with mean μ²/2 and variance μ².</summary>
    [Fact]
    public void Odds_exceed_their_bound_no_more_often_than_said() => Gen.Select(Gen.Double[0.05, 3], Gen.Double[-9, -3]).Sample((mu, power) =>
    {
        var beta = Delta.Of(Math.Pow(10, power));
        var limit = OddsBound.Of(new GaussianCurve(mu), beta);
        var chance = MathNet.Numerics.SpecialFunctions.Erfc((limit.EpsilonPrime.Value - (mu * mu / 2)) / mu / Math.Sqrt(2)) / 2;
        Assert.InRange(chance, 0, beta.Value);
        Assert.True(chance > beta.Value / 100);
    }, seed: Seed, iter: 100);

    [Fact]
    public void Quantities_refuse_what_is_no_loss()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Epsilon.Of(-1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Epsilon.Of(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => Rho.Of(-0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Delta.Of(1.1));
        Assert.Equal(1, Delta.AtMost(1.1).Value);
    }
}
