using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>Hidden lamps that a published total gives back: the total less the other parts. Of a street, its quarter and all, where labels.csv nests them.</summary>
public sealed class HiddenPartTests
{
    private const string Flat = "street,lit,broken,lit_status\nAll,60,9,\nKiln Row,31,4,\nQuay,,5,Q\nWeir Lane,9,-1,\n";
    private const string Nests = "column,value,parent\nstreet,Kiln Row,North\nstreet,Weir Lane,North\n";

    [Fact]
    public void Only_hidden_part_is_given_back() => Assert.Equal(["lamps/lit?street=Quay"], GivenBack(Flat));

    [Fact]
    public void Two_hidden_parts_are_not() => Assert.Empty(GivenBack(Flat.Replace("Weir Lane,9,-1,", "Weir Lane,,-1,Q", StringComparison.Ordinal)));

    [Fact]
    public void Hidden_part_of_a_total_that_is_not_published_is_not() => Assert.Empty(GivenBack(Flat.Replace("All,60,9,", "All,,9,Q", StringComparison.Ordinal)));

    // All has North and Quay, North has Kiln Row and Weir Lane.
    [Theory]
    [InlineData("40", "31", "20", null)]
    [InlineData("40", "31", "", "Quay")]
    [InlineData("", "31", "20", "North")]
    [InlineData("40", "", "20", "Kiln%20Row")]
    [InlineData("", "", "20", "North")]
    public void Parts_are_those_of_the_nearest_whole(string north, string kiln, string quay, string? given)
    {
        var table = $"street,lit,broken,lit_status\nAll,60,9,\nNorth,{Cell(north, 3)}\nKiln Row,{Cell(kiln, 4)}\nQuay,{Cell(quay, 5)}\nWeir Lane,9,-1,\n";
        Assert.Equal(given is null ? [] : [$"lamps/lit?street={given}"], GivenBack(table, Nests));
    }

    [Fact]
    public void Published_sum_gives_it_back_without_adds_too() => Assert.Equal(["lamps/lit?street=Quay"], GivenBack(Flat, adds: ""));

    private static string Cell(string number, int broken) => number.Length == 0 ? $",{broken},Q" : $"{number},{broken},";

    private static IEnumerable<string?> GivenBack(
        string table, string? labels = null, string adds = "\"adds\": [ { \"figure\": \"lit\", \"over\": \"street\" } ], ")
    {
        using var broken = new Broken(folder =>
        {
            folder.With("tables/lamps.csv", table).Edit("release.json", "\"figures\": [\n",
                $"\"hidden\": {{ \"by\": \"public-rule\", \"inTotals\": true }}, \"statuses\": {{ \"column\": \"*_status\" }}, {adds}\"figures\": [\n");
            if (labels is not null)
                folder.With("labels.csv", labels).Edit("release.json", "{ \"mechanism\": \"lamps-lit\" }", "{ \"where\": { \"street\": \"North\" }, \"sumOver\": \"street\" }, { \"mechanism\": \"lamps-lit\" }");
        });
        return broken.Review().Where(finding => finding.Slug == "hidden-given-back").Select(finding => finding.Address);
    }
}
