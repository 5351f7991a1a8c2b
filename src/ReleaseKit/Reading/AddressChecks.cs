using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>Every address in release.json means what it is used for: short names and headlines one figure, charts several.</summary>
internal static class AddressChecks
{
    public static void Run(ReleaseDraft draft, Release release, FindingLog log)
    {
        foreach (var (value, at) in draft.Short)
            Try(at, log, () => FigureAddress.Parse(value.Address).ResolveOne(release));
        var shown = new Dictionary<(int, int, int), Place>();
        foreach (var (headline, at) in draft.Headlines)
            Try(at, log, () => CheckHeadline(headline, at, release, shown, log));
        foreach (var (chart, at) in draft.Charts)
            Try(at, log, () => CheckChart(chart, at, release, log));
    }

    private static void CheckHeadline(Headline headline, Place at, Release release, Dictionary<(int, int, int), Place> shown, FindingLog log)
    {
        var found = FigureAddress.Of(release, headline.Address).ResolveOne(release);
        var figure = (found.Table, found.Measure, found.Rows[0]);
        if (!shown.TryAdd(figure, at))
            log.Add(ReleaseProblems.HeadlineTwice(at, headline.Address, shown[figure], FindingOwner.Writer));
    }

    private static void CheckChart(ChartOrder chart, Place at, Release release, FindingLog log)
    {
        if (FigureAddress.Of(release, chart.Figures).Resolve(release).Rows.Count == 1)
            log.Add(ReleaseProblems.ChartHasOneFigure(at, FindingOwner.Writer));
    }

    private static void Try(Place at, FindingLog log, Action resolve)
    {
        try
        {
            resolve();
        }
        catch (AddressException problem)
        {
            log.Add(ReleaseProblems.Address(at, problem, FindingOwner.Writer));
        }
    }
}
