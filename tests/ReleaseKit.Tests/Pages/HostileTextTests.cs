using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class HostileTextTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Theory]
    [InlineData("<script>alert(1)</script>")]
    [InlineData("\"><img src=x onerror=alert(1)>")]
    [InlineData("' autofocus onfocus='alert(1)")]
    [InlineData("</title></style></script><b class=hostile>")]
    [InlineData("]]><svg onload=alert(1)>")]
    [InlineData("{{ say 'frame.skip' }}{{ raw '<b>' }}")]
    [InlineData("<!--body--><b class=hostile>")]
    [InlineData("&lt;b&gt; &amp;amp; &#x3c;")]
    [InlineData("line\u2028and\u2029paragraph")]
    public void Text_of_the_folder_is_never_markup(string hostile)
    {
        PagesRelease.Compose(PagesRelease.Make(text => text + hostile), folder.In("site"));
        Assert.All(Pages(), page => Assert.Empty(Foreign(page)));
        Assert.Contains(hostile, Parsed(folder.In("site/index.html")).QuerySelector("h1")!.TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Text_of_ten_thousand_characters_is_written_whole()
    {
        var longText = new string('<', 10_000);
        PagesRelease.Compose(PagesRelease.Make(text => text + longText), folder.In("site"));
        Assert.EndsWith(longText, Parsed(folder.In("site/404.html")).Title, StringComparison.Ordinal);
    }

    private IEnumerable<IDocument> Pages() => Directory.EnumerateFiles(folder.In("site"), "*.html", SearchOption.AllDirectories).Select(Parsed);

    private static IDocument Parsed(string file) => new HtmlParser().ParseDocument(File.ReadAllText(file));

    /// <summary>What our templates never write: scripts, inline styles, event handlers, elements of the corpus.</summary>
    private static IEnumerable<string> Foreign(IDocument page) =>
        from element in page.All
        where element.LocalName is "script" or "style" || element.ClassList.Contains("hostile")
            || element.Attributes.Any(attribute => attribute.Name.StartsWith("on", StringComparison.Ordinal) || attribute.Name is "style" or "autofocus")
        select element.OuterHtml;
}
