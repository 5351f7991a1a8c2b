using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Parents in labels.csv that are not there, or lead in a circle.</summary>
public sealed class LabelParentTests
{
    private const string Labels = "labels.csv";

    [Fact]
    public void Two_that_are_part_of_each_other_are_a_stop_and_nothing_follows_from_them() => Broken.Stops(
        "parent-cycle", Labels, "Weir Lane\nstreet,Weir Lane", "leave \"parent\" empty",
        folder => folder.With(Labels, "column,value,parent\nstreet,Quay,Weir Lane\nstreet,Weir Lane,Quay\n"));

    [Fact]
    public void One_that_is_part_of_itself_is_a_stop() => Broken.Stops(
        "parent-cycle", Labels, "Quay,1", "leave \"parent\" empty",
        folder => folder.With(Labels, "column,value,parent,order\nstreet,Quay,Quay,1\n"));

    [Fact]
    public void Circle_is_reported_once_with_all_who_are_in_it()
    {
        using var folder = new TestFolder().With(Labels, "column,value,parent\nstreet,Kiln Row,Quay\nstreet,Quay,Weir Lane\nstreet,Weir Lane,All\nstreet,All,Quay\n")
            .Edit("tables/lamps.csv", "All,60,", "All,29,");
        var found = folder.OnlyStop("parent-cycle");
        Assert.Contains("the first: \"Quay\", \"Weir Lane\", \"All\".", found.Found, StringComparison.Ordinal);
        Assert.Equal("labels.csv:3:13", found.At.ToString());
    }

    [Fact]
    public void Parent_that_is_no_row_heading_is_a_stop_and_told_the_nearest() => Broken.Stops(
        "unknown-label", Labels, "Quai", "write \"Quay\".",
        folder => folder.With(Labels, "column,value,parent\nstreet,Weir Lane,Quai\n"));
}
