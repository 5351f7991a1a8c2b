using AngleSharp.Dom;
using AngleSharp.Html.Parser;
using ReleaseKit.Appraisal;
using ReleaseKit.Pages;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Tests.Pages;

/// <summary>The table pages of a release made in code, written to a folder of their own and read back.</summary>
internal sealed class TableSite : IDisposable
{
    private readonly TemporaryFolder folder = new();

    private TableSite(Release release)
    {
        Appraised = AppraisedRelease.Of(release);
        Language = ReleaseKit.Wording.Language.Load(TemplatesFolder, "en");
        using var site = SiteFolder.Open(Root);
        TablePages.WriteAll(Context(Appraised, Language, site), site);
        site.Finish();
    }

    public static string TemplatesFolder => Path.Combine(AppContext.BaseDirectory, "site-templates");

    public IAppraisedRelease Appraised { get; }

    public ILanguage Language { get; }

    public string Root => folder.In("site");

    public static TableSite Of(Release release) => new(release);

    public string Html(string path) => File.ReadAllText(Path.Combine(Root, path));

    public IDocument Page(string path = "tables/table/index.html") => new HtmlParser(new HtmlParserOptions { IsStrictMode = false }).ParseDocument(Html(path));

    public void Dispose() => folder.Dispose();

    private static SiteContext Context(IAppraisedRelease appraised, ILanguage language, SiteFolder site)
    {
        var assets = Assets.Write(site, TemplatesFolder, appraised.Release.Look, "A running foot");
        return new(appraised, language, BudgetStatement.Of(appraised.Release), Templates.Load(TemplatesFolder), assets, PageMap.Of(appraised.Release));
    }
}
