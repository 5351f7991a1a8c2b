using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Leaks;

/// <summary>Declared columns whose names say that they stand before the noise.</summary>
public sealed class UnnoisedNameTests
{
    [Theory]
    [InlineData("true_count", "public")]
    [InlineData("TrueCount", "public")]
    [InlineData("raw", "public")]
    [InlineData("seed2", "published")]
    [InlineData("lit-unnoised", "published")]
    public void Telling_name_is_a_caution(string column, string from) => Broken.Cautions(
        "looks-unnoised", "release.json", $"\"{column}\"", "take the column out of the CSV", folder => Named(folder, column, from));

    [Theory]
    [InlineData("strawberries")]
    [InlineData("seedlings")]
    [InlineData("drawn_2030")]
    public void Word_that_only_holds_such_a_word_is_none(string column)
    {
        using var broken = new Broken(folder => Named(folder, column, "public"));
        Assert.DoesNotContain(broken.Review(), finding => finding.Slug == "looks-unnoised");
    }

    private static void Named(TestFolder folder, string column, string from) => folder
        .With("tables/lamps.csv", $"street,lit,broken,{column}\nAll,60,9,1\nKiln Row,31,4,2\nQuay,20,5,3\nWeir Lane,9,-1,4\n")
        .Edit("release.json", "\"figures\": [\n", $"\"columns\": {{ \"{column}\": {{ \"from\": \"{from}\" }} }}, \"figures\": [\n");
}
