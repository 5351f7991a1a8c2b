using ReleaseKit.Reading;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Rows that read like totals in a column that gives no heading for all.</summary>
public sealed class TotalRowTests
{
    private const string Csv = "tables/lamps.csv";
    private const string Release = "release.json";

    [Theory]
    [InlineData("All", 7)]
    [InlineData("TOTAL", 7)]
    [InlineData("Grand total", 7)]
    [InlineData("All streets", 60)]
    [InlineData("Total, streets", 58)]
    public void Row_that_reads_like_a_total_is_a_caution_with_what_to_paste(string label, int lit) => Broken.Cautions(
        "looks-like-total", Release, "\"street\", \"title\"", $"{{ \"column\": \"street\", …, \"all\": \"{label}\" }}", folder => Named(folder, label, lit));

    [Theory]
    [InlineData("All Saints", 31)]
    [InlineData("Allerton", 60)]
    [InlineData("Totally Lane", 60)]
    [InlineData("Old Total", 60)]
    public void Name_that_begins_like_a_total_is_left_alone(string label, int lit)
    {
        using var folder = new TestFolder();
        Named(folder, label, lit);
        Assert.DoesNotContain(folder.Read().Findings, finding => finding.Slug == "looks-like-total");
    }

    [Fact]
    public void Declared_totals_of_the_example_and_the_sample_are_no_finding() => Assert.DoesNotContain(
        new[] { Repository.Example, Repository.Sample }.SelectMany(folder => ReleaseFolder.Read(folder).Findings), finding => finding.Slug == "looks-like-total");

    private static void Named(TestFolder folder, string label, int lit) => folder
        .Edit(Release, ", \"all\": \"All\"", "").Edit(Release, "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, ", "")
        .Edit(Release, "lamps/lit?street=All", "lamps/lit?street=Quay").Edit("narrative/summary.md", "street=All", "street=Quay")
        .Edit(Csv, "All,60,", $"{(label.Contains(',', StringComparison.Ordinal) ? $"\"{label}\"" : label)},{lit},");
}
