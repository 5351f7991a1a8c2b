using ReleaseKit.Appraisal;
using ReleaseKit.Charts;
using ReleaseKit.Downloads;
using ReleaseKit.Pages.Downloads;
using ReleaseKit.Pages.Home;
using ReleaseKit.Pages.HowToRead;
using ReleaseKit.Pages.Methods;
using ReleaseKit.Pages.Prose;
using ReleaseKit.Wording;

namespace ReleaseKit.Pages;

/// <summary>The publication: every page, picture and download of a release.</summary>
public static class Site
{
    /// <summary>Writes the whole publication into the target; the caller calls <see cref="SiteFolder.Finish"/> when it is content.</summary>
    /// <param name="appraised">A release that the review does not stop.</param>
    /// <param name="language">The language of the pages.</param>
    /// <param name="budget">The account of the release.</param>
    /// <param name="siteTemplatesFolder">Templates, styles, fonts and wording.</param>
    /// <param name="target">Where to write.</param>
    /// <param name="progress">Told the number of figures done so far; may be null.</param>
    public static void Compose(
        IAppraisedRelease appraised, ILanguage language, BudgetStatement budget, string siteTemplatesFolder, SiteFolder target, IProgress<long>? progress)
    {
        var context = ContextOf(appraised, language, budget, siteTemplatesFolder, target);
        HomePage.Write(context, target);
        ProsePages.Write(context, target);
        BudgetPage.Write(context, target);
        TablePages.WriteAll(context, target, progress);
        ReadingPage.Write(context, target);
        MethodsPage.Write(context, target);
        DownloadFiles.WriteAll(context, target);
        ChartImages.WriteAll(context, target);
        DownloadsPage.Write(context, target);
        NotFoundPage.Write(context, target);
    }

    private static SiteContext ContextOf(
        IAppraisedRelease appraised, ILanguage language, BudgetStatement budget, string siteTemplatesFolder, SiteFolder target)
    {
        var release = appraised.Release;
        var runningFoot = $"{release.Look.Foot ?? release.Publisher.Name}. {release.Title.In(language.Tag)}";
        var assets = Assets.Write(target, siteTemplatesFolder, release.Look, runningFoot);
        return new SiteContext(appraised, language, budget, Templates.Load(siteTemplatesFolder), assets, PageMap.Of(release));
    }
}
