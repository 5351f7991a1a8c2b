using AngleSharp.Html.Parser;
using ReleaseKit.Site.Tests.Fixtures;

namespace ReleaseKit.Site.Tests;

/// <summary>Every link within the site leads to a file and, with a fragment, to an element of it.</summary>
public sealed class LinkTests(ComposedSample sample)
{
    [Fact]
    public void Every_inner_link_leads_somewhere()
    {
        var pages = sample.Pages.ToDictionary(path => path, path => new HtmlParser().ParseDocument(File.ReadAllText(sample.File(path))));
        var ids = pages.ToDictionary(page => page.Key, page => page.Value.All.Select(element => element.Id).Where(id => id is not null).ToHashSet());
        var broken = new List<string>();
        foreach (var (path, page) in pages)
        {
            foreach (var link in page.QuerySelectorAll("a[href]").Select(link => link.GetAttribute("href")!).Distinct())
            {
                var target = new Uri(new Uri("http://release.test/" + path), link);
                if (target.Host != "release.test" || target.Scheme != "http")
                    continue;
                var file = ComposedSample.FileAt(target.AbsolutePath);
                var fragment = Uri.UnescapeDataString(target.Fragment).TrimStart('#');
                if (!File.Exists(sample.File(file)) || (fragment.Length > 0 && !(ids.TryGetValue(file, out var known) && known.Contains(fragment))))
                    broken.Add($"{path}: {link}");
            }
        }

        Assert.Empty(broken);
    }

    [Fact]
    public void No_id_stands_twice_on_a_page()
    {
        foreach (var path in sample.Pages)
        {
            var page = new HtmlParser().ParseDocument(File.ReadAllText(sample.File(path)));
            var twice = page.All.Select(element => element.Id).Where(id => !string.IsNullOrEmpty(id)).GroupBy(id => id).Where(group => group.Count() > 1).Select(group => $"{path}#{group.Key}");
            Assert.Empty(twice);
        }
    }
}
