using System.Security.Cryptography;
using System.Text.Json;
using Xunit;

namespace ReleaseKit.Tests.Downloads;

public sealed class BudgetJsonTests(SampleDownloads downloads) : IClassFixture<SampleDownloads>
{
    private JsonElement Budget => JsonDocument.Parse(File.ReadAllText(downloads.PathOf("downloads/budget.json"))).RootElement;

    [Fact]
    public void Keys_are_those_of_the_record() => Assert.Equal(
        ["unitOfPrivacy", "neighbouring", "authorised", "declared", "recomputed", "smallestBound", "mechanisms", "earlier", "exactFigures"],
        Budget.EnumerateObject().Select(property => property.Name));

    [Fact]
    public void Unit_and_neighbours_stand_as_in_mechanisms_json()
    {
        Assert.Equal("household", Budget.GetProperty("unitOfPrivacy").GetProperty("who").GetString());
        Assert.Equal("the year 2031", Budget.GetProperty("unitOfPrivacy").GetProperty("over").GetString());
        Assert.Equal("add-or-remove", Budget.GetProperty("neighbouring").GetString());
        Assert.Empty(Budget.GetProperty("earlier").EnumerateArray());
    }

    [Fact]
    public void Figures_that_no_total_covers_are_listed_with_their_reason()
    {
        var exact = Assert.Single(Budget.GetProperty("exactFigures").EnumerateArray());
        Assert.Equal("owed", exact.GetProperty("table").GetString());
        Assert.Equal("exact", exact.GetProperty("kind").GetString());
        Assert.Contains("Relief Act", exact.GetProperty("reason").GetString(), StringComparison.Ordinal);
    }

    // Summed by hand from the laws of the sample: m/(2σ²) for Gaussian noise, m·ε·tanh(ε/2) at most for the others
    // (Bun & Steinke 2016; from memory). The sample's account: 0.23637 at most.
    [Fact]
    public void Recomputed_total_lies_between_its_parts_and_what_was_authorised()
    {
        var recomputed = Budget.GetProperty("recomputed");
        var parts = Budget.GetProperty("mechanisms").EnumerateArray().Sum(mechanism => mechanism.GetProperty("recomputed").GetProperty("rho").GetDouble());
        Assert.Equal(parts, recomputed.GetProperty("rho").GetDouble(), 12);
        Assert.InRange(recomputed.GetProperty("rho").GetDouble(), 0.22, 0.23637);
        Assert.True(recomputed.GetProperty("epsilon").GetDouble() < Budget.GetProperty("authorised").GetProperty("epsilon").GetDouble());
        Assert.Equal(1e-9, Budget.GetProperty("authorised").GetProperty("delta").GetDouble());
    }

    [Fact]
    public void Shares_of_the_budget_add_up_to_one_and_every_mechanism_has_a_table()
    {
        var mechanisms = Budget.GetProperty("mechanisms").EnumerateArray().ToList();
        Assert.Equal(downloads.Release.Noise.Mechanisms.Select(mechanism => mechanism.Id), mechanisms.Select(mechanism => mechanism.GetProperty("id").GetString()));
        Assert.Equal(1, mechanisms.Sum(mechanism => mechanism.GetProperty("shareOfBudget").GetDouble()), 12);
        Assert.All(mechanisms, mechanism => Assert.NotEmpty(mechanism.GetProperty("tables").EnumerateArray()));
    }

    [Fact]
    public void Declared_stands_where_the_office_declared_it_and_is_null_elsewhere()
    {
        Assert.Equal(JsonValueKind.Null, Budget.GetProperty("declared").ValueKind);
        var mechanisms = Budget.GetProperty("mechanisms").EnumerateArray().ToDictionary(mechanism => mechanism.GetProperty("id").GetString()!);
        Assert.Equal(0.03125, mechanisms["total-arrears"].GetProperty("declared").GetProperty("rho").GetDouble());
        Assert.Equal(JsonValueKind.Null, mechanisms["help"].GetProperty("declared").ValueKind);
    }

    [Fact]
    public void Checksums_are_those_of_the_files_and_leave_none_out()
    {
        var folder = downloads.PathOf("downloads");
        var lines = File.ReadAllLines(Path.Combine(folder, "checksums.txt"));
        Assert.Equal(Directory.GetFiles(folder).Length - 1, lines.Length);
        foreach (var line in lines)
        {
            var (hash, name) = (line[..64], line[66..]);
            Assert.Equal("  ", line[64..66]);
            Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(File.ReadAllBytes(Path.Combine(folder, name)))), hash);
        }
    }
}
