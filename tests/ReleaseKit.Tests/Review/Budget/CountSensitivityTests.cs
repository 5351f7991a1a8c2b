using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Budget;

/// <summary>A declared sensitivity that is below what one unit moves a count of units; what it moves is counted by hand beside each.</summary>
public sealed class CountSensitivityTests
{
    private const string Keeper = "\"who\": { \"one\": \"keeper\", \"other\": \"keepers\" }";
    private const string AllIsSum = "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ";

    private static TestFolder Folder(string sensitivity, string law = "laplace", string noise = AllIsSum) => new TestFolder()
        .Edit("mechanisms.json", Keeper, "\"who\": \"lamp\"")
        .Edit("release.json", AllIsSum, noise)
        .WithLit($$"""{ "id": "lamps-lit", "law": "{{law}}", "{{(law == "gaussian" ? "sigma" : "scale")}}": 4.0, "sensitivity": { {{sensitivity}} } }""");

    // One lamp more or less: its street by 1.
    [Theory]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.01", "laplace", "\"perCell\": 1")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 1e-12", "laplace", "\"perCell\": 1")]
    [InlineData("\"cellsPerUnit\": 2, \"perCell\": 1, \"perUnit\": 0.5", "laplace", "\"perUnit\": 1")]
    [InlineData("\"l1\": 0.01", "laplace", "\"l1\": 1")]
    [InlineData("\"l2\": 0.99", "discrete-laplace", "\"l2\": 1")]
    [InlineData("\"l2\": 0.5", "gaussian", "\"l2\": 1")]
    public void Count_of_units_moves_by_one_at_least(string sensitivity, string law, string write)
    {
        using var folder = Folder(sensitivity, law);
        var text = folder.Text("sensitivity-too-small");
        Assert.Contains("Stop mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains("column \"lit\" of table \"lamps\" counts lamps: one lamp more or less moves a cell of it by 1.", text, StringComparison.Ordinal);
        Assert.Contains($"Do: write {write} or more;", text, StringComparison.Ordinal);
    }

    // A weight of at most 0.01, or in two cells together at most 0.01: that is said by "clipped".
    [Theory]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.01", "\"add-or-remove\"", "write as \"perCell\" the largest weight; or, if no weight is above 0.01,", "0.01")]
    [InlineData("\"l1\": 0.01", "\"replace\"", "write as \"l1\" 2 times the largest weight; or, if no weight is above 0.005,", "0.005")]
    public void Estimate_of_units_moves_by_a_weight_that_is_seldom_below_one(string sensitivity, string relation, string remedy, string weight)
    {
        using var folder = Folder(sensitivity).Edit("release.json", "\"Lamps lit\", \"unit\": \"lamp\", \"kind\": \"count\"", "\"Lamps lit\", \"unit\": \"lamp\", \"kind\": \"estimate\"")
            .Edit("mechanisms.json", "\"add-or-remove\"", relation);
        var text = folder.Text("sensitivity-below-one");
        Assert.StartsWith("Caution mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains("estimates lamps: ", text, StringComparison.Ordinal);
        Assert.Contains($"Do: {remedy} say so: \"clipped\": {{ \"from\": 0, \"to\": {weight} }}", text, StringComparison.Ordinal);
        folder.HasNo("sensitivity-as-stated");
        folder.Edit("mechanisms.json", "\"law\": \"laplace\"", $"\"clipped\": {{ \"from\": 0, \"to\": {weight} }}, \"law\": \"laplace\"");
        folder.HasNo("sensitivity-below-one");
        folder.HasNo("sensitivity-too-small");
    }

    // A lamp of one street in place of one of another: both streets by 1; Δ₁ = 2, Δ₂ = √2 = 1.414214 rounded up.
    [Theory]
    [InlineData("\"l1\": 1", "laplace", "\"l1\": 2")]
    [InlineData("\"l2\": 1", "gaussian", "\"l2\": 1.414214")]
    public void Unit_in_place_of_another_moves_two_cells(string sensitivity, string law, string write)
    {
        using var folder = Folder(sensitivity, law).Edit("mechanisms.json", "\"add-or-remove\"", "\"replace\"");
        var text = folder.Text("sensitivity-too-small");
        Assert.Contains("one lamp in place of another moves 2 cells of it by 1.", text, StringComparison.Ordinal);
        Assert.Contains($"Do: write {write} or more; or \"moves\": false in \"sensitivity\" if no unit can change cells;", text, StringComparison.Ordinal);
    }

    // The total has a draw of the same mechanism: a lamp moves its street and the total; replaced, two streets, and not the total.
    [Theory]
    [InlineData("\"l1\": 1", "add-or-remove", "\"l1\": 2")]
    [InlineData("\"l2\": 1.4", "add-or-remove", "\"l2\": 1.414214")]
    [InlineData("\"l1\": 1.5", "replace", "\"l1\": 2")]
    public void Total_of_the_same_mechanism_is_moved_too(string sensitivity, string neighbouring, string write)
    {
        using var folder = Folder($"{sensitivity}, \"l1Levels\": 2", noise: "").Edit("mechanisms.json", "\"add-or-remove\"", $"\"{neighbouring}\"");
        Assert.Contains($"Do: write {write} or more;", folder.Text("sensitivity-too-small"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 1", "add-or-remove")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 1, \"perUnit\": 1", "replace")]
    [InlineData("\"l1\": 1", "add-or-remove")]
    [InlineData("\"l1\": 2", "replace")]
    [InlineData("\"l2\": 1.414214", "replace")]
    [InlineData("\"l1\": 1, \"moves\": false", "replace")]
    public void Sensitivity_that_holds_passes(string sensitivity, string neighbouring)
    {
        using var folder = Folder(sensitivity).Edit("mechanisms.json", "\"add-or-remove\"", $"\"{neighbouring}\"");
        folder.HasNo("sensitivity-too-small");
    }

    [Fact]
    public void Count_of_something_else_is_left_alone()
    {
        using var folder = Folder("\"l1\": 0.5").Edit("mechanisms.json", "\"who\": \"lamp\"", Keeper);
        folder.HasNo("sensitivity-too-small");
    }

    // A sum of contributions from 0 to 400: one more moves it by 400; −30 to 20 by 30, and in place of another by 50, ±25 each; of another cell, by 30 in one.
    [Theory]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 1", "\"from\": 0, \"to\": 400", "add-or-remove", "\"perCell\": 400")]
    [InlineData("\"l1\": 399", "\"from\": 0, \"to\": 400", "add-or-remove", "\"l1\": 400")]
    [InlineData("\"l2\": 20", "\"from\": -30, \"to\": 20", "add-or-remove", "\"l2\": 30")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 20, \"signed\": true, \"moves\": false", "\"from\": -30, \"to\": 20", "replace", "\"perCell\": 25")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 25, \"signed\": true", "\"from\": -30, \"to\": 20", "replace", "\"perCell\": 30")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 400", "\"from\": 0, \"to\": 400", "add-or-remove", null)]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 30, \"signed\": true", "\"from\": -30, \"to\": 20", "replace", null)]
    public void Sum_moves_by_what_a_unit_can_put_into_it(string sensitivity, string clipped, string neighbouring, string? write)
    {
        using var folder = Folder($"{sensitivity} }}, \"clipped\": {{ {clipped}").Edit("mechanisms.json", "\"who\": \"lamp\"", Keeper)
            .Edit("mechanisms.json", "\"add-or-remove\"", $"\"{neighbouring}\"");
        if (write is null)
            folder.HasNo("sensitivity-too-small");
        else
            Assert.Contains($"Do: write {write} or more,", folder.Text("sensitivity-too-small"), StringComparison.Ordinal);
    }
}
