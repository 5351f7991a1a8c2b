namespace ReleaseKit.Reading.Tables;

/// <summary>Where, in a row as it stands in a CSV file, the quoting first goes wrong: at a quote that is never closed or stands inside a field without quotes, or at text after a closing one.</summary>
internal static class QuoteFault
{
    /// <returns>The index of a character; 0 if there is no such fault.</returns>
    public static int In(string row)
    {
        for (var at = 0; at < row.Length;)
        {
            var start = PastBlanks(row, at);
            var end = start < row.Length && row[start] == '"' ? PastQuoted(row, start) : NextOf(row, start, ',', '"');
            if (end < 0)
                return start;
            if (end < row.Length && row[end] != ',')
                return end;
            at = end + 1;
        }

        return 0;
    }

    /// <summary>Where the field goes on after its closing quote; −1 if there is none.</summary>
    private static int PastQuoted(string row, int open)
    {
        for (var at = open + 1; (at = row.IndexOf('"', at)) >= 0; at += 2)
            if (at + 1 == row.Length || row[at + 1] != '"')
                return PastBlanks(row, at + 1);
        return -1;
    }

    private static int NextOf(string row, int from, char one, char other) => row.AsSpan(from).IndexOfAny(one, other) is >= 0 and var next ? from + next : row.Length;

    private static int PastBlanks(string row, int from) => row.AsSpan(from).IndexOfAnyExcept(' ', '\t') is >= 0 and var next ? from + next : row.Length;
}
