using System.Globalization;
using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using ReleaseKit.Appraisal;
using ReleaseKit.Appraisal.Budget;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Wording;
using ReleaseKit.Wording;
using Xunit;

namespace ReleaseKit.Tests.Pages;

/// <summary>The budget page read back: every number of the statement stands on it, nothing is said that was not shown.</summary>
public sealed class BudgetPageTests
{
    private static readonly string[] Forbidden = ["safe", "anonymous", "true value", "confident", "confidence", "significant", "no difference"];

    [Fact]
    public void Meaning_comes_first_and_opens_with_the_sentences_about_exact_figures()
    {
        var page = Read(new BudgetSample());

        var first = page.QuerySelectorAll("main section h2")[0];
        Assert.Equal("What it means for one household", first.TextContent);
        Assert.Equal(
            "These figures were published exactly. For them there is no limit on what can be learned. All that follows compares two data sets that agree on them.",
            first.NextElementSibling!.NextElementSibling!.TextContent.Trim());
    }

    [Fact]
    public void Exact_figures_are_named_directly_before_the_sentences_about_them()
    {
        var sentences = Read(new BudgetSample()).QuerySelector(".exact-first")!;

        Assert.StartsWith("Published exactly: ", sentences.PreviousElementSibling!.TextContent, StringComparison.Ordinal);
        Assert.Contains("7 figures", sentences.PreviousElementSibling!.TextContent, StringComparison.Ordinal);
        Assert.Equal(
            "Someone who knows what all other households add to an exact count or sum can work out what this household adds, to the last digit. The limits below do not cover that.",
            sentences.NextElementSibling!.TextContent.Trim());
    }

    [Fact]
    public void Beside_exact_figures_no_limit_is_said_to_hold_for_the_whole_release()
    {
        var page = Read(new BudgetSample());

        const string Beside = "This holds for all figures with noise. The figures published exactly have no limit.";
        Assert.DoesNotContain("The whole release can", Text(page), StringComparison.Ordinal);
        Assert.Contains("The figures with noise can multiply the odds", Text(page), StringComparison.Ordinal);
        Assert.EndsWith(Beside, page.QuerySelector(".promise")!.TextContent.Trim(), StringComparison.Ordinal);
        Assert.EndsWith(Beside, page.QuerySelector("#total")!.NextElementSibling!.TextContent.Trim(), StringComparison.Ordinal);
        Assert.Contains("The whole release can multiply the odds", Text(Read(new BudgetSample { WithExactFigures = false })), StringComparison.Ordinal);
    }

    [Fact]
    public void Very_small_loss_takes_the_last_place_of_the_columns_and_digits_of_its_own_elsewhere()
    {
        var page = Read(new BudgetSample { Currency = LossCurrency.Epsilon, Authorised = 753.034261522, Amounts = [([0], "ward", 14.5), ([1], "ward", 0.175756404), ([2], "ward", 0.0000000000021)] });

        Assert.Equal("14.6758 spent, of 753.0342 authorised", Text(page.QuerySelector(".spent-num")!));
        Assert.Equal(["14.5000", "0.1758", "0.0001", "14.6758"], page.QuerySelectorAll(".ledger tbody .tot, .ledger tfoot tr:first-child .tot").Select(cell => cell.TextContent));
        Assert.Contains("0.0000000000021", Text(page.QuerySelector(".mechanisms")!), StringComparison.Ordinal);
    }

    [Fact]
    public void Without_a_limit_on_odds_the_page_says_so_and_names_no_share_of_outcomes()
    {
        var page = Read(new BudgetSample { WithExactFigures = false, WithLimit = false });

        Assert.Contains("No limit on the odds of that guess can be shown. A result may show for certain what this reader guesses.", Text(page), StringComparison.Ordinal);
        Assert.DoesNotContain("outcomes", Text(page), StringComparison.Ordinal);
        Assert.Contains("100.0 in 100", page.QuerySelector(".odds tbody tr .main")!.TextContent, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(Neighbouring.AddOrRemove, "Found at most, of 100 cases where the record was used")]
    [InlineData(Neighbouring.Replace, "Found at most, of 100 cases where it is the second")]
    public void Test_table_says_of_which_cases_it_counts(Neighbouring neighbouring, string head) =>
        Assert.Equal(head, Read(new BudgetSample { Neighbouring = neighbouring }).QuerySelectorAll(".test th.main").Single().TextContent);

    [Fact]
    public void Without_exact_figures_their_sentences_are_not_said()
    {
        var page = Read(new BudgetSample { WithExactFigures = false });

        Assert.DoesNotContain("published exactly", Text(page), StringComparison.Ordinal);
    }

    [Fact]
    public void What_is_shown_about_all_units_is_always_spoken_of()
    {
        Assert.Contains("What the figures show about households in general is not limited by this.", Text(Read(new BudgetSample())), StringComparison.Ordinal);
    }

    [Fact]
    public void Odds_beliefs_and_tests_are_never_printed_smaller_than_they_are()
    {
        var sample = new BudgetSample();
        var page = Read(sample);
        var meaning = sample.Statement.Meaning;

        var tables = page.QuerySelectorAll(".odds");
        // e^4.5 = 90.017…, rounded up to three digits.
        Assert.Contains("multiply the odds of that guess by at most 90.1, or divide them by at most 90.1.", Text(page), StringComparison.Ordinal);
        Assert.Contains("This holds for all but at most 1 in 100,000,000 outcomes.", Text(page), StringComparison.Ordinal);
        foreach (var (belief, row) in meaning.Beliefs.Zip(tables[0].QuerySelectorAll("tbody tr")))
        {
            Assert.InRange(Chance(row.Children[1]), belief.Highest, belief.Highest + 0.001);
            Assert.InRange(Chance(row.Children[2]), belief.Lowest - 0.001, belief.Lowest);
        }

        foreach (var (test, row) in meaning.Tests.Zip(tables[1].QuerySelectorAll("tbody tr")))
        {
            Assert.Equal(test.FalseAlarms, Chance(row.Children[0]), 1e-12);
            Assert.InRange(Chance(row.Children[2]), test.LargestSuccess, test.LargestSuccess + 0.001);
        }
    }

    [Fact]
    public void Spent_is_rounded_up_authorised_down_and_the_rest_is_their_difference()
    {
        var page = Read(new BudgetSample());

        var large = page.QuerySelectorAll(".spent-num .firm").Select(number => decimal.Parse(number.TextContent, CultureInfo.InvariantCulture)).ToList();
        // The sum of the sample's amounts is 0.2241725.
        Assert.Equal([0.2242m, 0.3500m], large);
        Assert.Contains("What is left is 0.1258.", Text(page), StringComparison.Ordinal);
    }

    [Fact]
    public void Ledger_names_every_amount_and_its_sums_hold_within_the_last_digit()
    {
        var sample = new BudgetSample();
        var ledger = Read(sample).QuerySelector(".ledger")!;

        var groups = ledger.QuerySelectorAll("tr.ledger-table").Select(Cells).ToList();
        var foot = Cells(ledger.QuerySelector("tfoot tr")!);
        var unit = 0.0001m;
        Assert.All(groups, cells => Assert.InRange(cells[..^1].Sum() - cells[^1], 0, unit * cells.Length));
        for (var column = 0; column < foot.Length; column++)
            Assert.InRange(groups.Sum(cells => cells[column]) - foot[column], 0, unit * groups.Count);
        Assert.Equal(0.2242m, foot[^1]);
        // Table 1: wards 0.0310912 + 0.0102041, districts 0.0138889 + 0.0078125, Norrvale 0.03125, each rounded up.
        Assert.Equal([0.0413m, 0.0218m, 0.0313m, 0, 0.0943m], groups[0]);
    }

    [Fact]
    public void Ledger_says_why_printed_parts_do_not_come_to_their_total_only_where_they_do_not()
    {
        BudgetSample even = new() { Amounts = [([0], "ward", 0.125), ([1], "ward", 0.25), ([1], "district", 0.0625)] };

        Assert.Contains("Each amount is rounded up on its own", Text(Read(new BudgetSample())), StringComparison.Ordinal);
        Assert.DoesNotContain("Each amount is rounded up on its own", Text(Read(even)), StringComparison.Ordinal);
    }

    [Fact]
    public void Totals_stand_side_by_side_with_rule_and_source()
    {
        var rows = Read(new BudgetSample()).QuerySelectorAll(".totals tbody tr").Select(row => row.Children.Select(Unlabelled).ToList()).ToList();

        Assert.Equal(["Authorised", "Declared by the Office", "Worked out again here", "The same rho, converted", "The same rho, converted", "Smallest upper bound that this program can prove", "Largest lower bound of any one run of noise, before any step after it, rounded down (runs cannot be added here)"], rows.Select(row => row[0]));
        Assert.Equal(["6", "0.000000001", "none"], rows[0][1..4]);
        Assert.Equal(["none", "none", "0.2301"], rows[1][1..4]);
        Assert.Equal(["4.235", "0.000000001", "0.2242"], rows[2][1..4]);
        Assert.Equal(["4.235", "0.000000001", "none"], rows[3][1..4]);
        Assert.Equal(["4.877", "0.000000001", "none"], rows[4][1..4]);
        Assert.Equal(["4.199", "0.000000001", "none"], rows[5][1..4]);
        Assert.Equal("0.2109", rows[6][3]);
        Assert.Contains("Canonne, Kamath & Steinke 2020, Corollary 13", rows[5][4], StringComparison.Ordinal);
    }

    [Fact]
    public void Every_step_stands_with_its_numbers_rule_and_source()
    {
        var sample = new BudgetSample();
        var rows = Read(sample).QuerySelectorAll(".steps tbody tr:not(.steps-of)").ToList();

        Assert.Equal(sample.Statement.Steps.Count, rows.Count);
        foreach (var step in sample.Statement.Steps)
            Assert.Contains(rows, row => row.Children[1].TextContent == step.Arithmetic && row.Children[2].TextContent.EndsWith(step.Rule.Source, StringComparison.Ordinal));
    }

    [Fact]
    public void Every_mechanism_stands_with_law_reach_loss_and_share()
    {
        var sample = new BudgetSample();
        var items = Read(sample).QuerySelectorAll(".mechanisms li").ToList();

        Assert.Equal(sample.Statement.Mechanisms.Count, items.Count);
        var first = items[0].TextContent;
        foreach (var words in new[] { "Households counted in question 1", "Discrete Gaussian noise, sigma 9.5.", "One household counts in at most 1 cell, by at most 1.", "2 published figures carry it. 1 more carries it and is hidden.", "0.0311", "13.9 in 100" })
            Assert.Contains(words, first, StringComparison.Ordinal);
    }

    [Fact]
    public void Least_loss_is_said_of_the_noise_alone_where_nothing_follows_it() =>
        Assert.Contains("No less than rho 0.03109 is lost in the worst case.", Read(new BudgetSample()).QuerySelectorAll(".mechanisms li")[0].TextContent, StringComparison.Ordinal);

    [Fact]
    public void What_is_only_declared_says_so_and_nothing_else_does()
    {
        var items = Read(new BudgetSample()).QuerySelectorAll(".mechanisms li").ToList();

        Assert.Equal([2], items.Select((item, index) => (Text: item.TextContent, index))
            .Where(item => item.Text.Contains("The Office states this; it could not be worked out again here.", StringComparison.Ordinal)).Select(item => item.index));
    }

    [Fact]
    public void Exact_and_public_figures_stand_with_their_reasons()
    {
        var tables = Read(new BudgetSample()).QuerySelectorAll("table.exact");

        Assert.Contains("The Relief Act orders the exact sum to be published", tables[0].TextContent, StringComparison.Ordinal);
        Assert.Contains("Public list of accounts, 31 December 2030", tables[1].TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Who_authorised_when_and_on_what_paper_is_said()
    {
        var text = Read(new BudgetSample()).QuerySelector("#authority")!.ParentElement!.TextContent;

        foreach (var words in new[] { "The Registrar", "4\u00A0September 2031", "NOPF/2031/7", "lapses", "one household, over the year 2031" })
            Assert.Contains(words, text, StringComparison.Ordinal);
    }

    [Fact]
    public void Twenty_disclosures_are_stated_or_not_stated()
    {
        var items = Read(new BudgetSample()).QuerySelectorAll(".disclosures li .standing").Select(item => item.TextContent).ToList();

        Assert.Equal(20, items.Count);
        // 10: one law of the sample is outside the program's list.
        Assert.Equal([10, 13, 17, 18], items.Select((text, index) => (text, index)).Where(item => item.text == "not stated").Select(item => item.index + 1));
    }

    [Fact]
    public void Words_of_the_office_end_before_the_next_sentence() => Assert.Contains(
        "The Registrar's office. The Office states this", Read(new BudgetSample()).QuerySelectorAll(".disclosures li")[5].TextContent, StringComparison.Ordinal);

    [Theory]
    [InlineData(1, "At the head and foot of every page; the time on the first page.")]
    [InlineData(2, "Population under the title of every table, sources below it, the period on the first page.")]
    [InlineData(15, "A margin beside each figure that has one; range and attained coverage in the unfolded figure and in the downloads; formulas on the page of methods.")]
    [InlineData(16, "In the reading of each figure that has a range.")]
    public void Disclosure_says_where_it_stands_and_no_more(int number, string where) =>
        Assert.Contains(where, Read(new BudgetSample()).QuerySelectorAll(".disclosures li")[number - 1].TextContent, StringComparison.Ordinal);

    [Theory]
    [InlineData(Neighbouring.AddOrRemove)]
    [InlineData(Neighbouring.Replace)]
    public void Page_never_promises_more_than_a_bound(Neighbouring neighbouring)
    {
        var text = Text(Read(new BudgetSample { Neighbouring = neighbouring })).ToLowerInvariant();

        Assert.All(Forbidden, word => Assert.DoesNotContain(word, text, StringComparison.Ordinal));
    }

    [Fact]
    public void Authorised_amount_that_cannot_be_put_in_the_currency_leaves_the_spent_alone()
    {
        var page = Read(new BudgetSample { Authorised = null });

        Assert.Single(page.QuerySelectorAll(".spent-num .firm"));
        Assert.DoesNotContain("Not spent", page.QuerySelector(".ledger")!.TextContent, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(LossCurrency.Rho, "The release used nothing in rho (ρ).", false)]
    [InlineData(LossCurrency.Epsilon, "The release used nothing in epsilon (ε).", true)]
    public void Release_that_spent_nothing_in_the_currency_says_so_and_draws_no_stick(LossCurrency currency, string words, bool saysDelta)
    {
        var page = Read(new BudgetSample { Currency = currency, Amounts = [] });

        Assert.Empty(page.QuerySelectorAll("svg.tally"));
        Assert.Contains(words, page.QuerySelector("#account")!.ParentElement!.TextContent, StringComparison.Ordinal);
        Assert.Equal(saysDelta, Text(page).Contains("It used a delta of 0.000000001.", StringComparison.Ordinal));
        Assert.DoesNotContain("The release used 0", Text(page), StringComparison.Ordinal);
    }

    [Fact]
    public void Every_rule_step_law_and_choice_has_its_words()
    {
        var language = Language.Load(BudgetSample.Templates, "en");
        string[] keys =
        [
            .. AccountRules.All.Select(rule => $"budget.rule.{rule.Key}"), .. AccountSteps.All.Select(step => $"budget.step.{step}"),
            .. Enum.GetNames<LawName>().Select(law => $"budget.law.{law}"), .. Enum.GetNames<WithoutNoiseKind>().Select(kind => $"budget.without.{kind}"),
            .. Enum.GetNames<Accounting>().Select(accounting => $"budget.accounting.{accounting}"),
            .. Enum.GetNames<MechanismUse>().Where(use => use != nameof(MechanismUse.Figures)).Select(use => $"budget.use.{use}"),
        ];

        Assert.All(keys, key => Assert.NotEmpty(language.Text(key)));
    }

    [Fact]
    public void Page_holds_no_inline_style_and_no_doubled_id()
    {
        var page = Read(new BudgetSample());

        Assert.Empty(page.QuerySelectorAll("[style], style, script"));
        Assert.Empty(page.QuerySelectorAll("[id]").GroupBy(element => element.Id).Where(group => group.Count() > 1).Select(group => group.Key));
    }

    [Theory]
    [InlineData(Neighbouring.AddOrRemove)]
    [InlineData(Neighbouring.Replace)]
    public void Meaning_can_be_read_at_grade_eight_and_no_sentence_is_long(Neighbouring neighbouring)
    {
        var page = Read(new BudgetSample { Neighbouring = neighbouring });
        var texts = page.QuerySelectorAll(".meaning .exact-first, .meaning .exact-sums, .meaning .two > div:first-child").ToList();

        Assert.Equal(4, texts.Count);
        foreach (var text in texts)
        {
            string[] sentences = [.. text.QuerySelectorAll("p").DefaultIfEmpty(text).SelectMany(part => Sentences(part.TextContent))];
            Assert.InRange(Readability.Grade(sentences), -4, 8);
            Assert.All(sentences, sentence => Assert.True(Readability.Words(sentence).Count <= 25, sentence));
        }
    }

    private static IEnumerable<string> Sentences(string text) =>
        text.Split(". ", StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries).Where(sentence => sentence.Length > 0);

    private static IDocument Read(BudgetSample sample) => new HtmlParser().ParseDocument(sample.Page());

    private static string Text(IDocument page) => Text(page.QuerySelector("main")!);

    private static string Text(IElement part) => string.Join(' ', part.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));

    // On a narrow page each number has its sign before it, as the column heads are gone.
    private static string Unlabelled(IElement cell) => cell.TextContent[(cell.QuerySelector(".lab")?.TextContent.Length ?? 0)..].Trim();

    private static double Chance(IElement cell) => double.Parse(cell.TextContent.Split(' ')[0], CultureInfo.InvariantCulture) / 100;

    private static decimal[] Cells(IElement row) =>
        [.. row.QuerySelectorAll("td").Select(cell => cell.TextContent.Trim() == "none" ? 0 : decimal.Parse(cell.TextContent, CultureInfo.InvariantCulture))];
}
