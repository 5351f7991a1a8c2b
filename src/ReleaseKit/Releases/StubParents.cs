namespace ReleaseKit.Releases;

/// <summary>Which value of a stub column each value is a part of: the one that it names as its parent, else "all".</summary>
internal static class StubParents
{
    /// <summary>For each label the code of its whole in the same column; −1 for "all", and where there is none.</summary>
    public static int[] Of(StubColumn column)
    {
        var codes = column.Labels.Select((label, code) => (label.Value, code)).ToDictionary(pair => pair.Value, pair => pair.code);
        return [.. column.Labels.Select((label, code) =>
            label.Parent is { } parent && codes.TryGetValue(parent, out var named) ? named : code == column.AllCode ? -1 : column.AllCode)];
    }

    /// <summary>A label, what it is a part of, and so on up.</summary>
    public static IEnumerable<int> Upwards(int[] parents, int code)
    {
        var steps = 0;
        for (var next = code; next >= 0 && steps <= parents.Length; next = parents[next], steps++)
            yield return next;
    }
}
