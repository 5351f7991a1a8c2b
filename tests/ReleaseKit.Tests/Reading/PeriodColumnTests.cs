using ReleaseKit.Reading;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Stub columns whose headings read like periods and that do not say so.</summary>
public sealed class PeriodColumnTests
{
    [Theory]
    [InlineData("2031-Q1", "2031-Q2", "2031-Q3", true)]
    [InlineData("2031-01", "2031-02", "2031-03", true)]
    [InlineData("2029", "2030", "2031", true)]
    [InlineData("2031-01-01/2031-06-30", "2031-07-01/2031-12-31", "2032-01-01/2032-06-30", true)]
    [InlineData("2029/30", "2030/31", "2031/32", false)]
    [InlineData("Q1 2031", "Q2 2031", "Q3 2031", false)]
    public void Headings_that_read_like_periods_are_a_caution_with_what_to_paste(string first, string second, string third, bool isIso)
    {
        using var folder = Named(first, second, third);
        var found = Assert.Single(folder.Read().Findings, finding => finding.Slug == "looks-like-period");
        Assert.Contains("{ \"column\": \"street\", …, \"period\": true }", found.Do, StringComparison.Ordinal);
        Assert.Equal(!isIso, found.Do.Contains("write them as 2031, 2031-Q1", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("2031", "2032", "Quay")]
    [InlineData("1201", "1202", "1203")]
    [InlineData("20311", "20312", "20313")]
    [InlineData("0 to 9", "10 to 19", "20 to 29")]
    public void Other_headings_are_none(string first, string second, string third)
    {
        using var folder = Named(first, second, third);
        Assert.DoesNotContain(folder.Read().Findings, finding => finding.Slug == "looks-like-period");
    }

    [Fact]
    public void Years_of_birth_that_are_said_to_be_no_periods_are_none()
    {
        using var folder = Named("1930", "1931", "1932").Edit("release.json", "\"all\": \"All\" }", "\"all\": \"All\", \"period\": false }");
        Assert.DoesNotContain(folder.Read().Findings, finding => finding.Slug is "looks-like-period" or "period");
    }

    [Fact]
    public void Declared_periods_and_those_of_the_example_and_the_sample_are_none()
    {
        using var folder = Named("2029", "2030", "2031").Edit("release.json", "\"all\": \"All\" }", "\"all\": \"All\", \"period\": true }");
        Assert.DoesNotContain(
            new[] { folder.Root, Repository.Example, Repository.Sample }.SelectMany(path => ReleaseFolder.Read(path).Findings), finding => finding.Slug == "looks-like-period");
    }

    private static TestFolder Named(string first, string second, string third) =>
        new TestFolder().With("tables/lamps.csv", $"street,lit,broken\nAll,60,9\n{first},31,4\n{second},20,5\n{third},9,-1\n");
}
