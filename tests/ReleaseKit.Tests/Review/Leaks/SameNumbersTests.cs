using System.Globalization;
using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Leaks;

/// <summary>Lamps lit and lamps broken, each by a mechanism of its own, in so many streets.</summary>
public sealed class SameNumbersTests
{
    private const string Again = """
        ] } ] }, { "id": "again", "file": "tables/lamps.csv", "title": "Again", "stub": [ { "column": "street", "title": "Street", "all": "All" } ],
          "figures": [
            { "column": "broken", "title": "Lamps broken", "unit": "lamp", "kind": "count", "noise": [ { "mechanism": "lamps-lit" } ] },
            { "column": "lit", "title": "Lamps lit", "unit": "lamp", "kind": "count", "noise": [ { "mechanism": "lamps-broken" } ] } ] }
        """;

    [Theory]
    [InlineData(8, -1, 1)]
    [InlineData(7, -1, 0)]
    [InlineData(12, 9, 0)]
    public void Columns_with_the_same_numbers_are_a_caution(int streets, int differing, int count)
    {
        var found = FindingsOf(Table(streets, street => street + (street == differing ? 1 : 0))).ToList();
        Assert.Equal(count, found.Count);
        Assert.All(found, finding => Assert.StartsWith($"lamps/broken has the numbers of lamps/lit in all {streets} rows", finding.Found, StringComparison.Ordinal));
    }

    [Fact]
    public void Zeros_at_a_floor_are_none() => Assert.Empty(FindingsOf(Table(12, _ => 0, _ => 0), folder => folder
        .Edit("mechanisms.json", "\"sigma\": 4.0", "\"sigma\": 4.0, \"afterwards\": [ { \"notBelow\": 0 } ]")
        .Edit("mechanisms.json", "\"scale\": 3.0", "\"scale\": 3.0, \"afterwards\": [ { \"notBelow\": 0 } ]")));

    [Fact]
    public void One_file_under_two_mechanisms_is_a_caution_for_each_column() => Assert.Equal(
        ["again/broken has the numbers of lamps/broken in all 11 rows", "again/lit has the numbers of lamps/lit in all 10 rows"],
        FindingsOf(Table(10, street => 50 - 4 * street), folder => folder.Edit("release.json", "] }\n      ]\n    }", Again + "\n"))
            .Select(finding => finding.Found[..(finding.Found.IndexOf(" rows", StringComparison.Ordinal) + 5)]).Order(StringComparer.Ordinal));

    private static string Table(int streets, Func<int, int> broken, Func<int, int>? lit = null)
    {
        var numbers = Enumerable.Range(0, streets).Select(street => (Lit: lit?.Invoke(street) ?? street, Broken: broken(street))).ToList();
        return string.Create(CultureInfo.InvariantCulture, $"street,lit,broken\nAll,{numbers.Sum(row => row.Lit)},{numbers.Sum(row => row.Broken) + 1}\n")
            + string.Concat(numbers.Select((row, street) => string.Create(CultureInfo.InvariantCulture, $"Row {street},{row.Lit},{row.Broken}\n")));
    }

    private static IEnumerable<Finding> FindingsOf(string table, Action<TestFolder>? damage = null)
    {
        using var broken = new Broken(folder =>
        {
            folder.With("tables/lamps.csv", table);
            damage?.Invoke(folder);
        });
        return broken.Review().Where(finding => finding.Slug == "same-numbers");
    }
}
