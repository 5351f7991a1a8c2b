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
        foreach (var (headline, at) in draft.Headlines)
            Try(at, log, () => FigureAddress.Of(release, headline.Address).ResolveOne(release));
        foreach (var (chart, at) in draft.Charts)
            Try(at, log, () => CheckChart(chart, at, release, log));
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
