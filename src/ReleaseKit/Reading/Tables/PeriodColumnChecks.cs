using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>A stub column whose headings all read like periods and that does not say so: one unit can then be counted in several rows unseen.</summary>
internal static class PeriodColumnChecks
{
    public static void Run(ReadTable read, FindingLog log)
    {
        for (var column = 0; column < read.Table.Stub.Count; column++)
        {
            var stub = read.Table.Stub[column];
            var headings = stub.Labels.Select(label => label.Value).Where(value => value != stub.All).ToList();
            if (read.Draft.Stub[column].Period is null && headings.Count > 1 && headings.TrueForAll(Periods.ReadsLikePeriod))
                log.Add(TotalProblems.LooksLikePeriod(read.Draft.Stub[column].At, stub.Column, headings[0], headings.TrueForAll(Periods.IsPeriod), FindingOwner.Writer));
        }
    }
}
