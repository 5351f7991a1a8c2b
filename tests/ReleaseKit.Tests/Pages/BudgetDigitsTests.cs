using ReleaseKit.Appraisal;
using ReleaseKit.Pages.Budget;
using ReleaseKit.Reading;
using ReleaseKit.Tests.Sample;
using ReleaseKit.Wording;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class BudgetDigitsTests
{
    private static readonly ILanguage English = PagesRelease.English;

    private static IEnumerable<string> Printed(BudgetStatement statement) =>
        statement.Mechanisms.Select(account => PrintedShares.Of(account, statement).ToString());

    /// <summary>The hand-made statement, with so many times these shares.</summary>
    private static BudgetStatement With(params double[] shares)
    {
        var statement = new BudgetSample().Statement;
        return statement with { Mechanisms = [.. shares.Select((share, index) => statement.Mechanisms[index] with { ShareOfSpent = share })] };
    }

    [Fact]
    public void Shares_of_the_sample_add_up_to_100()
    {
        var statement = BudgetStatement.Of(ReleaseFolder.Read(SampleRelease.Folder).Release!);
        Assert.True(statement.Mechanisms.Count > 10);
        Assert.Equal(100.0m, statement.Mechanisms.Sum(account => PrintedShares.Of(account, statement).ToDecimal()));
        Assert.All(statement.Mechanisms, account =>
            Assert.True(Math.Abs((double)PrintedShares.Of(account, statement).ToDecimal() - 100 * account.ShareOfSpent) < 0.1, account.Mechanism.Id));
    }

    // Worked by hand: 33.3333 three times leaves 0.1, which goes to the first; 16.667 twice and 66.666 leave 0.2, for the two largest remainders.
    [Theory]
    [InlineData(new[] { 1 / 3.0, 1 / 3.0, 1 / 3.0 }, "33.4 33.3 33.3")]
    [InlineData(new[] { 0.16667, 0.16667, 0.66666 }, "16.7 16.7 66.6")]
    [InlineData(new[] { 1.0 }, "100.0")]
    [InlineData(new[] { 0.00001, 0.99999 }, "0.1 99.9")]
    [InlineData(new[] { 0, 1.0 }, "0.0 100.0")]
    [InlineData(new[] { 0, 0.0 }, "0.0 0.0")]
    public void Shares_add_up_by_the_largest_remainder_and_none_that_is_spent_is_zero(double[] shares, string printed) =>
        Assert.Equal(printed, string.Join(' ', Printed(With(shares))));

    [Theory]
    [InlineData(0.310, "31.0 in 100")]
    [InlineData(0.9978, "99.8 in 100")]
    [InlineData(0.99961, "99.97 in 100")]
    [InlineData(0.0012, "0.12 in 100")]
    [InlineData(0.4536, "45.4 in 100")]
    [InlineData(0.9999999999999, "100.0 in 100")]
    public void Largest_chance_has_one_decimal_and_more_only_next_to_0_and_100(double chance, string words) => Assert.Equal(words, Chances.AtMost(chance, English));

    [Theory]
    [InlineData(0.000012, "0.0012 in 100")]
    [InlineData(0.0129, "1.2 in 100")]
    [InlineData(0.9999, "99.99 in 100")]
    [InlineData(1e-20, "0.0 in 100")]
    public void Smallest_chance_likewise(double chance, string words) => Assert.Equal(words, Chances.AtLeast(chance, English));
}
