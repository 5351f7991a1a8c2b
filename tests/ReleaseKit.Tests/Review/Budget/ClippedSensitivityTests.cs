using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Budget;

/// <summary>A declared sensitivity of sums and means that the folder's own clipping and public denominators disprove; the numbers are worked out by hand beside each.</summary>
public sealed class ClippedSensitivityTests
{
    private const string Count = "\"title\": \"Lamps lit\", \"unit\": \"lamp\", \"kind\": \"count\",";
    private const string Mean = "\"title\": \"Mean hours lit\", \"unit\": \"hour\", \"kind\": \"mean\", \"decimals\": 2,";
    private const string Replace = "\"neighbouring\": \"replace\"";

    /// <summary>Means over 50, 200 and 400 lamps, and over 650 in all; each from a draw of its own.</summary>
    private static TestFolder Folder(string sensitivity, string clipped = "\"from\": 0, \"to\": 20", string rest = "\"denominator\": { \"public\": \"lamps\" }, ", string all = "{ \"public\": \"List of lamps\" }") => new TestFolder()
        .With("tables/lamps.csv", "street,lit,broken,lamps\nAll,6.00,9,650\nKiln Row,3.10,4,50\nQuay,2.00,5,200\nWeir Lane,9.00,-1,400\n")
        .Edit("release.json", Count, Mean)
        .Edit("release.json", "\"units\": {", "\"units\": { \"hour\": { \"en\": { \"one\": \"hour\", \"other\": \"hours\" } }, ")
        .Edit("release.json", "\"figures\": [\n", "\"columns\": { \"lamps\": { \"from\": \"public\" } }, \"figures\": [\n")
        .Edit("release.json", "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }", $"{{ \"where\": {{ \"street\": \"All\" }},{all[1..^1]}}}")
        .WithLit($$"""{ "id": "lamps-lit", "law": "laplace", "scale": 4.0, {{rest}}"clipped": { {{clipped}} }, "sensitivity": { {{sensitivity}} } }""");

    // One cell: 20 ÷ 50 = 0.4; of either sign −30 to 20, 30 ÷ 50 = 0.6; 5 to 20, 20 ÷ 50 = 0.4.
    [Theory]
    [InlineData("\"l1\": 0.39", "\"from\": 0, \"to\": 20", "\"l1\": 0.4 or more")]
    [InlineData("\"l2\": 0.05", "\"from\": 0, \"to\": 20", "\"l2\": 0.4 or more")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.1", "\"from\": 0, \"to\": 20", "\"perCell\": 0.4 or more")]
    [InlineData("\"l1\": 0.4", "\"from\": -30, \"to\": 20", "\"l1\": 0.6 or more")]
    [InlineData("\"l1\": 0.3", "\"from\": 5, \"to\": 20", "\"l1\": 0.4 or more")]
    [InlineData("\"l1\": 0.13", "\"from\": 0, \"to\": 6.666666666", "\"l1\": 0.1333334 or more")]
    public void Norm_below_what_one_cell_moves_is_a_stop_with_the_number(string sensitivity, string clipped, string write)
    {
        using var folder = Folder(sensitivity, clipped);
        var text = folder.Text("sensitivity-too-small");
        Assert.Contains("Stop mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains("one keeper more or less can move the means of column \"lit\" by", text, StringComparison.Ordinal);
        Assert.Contains("\"lamps\", at the smallest 50.", text, StringComparison.Ordinal);
        Assert.Contains($"Do: write {write}", text, StringComparison.Ordinal);
    }

    // A sum has no denominator: one clipped contribution moves it by 20.
    [Fact]
    public void Sum_of_clipped_amounts_moves_by_what_one_unit_may_put_in()
    {
        using var folder = Folder("\"cellsPerUnit\": 1, \"perCell\": 1", rest: "").Edit("release.json", Mean, Mean.Replace("mean", "amount", StringComparison.Ordinal));
        var text = folder.Text("sensitivity-too-small");
        Assert.Contains("can move the sums of column \"lit\" by 20.", text, StringComparison.Ordinal);
        Assert.Contains("Do: write \"perCell\": 20 or more", text, StringComparison.Ordinal);
    }

    // Replaced, in one cell: 5 to 20, 15 ÷ 50 = 0.3; −30 to 20, 50 ÷ 50 = 1, of either sign ±0.5.
    [Theory]
    [InlineData("\"l1\": 0.29, \"moves\": false", "\"from\": 5, \"to\": 20", "\"l1\": 0.3 or more, or correct")]
    [InlineData("\"l1\": 0.6", "\"from\": -30, \"to\": 20", "\"l1\": 1 or more, or correct")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.4, \"signed\": true, \"moves\": false", "\"from\": -30, \"to\": 20", "\"perCell\": 0.5 or more, or correct")]
    public void Unit_in_place_of_another_moves_a_mean_from_end_to_end(string sensitivity, string clipped, string write)
    {
        using var folder = Replaced(sensitivity, clipped);
        Assert.Contains($"Do: write {write}", folder.Text("sensitivity-too-small"), StringComparison.Ordinal);
    }

    // In place of one of another cell: 20 ÷ 50 + 20 ÷ 200 = 0.5, √(0.4² + 0.1²) = 0.4123106 rounded up; a contribution of −30 ÷ 50 is not within ±0.5.
    [Theory]
    [InlineData("\"l1\": 0.4", "\"from\": 0, \"to\": 20", "\"l1\": 0.5 or more, or \"moves\": false in \"sensitivity\" if no unit can change cells, or correct")]
    [InlineData("\"l2\": 0.4", "\"from\": 0, \"to\": 20", "\"l2\": 0.4123106 or more, or \"moves\": false")]
    [InlineData("\"l1\": 0.3", "\"from\": 5, \"to\": 20", "\"l1\": 0.5 or more, or \"moves\": false")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.3", "\"from\": 5, \"to\": 20", "\"perCell\": 0.4 or more")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.5, \"signed\": true", "\"from\": -30, \"to\": 20", "\"perCell\": 0.6 or more")]
    public void Unit_in_place_of_one_of_another_cell_moves_both(string sensitivity, string clipped, string write)
    {
        using var folder = Replaced(sensitivity, clipped);
        Assert.Contains($"Do: write {write}", folder.Text("sensitivity-too-small"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"l1\": 0.5", "\"from\": 0, \"to\": 20")]
    [InlineData("\"l1\": 0.4, \"moves\": false", "\"from\": 0, \"to\": 20")]
    [InlineData("\"l1\": 1", "\"from\": -30, \"to\": 20")]
    [InlineData("\"l2\": 0.4123106", "\"from\": 0, \"to\": 20")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.4", "\"from\": 0, \"to\": 20")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.6, \"signed\": true", "\"from\": -30, \"to\": 20")]
    public void Norm_over_both_cells_of_a_unit_that_is_replaced_passes(string sensitivity, string clipped)
    {
        using var folder = Replaced(sensitivity, clipped);
        folder.HasNo("sensitivity-too-small");
    }

    // 15 to 20: two streets by 20 each, the total by nothing; −10 to 20: a street and the total by 30 each.
    [Theory]
    [InlineData("\"l1\": 39", "\"from\": 15, \"to\": 20", "\"l1\": 40 or more")]
    [InlineData("\"l1\": 59", "\"from\": -10, \"to\": 20", "\"l1\": 60 or more")]
    public void Sums_with_their_total_move_for_a_unit_that_is_replaced(string sensitivity, string clipped, string write)
    {
        using var folder = Folder($"{sensitivity}, \"l1Levels\": 2", clipped, rest: "", all: "{ \"mechanism\": \"lamps-lit\" }").Edit("mechanisms.json", "\"neighbouring\": \"add-or-remove\"", Replace)
            .Edit("release.json", Mean, Mean.Replace("mean", "amount", StringComparison.Ordinal));
        Assert.Contains($"Do: write {write}", folder.Text("sensitivity-too-small"), StringComparison.Ordinal);
    }

    // In every year one of two streets in place of the other: 20 ÷ 200 + 20 ÷ 400 in each of the two years.
    [Fact]
    public void Unit_that_is_replaced_moves_two_cells_in_every_period()
    {
        using var folder = Replaced("\"l1\": 0.29, \"l1Levels\": 2", "\"from\": 0, \"to\": 20")
            .With("tables/lamps.csv", "street,year,lit,broken,lamps\nQuay,2031,2.00,5,200\nWeir Lane,2031,9.00,-1,400\nQuay,2032,2.20,5,200\nWeir Lane,2032,9.10,-1,400\n")
            .Edit("release.json", "\"title\": \"Street\", \"all\": \"All\" }", "\"title\": \"Street\" }, { \"column\": \"year\", \"title\": \"Year\", \"period\": true }")
            .Edit("release.json", "{ \"where\": { \"street\": \"All\" }, \"public\": \"List of lamps\" }, ", "");
        Assert.Contains("Do: write \"l1\": 0.3 or more", folder.Text("sensitivity-too-small"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"l1\": 0.4")]
    [InlineData("\"l2\": 0.4")]
    [InlineData("\"l1\": 0.5")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 0.4")]
    public void Norm_that_holds_passes(string sensitivity)
    {
        using var folder = Folder(sensitivity);
        Assert.Empty(folder.Review().Select(finding => $"{finding.Slug} {finding.Found}"));
    }

    // The total has a draw of the same mechanism: 20 ÷ 50 + 20 ÷ 650 = 0.4307693 rounded up, and √(0.4² + 0.0307692…²) = 0.4011817 rounded up.
    [Theory]
    [InlineData("\"l1\": 0.43, \"l1Levels\": 2", "\"l1\": 0.4307693 or more")]
    [InlineData("\"l2\": 0.401, \"l1Levels\": 2", "\"l2\": 0.4011817 or more")]
    public void Total_of_the_same_mechanism_is_moved_too(string sensitivity, string write)
    {
        using var folder = Folder(sensitivity, all: "{ \"mechanism\": \"lamps-lit\" }");
        Assert.Contains($"Do: write {write}", folder.Text("sensitivity-too-small"), StringComparison.Ordinal);
    }

    // Two years, of one street each: 20 ÷ 200 + 20 ÷ 400 = 0.15, and √(0.1² + 0.05²) = 0.1118034 rounded up. It need not be one unit that is in the smallest cells.
    [Theory]
    [InlineData("\"l1\": 0.14, \"l1Levels\": 2", "\"l1\": 0.15 or more")]
    [InlineData("\"l2\": 0.11, \"l1Levels\": 2", "\"l2\": 0.1118034 or more")]
    public void Unit_is_moved_in_every_period(string sensitivity, string write)
    {
        using var folder = Periods(sensitivity);
        Assert.Contains($"Do: write {write}", folder.Text("sensitivity-too-small"), StringComparison.Ordinal);
    }

    [Fact]
    public void Norm_over_the_smallest_moves_of_every_period_passes()
    {
        using var folder = Periods("\"l1\": 0.15, \"l1Levels\": 2");
        folder.HasNo("sensitivity-too-small");
    }

    [Theory]
    [InlineData("\"l1\": 0.4", "gives an l1 for the means of column \"lit\" in table \"lamps\"")]
    [InlineData("\"l2\": 0.4", "gives an l2 for the means")]
    public void Norm_of_a_mean_without_a_denominator_is_a_stop_with_what_to_paste(string sensitivity, string found)
    {
        using var folder = Folder(sensitivity, rest: "");
        var text = folder.Text("denominator-missing");
        Assert.Contains(found, text, StringComparison.Ordinal);
        Assert.Contains("Do: if the denominators are public, add \"denominator\": { \"public\": \"lamps\" };", text, StringComparison.Ordinal);
    }

    // Shares of the unit of privacy over 50, 200 and 400: 100 ÷ 50 = 2, in ones 0.02, a rate per 1,000 20. Replaced by one of another street: 100 ÷ 50 + 100 ÷ 200 = 2.5.
    [Theory]
    [InlineData("\"kind\": \"share\"", "\"l1\": 1.99", "shares of column \"lit\" by 2.", "\"l1\": 2 or more")]
    [InlineData("\"kind\": \"share\"", "\"l2\": 1.99", "shares of column \"lit\" by 2.", "\"l2\": 2 or more")]
    [InlineData("\"kind\": \"share\"", "\"cellsPerUnit\": 1, \"perCell\": 0.01", "shares of column \"lit\" by 2.", "\"perCell\": 2 or more")]
    [InlineData("\"kind\": \"share\", \"in\": \"ones\"", "\"l1\": 0.0001", "shares of column \"lit\" by 0.02.", "\"l1\": 0.02 or more")]
    [InlineData("\"kind\": \"rate\", \"per\": 1000", "\"l1\": 19", "rates of column \"lit\" by 20.", "\"l1\": 20 or more")]
    [InlineData("\"kind\": \"share\"", "\"l1\": 2.4", "shares of column \"lit\" by 2.5 in all", "\"l1\": 2.5 or more, or \"moves\": false", true)]
    public void Share_of_units_moves_by_one_of_its_numerator(string kind, string sensitivity, string found, string write, bool replaced = false)
    {
        using var folder = Shares(kind, sensitivity);
        if (replaced)
            folder.Edit("mechanisms.json", "\"neighbouring\": \"add-or-remove\"", Replace);
        var text = folder.Text("sensitivity-too-small");
        Assert.StartsWith("Stop mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains(found, text, StringComparison.Ordinal);
        Assert.Contains("That follows from \"unit\": each keeper is 1 of the numerator", text, StringComparison.Ordinal);
        Assert.Contains($"Do: write {write}", text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"kind\": \"share\"", "\"l1\": 2")]
    [InlineData("\"kind\": \"share\", \"in\": \"ones\"", "\"l2\": 0.02")]
    [InlineData("\"kind\": \"rate\", \"per\": 1000", "\"cellsPerUnit\": 1, \"perCell\": 20")]
    public void Share_of_units_with_a_norm_that_holds_passes(string kind, string sensitivity)
    {
        using var folder = Shares(kind, sensitivity);
        Assert.Empty(folder.Review().Where(finding => finding.Level != FindingLevel.Note || finding.Slug.StartsWith("sensitivity", StringComparison.Ordinal)).Select(finding => $"{finding.Slug} {finding.Found}"));
    }

    // How many lamps one keeper is in the numerator is not said: a note, until the page that shows how is named.
    [Fact]
    public void Share_of_something_else_is_noted_as_stated()
    {
        using var folder = Shares("\"kind\": \"share\"", "\"l1\": 0.01", unit: "lamp");
        folder.HasNo("sensitivity-too-small");
        Assert.Contains("can move the shares of column \"lit\" in table \"lamps\": what \"lamps-lit\" declares is taken as it stands.", folder.Text("sensitivity-as-stated"), StringComparison.Ordinal);
        folder.Edit("mechanisms.json", "\"denominator\"", "\"describedAt\": \"https://office.example/shares\", \"denominator\"");
        folder.HasNo("sensitivity-as-stated");
    }

    [Theory]
    [InlineData("\"kind\": \"share\"", "\"l1\": 2", "Stop", "shares")]
    [InlineData("\"kind\": \"share\"", "\"cellsPerUnit\": 1, \"perCell\": 2", "Caution", "shares")]
    [InlineData("\"kind\": \"rate\", \"per\": 1000", "\"l2\": 20", "Stop", "rates")]
    public void Share_without_a_denominator_is_told_as_a_mean_is(string kind, string sensitivity, string level, string shares)
    {
        using var folder = Shares(kind, sensitivity, denominator: "");
        var text = folder.Text("denominator-missing");
        Assert.StartsWith(level, text, StringComparison.Ordinal);
        Assert.Contains($"for the {shares} of column \"lit\"", text, StringComparison.Ordinal);
        Assert.Contains("add \"denominator\": { \"public\": \"lamps\" }; else publish both counts, each with a mechanism of its own.", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Share_that_is_said_to_move_from_end_to_end_needs_no_denominator()
    {
        using var folder = Shares("\"kind\": \"share\"", "\"cellsPerUnit\": 1, \"perCell\": 100", denominator: "");
        folder.HasNo("denominator-missing");
    }

    [Theory]
    [InlineData("\"l1\": 0.0001", "\"kind\": \"mean\"", "\"clipped\": { \"from\": 0, \"to\": LIMIT }; else")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 3", "\"kind\": \"amount\"", "\"clipped\": { \"from\": 0, \"to\": 3 } if these are the limits; else")]
    [InlineData("\"cellsPerUnit\": 1, \"perCell\": 3, \"signed\": true", "\"kind\": \"amount\"", "\"clipped\": { \"from\": -3, \"to\": 3 } if these are the limits; else")]
    public void Contribution_that_nothing_bounds_is_a_caution_until_it_is_clipped(string sensitivity, string kind, string remedy)
    {
        using var folder = Folder(sensitivity).Edit("release.json", "\"kind\": \"mean\"", kind).Edit("mechanisms.json", "\"clipped\": { \"from\": 0, \"to\": 20 }, ", "");
        var text = folder.Text("contribution-not-bounded");
        Assert.StartsWith("Caution mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains("nothing in the folder says how much one keeper can add to them.", text, StringComparison.Ordinal);
        Assert.Contains(remedy, text, StringComparison.Ordinal);
        folder.Edit("mechanisms.json", "\"sensitivity\": { " + sensitivity, $"\"clipped\": {{ \"from\": {(sensitivity.Contains("signed", StringComparison.Ordinal) ? "-3" : "0")}, \"to\": {(kind.Contains("mean", StringComparison.Ordinal) ? "0.005" : "3")} }}, \"sensitivity\": {{ {sensitivity}");
        folder.HasNo("contribution-not-bounded");
        folder.HasNo("sensitivity-too-small");
    }

    [Theory]
    [InlineData("median", "medians")]
    [InlineData("index", "indices")]
    [InlineData("estimate", "estimates")]
    public void Sensitivity_that_nothing_can_be_held_against_is_a_note(string kind, string figures)
    {
        using var folder = Folder("\"l1\": 0.0001", rest: "").Edit("release.json", "\"kind\": \"mean\"", $"\"kind\": \"{kind}\"").Edit("mechanisms.json", "\"clipped\": { \"from\": 0, \"to\": 20 }, ", "");
        var text = folder.Text("sensitivity-as-stated");
        Assert.StartsWith("Note mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains($"can move the {figures} of column \"lit\"", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Cells_of_a_mean_without_a_denominator_are_a_stop()
    {
        using var folder = Folder("\"cellsPerUnit\": 1, \"perCell\": 0.4", rest: "");
        Assert.StartsWith("Stop mechanisms.json:7:", folder.Text("denominator-missing"), StringComparison.Ordinal);
        Assert.Contains("gives a \"perCell\" for the means of column \"lit\"", folder.Text("denominator-missing"), StringComparison.Ordinal);
    }

    // Contributions of at most 0.4 hours move no mean farther: that, or bounds of the mean itself, settles it.
    [Fact]
    public void Cells_of_a_mean_without_a_denominator_and_without_clipping_are_a_caution()
    {
        using var folder = Folder("\"cellsPerUnit\": 1, \"perCell\": 0.4", rest: "").Edit("mechanisms.json", "\"clipped\": { \"from\": 0, \"to\": 20 }, ", "");
        var text = folder.Text("denominator-missing");
        Assert.StartsWith("Caution mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains("if no contribution is above 0.4, add \"clipped\": { \"from\": 0, \"to\": 0.4 };", text, StringComparison.Ordinal);
        folder.Edit("release.json", "\"decimals\": 2,", "\"decimals\": 2, \"lowest\": 0, \"highest\": 0.4,");
        folder.HasNo("denominator-missing");
    }

    [Fact]
    public void Cells_of_a_mean_that_move_as_far_as_a_contribution_need_no_denominator()
    {
        using var folder = Folder("\"cellsPerUnit\": 1, \"perCell\": 20", rest: "");
        folder.HasNo("denominator-missing");
    }

    [Fact]
    public void Mean_with_a_denominator_that_is_wrong_is_not_said_to_have_none()
    {
        using var folder = Folder("\"l1\": 0.4", rest: "\"denominator\": { }, ");
        folder.HasNo("denominator-missing");
    }

    [Fact]
    public void Denominator_from_the_records_that_is_called_public_is_a_stop()
    {
        using var folder = Folder("\"l1\": 0.4").Edit("release.json", "\"lamps\": { \"from\": \"public\" }", "\"lamps\": { \"from\": \"confidential\" }");
        var text = folder.Text("denominator-not-public");
        Assert.StartsWith("Stop mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains("\"lamps-lit\" calls the denominator \"lamps\" public, but table \"lamps\" says that this column is \"from\": \"confidential\".", text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"from\": \"published\"")]
    [InlineData("\"from\": \"confidential\", \"mechanism\": \"lamps-broken\"")]
    public void Denominator_that_is_noised_itself_passes(string from)
    {
        using var folder = Folder("\"l1\": 0.4").Edit("release.json", "\"lamps\": { \"from\": \"public\" }", $"\"lamps\": {{ {from} }}");
        folder.HasNo("denominator-not-public");
    }

    private static TestFolder Replaced(string sensitivity, string clipped) => Folder(sensitivity, clipped).Edit("mechanisms.json", "\"neighbouring\": \"add-or-remove\"", Replace);

    private static TestFolder Shares(string kind, string sensitivity, string unit = "keeper", string denominator = "\"denominator\": { \"public\": \"lamps\" }, ") => Folder(sensitivity, rest: denominator)
        .Edit("mechanisms.json", "\"clipped\": { \"from\": 0, \"to\": 20 }, ", "")
        .With("tables/lamps.csv", "street,lit,broken,lamps\nAll,0.60,9,650\nKiln Row,0.31,4,50\nQuay,0.20,5,200\nWeir Lane,0.90,-1,400\n")
        .Edit("release.json", "\"units\": {", "\"units\": { \"keeper\": { \"en\": { \"one\": \"keeper\", \"other\": \"keepers\" } }, ")
        .Edit("release.json", "\"unit\": \"hour\", \"kind\": \"mean\"", $"\"unit\": \"{unit}\", {kind}");

    private static TestFolder Periods(string sensitivity) => Folder(sensitivity)
        .With("tables/lamps.csv", "street,lit,broken,lamps\n2031,2.00,5,200\n2032,9.00,-1,400\n")
        .Edit("release.json", "\"title\": \"Street\", \"all\": \"All\"", "\"title\": \"Year\", \"period\": true")
        .Edit("release.json", "{ \"where\": { \"street\": \"All\" }, \"public\": \"List of lamps\" }, ", "");
}
