using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>Parents in labels.csv that lead in a circle: each circle is reported once, and opened, so that what depends on levels is no further fault.</summary>
internal static class LabelParents
{
    private const int Listed = 5;

    public static void BreakCycles(Dictionary<StubValue, LabelEntry> entries, ReadContext context)
    {
        var done = new HashSet<StubValue>();
        foreach (var start in entries.Keys.ToList())
        {
            var path = new List<StubValue>();
            var next = (StubValue?)start;
            while (next is { } value && done.Add(value))
            {
                path.Add(value);
                next = ParentOf(value, entries);
            }
            if (next is { } again && path.IndexOf(again) is >= 0 and var from)
                Break(path[from..], entries, context);
        }
    }

    private static StubValue? ParentOf(StubValue value, Dictionary<StubValue, LabelEntry> entries) =>
        entries.TryGetValue(value, out var entry) && entry.Parent is { } parent ? new StubValue(value.Column, parent) : null;

    private static void Break(List<StubValue> cycle, Dictionary<StubValue, LabelEntry> entries, ReadContext context)
    {
        context.Add(LabelProblems.ParentCycle(entries[cycle[0]].ParentAt, cycle.Take(Listed).Select(value => value.Value), context.Owner));
        foreach (var value in cycle)
            entries[value] = entries[value] with { Parent = null };
    }
}
