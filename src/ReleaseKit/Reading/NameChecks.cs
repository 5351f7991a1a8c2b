using ReleaseKit.Review;

namespace ReleaseKit.Reading;

/// <summary>Ids of tables, short names and charts share one namespace.</summary>
internal static class NameChecks
{
    public static void Run(ReleaseDraft draft, FindingLog log)
    {
        var first = new Dictionary<string, (string What, Place At)>();
        foreach (var (name, what, at) in Names(draft))
            if (!first.TryAdd(name, (what, at)))
                log.Add(ReleaseProblems.IdTaken(at, name, what, first[name].What, first[name].At, FindingOwner.Writer));
    }

    private static IEnumerable<(string Name, string What, Place At)> Names(ReleaseDraft draft) =>
        draft.Tables.Select(table => (table.Id, "a table", table.At))
            .Concat(draft.Short.Select(name => (name.Value.Name, "a short name", name.At)))
            .Concat(draft.Charts.Select(chart => (chart.Value.Id, "a chart", chart.At)));
}
