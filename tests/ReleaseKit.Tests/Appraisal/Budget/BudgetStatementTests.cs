using System.Globalization;
using ReleaseKit.Appraisal;
using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;
using Xunit;

namespace ReleaseKit.Tests.Appraisal.Budget;

public sealed class BudgetStatementTests
{
    [Fact]
    public void Concentrated_account_adds_rho_and_converts_it_by_both_rules()
    {
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Accounts.Gaussian(10, "a"), Accounts.Gaussian(5, "b")));
        Assert.Equal(LossCurrency.Rho, statement.Currency);
        Assert.Equal(0.005 + 0.02, statement.Spent, 1e-15);
        Assert.Equal([0.005, 0.02], statement.Mechanisms.Select(account => account.Amount), (left, right) => Math.Abs(left - right) < 1e-15);
        Assert.Equal([0.2, 0.8], statement.Mechanisms.Select(account => account.ShareOfSpent), (left, right) => Math.Abs(left - right) < 1e-12);
        Assert.Equal(1e-9, statement.Delta);
        Assert.Equal(["conversion-tight", "conversion-simple"], statement.Conversions.Select(total => total.Rule.Key));
        // Bun & Steinke 2016, Proposition 1.3, by hand: 0.025 + 2√(0.025 · ln 1e9).
        Assert.Equal(0.025 + (2 * Math.Sqrt(0.025 * Math.Log(1e9))), statement.Conversions[1].Epsilon!.Value, 1e-12);
        Assert.True(statement.Conversions[0].Epsilon < statement.Conversions[1].Epsilon);
        Assert.Equal(statement.Conversions[0].Epsilon, statement.SmallestBound.Epsilon);
    }

    [Fact]
    public void Authorised_epsilon_becomes_the_largest_rho_that_meets_it()
    {
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Accounts.Gaussian(10)));
        var back = Privacy.Composition.ConcentratedConversion.EpsilonAt(Privacy.Rho.Of(statement.Authorised!.Value), Privacy.Delta.Of(1e-9));
        Assert.Equal(6, back.Value, 1e-9);
        Assert.True(statement.IsWithinAuthorised);
        Assert.Equal(statement.Authorised.Value - 0.005, statement.Unspent!.Value, 1e-12);
    }

    [Fact]
    public void Pure_account_needs_no_delta()
    {
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Pure, Accounts.Laplace(4, "a"), Accounts.Laplace(2, "b")));
        Assert.Equal(0.75, statement.Spent, 1e-15);
        Assert.Equal(0, statement.Delta);
        Assert.Empty(statement.Conversions);
        Assert.Null(statement.Meaning.Beta);
        Assert.Equal(0.75, statement.Meaning.EpsilonPrime, 1e-12);
        Assert.Equal(Math.Exp(0.75), statement.Meaning.Odds, 1e-12);
    }

    [Fact]
    public void Approximate_account_takes_a_Gaussian_at_the_delta_it_declares()
    {
        var gaussian = SmallRelease.Mechanism("g", LawName.Gaussian, ("sigma", 5)) with { Spent = new DeclaredLoss(1, 1e-6, null) };
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Approximate, gaussian, Accounts.Laplace(4, "a")));
        var exact = new Privacy.Composition.GaussianCurve(0.2).EpsilonAt(Privacy.Delta.Of(1e-6)).Value;
        Assert.Equal(exact + 0.25, statement.Spent, 1e-9);
        Assert.Equal(1e-6, statement.Recomputed.Delta!.Value, 1e-20);
    }

    /// <summary>A guarantee that holds without δ wins over one that needs it, whatever accounting is declared.</summary>
    [Fact]
    public void Smallest_bound_is_taken_from_every_rule_that_holds()
    {
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Accounts.Laplace(4, "a"), Accounts.Laplace(4, "b")));
        Assert.Equal(0.5, statement.SmallestBound.Epsilon!.Value, 1e-12);
        Assert.Equal("pure-sum", statement.SmallestBound.Rule.Key);
        Assert.True(statement.Recomputed.Epsilon > 0.5);
    }

    [Fact]
    public void Law_without_a_loss_in_the_accounting_makes_the_total_infinite_and_unproven()
    {
        var uniform = SmallRelease.Mechanism("u", LawName.Uniform, ("halfWidth", 5));
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, uniform, Accounts.Gaussian(10)));
        Assert.True(double.IsPositiveInfinity(statement.Spent));
        Assert.False(statement.IsWithinAuthorised);
        Assert.Equal([1, 0], statement.Mechanisms.Select(account => account.ShareOfSpent));
        Assert.Equal(1, statement.Meaning.Beliefs[0].Highest);
        Assert.Contains(statement.Steps, step => step.Key == AccountSteps.Unbounded && step.Mechanism == "u");
    }

    [Fact]
    public void Sum_of_epsilon_at_no_delta_never_comes_from_numbers_too_small_to_hold()
    {
        var gaussian = SmallRelease.Mechanism("g", LawName.Gaussian, ("sigma", 5));
        var pure = new Authorised { Epsilon = 1000, At = Accounts.Place };
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Pure, Neighbouring.AddOrRemove, pure, gaussian));
        Assert.True(double.IsPositiveInfinity(statement.SmallestBound.Epsilon!.Value));
        Assert.False(statement.IsWithinAuthorised);
    }

    [Fact]
    public void Account_adds_up_by_table_by_level_and_by_mechanism()
    {
        Mechanism Level(Mechanism mechanism, string level) => mechanism with { Level = SmallRelease.Words(level) };
        var statement = BudgetStatement.Of(Accounts.Of(
            Accounting.Concentrated, Level(Accounts.Gaussian(10, "a"), "ward"), Level(Accounts.Laplace(4, "b"), "ward"), Level(Accounts.Gaussian(3, "c"), "district")));
        double By<T>(Func<BudgetPiece, T> key) => statement.Pieces.GroupBy(key).Sum(group => group.Sum(piece => piece.Amount));
        Assert.Equal(statement.Spent, By(piece => string.Join(',', piece.Tables)), 1e-15);
        Assert.Equal(statement.Spent, By(piece => piece.LevelKey), 1e-15);
        Assert.Equal(statement.Spent, By(piece => piece.Mechanism), 1e-15);
        Assert.Equal(1, statement.Mechanisms.Sum(account => account.ShareOfSpent), 1e-12);
    }

    [Fact]
    public void Stated_loss_of_a_declared_law_enters_as_stated()
    {
        var choice = SmallRelease.Mechanism("choice", LawName.Declared) with { Use = MechanismUse.ChoiceOfRows, Spent = new DeclaredLoss(0.1, null, null) };
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Accounts.Gaussian(10), choice));
        Assert.Equal(0.005 + (0.1 * Math.Tanh(0.05)), statement.Spent, 1e-15);
        Assert.True(statement.Mechanisms[1].OnlyDeclared);
        Assert.Empty(statement.Mechanisms[1].Tables);
    }

    [Fact]
    public void Scale_in_a_column_is_charged_at_its_smallest_row()
    {
        var mechanism = SmallRelease.Mechanism("m", LawName.Laplace) with
        {
            Parameters = new Dictionary<string, NumberOrColumn> { ["scale"] = NumberOrColumn.From("scale") },
        };
        var release = new SmallRelease().Side("scale", 1.5, 2.5, 2).Figures(MeasureKind.Mean, mechanism, "1", "2", "3").Build();
        release = release with { Noise = release.Noise with { Accounting = Accounting.Pure, Mechanisms = [mechanism] } };
        var statement = BudgetStatement.Of(release);
        Assert.Equal(1 / 1.5, statement.Spent, 1e-12);
        Assert.Equal(3, statement.Mechanisms[0].Cells);
        var concentrated = BudgetStatement.Of(release with { Noise = release.Noise with { Accounting = Accounting.Concentrated } });
        var step = concentrated.Steps.Single(step => step.Key == AccountSteps.LossByRow);
        Assert.StartsWith("ε = 1 ÷ 1.5 = 0.666666666667; ρ = (0.666666666667 − 1 + e^−0.666666666667) = ", step.Arithmetic, StringComparison.Ordinal);
        Assert.Equal((1 / 1.5) - 1 + Math.Exp(-1 / 1.5), step.Result, 1e-12);
    }

    /// <summary>The account counts every draw; the reader is told which of them were published.</summary>
    [Fact]
    public void Hidden_and_uncollected_cells_are_not_counted_as_published()
    {
        var mechanism = Accounts.Gaussian(10);
        var release = new SmallRelease().Figures(MeasureKind.Count, mechanism, "1", "Q", "L", "4").Build();
        var account = BudgetStatement.Of(release with { Noise = release.Noise with { Mechanisms = [mechanism] } }).Mechanisms[0];
        Assert.Equal((4, 2, 1), (account.Cells, account.Published, account.Hidden));
    }

    [Fact]
    public void Delta_of_the_odds_can_be_followed_from_its_step()
    {
        var step = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Accounts.Gaussian(10, "a"), Accounts.Gaussian(10, "b"))).Steps[^1];
        double After(string sign, char end) => double.Parse(step.Arithmetic[(step.Arithmetic.IndexOf(sign, StringComparison.Ordinal) + sign.Length)..].Split(end)[0].Trim(), CultureInfo.InvariantCulture);
        var (epsilon, order) = (After("ε₀ = ", ','), After("e^((", '−'));
        // Canonne, Kamath & Steinke 2020, Corollary 13, as the step writes it; ρ = 2 ÷ (2 · 10²).
        var delta = Math.Exp((order - 1) * ((order * 0.01) - epsilon)) / (order - 1) * Math.Pow(1 - (1 / order), order);
        Assert.Equal(1, delta / After($")^{order.ToString("G12", CultureInfo.InvariantCulture)} = ", ','), 1e-8);
    }

    [Fact]
    public void Figures_without_noise_are_counted_with_their_reason()
    {
        var measure = SmallRelease.Measure(MeasureKind.Amount, "credits");
        var release = new SmallRelease { Hidden = new Hiding(HiddenBy.ValueBeforeNoise, false) }
            .Figures(measure, [new NoiseRule.Public(SmallRelease.Words("list")), new NoiseRule.Exact(SmallRelease.Words("audited"))], [0, 1, 1, 1], "1", "2", "3", "Q")
            .Build();
        var statement = BudgetStatement.Of(release);
        Assert.True(statement.HasExactFigures);
        Assert.Equal(
            [(WithoutNoiseKind.Exact, 2, 1), (WithoutNoiseKind.HiddenByValueBeforeNoise, 1, 0), (WithoutNoiseKind.Public, 1, 0)],
            statement.WithoutNoise.Select(figures => (figures.Kind, figures.Count, figures.FirstRow)));
    }

    /// <summary>Each step of arithmetic that a pocket calculator can follow gives the number it ends with.</summary>
    [Fact]
    public void Steps_show_their_arithmetic()
    {
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Neighbouring.Replace, Accounts.SixAtOneInABillion, Accounts.Gaussian(9.5)));
        Assert.Equal(
            ["moved-by-replacing", "loss", "sum", "conversion-tight", "conversion-simple", "authorised-in-currency", "odds"],
            statement.Steps.Select(step => step.Key));
        Assert.Equal("2 × 1 = 2", statement.Steps[0].Arithmetic);
        Assert.Equal("ρ = 2 × 1² ÷ (2 × 9.5²) = 0.01108033241", statement.Steps[1].Arithmetic);
        Assert.Equal(2 / (2 * 9.5 * 9.5), statement.Steps[1].Result, 1e-15);
        Assert.All(statement.Steps, step => Assert.Contains(step.Rule.Key, AccountRules.All.Select(rule => rule.Key)));
        Assert.All(statement.Steps, step => Assert.Contains(step.Key, AccountSteps.All));
        Assert.StartsWith("α = ", statement.Steps[3].Arithmetic, StringComparison.Ordinal);
    }

    [Fact]
    public void Tight_conversion_can_be_followed_from_its_step()
    {
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Accounts.Gaussian(10)));
        var step = statement.Steps.Single(step => step.Key == "conversion-tight");
        var order = double.Parse(step.Arithmetic[4..step.Arithmetic.IndexOf(':', StringComparison.Ordinal)], CultureInfo.InvariantCulture);
        var epsilon = (order * 0.005) + ((Math.Log(1e9) - Math.Log(order - 1) + (order * Math.Log(1 - (1 / order)))) / (order - 1));
        Assert.Equal(step.Result, epsilon, 1e-9);
    }

    /// <summary>Discrete Laplace of scale 5 has ε = 0.2 (Ghosh, Roughgarden and Sundararajan 2012) whatever δ is: 50 in 100 becomes e^0.2 ÷ (1 + e^0.2) = 54.98… in 100.</summary>
    [Theory]
    [InlineData(0.05)]
    [InlineData(0.2)]
    [InlineData(0.5)]
    public void Meaning_under_a_large_delta_is_that_of_the_bound_without_one(double delta)
    {
        var meaning = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Neighbouring.AddOrRemove, With(delta), Accounts.Laplace(5))).Meaning;
        Assert.Null(meaning.Beta);
        Assert.Equal(Math.Exp(0.2), meaning.Odds, 1e-12);
        Assert.Equal(Math.Exp(0.2) / (1 + Math.Exp(0.2)), meaning.Beliefs[3].Highest, 1e-12);
    }

    [Fact]
    public void Meaning_under_a_large_delta_without_another_bound_has_no_limit()
    {
        var meaning = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Neighbouring.AddOrRemove, With(0.5), Accounts.Gaussian(5))).Meaning;
        Assert.Null(meaning.Beta);
        Assert.Equal(double.PositiveInfinity, meaning.EpsilonPrime);
        Assert.All(meaning.Beliefs, belief => Assert.Equal((1, 0), (belief.Highest, belief.Lowest)));
    }

    [Fact]
    public void Meaning_holds_for_all_but_the_share_that_it_names()
    {
        var meaning = BudgetStatement.Of(Accounts.Of(Accounting.Concentrated, Accounts.Gaussian(2))).Meaning;
        Assert.Equal(1e-8, meaning.Beta!.Value, 1e-20);
        Assert.Equal([0.001, 0.01, 0.1, 0.5], meaning.Beliefs.Select(belief => belief.Prior));
        Assert.Equal([0.01, 0.05, 0.1], meaning.Tests.Select(test => test.FalseAlarms));
        Assert.All(meaning.Tests, test => Assert.InRange(test.LargestSuccess, test.FalseAlarms, 1));
        Assert.All(meaning.Beliefs, belief => Assert.True(belief.Lowest < belief.Prior && belief.Prior < belief.Highest));
    }

    /// <summary>Of a discrete Gaussian only one cell's curve is summed exactly; of a continuous one the length of the shifts alone counts (Balle and Wang 2018).</summary>
    [Theory]
    [InlineData(LawName.DiscreteGaussian, 1, "exact-curve", "=")]
    [InlineData(LawName.DiscreteGaussian, 2, "curve-bound", "≤")]
    [InlineData(LawName.Gaussian, 2, "exact-curve", "=")]
    public void Curve_is_called_exact_only_where_it_is(LawName law, int cells, string rule, string sign)
    {
        var mechanism = SmallRelease.Mechanism("a", law, ("sigma", 4)) with
        {
            Sensitivity = new Sensitivity { CellsPerUnit = cells, PerCell = 1 },
            Spent = new DeclaredLoss(0.3, 0.0449, null),
        };
        var statement = BudgetStatement.Of(Accounts.Of(Accounting.Approximate, Neighbouring.AddOrRemove, With(0.2), mechanism));
        Assert.Equal(rule, statement.Mechanisms[0].Recomputed.Rule.Key);
        Assert.Contains($") {sign} ", statement.Steps.Single(step => step.Key == "curve").Arithmetic, StringComparison.Ordinal);
    }

    private static Authorised With(double delta) => Accounts.SixAtOneInABillion with { Delta = delta };

    // δ(ε) of the uniform law is 1 ÷ 21 at every ε; that of the table 0.7 − 0.3 e^ε up to ln 2, by hand.
    [Fact]
    public void Lower_bound_under_a_declared_delta_claims_no_more_than_the_curve_shows()
    {
        var uniform = SmallRelease.Mechanism("u", LawName.DiscreteUniform, ("halfWidth", 10)) with { Spent = new DeclaredLoss(0, 0.0477, null) };
        var table = SmallRelease.Mechanism("t", LawName.Tabulated) with
        {
            Tabulated = [(-2, 0.1m), (-1, 0.2m), (0, 0.4m), (1, 0.2m), (2, 0.1m)],
            Spent = new DeclaredLoss(0.6931472, 0.1000003, null),
        };
        var stated = SmallRelease.Mechanism("s", LawName.Declared) with { Spent = new DeclaredLoss(0.1, 0.01, null) };
        var lower = BudgetStatement.Of(Accounts.Of(Accounting.Approximate, uniform, table, stated)).Mechanisms.Select(account => account.Lower).ToList();

        Assert.Equal((0, 1 / 21.0), (lower[0].Epsilon!.Value, lower[0].Delta!.Value), (left, right) => Math.Abs(left.Item1 - right.Item1) + Math.Abs(left.Item2 - right.Item2) < 1e-15);
        Assert.InRange(lower[1].Delta!.Value, 0.1, 0.7 - (0.3 * Math.Exp(lower[1].Epsilon!.Value)) + 1e-12);
        Assert.InRange(lower[1].Epsilon!.Value, 0.693146, 0.693147);
        Assert.Equal((0, 0), (lower[2].Epsilon, lower[2].Delta));
    }

    [Fact]
    public void Curve_that_lies_below_the_declared_delta_is_shown_with_its_own_value()
    {
        var uniform = SmallRelease.Mechanism("u", LawName.DiscreteUniform, ("halfWidth", 10)) with { Spent = new DeclaredLoss(0, 0.0477, null) };
        var step = BudgetStatement.Of(Accounts.Of(Accounting.Approximate, uniform)).Steps.Single(step => step.Key == AccountSteps.Curve);

        Assert.Equal("δ(0) = 0.047619047619 ≤ 0.0477", step.Arithmetic);
    }

    // The mechanism has three cells.
    [Theory]
    [InlineData(Neighbouring.AddOrRemove, 2, null, false, "2", "declared")]
    [InlineData(Neighbouring.AddOrRemove, 5, null, false, "min(5, 3) = 3", "cells-there-are")]
    [InlineData(Neighbouring.AddOrRemove, 3, 2.0, false, "⌈2 ÷ 1⌉ = 2", "bounded-sum")]
    [InlineData(Neighbouring.Replace, 1, null, false, "2 × 1 = 2", "both-records")]
    [InlineData(Neighbouring.Replace, 2, null, false, "min(2 × 2, 3) = 3", "both-records")]
    [InlineData(Neighbouring.Replace, 2, 1.0, false, "2 × ⌈1 ÷ 1⌉ = 2", "both-records")]
    [InlineData(Neighbouring.Replace, 3, null, true, "3, by 2 × 1 = 2", "both-records")]
    public void Cells_that_are_not_as_declared_are_worked_out(Neighbouring neighbouring, int cells, double? sum, bool isSigned, string arithmetic, string rule)
    {
        var mechanism = Accounts.Laplace(4) with { Sensitivity = new Sensitivity { CellsPerUnit = cells, PerCell = 1, PerUnit = sum, Signed = isSigned } };
        var step = BudgetStatement.Of(Accounts.Of(Accounting.Pure, neighbouring, Accounts.SixAtOneInABillion, mechanism)).Steps[0];

        Assert.Equal((arithmetic, rule), (step.Arithmetic, step.Rule.Key));
    }
}
