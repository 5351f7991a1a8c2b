using ReleaseKit.Noise.Errors;
using ReleaseKit.Pages.Budget;
using ReleaseKit.Pages.Methods;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Pages;

/// <summary>A mechanism in words: its numbers have the unit of its figures, and the rounding to the decimals of the file is a step like any other.</summary>
public sealed class MechanismWordsTests
{
    private static readonly Unit Crowns = SmallRelease.UnitOf("crown", "crowns");

    private static Mechanism Laplace => SmallRelease.Mechanism("m", LawName.Laplace, ("scale", 0.5));

    private static Measure Measure(MeasureKind kind, string column = "figure") => SmallRelease.Measure(kind, column) with { Unit = Crowns };

    private static SmallRelease Of(MeasureKind kind, Mechanism mechanism, params string[] values) => new SmallRelease().Figures(Measure(kind), mechanism, values);

    private static MechanismWords Say(SmallRelease release, Mechanism mechanism) => new(mechanism, new BudgetWords(PagesRelease.ContextOf(release.Build())));

    [Fact]
    public void Numbers_of_amounts_have_their_unit()
    {
        var mechanism = SmallRelease.Mechanism("m", LawName.Staircase, ("epsilon", 0.25), ("sensitivity", 240), ("gamma", 0.47)) with
        {
            Sensitivity = new Sensitivity { CellsPerUnit = 1, PerCell = 240 },
            Clipped = new ClippedTo(0, 400),
        };
        var words = Say(Of(MeasureKind.Amount, mechanism, "321502"), mechanism);

        Assert.Equal("Staircase noise, epsilon 0.25, step 240\u00a0crowns and gamma 0.47.", words.Law());
        Assert.Equal("One household counts in at most 1 cell, by at most 240\u00a0crowns.", words.Sensitivity());
        Assert.Equal("Amounts are counted from 0 to 400\u00a0crowns.", words.Clipped());
        Assert.Equal("After the noise: rounded to 1\u00a0crown.", words.Afterwards());
    }

    [Fact]
    public void Numbers_of_counts_and_of_figures_in_several_units_stand_alone()
    {
        var counts = SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(5));
        var two = Of(MeasureKind.Mean, Laplace, "18.29").Figures(SmallRelease.Measure(MeasureKind.Mean, "other"), Laplace, "4.25");

        Assert.Equal("Discrete Gaussian noise, sigma 9.5.", Say(Of(MeasureKind.Count, counts, "10"), counts).Law());
        Assert.Equal("After the noise: rounded to the nearest 5.", Say(Of(MeasureKind.Count, counts, "10"), counts).Afterwards());
        Assert.Equal("Laplace noise, scale 0.5.", Say(two, Laplace).Law());
    }

    [Theory]
    [InlineData(0.7, 1.0, "Laplace noise, scale from 0.7 to 1.0\u00a0crowns, set row by row.")]
    [InlineData(0.7, 0.7, "Laplace noise, scale 0.7\u00a0crowns.")]
    public void Number_set_row_by_row_has_its_smallest_and_largest_value(double first, double second, string words)
    {
        var mechanism = Laplace with { Parameters = new Dictionary<string, NumberOrColumn> { ["scale"] = NumberOrColumn.From("owed_scale") } };
        // The third row is public: its number in the column is no scale of this noise.
        var release = new SmallRelease().Side("owed_scale", first, second, 90)
            .Figures(Measure(MeasureKind.Mean), [new NoiseRule.FromMechanism(mechanism), new NoiseRule.Public(SmallRelease.Words("list"))], [0, 0, 1], "18.29", "23.07", "20");

        Assert.Equal(words, Say(release, mechanism).Law());
    }

    [Theory]
    [InlineData("23.07", "0.01\u00a0crowns")]
    [InlineData("321502", "1\u00a0crown")]
    public void Rounding_to_the_decimals_of_the_file_stands_with_its_step_on_both_pages(string value, string step)
    {
        var release = Of(MeasureKind.Mean, Laplace, value).Build();
        var context = PagesRelease.ContextOf(release);

        Assert.Equal($"After the noise: rounded to {step}.", new MechanismWords(Laplace, new BudgetWords(context)).Afterwards());
        Assert.Equal($"rounded to {step}", MethodsRow(context, Laplace));
    }

    [Fact]
    public void Declared_rounding_that_the_file_keeps_is_the_only_one()
    {
        var mechanism = Laplace with { Afterwards = [new AfterStep.RoundTo(0.1)] };

        Assert.Equal("After the noise: rounded to the nearest 0.1\u00a0crowns.", Say(Of(MeasureKind.Mean, mechanism, "18.2"), mechanism).Afterwards());
    }

    [Fact]
    public void Loss_is_said_to_be_one_before_steps_only_where_there_are_steps()
    {
        var bare = SmallRelease.DiscreteGaussian(9.5);
        var lifted = SmallRelease.DiscreteGaussian(9.5, new AfterStep.NotBelow(0));
        var whole = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count) with { PublishedFrom = 30 }, bare, "45");

        Assert.False(Say(Of(MeasureKind.Count, bare, "10"), bare).HasSteps);
        Assert.True(Say(Of(MeasureKind.Count, lifted, "10"), lifted).HasSteps);
        Assert.True(Say(Of(MeasureKind.Mean, Laplace, "18.29"), Laplace).HasSteps);
        Assert.True(Say(whole, bare).HasSteps);
    }

    [Fact]
    public void Level_from_which_figures_are_published_is_a_step_on_both_pages()
    {
        var bare = SmallRelease.DiscreteGaussian(9.5);
        var context = PagesRelease.ContextOf(new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count) with { PublishedFrom = 30 }, bare, "45").Build());

        Assert.Equal("After the noise: published only from 30 up.", new MechanismWords(bare, new BudgetWords(context)).Afterwards());
        Assert.Equal("published from 30 up", MethodsRow(context, bare));
    }

    [Theory]
    [InlineData(RoundingHow.Nearest, RoundingTies.Away, "rounded to the nearest 10, halves away from 0")]
    [InlineData(RoundingHow.Nearest, RoundingTies.Up, "rounded to the nearest 10, halves up")]
    [InlineData(RoundingHow.Nearest, RoundingTies.Even, "rounded to the nearest 10, halves to the even multiple")]
    [InlineData(RoundingHow.Up, RoundingTies.Away, "rounded up to 10")]
    [InlineData(RoundingHow.Down, RoundingTies.Away, "rounded down to 10")]
    [InlineData(RoundingHow.AtRandom, RoundingTies.Away, "rounded to 10 at random, without bias")]
    public void Methods_say_how_figures_were_rounded(RoundingHow how, RoundingTies ties, string words)
    {
        var rounded = SmallRelease.DiscreteGaussian(9.5, new AfterStep.RoundTo(10, how, ties));
        Assert.Equal(words, MethodsRow(PagesRelease.ContextOf(new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count), rounded, "40").Build()), rounded));
    }

    private static string MethodsRow(ReleaseKit.Pages.SiteContext context, Mechanism mechanism)
    {
        var rows = (Scriban.Runtime.ScriptArray)LawModel.Of(context, mechanism.Law, [mechanism])["mechanisms"]!;
        return (string)((Scriban.Runtime.ScriptObject)rows[0]!)["afterwards"]!;
    }
}
