using ReleaseKit.Pages;
using Xunit;

namespace ReleaseKit.Tests.Pages;

public sealed class LinkTests
{
    [Theory]
    [InlineData("index.html", "budget.html", "budget.html")]
    [InlineData("index.html", "tables/a/index.html", "tables/a/index.html")]
    [InlineData("tables/a/index.html", "index.html", "../../index.html")]
    [InlineData("tables/a/index.html", "tables/a/north.html#x.y", "north.html#x.y")]
    [InlineData("tables/a/index.html", "tables/b/index.html", "../b/index.html")]
    [InlineData("tables/a/index.html", "tables/a/index.html#x", "#x")]
    [InlineData("tables/a/index.html", "tables/a/index.html", "index.html")]
    [InlineData("index.html", "#x", "#x")]
    public void Link_leads_from_page_to_target(string page, string target, string expected) => Assert.Equal(expected, Link.From(page, target));
}
