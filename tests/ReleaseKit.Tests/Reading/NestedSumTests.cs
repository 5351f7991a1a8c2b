using ReleaseKit.Appraisal;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Sums where labels.csv nests values of one column: All has North and Quay, North has Kiln Row and Weir Lane. The review and the margins count the same parts.</summary>
public sealed class NestedSumTests
{
    private const string Csv = "tables/lamps.csv";
    private const string Release = "release.json";

    [Fact]
    public void Sum_of_a_parent_is_that_of_its_children_and_all_counts_each_draw_once()
    {
        using var folder = Nested(60, 40);
        var read = folder.Read();
        Assert.Empty(read.Findings.Select(finding => $"{finding.Slug} {finding.Found}"));
        var appraised = AppraisedRelease.Of(read.Release!);
        Assert.Equal([3, 2, 1, 1, 1], Enumerable.Range(0, 5).Select(row => appraised.Figure(new FigureRef(0, 0, row)).Draws));
    }

    [Theory]
    [InlineData(100, 40, "is 100, but its parts over \"street\" add up to 60: a gap of 40.")]
    [InlineData(60, 41, "is 41, but its parts over \"street\" add up to 40: a gap of 1.")]
    public void Total_that_counts_its_grandchildren_or_misses_its_children_is_a_stop(int all, int north, string found)
    {
        using var folder = Nested(all, north);
        Assert.Contains(folder.Read().Findings, finding => finding.Slug == "sum-differs" && finding.Found.EndsWith(found, StringComparison.Ordinal));
    }

    [Fact]
    public void Value_that_is_no_parent_is_no_total()
    {
        using var folder = Nested(60, 40).Edit("labels.csv", "street,Kiln Row,North\nstreet,Weir Lane,North\n", "street,Kiln Row,\nstreet,Weir Lane,\n");
        Assert.Contains("\"parent\" of its parts", Assert.Single(folder.Read().Findings, finding => finding.Slug == "sum-not-a-total").Do, StringComparison.Ordinal);
    }

    private static TestFolder Nested(int all, int north) => new TestFolder()
        .With(Csv, $"street,lit,broken\nAll,{all},9\nNorth,{north},3\nKiln Row,31,4\nQuay,20,5\nWeir Lane,9,-1\n")
        .With("labels.csv", "column,value,parent\nstreet,Kiln Row,North\nstreet,Weir Lane,North\n")
        .Edit(Release, "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" },", "{ \"where\": { \"street\": \"All\" }, \"sumOver\": \"street\" }, { \"where\": { \"street\": \"North\" }, \"sumOver\": \"street\" },");
}
