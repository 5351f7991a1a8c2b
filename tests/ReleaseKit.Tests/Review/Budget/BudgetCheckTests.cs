using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Budget;

public sealed class BudgetCheckTests
{
    [Fact]
    public void Small_folder_and_example_have_no_finding_of_the_budget()
    {
        using var folder = new TestFolder();
        Assert.Empty(folder.Review().Select(finding => $"{finding.Slug} {finding.Found}"));
        Assert.Empty(ReleaseReview.Of(ReleaseKit.Reading.ReleaseFolder.Read(Repository.Example), null).Select(finding => $"{finding.Slug} {finding.Found}"));
    }

    [Fact]
    public void Sample_has_no_stop() =>
        Assert.Empty(ReleaseReview.Of(ReleaseKit.Reading.ReleaseFolder.Read(Repository.Sample), null)
            .Where(finding => finding.Level == FindingLevel.Stop).Select(finding => $"{finding.Slug} {finding.Found}"));

    [Fact]
    public void Total_above_what_is_authorised_is_a_stop()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"epsilon\": 6.0, \"delta\": 1e-9", "\"rho\": 0.05");
        var text = folder.Text("authorised-exceeded");
        Assert.Contains("mechanisms.json:5:", text, StringComparison.Ordinal);
        Assert.Contains("Authorised is rho 0.05.\nThe mechanisms spend rho 0.14134", text, StringComparison.Ordinal);
        Assert.DoesNotContain("delta", text, StringComparison.Ordinal);
        Assert.Contains("add noise until the mechanisms spend at most rho 0.05 together", text, StringComparison.Ordinal);
    }

    // 1 ÷ 4 and 2 ÷ 3 are 0.9166667 together.
    [Theory]
    [InlineData("approximate", "\"delta\": 1e-9", "spend at most epsilon 0.01 and delta 0.000000001 together")]
    [InlineData("pure", "\"delta\": 0", "spend at most epsilon 0.01 together")]
    public void Limit_is_told_in_the_numbers_of_the_accounting(string accounting, string delta, string limit)
    {
        using var folder = new TestFolder();
        folder.WithLit("""{ "id": "lamps-lit", "law": "discrete-laplace", "scale": 4, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 } }""")
            .Edit("mechanisms.json", "\"concentrated\"", $"\"{accounting}\"").Edit("mechanisms.json", "\"epsilon\": 6.0, \"delta\": 1e-9", $"\"epsilon\": 0.01, {delta}");
        Assert.Contains(limit, folder.Text("authorised-exceeded"), StringComparison.Ordinal);
    }

    [Fact]
    public void Total_is_held_against_every_bound_that_can_be_shown()
    {
        using var folder = new TestFolder();
        // Two discrete Laplace mechanisms together are 0.1 + 0.2 pure; converted from rho they would not meet 0.31 at 1e-9.
        folder.WithLit("""{ "id": "lamps-lit", "law": "discrete-laplace", "scale": 10, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 } }""")
            .Edit("mechanisms.json", "\"scale\": 3.0, \"sensitivity\": { \"cellsPerUnit\": 2", "\"scale\": 10.0, \"sensitivity\": { \"cellsPerUnit\": 2")
            .Edit("mechanisms.json", "\"epsilon\": 6.0", "\"epsilon\": 0.3");
        folder.HasNo("authorised-exceeded");
        folder.Edit("mechanisms.json", "\"epsilon\": 0.3", "\"epsilon\": 0.29");
        Assert.Contains("below epsilon 0.3 ", folder.Text("authorised-exceeded"), StringComparison.Ordinal);
    }

    [Fact]
    public void Law_without_a_loss_in_the_accounting_names_those_in_which_it_has_one()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"concentrated\"", "\"pure\"");
        var text = folder.Text("no-loss-in-accounting");
        Assert.Contains("\"lamps-lit\" has the law \"discrete-gaussian\", whose loss has no limit in", text, StringComparison.Ordinal);
        Assert.Contains("It has one in: approximate, concentrated.", text, StringComparison.Ordinal);
        Assert.Contains("write \"accounting\": \"concentrated\"", text, StringComparison.Ordinal);
        folder.HasNo("authorised-exceeded");
    }

    [Fact]
    public void Law_without_pure_epsilon_needs_a_declared_pair_under_approximate_accounting()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"concentrated\"", "\"approximate\"");
        var text = folder.Text("spent-needed");
        Assert.Contains("\"lamps-lit\" has the law \"discrete-gaussian\" and does not say what it", text, StringComparison.Ordinal);
        Assert.Contains("\"delta\": 0.000000001 }", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Uniform_noise_is_told_in_plain_words()
    {
        using var folder = new TestFolder();
        folder.WithLit("""{ "id": "lamps-lit", "law": "discrete-uniform", "halfWidth": 12, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 } }""");
        var text = folder.Text("uniform-noise");
        Assert.Contains("With chance 0.04 its figures show with certainty whether one keeper was counted.", text, StringComparison.Ordinal);
        Assert.Contains("It has one in: approximate.", folder.Text("no-loss-in-accounting"), StringComparison.Ordinal);
        Assert.Contains(
            "Do: noise its figures with a law that has no end, such as discrete-laplace: the delta of this one is at least 0.04 at every epsilon, and 0.000000001 is authorised.",
            folder.Text("no-loss-in-accounting"), StringComparison.Ordinal);
    }

    [Fact]
    public void Uniform_noise_whose_delta_is_authorised_is_told_the_pair_to_paste()
    {
        using var folder = new TestFolder();
        folder.WithLit("""{ "id": "lamps-lit", "law": "discrete-uniform", "halfWidth": 12, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 } }""")
            .Edit("mechanisms.json", "\"delta\": 1e-9", "\"delta\": 0.05");
        Assert.Contains("\"spent\": { \"epsilon\": 0, \"delta\": 0.04000004 }", folder.Text("no-loss-in-accounting"), StringComparison.Ordinal);
    }

    // Truncated discrete Laplace of scale 4 cut at 3, one step: δ is the chance of the outermost step, e^(−3/4) ÷ (1 + 2(e^(−1/4) + e^(−2/4) + e^(−3/4))) = 0.1001….
    [Theory]
    [InlineData("concentrated", "no-loss-in-accounting")]
    [InlineData("approximate", "spent-needed")]
    public void Delta_far_above_the_authorised_one_is_not_proposed(string accounting, string slug)
    {
        using var folder = new TestFolder();
        folder.WithLit("""{ "id": "lamps-lit", "law": "truncated-discrete-laplace", "scale": 4, "cutoff": 3, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 } }""")
            .Edit("mechanisms.json", "\"concentrated\"", $"\"{accounting}\"");
        var text = folder.Text(slug);
        Assert.Contains("or give this one a larger \"cutoff\": the delta of this one is at least 0.1001", text, StringComparison.Ordinal);
        Assert.DoesNotContain("\"spent\": {", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Mechanism_that_nothing_uses_is_a_stop_unless_its_use_says_why()
    {
        using var folder = new TestFolder();
        const string Spare = "{ \"id\": \"spare\", \"law\": \"laplace\", \"scale\": 1, \"sensitivity\": { \"l1\": 1 }USE },\n    { \"id\": \"lamps-lit\"";
        folder.Edit("mechanisms.json", "{ \"id\": \"lamps-lit\"", Spare.Replace("USE", "", StringComparison.Ordinal));
        Assert.Contains("No figure carries the noise of \"spare\".", folder.Text("mechanism-unused"), StringComparison.Ordinal);
        folder.Edit("mechanisms.json", "\"l1\": 1 }", "\"l1\": 1 }, \"use\": \"not-published\"");
        folder.HasNo("mechanism-unused");
    }

    [Fact]
    public void Mechanism_that_is_not_published_is_carried_by_no_figure()
    {
        using var folder = new TestFolder();
        folder.WithLit(BudgetFolder.Lit.Replace("\"sigma\"", "\"use\": \"not-published\", \"sigma\"", StringComparison.Ordinal));
        Assert.Contains("but 3 published figures carry it, in column \"lit\" of table \"lamps\".", folder.Text("not-published-used"), StringComparison.Ordinal);
    }

    // Sigma 4: rho 1 ÷ 32 = 0.03125; scale 3 in two cells: 2 × (1/3)·tanh(1/6) = 0.110…; authorised is rho 0.2.
    [Theory]
    [InlineData("\"rho\": 0.2", "\"rho\": 0.5", true)]
    [InlineData("\"rho\": 0.2", "\"rho\": 0.09", true)]
    [InlineData("\"rho\": 0.2", "\"rho\": 0.08", false)]
    [InlineData("\"epsilon\": 4, \"delta\": 1e-9", "\"rho\": 0.5", true)]
    [InlineData("\"epsilon\": 6, \"delta\": 1e-9", "\"rho\": 0.04", false)]
    public void Declared_total_above_the_authorised_one_is_a_stop(string authorised, string spent, bool isAbove)
    {
        using var folder = new TestFolder();
        folder.WithLit(BudgetFolder.Lit.Replace("\"sigma\"", $"\"spent\": {{ {spent} }}, \"sigma\"", StringComparison.Ordinal))
            .Edit("mechanisms.json", "\"epsilon\": 6.0, \"delta\": 1e-9", authorised);
        if (isAbove)
            Assert.Contains("The mechanisms declare rho 0.", folder.Text("declared-above-authorised"), StringComparison.Ordinal);
        else
            folder.HasNo("declared-above-authorised");
    }

    // Scale 3 in two cells: epsilon 2 ÷ 3; what is authorised without delta is met by epsilon alone, whatever its rho.
    [Fact]
    public void Declared_total_that_another_currency_meets_is_no_finding()
    {
        using var folder = new TestFolder();
        folder.WithLit("""{ "id": "lamps-lit", "law": "discrete-laplace", "scale": 4, "sensitivity": { "cellsPerUnit": 1, "perCell": 1 }, "spent": { "rho": 0.0311 } }""")
            .Edit("mechanisms.json", "\"epsilon\": 6.0, \"delta\": 1e-9", "\"epsilon\": 0.95");
        folder.HasNo("declared-above-authorised");
        folder.HasNo("authorised-exceeded");
    }

    [Fact]
    public void Totals_beside_their_parts_move_a_unit_twice()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"cellsPerUnit\": 2", "\"cellsPerUnit\": 1");
        var text = folder.Text("sensitivity-too-small");
        Assert.Contains("\"lamps-broken\" counts a keeper in 1 cell, but table \"lamps\" has it in 2: totals beside their parts, or several periods.", text, StringComparison.Ordinal);
        Assert.Contains("write \"cellsPerUnit\": 2,", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Periods_move_a_unit_once_each()
    {
        using var folder = new TestFolder();
        folder.With("tables/lamps.csv", "street,lit,broken\n2031-Q1,31,4\n2031-Q2,20,5\n2031-Q3,9,-1\n")
            .With("narrative/summary.md", "# Summary\n")
            .Edit("release.json", "\"title\": \"Street\", \"all\": \"All\"", "\"title\": \"Street\", \"period\": true")
            .Edit("release.json", "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ", "")
            .Edit("release.json", "\"headlines\": [ \"lamps/lit?street=All\" ],", "");
        var stops = folder.Review().Where(finding => finding.Slug == "sensitivity-too-small").ToList();
        Assert.Equal(2, stops.Count);
        Assert.Contains("write \"cellsPerUnit\": 3,", stops[0].Do, StringComparison.Ordinal);
    }

    [Fact]
    public void Norm_over_several_levels_says_how_many_it_counts()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"cellsPerUnit\": 2, \"perCell\": 1", "\"l1\": 2");
        Assert.Contains("\"lamps-broken\" gives an l1, and table \"lamps\" has a keeper in 2 cells of", folder.Text("levels-not-counted"), StringComparison.Ordinal);
        folder.Edit("mechanisms.json", "\"l1\": 2", "\"l1\": 2, \"l1Levels\": 2");
        folder.HasNo("levels-not-counted");
    }

    [Fact]
    public void Several_columns_of_one_mechanism_are_a_caution()
    {
        using var folder = new TestFolder();
        folder.Edit("release.json", "{ \"mechanism\": \"lamps-lit\" }", "{ \"mechanism\": \"lamps-broken\" }");
        var text = folder.Text("counted-in-several-columns");
        Assert.StartsWith("Caution ", text, StringComparison.Ordinal);
        Assert.Contains("noises 2 columns and counts a keeper in 2 cells; one that stands in every column is in 3.", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Exact_number_of_units_leaves_no_neighbours_where_one_unit_is_added()
    {
        using var folder = new TestFolder();
        folder.Edit("release.json", "{ \"mechanism\": \"lamps-broken\" }", "{ \"exact\": \"audited\" }")
            .Edit("mechanisms.json", "\"who\": { \"one\": \"keeper\", \"other\": \"keepers\" }", "\"who\": \"lamp\"");
        var text = folder.Text("exact-unit-count");
        Assert.Contains("lamps/broken?street=All is an exact number of lamps, as are 3 more figures of its column.", text, StringComparison.Ordinal);
        folder.Edit("mechanisms.json", "\"add-or-remove\"", "\"replace\"");
        folder.HasNo("exact-unit-count");
    }

    [Theory]
    [InlineData("\"lamps\"", "count")]
    [InlineData("{ \"one\": \"Lamp\", \"other\": \"lamps\" }", "count")]
    [InlineData("\"lamp\"", "estimate")]
    [InlineData("\"lamp\"", "amount")]
    public void Exact_number_of_units_is_recognised_in_any_form_and_as_an_estimate(string who, string kind)
    {
        using var folder = new TestFolder();
        folder.Edit("release.json", "\"kind\": \"count\", \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", $"\"kind\": \"{kind}\", \"noise\": [ {{ \"exact\": \"audited\" }} ]")
            .Edit("mechanisms.json", "\"who\": { \"one\": \"keeper\", \"other\": \"keepers\" }", $"\"who\": {who}");
        Assert.StartsWith("Stop ", folder.Text("exact-unit-count"), StringComparison.Ordinal);
    }

    [Fact]
    public void One_more_exact_number_is_told_in_the_singular()
    {
        using var folder = new TestFolder();
        folder.Edit("release.json", "{ \"mechanism\": \"lamps-broken\" }", "{ \"where\": { \"street\": \"Quay\" }, \"exact\": \"audited\" }, { \"where\": { \"street\": \"Kiln Row\" }, \"exact\": \"audited\" }, { \"mechanism\": \"lamps-broken\" }")
            .Edit("mechanisms.json", "\"who\": { \"one\": \"keeper\", \"other\": \"keepers\" }", "\"who\": \"lamp\"");
        Assert.Contains("is an exact number of lamps, as is one more figure of its column.", folder.Text("exact-unit-count"), StringComparison.Ordinal);
    }

    [Fact]
    public void Exact_count_that_does_not_say_of_what_is_a_caution()
    {
        using var folder = new TestFolder();
        folder.Edit("release.json", "\"title\": \"Lamps broken\", \"unit\": \"lamp\", \"kind\": \"count\", \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "\"title\": \"Lamps broken\", \"kind\": \"count\", \"noise\": [ { \"exact\": \"audited\" } ]");
        var text = folder.Text("exact-count-without-unit");
        Assert.StartsWith("Caution ", text, StringComparison.Ordinal);
        Assert.Contains("give the figures \"broken\" their \"unit\"", text, StringComparison.Ordinal);
        folder.HasNo("exact-unit-count");
    }

    [Fact]
    public void Value_off_the_grid_of_its_noise_is_a_stop()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"scale\": 3.0", "\"scale\": 3.0, \"grid\": 2");
        var text = folder.Text("off-grid");
        Assert.Contains("lamps/broken?street=All is 9, which is no multiple of 2, as are 2 more figures of \"lamps-broken\".", text, StringComparison.Ordinal);
        Assert.Contains("what stands between two steps passed through it unprotected.", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Value_off_its_declared_rounding_is_a_stop_but_a_bound_is_none()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"scale\": 3.0, ", "\"scale\": 3.0, \"afterwards\": [ { \"roundTo\": 5 }, { \"notBelow\": 4 } ], ")
            .With("tables/lamps.csv", "street,lit,broken\nAll,60,10\nKiln Row,31,4\nQuay,20,5\nWeir Lane,9,7\n");
        var text = folder.Text("off-grid");
        Assert.Contains("lamps/broken?street=Weir%20Lane is 7, which is no multiple of 5.", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Bound_inside_what_is_possible_is_a_stop_unless_the_release_says_that_it_is_public()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"scale\": 3.0, ", "\"scale\": 3.0, \"afterwards\": [ { \"notAbove\": 50 } ], ");
        var text = folder.Text("bound-not-respected");
        Assert.StartsWith("Stop mechanisms.json:8:", text, StringComparison.Ordinal);
        Assert.Contains("values before noise above 50 are possible in column \"broken\" of table \"lamps\".", text, StringComparison.Ordinal);
        Assert.Contains("write \"highest\": 50 in the figures \"broken\" of release.json", text, StringComparison.Ordinal);
        folder.Edit("release.json", "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "\"highest\": 50, \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]");
        folder.HasNo("bound-not-respected");
    }

    [Theory]
    [InlineData("{ \"notBelow\": 100 }", true)]
    [InlineData("{ \"roundTo\": 5 }, { \"notBelow\": 2 }", true)]
    [InlineData("{ \"notBelow\": 0 }", false)]
    [InlineData("{ \"notBelow\": -5 }", false)]
    public void Bound_is_held_against_what_the_kind_allows(string steps, bool isInside)
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"scale\": 3.0, ", $"\"scale\": 3.0, \"afterwards\": [ {steps} ], ");
        Assert.Equal(isInside, folder.Review().Any(finding => finding.Slug == "bound-not-respected"));
    }

    [Theory]
    [InlineData("{ \"notBelow\": 0 }", "lamps/broken?street=Weir%20Lane is -1, but \"lamps-broken\" says that no figure is below 0.")]
    [InlineData("{ \"notAbove\": 8 }", "lamps/broken?street=All is 9, but \"lamps-broken\" says that no figure is above 8.")]
    [InlineData("{ \"zeroBelow\": 5 }", "lamps/broken?street=Kiln%20Row is 4, but \"lamps-broken\" says that every figure below 5 is 0; one more figure is against it in column \"broken\".")]
    public void Value_against_its_after_steps_is_a_stop(string step, string found)
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"scale\": 3.0, ", $"\"scale\": 3.0, \"afterwards\": [ {step} ], ");
        var text = folder.Text("past-afterwards");
        Assert.Contains(found, text, StringComparison.Ordinal);
        Assert.Contains($"or take {step} out of \"afterwards\"", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Value_that_a_later_step_makes_is_not_against_an_earlier_one()
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"scale\": 3.0, ", "\"scale\": 3.0, \"afterwards\": [ { \"notBelow\": 0 }, { \"zeroBelow\": 5 } ], ")
            .With("tables/lamps.csv", "street,lit,broken\nAll,60,9\nKiln Row,31,0\nQuay,20,5\nWeir Lane,9,0\n");
        folder.HasNo("past-afterwards");
    }

    [Fact]
    public void Noise_finer_than_the_unit_of_the_file_is_a_stop_unless_a_rounding_says_so()
    {
        using var folder = new TestFolder();
        folder.Edit("release.json", "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "\"multiplier\": 1000, \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]");
        var text = folder.Text("noise-finer-than-unit");
        Assert.Contains("moves in steps of 1, but column \"broken\" of table \"lamps\" has \"multiplier\": 1000 and its digits move in steps of 1000.", text, StringComparison.Ordinal);
        Assert.Contains("write \"grid\": 1000", text, StringComparison.Ordinal);
        folder.Edit("mechanisms.json", "\"scale\": 3.0, ", "\"scale\": 3.0, \"afterwards\": [ { \"roundTo\": 1000 } ], ");
        folder.HasNo("noise-finer-than-unit");
        folder.Edit("mechanisms.json", "\"afterwards\": [ { \"roundTo\": 1000 } ]", "\"grid\": 1000");
        folder.HasNo("noise-finer-than-unit");
    }

    [Fact]
    public void Continuous_noise_has_no_steps_to_be_finer_than_the_unit()
    {
        using var folder = new TestFolder();
        folder.Edit("release.json", "\"noise\": [ { \"mechanism\": \"lamps-broken\" } ]", "\"multiplier\": 1000, \"noise\": [ { \"mechanism\": \"lamps-broken\" } ]")
            .Edit("mechanisms.json", "\"discrete-laplace\"", "\"laplace\"");
        folder.HasNo("noise-finer-than-unit");
    }

    [Fact]
    public void Confidential_column_and_cells_hidden_by_value_count_as_exact()
    {
        using var folder = new TestFolder();
        folder.With("tables/lamps.csv", "street,lit,broken,watts\nAll,60,9,3\nKiln Row,31,4,1\nQuay,20,5,1\nWeir Lane,9,[c],1\n")
            .Edit("release.json", "\"stub\": [", "\"columns\": { \"watts\": { \"from\": \"confidential\" } }, \"hidden\": { \"by\": \"value-before-noise\", \"inTotals\": false }, \"statuses\": { \"marks\": { \"[c]\": \"Q\" } }, \"stub\": [");
        Assert.Contains("Column \"watts\" of table \"lamps\" comes from the confidential records", folder.Text("confidential-column"), StringComparison.Ordinal);
        Assert.Contains("Table \"lamps\" hides cells because of their value before noise.", folder.Text("hidden-by-value"), StringComparison.Ordinal);
    }

    [Fact]
    public void Delta_is_held_against_a_public_number_of_units()
    {
        using var folder = new TestFolder();
        folder.Edit("release.json", "{ \"mechanism\": \"lamps-broken\" }", "{ \"public\": \"town survey\" }")
            .With("tables/lamps.csv", "street,lit,broken\nAll,60,2000000000\nKiln Row,31,4\nQuay,20,5\nWeir Lane,9,1\n")
            .Edit("mechanisms.json", "\"who\": { \"one\": \"keeper\", \"other\": \"keepers\" }", "\"who\": \"lamp\"");
        Assert.Contains("is not below 1 divided by the 2,000,000,000 lamps", folder.Text("delta-too-large"), StringComparison.Ordinal);
    }

    // 60 lamps are counted in all: 1 ÷ 60 = 0.0166….
    [Theory]
    [InlineData("0.5", "\"lamp\"", "Delta 0.5 is not below 1 divided by the 60 lamps that a figure with noise counts.")]
    [InlineData("0.5", "\"keeper\"", "Delta 0.5 is above 1 in 1,000.")]
    [InlineData("0.002", "\"lamp\"", "Delta 0.002 is above 1 in 1,000.")]
    public void Delta_of_any_size_that_protects_nobody_is_a_caution(string delta, string who, string found)
    {
        using var folder = new TestFolder();
        folder.Edit("mechanisms.json", "\"delta\": 1e-9", $"\"delta\": {delta}")
            .Edit("mechanisms.json", "\"who\": { \"one\": \"keeper\", \"other\": \"keepers\" }", $"\"who\": {who}");
        Assert.Contains(found, folder.Text("delta-too-large"), StringComparison.Ordinal);
    }

    /// <summary>Norms by Dwork, McSherry, Nissim and Smith 2006, definition 3: one unit in four cells by 1 each has an l1 of 4 and an l2 of 2.</summary>
    [Theory]
    [InlineData("\"cellsPerUnit\": 4, \"perCell\": 1, \"l2\": 1.5", "an l2 of 2, and an l2 of 1.5")]
    [InlineData("\"cellsPerUnit\": 4, \"perCell\": 1, \"l2\": 3", "an l2 of 2, and an l2 of 3")]
    [InlineData("\"cellsPerUnit\": 4, \"perCell\": 1, \"l1\": 1", "an l1 of 4, and an l1 of 1")]
    [InlineData("\"l1\": 2, \"l2\": 3, \"l1Levels\": 1", "an l1 of 2 and an l2 of 3")]
    public void Sensitivity_given_in_two_ways_that_differ_is_a_stop(string sensitivity, string words)
    {
        using var folder = new TestFolder();
        folder.WithLit($"{{ \"id\": \"lamps-lit\", \"law\": \"discrete-gaussian\", \"sigma\": 8.0, \"sensitivity\": {{ {sensitivity} }} }}");
        var text = folder.Text("sensitivity-unclear");
        Assert.Contains("Stop mechanisms.json:7:", text, StringComparison.Ordinal);
        Assert.Contains(words, text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"cellsPerUnit\": 4, \"perCell\": 1, \"l2\": 2")]
    [InlineData("\"cellsPerUnit\": 2, \"perCell\": 1, \"l1\": 2, \"l2\": 1.41421")]
    [InlineData("\"l1\": 3, \"l2\": 2, \"l1Levels\": 1")]
    public void Sensitivity_given_in_two_ways_that_agree_is_no_finding(string sensitivity)
    {
        using var folder = new TestFolder();
        folder.WithLit($"{{ \"id\": \"lamps-lit\", \"law\": \"discrete-gaussian\", \"sigma\": 8.0, \"sensitivity\": {{ {sensitivity} }} }}");
        folder.HasNo("sensitivity-unclear");
    }
}
