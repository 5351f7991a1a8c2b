using ReleaseKit.Review;
using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Review.Leaks;

/// <summary>Broken lamps, with discrete Laplace noise of scale 3: a count below zero by far more than that noise reaches.</summary>
public sealed class BeyondNoiseTests
{
    private const string Scale = "\"law\": \"discrete-laplace\", \"scale\": 3.0";

    [Fact]
    public void Value_that_the_noise_hardly_reaches_is_a_stop() => Broken.Stops(
        "beyond-noise", "tables/lamps.csv", "-5000", "correct the value", folder => folder.Edit("tables/lamps.csv", ",-1\n", ",-5000\n"));

    [Theory]
    [InlineData("\"law\": \"discrete-uniform\", \"halfWidth\": 5", "-6")]
    [InlineData("\"law\": \"truncated-discrete-laplace\", \"scale\": 3.0, \"cutoff\": 5", "-6")]
    public void Value_beyond_the_end_of_the_noise_is_a_stop(string law, string value)
    {
        var found = Assert.Single(FindingsOf(law, $",{value}\n"));
        Assert.Contains("never reaches it", found.Found, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"law\": \"discrete-uniform\", \"halfWidth\": 5", "-5")]
    [InlineData("\"law\": \"truncated-discrete-laplace\", \"scale\": 3.0, \"cutoff\": 5", "-5")]
    [InlineData(Scale, "-40")]
    public void Value_that_the_noise_reaches_is_none(string law, string value) => Assert.Empty(FindingsOf(law, $",{value}\n"));

    // P(N <= -66) = q^66 / (1 + q), q = e^(-1/3): 1.6e-10, times the 8 figures with noise 1.3e-9, which is above 1e-9; at -67 it is 9.3e-10.
    [Theory]
    [InlineData("-66", false)]
    [InlineData("-67", true)]
    public void Chance_counts_for_all_figures_together(string value, bool isFound)
    {
        var found = FindingsOf(Scale, $",{value}\n").ToList();
        Assert.Equal(isFound ? 1 : 0, found.Count);
        Assert.All(found, finding => Assert.Contains("in any of 8 figures, is at most 1 in 1000 million.", finding.Found, StringComparison.Ordinal));
    }

    [Fact]
    public void Many_values_that_the_noise_reaches_one_by_one_are_a_stop_together()
    {
        using var broken = new Broken(folder => folder.With("tables/lamps.csv", "street,lit,broken\nAll,60,-40\nKiln Row,31,-40\nQuay,20,-40\nWeir Lane,9,-40\n"));
        var found = Assert.Single(broken.Review(), finding => finding.Slug == "beyond-noise");
        Assert.Contains("4 figures of its rule lie beyond it.", found.Found, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"count\"", "correct \"kind\" in release.json, which is \"count\".", "-5000")]
    [InlineData("\"count\", \"lowest\": 500", "correct \"lowest\" in release.json.", "-1")]
    [InlineData("\"amount\", \"lowest\": 500", "correct \"lowest\" in release.json.", "-1")]
    [InlineData("\"share\"", "correct \"kind\" in release.json, which is \"share\".", "5000")]
    [InlineData("\"share\", \"highest\": 50", "correct \"highest\" in release.json.", "5000")]
    public void Remedy_names_the_key_that_sets_the_bound(string kind, string remedy, string value)
    {
        using var broken = new Broken(folder => folder.Edit("release.json", "\"kind\": \"count\", \"noise\": [ { \"mechanism\": \"lamps-broken\"", $"\"kind\": {kind}, \"noise\": [ {{ \"mechanism\": \"lamps-broken\"").Edit("tables/lamps.csv", ",-1\n", $",{value}\n"));
        Assert.EndsWith(remedy, Assert.Single(broken.Review(), finding => finding.Slug == "beyond-noise").Do, StringComparison.Ordinal);
    }

    private static IEnumerable<Finding> FindingsOf(string law, string end)
    {
        using var broken = new Broken(folder => folder.Edit("mechanisms.json", Scale, law).Edit("tables/lamps.csv", ",-1\n", end));
        return broken.Review().Where(finding => finding.Slug == "beyond-noise");
    }
}
