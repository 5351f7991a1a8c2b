using System.Text.Json;
using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using ReleaseKit.Downloads;
using ReleaseKit.Noise.Errors;
using ReleaseKit.Releases;
using ReleaseKit.Tests.Appraisal;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class SiteTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Links_within_the_site_all_lead_to_a_file_and_an_element()
    {
        var documents = ComposedPages();
        var dead = from page in documents
                   from address in page.Document.QuerySelectorAll("[href]").Select(element => element.GetAttribute("href")!)
                   where page.Path != "404.html" && !address.Contains(':', StringComparison.Ordinal) && !Leads(page.Path, address, documents)
                   select $"{page.Path} -> {address}";
        Assert.Empty(dead);
    }

    // A server shows the page under whatever address was asked for, however deep.
    [Theory]
    [InlineData("https://nopf.example/ehr-2031/1/", "/ehr-2031/1/")]
    [InlineData("https://nopf.example/", "/")]
    [InlineData("https://nopf.example//other.example/", "/other.example/")]
    public void Page_of_what_is_not_there_has_links_that_hold_at_any_depth(string address, string root)
    {
        PagesRelease.Compose(PagesRelease.Make() with { Address = address }, folder.In("site"));
        var links = NotFoundLinks();
        Assert.Contains(root + "index.html", links);
        Assert.All(links, link => Assert.StartsWith(root, link, StringComparison.Ordinal));
        Assert.All(links, link => Assert.True(File.Exists(folder.In("site/" + link[root.Length..])), link));
    }

    [Fact]
    public void Page_of_what_is_not_there_has_no_links_and_no_style_where_no_address_is_given()
    {
        PagesRelease.Compose(PagesRelease.Make() with { Address = null }, folder.In("site"));
        Assert.Empty(NotFoundLinks());
    }

    // But for links to other places and to the page itself.
    private List<string> NotFoundLinks() => [.. new HtmlParser().ParseDocument(File.ReadAllText(folder.In("site/404.html"))).QuerySelectorAll("[href], [src]")
        .Select(element => element.GetAttribute("href") ?? element.GetAttribute("src")!).Where(link => !link.Contains(':', StringComparison.Ordinal) && !link.StartsWith('#'))];

    [Fact]
    public void Beside_exact_figures_methods_and_home_say_what_the_guarantee_and_the_loss_do_not_cover()
    {
        var documents = ComposedPages().ToDictionary(page => page.Path, page => page.Document.QuerySelector("main")!.TextContent);
        Assert.Contains("It covers the figures with noise. The figures published exactly have no limit", documents["methods.html"], StringComparison.Ordinal);
        Assert.Matches(@"[0-9.]+ of [0-9.]+ authorised, in (rho|epsilon) \(.\), for the figures with noise", documents["index.html"]);
        Assert.DoesNotContain("The whole release", documents["index.html"], StringComparison.Ordinal);
    }

    [Fact]
    public void Downloads_name_the_coverages_and_the_pictures_of_headlines()
    {
        var page = ComposedPages().Single(page => page.Path == "downloads.html").Document.QuerySelector("main")!.TextContent;
        Assert.Contains("at a coverage of 50 in 100", page, StringComparison.Ordinal);
        Assert.Contains("at a coverage of 99 in 100", page, StringComparison.Ordinal);
        Assert.Contains("A headline with its figure, as picture (PNG)", page, StringComparison.Ordinal);
        Assert.Contains("The checksum (SHA-256) of each other file in this folder; pages and pictures have none", page, StringComparison.Ordinal);
    }

    [Fact]
    public void Downloads_explain_every_column_of_the_long_file_and_every_key_of_a_line()
    {
        var page = ComposedPages().Single(page => page.Path == "downloads.html").Document;
        var explained = page.QuerySelectorAll("dt").Select(term => term.TextContent).ToHashSet();
        Assert.Superset(LongColumn.Of(PagesRelease.Make().Tables[0]).Where(column => column.Key is not null).Select(column => column.Name).ToHashSet(), explained);
        using var line = JsonDocument.Parse(File.ReadLines(folder.In("site/downloads/late.jsonl")).First());
        var own = line.RootElement.EnumerateObject().Select(key => key.Name).Where(key => !explained.Contains(JsonNamingPolicy.SnakeCaseLower.ConvertName(key)));
        Assert.All(own, key => Assert.Contains($"“{key}”", page.QuerySelector("#columns")!.ParentElement!.TextContent, StringComparison.Ordinal));
    }

    [Fact]
    public void Methods_lead_to_the_list_of_chances_that_noise_was_drawn_by()
    {
        var release = PagesRelease.Make();
        var drawn = SmallRelease.Mechanism("drawn", LawName.Tabulated) with { Tabulated = [(-1, 0.25m), (0, 0.5m), (1, 0.25m)] };
        PagesRelease.Compose(release with { Noise = release.Noise with { Mechanisms = [.. release.Noise.Mechanisms, drawn] } }, folder.In("site"));
        var link = new HtmlParser().ParseDocument(File.ReadAllText(folder.In("site/methods.html"))).QuerySelector("#mechanism-drawn a")!;
        Assert.Equal(("list of chances", true), (link.TextContent, File.Exists(folder.In("site/" + link.GetAttribute("href")))));
    }

    [Fact]
    public void Where_small_counts_become_zero_no_page_and_no_download_promises_their_ranges_without_condition()
    {
        var gauss = SmallRelease.DiscreteGaussian(9.5, new AfterStep.ZeroBelow(30));
        var zeroed = new SmallRelease().Figures(MeasureKind.Count, gauss, "45", "0", "1240").Build().Tables[0] with { Id = "zeroed" };
        var release = PagesRelease.Make();
        PagesRelease.Compose(release with { Tables = [zeroed, release.Tables[1]], Headlines = [], Narrative = [], Short = new Dictionary<string, string>() }, folder.In("site"));
        string Main(string page) => new HtmlParser().ParseDocument(File.ReadAllText(folder.In("site/" + page))).QuerySelector("main")!.TextContent;

        Assert.Contains("this holds among the figures not set to 0", Main("reading.html"), StringComparison.Ordinal);
        Assert.Contains("For those not set to 0, the count before noise is between 1,221 and 1,259 in at least 95 of 100 cases.", Main("tables/zeroed/index.html"), StringComparison.Ordinal);
        Assert.DoesNotContain("In at least 95", Main("tables/zeroed/index.html"), StringComparison.Ordinal);
        var columns = Directory.GetFiles(folder.In("site/downloads"), "*.json").Single(path => Path.GetFileName(path).StartsWith("zeroed", StringComparison.Ordinal));
        Assert.Contains("The coverage holds among the figures not set to 0.", File.ReadAllText(columns), StringComparison.Ordinal);
    }

    [Fact]
    public void Methods_say_that_rounding_of_continuous_noise_widens_the_margin()
    {
        var release = PagesRelease.Make();
        var gauss = release.Noise.Mechanisms[0] with { Id = "plain", Law = LawName.Gaussian };
        PagesRelease.Compose(release with { Noise = release.Noise with { Mechanisms = [.. release.Noise.Mechanisms, gauss] } }, folder.In("site"));
        var page = new HtmlParser().ParseDocument(File.ReadAllText(folder.In("site/methods.html")));
        Assert.Contains("half a step of that rounding is added", page.QuerySelector("#law-gaussian")!.ParentElement!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Methods_say_what_publishing_from_a_threshold_does()
    {
        var level = SmallRelease.Measure(MeasureKind.Count) with { PublishedFrom = 30 };
        var from = new SmallRelease().Figures(level, SmallRelease.DiscreteGaussian(9.5), "45", "Q").Build().Tables[0] with { Id = "from" };
        var release = PagesRelease.Make();
        PagesRelease.Compose(release with { Tables = [from, release.Tables[1]], Headlines = [], Narrative = [], Short = new Dictionary<string, string>() }, folder.In("site"));
        var steps = new HtmlParser().ParseDocument(File.ReadAllText(folder.In("site/methods.html"))).QuerySelector("section[aria-labelledby=steps]")!;
        Assert.Contains("Only noised values from the threshold up are published.", steps.TextContent, StringComparison.Ordinal);
    }

    private List<(string Path, IDocument Document)> ComposedPages()
    {
        PagesRelease.Compose(PagesRelease.Make(), folder.In("site"));
        var parser = new HtmlParser();
        return [.. Directory.EnumerateFiles(folder.In("site"), "*.html", SearchOption.AllDirectories)
            .Select(file => (Path.GetRelativePath(folder.In("site"), file), (IDocument)parser.ParseDocument(File.ReadAllText(file))))];
    }

    private bool Leads(string page, string address, List<(string Path, IDocument Document)> documents)
    {
        var parts = address.Split('#');
        var path = parts[0].Length == 0 ? page : Path.GetRelativePath(folder.In("site"), Path.Combine(folder.In("site"), Path.GetDirectoryName(page)!, parts[0]));
        if (parts.Length == 1)
            return File.Exists(folder.In($"site/{path}"));
        return documents.Any(other => other.Path == path && other.Document.GetElementById(parts[1]) is not null);
    }
}
