namespace ReleaseKit.Releases;

/// <summary>The known name that a mistyped one was probably meant to be.</summary>
internal static class Nearest
{
    private const int LongestCompared = 64;

    /// <summary>The closest name by edit distance, if at most a third of its letters differ (case aside); null if none is close.</summary>
    public static string? Of(string given, IEnumerable<string> known)
    {
        if (given.Length > LongestCompared)
            return null;
        var best = known.Where(name => name.Length <= LongestCompared)
            .Select(name => (Name: name, Distance: Distance(given.ToLowerInvariant(), name.ToLowerInvariant())))
            .DefaultIfEmpty((Name: "", Distance: int.MaxValue))
            .MinBy(pair => pair.Distance);
        return best.Distance <= Math.Max(1, Math.Max(best.Name.Length, given.Length) / 3) ? best.Name : null;
    }

    /// <summary>Levenshtein's edit distance (1966): insertions, deletions and replacements of one character.</summary>
    public static int Distance(string left, string right)
    {
        var previous = Enumerable.Range(0, right.Length + 1).ToArray();
        for (var row = 1; row <= left.Length; row++)
        {
            var current = new int[right.Length + 1];
            current[0] = row;
            for (var column = 1; column <= right.Length; column++)
                current[column] = Math.Min(
                    Math.Min(current[column - 1], previous[column]) + 1,
                    previous[column - 1] + (left[row - 1] == right[column - 1] ? 0 : 1));
            previous = current;
        }
        return previous[right.Length];
    }
}
