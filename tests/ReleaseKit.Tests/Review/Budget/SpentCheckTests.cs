using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Budget;

public sealed class SpentCheckTests
{
    /// <summary>The message of the design, word for word, with its numbers.</summary>
    [Fact]
    public void Loss_declared_too_low_is_a_stop_that_gives_the_value()
    {
        using var folder = new TestFolder();
        folder.WithLit("""{ "id": "lamps-lit", "law": "discrete-gaussian", "sigma": 9.5, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 }, "spent": { "rho": 0.0054 } }""");
        Assert.Equal(
            """
            STOP  spent-too-low                                                   for: noise
            mechanisms.json:7:129  "lamps-lit" declares rho 0.0054
              Sigma 9.5 with 1 cell a keeper, 1 a cell, costs 0.005540167.
              Why: the budget page would promise more protection than there is.
              Do: write 0.005540167, or leave "spent" out and the computed value is used.

            """, FindingText.Of(folder.One("spent-too-low")));
    }

    [Theory]
    [InlineData(0.005540167)]
    [InlineData(0.0055401662)]
    [InlineData(0.5)]
    public void Loss_declared_high_enough_is_no_finding(double rho)
    {
        using var folder = new TestFolder();
        folder.WithLit(Spent("9.5", "1", $"\"rho\": {rho.ToString(System.Globalization.CultureInfo.InvariantCulture)}"));
        Assert.DoesNotContain(folder.Review(), finding => finding.Slug.StartsWith("spent", StringComparison.Ordinal));
    }

    [Fact]
    public void Loss_rounded_down_to_its_digits_is_a_caution_with_the_value_to_paste()
    {
        using var folder = new TestFolder();
        var text = folder.WithLit(Spent("9.5", "1", "\"rho\": 0.00554")).Text("spent-rounded");
        Assert.StartsWith("Caution ", text, StringComparison.Ordinal);
        Assert.Contains("\"lamps-lit\" declares rho 0.00554, which is 0.00554016620499 rounded down.\n", text, StringComparison.Ordinal);
        Assert.Contains("Do: write 0.005540167.", text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("4", "1", "\"rho\": 0.001953125", "It is what sigma 16, the square of 4, would cost.")]
    [InlineData("4", "1", "\"rho\": 0.125", null)]
    [InlineData("0.5", "1", "\"rho\": 0.125", "It is what sigma 2, 1 divided by 0.5, would cost.")]
    [InlineData("4", "3", "\"rho\": 0.03125", "It is what 1 cell would cost, but \"cellsPerUnit\" is 3.")]
    public void Slip_behind_a_loss_that_is_too_low_is_named(string sigma, string cells, string spent, string? slip)
    {
        using var folder = new TestFolder();
        folder.WithLit(Spent(sigma, cells, spent));
        if (slip is null)
            folder.HasNo("spent-too-low");
        else
            Assert.Contains(slip, folder.Text("spent-too-low"), StringComparison.Ordinal);
    }

    [Fact]
    public void Loss_of_the_other_relation_is_recognised()
    {
        using var folder = new TestFolder();
        folder.WithLit(Spent("4", "1", "\"rho\": 0.03125")).Edit("mechanisms.json", "\"add-or-remove\"", "\"replace\"");
        var text = folder.Text("spent-too-low");
        Assert.Contains("Sigma 4 with 1 cell a keeper, 1 a cell, one keeper in place of another, costs 0.0625.", text, StringComparison.Ordinal);
        Assert.Contains("It is what one keeper more or less would cost, but \"neighbouring\" means one keeper in place of another.", text, StringComparison.Ordinal);
    }

    /// <summary>An l1 does not say over how many cells it is spread: with Gaussian noise less than l1² ÷ 2σ² may be true, and cannot be shown.</summary>
    [Fact]
    public void Loss_between_the_bounds_is_a_caution()
    {
        using var folder = new TestFolder();
        folder.WithLit("""{ "id": "lamps-lit", "law": "gaussian", "sigma": 1, "sensitivity": { "l1": 2 }, "spent": { "rho": 1.5 } }""");
        var text = folder.Text("spent-below-proof");
        Assert.Contains("\"lamps-lit\" declares rho 1.5\nThat is smaller than can be proved here.", text, StringComparison.Ordinal);
        Assert.Contains("Do: write 2,", text, StringComparison.Ordinal);
        folder.HasNo("spent-too-low");
    }

    [Fact]
    public void Epsilon_declared_for_a_law_without_one_is_a_stop()
    {
        using var folder = new TestFolder();
        var text = folder.WithLit(Spent("4", "1", "\"epsilon\": 1")).Text("spent-too-low");
        Assert.Contains("has no epsilon that bounds", text, StringComparison.Ordinal);
        Assert.Contains("Do: leave \"spent\" out", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Epsilon_and_delta_are_held_against_the_curve_of_the_law()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"concentrated\"", "\"approximate\"");
        folder.WithLit("""{ "id": "lamps-lit", "law": "gaussian", "sigma": 5, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 }, "spent": { "epsilon": 0.5, "delta": 1e-6 } }""");
        var text = folder.Text("spent-too-low");
        Assert.Contains("\"lamps-lit\" declares epsilon 0.5 at delta 0.000001", text, StringComparison.Ordinal);
        Assert.Contains("costs epsilon 0.8", text, StringComparison.Ordinal);
        Assert.Contains("Do: write \"spent\": { \"epsilon\": 0.8", text, StringComparison.Ordinal);
        Assert.Contains("\"delta\": 0.000001 }", text, StringComparison.Ordinal);
        Assert.DoesNotContain("leave \"spent\" out", text, StringComparison.Ordinal);
        folder.Edit("mechanisms.json", "\"epsilon\": 0.5", "\"epsilon\": 0.9");
        folder.HasNo("spent-too-low");
    }

    [Fact]
    public void Pair_that_a_law_never_meets_is_told_once_with_one_that_it_meets()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"concentrated\"", "\"approximate\"").Edit("mechanisms.json", "\"delta\": 1e-9", "\"delta\": 0.05");
        folder.WithLit("""{ "id": "lamps-lit", "law": "discrete-uniform", "halfWidth": 12, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 }, "spent": { "epsilon": 0, "delta": 0.01 } }""");
        Assert.Contains("Do: write \"spent\": { \"epsilon\": 0, \"delta\": 0.04000004 }", folder.Text("spent-needed"), StringComparison.Ordinal);
        folder.HasNo("spent-too-low");
    }

    /// <summary>1 ÷ 4001 = 0.000249937515…; moved by 1, noise on ±2000 has that delta at every epsilon.</summary>
    [Theory]
    [InlineData("0", "0.0002499375", "0")]
    [InlineData("0.5", "2.499e-4", "0.5")]
    public void Delta_rounded_down_to_its_digits_is_a_caution_with_the_pair_to_paste(string epsilon, string delta, string written)
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"concentrated\"", "\"approximate\"").Edit("mechanisms.json", "\"delta\": 1e-9", "\"delta\": 0.05");
        folder.WithLit($$"""{ "id": "lamps-lit", "law": "discrete-uniform", "halfWidth": 2000, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 }, "spent": { "epsilon": {{epsilon}}, "delta": {{delta}} } }""");
        var text = folder.Text("spent-rounded");
        Assert.StartsWith("Caution ", text, StringComparison.Ordinal);
        Assert.Contains("that delta is 0.000249937515621 rounded down.", text, StringComparison.Ordinal);
        Assert.Contains($"Do: write \"spent\": {{ \"epsilon\": {written}, \"delta\": 0.0002499376 }}.", text, StringComparison.Ordinal);
        Assert.DoesNotContain(folder.Review(), finding => finding.Level == ReleaseKit.Review.FindingLevel.Stop);
        folder.Edit("mechanisms.json", $"\"delta\": {delta}", "\"delta\": 0.0002499376");
        folder.HasNo("spent-rounded");
    }

    [Fact]
    public void Delta_below_what_its_digits_allow_is_no_rounding()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"concentrated\"", "\"approximate\"").Edit("mechanisms.json", "\"delta\": 1e-9", "\"delta\": 0.05");
        folder.WithLit("""{ "id": "lamps-lit", "law": "discrete-uniform", "halfWidth": 2000, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 }, "spent": { "epsilon": 0, "delta": 0.0002499374 } }""");
        Assert.Contains("\"delta\": 0.0002499378 }", folder.Text("spent-needed"), StringComparison.Ordinal);
    }

    /// <summary>By hand: moved by 1, the table's end (0.1) has no counterpart, and elsewhere the chances differ by the factor 2 at most, so δ(ln 2) = 0.1.</summary>
    [Fact]
    public void Pair_that_a_table_meets_exactly_is_enough()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"concentrated\"", "\"approximate\"").Edit("mechanisms.json", "\"delta\": 1e-9", "\"delta\": 0.2")
            .With("tables/noise.csv", "noise,probability\n-2,0.1\n-1,0.2\n0,0.4\n1,0.2\n2,0.1\n");
        folder.WithLit("""{ "id": "lamps-lit", "law": "tabulated", "file": "tables/noise.csv", "sensitivity": { "cellsPerUnit": 1, "perCell": 1 }, "spent": { "epsilon": 0.7, "delta": 0.1 } }""");
        folder.HasNo("spent-needed");
        folder.HasNo("spent-below-proof");
        folder.Edit("mechanisms.json", "\"delta\": 0.1 ", "\"delta\": 0.09 ");
        Assert.Contains("\"delta\": 0.1000002 }", folder.Text("spent-needed"), StringComparison.Ordinal);
    }

    // 1e-9 in three parts is 3.3e-10 each; with 4e-10 declared by one, the two others share 6e-10.
    [Theory]
    [InlineData("", 3, "0.00000000033")]
    [InlineData(", \"spent\": { \"epsilon\": 9, \"delta\": 4e-10 }", 2, "0.0000000003")]
    public void Pairs_proposed_share_what_is_authorised(string spent, int times, string share)
    {
        using var folder = new TestFolder();
        const string Noise = "\"law\": \"gaussian\", \"sigma\": 5, \"sensitivity\": { \"cellsPerUnit\": 1, \"perCell\": 1 }";
        folder.Edit("mechanisms.json", "\"concentrated\"", "\"approximate\"")
            .Edit("mechanisms.json", "\"mechanisms\": [", $"\"mechanisms\": [ {{ \"id\": \"third\", \"use\": \"not-published\", {Noise}{spent} }},")
            .Edit("mechanisms.json", "\"law\": \"discrete-laplace\", \"scale\": 3.0", "\"law\": \"discrete-gaussian\", \"sigma\": 5");
        var found = folder.Review().Where(finding => finding.Slug == "spent-needed").ToList();
        Assert.Equal(times, found.Count);
        Assert.All(found, finding => Assert.Contains($"\"delta\": {share} }}", finding.Do, StringComparison.Ordinal));
    }

    private static string Spent(string sigma, string cells, string spent) =>
        $$"""{ "id": "lamps-lit", "law": "discrete-gaussian", "sigma": {{sigma}}, "sensitivity": { "cellsPerUnit": {{cells}}, "perCell": 1 }, "spent": { {{spent}} } }""";
}
