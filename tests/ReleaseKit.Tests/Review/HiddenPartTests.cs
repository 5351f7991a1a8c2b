using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review;

/// <summary>Hidden lamps that a published total gives back: the total less the other parts. Of a street, its quarter and all, where labels.csv nests them.</summary>
public sealed class HiddenPartTests
{
    private const string Flat = "street,lit,broken,lit_status\nAll,60,9,\nKiln Row,31,4,\nQuay,,5,Q\nWeir Lane,9,-1,\n";
    private const string Adds = "\"adds\": [ { \"figure\": \"lit\", \"over\": \"street\" } ], ";
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

    // A total of the same draws gives the noised value; one without noise the value with the noise of the others; one with noise of its own an estimate.
    [Theory]
    [InlineData("\"sumOver\": \"street\"", FindingLevel.Caution, "the total less the other parts gives its noised value back.")]
    [InlineData("\"exact\": \"The Lamps Act\"", FindingLevel.Caution, "the total has no noise: less the other parts it gives the hidden value with their noise alone.")]
    [InlineData("\"public\": \"List of lamps\"", FindingLevel.Caution, "the total has no noise: less the other parts it gives the hidden value with their noise alone.")]
    [InlineData("\"mechanism\": \"lamps-broken\"", FindingLevel.Note, "less the other parts it gives an estimate of the hidden value, with the noise of all of them.")]
    public void What_a_total_gives_back_depends_on_its_noise(string rule, FindingLevel level, string why)
    {
        var found = Assert.Single(Found(Flat, rule: rule));
        Assert.Equal(level, found.Level);
        Assert.Contains(why, found.Why, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"exact\": \"The Lamps Act\"", FindingLevel.Caution, "neither the total nor the other parts have noise: the total less them is the value itself.")]
    [InlineData("\"mechanism\": \"lamps-lit\"", FindingLevel.Note, "with the noise of the total.")]
    public void Parts_without_noise_leave_that_of_the_total_alone(string rule, FindingLevel level, string why)
    {
        var found = Assert.Single(Found(Flat, rule: rule, part: "\"exact\": \"The Lamps Act\""));
        Assert.Equal(level, found.Level);
        Assert.Contains(why, found.Why, StringComparison.Ordinal);
    }

    // The total of the streets has noise of its own, that of the shifts is the sum: the worse is told, once.
    [Fact]
    public void Part_of_two_totals_is_told_of_the_one_that_gives_more_back()
    {
        const string Shifts = "street,shift,lit,broken,lit_status\nAll,All,60,9,\nAll,Day,31,4,\nAll,Night,29,4,\nQuay,All,40,5,\nQuay,Day,,5,Q\nQuay,Night,20,5,\nWeir Lane,All,21,5,\nWeir Lane,Day,11,5,\nWeir Lane,Night,10,5,\n";
        using var broken = new Broken(folder => folder.With("tables/lamps.csv", Shifts)
            .Edit("release.json", "\"figures\": [\n", "\"hidden\": { \"by\": \"public-rule\", \"inTotals\": true }, \"statuses\": { \"column\": \"*_status\" }, \"figures\": [\n")
            .Edit("release.json", "\"title\": \"Street\", \"all\": \"All\" }", "\"title\": \"Street\", \"all\": \"All\" }, { \"column\": \"shift\", \"title\": \"Shift\", \"all\": \"All\" }")
            .Edit("release.json", "\"All\" }, \"sumOver\": \"street\" }, ", "\"All\" }, \"mechanism\": \"lamps-broken\" }, { \"where\": { \"shift\": \"All\" }, \"sumOver\": \"shift\" }, "));
        Assert.Equal(FindingLevel.Caution, Assert.Single(broken.Review(), finding => finding.Slug == "hidden-given-back").Level);
    }

    private static string Cell(string number, int broken) => number.Length == 0 ? $",{broken},Q" : $"{number},{broken},";

    private static IEnumerable<string?> GivenBack(string table, string? labels = null, string adds = Adds) => Found(table, labels, adds).Select(finding => finding.Address);

    private static List<Finding> Found(string table, string? labels = null, string adds = Adds, string rule = "\"sumOver\": \"street\"", string part = "\"mechanism\": \"lamps-lit\"")
    {
        using var broken = new Broken(folder =>
        {
            folder.With("tables/lamps.csv", table).Edit("release.json", "\"figures\": [\n",
                $"\"hidden\": {{ \"by\": \"public-rule\", \"inTotals\": true }}, \"statuses\": {{ \"column\": \"*_status\" }}, {adds}\"figures\": [\n");
            if (labels is not null)
                folder.With("labels.csv", labels).Edit("release.json", "{ \"mechanism\": \"lamps-lit\" }", "{ \"where\": { \"street\": \"North\" }, \"sumOver\": \"street\" }, { \"mechanism\": \"lamps-lit\" }");
            folder.Edit("release.json", "\"All\" }, \"sumOver\": \"street\" }, ", $"\"All\" }}, {rule} }}, ").Edit("release.json", "{ \"mechanism\": \"lamps-lit\" } ]", $"{{ {part} }} ]");
        });
        return [.. broken.Review().Where(finding => finding.Slug == "hidden-given-back")];
    }
}
