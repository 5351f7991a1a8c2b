using ReleaseKit.Tests.Folders;
using Xunit;

namespace ReleaseKit.Tests.Reading;

/// <summary>Keys of the format that this version does not work out are one stop each, which names the key and its place.</summary>
public sealed class NotYetTests
{
    private const string Root = "\"title\": \"Lamps counted\"";
    private const string Figure = "\"column\": \"broken\"";
    private const string LitNoise = "{ \"mechanism\": \"lamps-lit\" }";
    private const string Neighbours = "\"neighbouring\": \"add-or-remove\"";

    public static TheoryData<string, string, string, string> Keys => new()
    {
        { "release.json", Root, Root + ", \"derived\": []", "\"derived\"" },
        { "release.json", Root, Root + ", \"edition\": { \"replaces\": {} }", "\"replaces\"" },
        { "release.json", Root, Root + ", \"languages\": [\"es\"]", "\"es\"" },
        { "release.json", Root, Root + ", \"languages\": [\"en\", \"fr\"]", "\"fr\"" },
        { "release.json", "\"narrative/summary.md\"", "\"narrative/summary.md\", \"language\": \"es\"", "\"es\"" },
        { "release.json", "\"lamps/lit\" } ]", "\"lamps/lit\", \"form\": \"series\" } ]", "\"series\"" },
        { "release.json", Figure, Figure + ", \"derived\": { \"ratio\": [\"broken\", \"lit\"] }", "\"derived\"" },
        { "release.json", Figure, Figure + ", \"publishedWhen\": { \"atLeast\": 30 }", "\"publishedWhen\"" },
        { "release.json", Figure, Figure + ", \"drawColumn\": \"key\"", "\"drawColumn\"" },
        { "release.json", Figure, Figure + ", \"sampling\": {}", "\"sampling\"" },
        { "release.json", LitNoise, "{ \"stated\": { } }", "\"stated\"" },
        { "release.json", LitNoise, "{ \"sameDrawAs\": \"lamps/broken\" }", "\"sameDrawAs\"" },
        { "release.json", LitNoise, "{ \"mechanisms\": [ { \"id\": \"lamps-lit\", \"times\": 0.5 } ] }", "\"mechanisms\"" },
        { "release.json", "\"title\": \"Lamps, by street\"", "\"title\": \"Lamps, by street\", \"rows\": { \"foundInData\": {} }", "\"foundInData\"" },
        { "mechanisms.json", "\"concentrated\"", "\"exact\"", "\"exact\"" },
        { "mechanisms.json", Neighbours, Neighbours + ", \"spentBefore\": []", "\"spentBefore\"" },
        { "mechanisms.json", "\"discrete-laplace\", \"scale\": 3.0", "\"randomised-response\"", "\"randomised-response\"" },
        { "mechanisms.json", "\"discrete-laplace\", \"scale\": 3.0", "\"exponential-quantile\"", "\"exponential-quantile\"" },
        { "mechanisms.json", "\"scale\": 3.0", "\"scale\": 3.0, \"afterwards\": [ { \"adjusted\": true } ]", "\"adjusted\"" },
    };

    [Theory]
    [MemberData(nameof(Keys))]
    public void Key_of_a_later_version_is_the_one_stop(string file, string from, string to, string at) =>
        Broken.Stops("not-yet", file, at, "", folder => folder.Edit(file, from, to));

    [Fact]
    public void Disjoint_composition_names_both_keys()
    {
        using var folder = new TestFolder().Edit("mechanisms.json", Neighbours, Neighbours + ", \"composition\": { \"together\": [ \"lamps-lit\", \"lamps-broken\", { \"disjoint\": [] } ] }");
        Assert.Contains("all losses are added then", folder.OnlyStop("not-yet").Do, StringComparison.Ordinal);
    }

    [Fact]
    public void Headline_chosen_for_its_size_is_not_yet() => Broken.Stops("not-yet", "release.json", "\"selectedFrom\"", "not picked for its size",
        folder => folder.Edit("release.json", "[ \"lamps/lit?street=All\" ]", "[ { \"figure\": \"lamps/lit?street=All\", \"selectedFrom\": \"lamps/lit\" } ]"));

    [Fact]
    public void Sum_over_continuous_parts_is_not_yet() => Broken.StopsAt("not-yet", "tables/lamps.csv", 2, 5, "leave these totals out",
        folder => folder.Edit("mechanisms.json", "\"discrete-gaussian\"", "\"gaussian\""));

    [Fact]
    public void Sum_over_rounded_parts_is_not_yet() => Broken.StopsAt("not-yet", "tables/lamps.csv", 2, 5, "leave these totals out",
        folder => folder.Edit("mechanisms.json", "\"sigma\": 4.0", "\"sigma\": 4.0, \"afterwards\": [ { \"roundTo\": 1 } ]"));

    [Fact]
    public void Figure_of_a_declared_mechanism_is_not_yet() => Broken.Stops("not-yet", "release.json", "\"broken\"", "leave \"broken\" out",
        folder => folder.Edit("mechanisms.json", "\"law\": \"discrete-laplace\", \"scale\": 3.0", "\"law\": \"declared\", \"spent\": { \"rho\": 0.01 }"));

    [Fact]
    public void Wording_of_the_folder_is_not_yet() => Broken.Stops("not-yet", "wording", null, "wording/",
        folder => folder.With("wording/en.json", "{}"));
}
