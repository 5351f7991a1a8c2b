using AngleSharp.Html.Parser;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Pages;

/// <summary>What pages say of releases of which no figure, or not every figure, carries noise.</summary>
public sealed class ReleaseWithoutNoiseTests : IDisposable
{
    private static readonly NoiseRule Exact = new NoiseRule.Exact(SmallRelease.Words("The law says so"));
    private static readonly NoiseRule Known = new NoiseRule.Public(SmallRelease.Words("Yearbook"));
    private static readonly string[] OfNoise =
    [
        "Most figures", "carry noise:", "All figures with noise", "This holds for all but", "Every run of noise", "Noise laws", "0 = 0", "Each figure with noise", "100.000000000",
        "compares two data sets that agree", "Heavy digits", "had all that is authorised been spent", "for the figures with noise",
    ];

    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Nothing_is_said_of_noise_that_is_not_there(bool isExact)
    {
        Compose(isExact ? Exact : Known, MeasureKind.Count);

        foreach (var page in Directory.EnumerateFiles(folder.In("site"), "*.html", SearchOption.AllDirectories))
            Assert.All(OfNoise, words => Assert.DoesNotContain(words, Text(page), StringComparison.Ordinal));
        Assert.Contains("No figure in this release carries noise.", Text("reading.html"), StringComparison.Ordinal);
        Assert.DoesNotContain("no less than", Text("budget.html"), StringComparison.OrdinalIgnoreCase);
        Assert.Equal(isExact, !Text("budget.html").Contains("Shown: at most", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(MeasureKind.Count, true)]
    [InlineData(MeasureKind.Median, false)]
    [InlineData(MeasureKind.Share, false)]
    public void Only_counts_and_sums_are_said_to_give_a_part_away(MeasureKind kind, bool isSum)
    {
        Compose(Exact, kind);

        Assert.Equal(isSum, Text("budget.html").Contains("can work out what this", StringComparison.Ordinal));
        Assert.DoesNotContain("The limits below", Text("budget.html"), StringComparison.Ordinal);
    }

    [Fact]
    public void Exact_mean_beside_a_count_without_noise_gives_a_part_away()
    {
        Compose(new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Mean, "mean"), [Exact], new byte[2], "1.5", "2.5")
            .Figures(SmallRelease.Measure(MeasureKind.Count, "count"), [Known], new byte[2], "10", "20").Build());

        Assert.Contains("can work out what this", Text("budget.html"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0, "All figures in this release carry noise")]
    [InlineData(1, "Most figures in this release carry noise")]
    [InlineData(2, "Some figures in this release carry noise")]
    public void Figures_with_noise_are_counted_before_they_are_spoken_of(int exact, string words)
    {
        var gauss = SmallRelease.Mechanism("gauss", LawName.DiscreteGaussian, ("sigma", 9.5));
        byte[] rules = [.. Enumerable.Range(0, 4).Select(row => (byte)(row < exact ? 1 : 0))];
        var release = new SmallRelease().Figures(SmallRelease.Measure(MeasureKind.Count), [new NoiseRule.FromMechanism(gauss), Exact], rules, "120", "130", "140", "150").Build();
        Compose(release with { Noise = release.Noise with { Mechanisms = [gauss] } });

        Assert.Contains(words, Text("reading.html"), StringComparison.Ordinal);
    }

    [Fact]
    public void Nobody_is_named_as_having_authorised_where_nobody_is_given()
    {
        var release = Release(Exact, MeasureKind.Count);
        Compose(release with { Noise = release.Noise with { Authorised = new Authorised { Epsilon = 3, Delta = 0.3, At = new("mechanisms.json") }, Over = null } });

        Assert.Contains("A total privacy loss of epsilon 3 at delta 0.3 was authorised.", Text("budget.html"), StringComparison.Ordinal);
        Assert.DoesNotContain($"{release.Publisher.Name} authorised", Text("budget.html"), StringComparison.Ordinal);
        Assert.Contains("Protectsone household", Text("budget.html"), StringComparison.Ordinal);
    }

    private static Release Release(NoiseRule rule, MeasureKind kind)
    {
        var release = new SmallRelease().Figures(SmallRelease.Measure(kind), [rule], new byte[2], "12", "30").Build();
        return release with { Noise = release.Noise with { Mechanisms = [] } };
    }

    private void Compose(NoiseRule rule, MeasureKind kind) => Compose(Release(rule, kind));

    private void Compose(Release release)
    {
        using var site = SiteFolder.Open(folder.In("site"));
        Site.Compose(AppraisedRelease.Of(release), PagesRelease.English, BudgetStatement.Of(release), PagesRelease.TemplatesFolder, site, null);
        site.Finish();
    }

    private string Text(string page) => string.Join(' ', new HtmlParser().ParseDocument(File.ReadAllText(Path.Combine(folder.In("site"), page)))
        .QuerySelector("main")!.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));
}
