using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>
/// A row heading that says "all" or "total" in a stub column that gives no heading for all: its figures would be counted among their own parts.
/// The heading alone decides where it is nothing but that word; where more words follow, as in the names of places, the figures must look like a sum too.
/// </summary>
internal static class TotalRowChecks
{
    /// <summary>How far a total with noise of its own may be from the sum of the others, as a share of that sum.</summary>
    private const decimal Near = 0.2m;

    /// <summary>Of names that begin with such a word only the first few are looked at.</summary>
    private const int MostNames = 5;

    private static readonly string[] Words = ["all", "total", "totals", "overall", "grand total", "sum"];
    private static readonly string[] FirstWords = ["all", "total", "overall"];

    public static void Run(ReadTable read, FindingLog log)
    {
        for (var column = 0; column < read.Table.Stub.Count; column++)
            if (read.Table.Stub[column] is { All: null, Period: false, Labels.Count: > 1 } stub && TotalIn(read.Table, column) is { } code)
                log.Add(TotalProblems.LooksLikeTotal(
                    read.Draft.Stub[column].At, stub.Column, stub.Labels[code].Value, read.Lines[Array.IndexOf(stub.Codes, code)], Review.FindingOwner.Writer));
    }

    private static int? TotalIn(Table table, int column)
    {
        var values = table.Stub[column].Labels.Select(label => label.Value).ToList();
        var alone = values.FindIndex(value => Is(value, Words));
        return alone >= 0
            ? alone
            : Enumerable.Range(0, values.Count).Where(code => Is(values[code].Split([' ', ',', ':', '('])[0], FirstWords)).Take(MostNames)
                .Select(code => (int?)code).FirstOrDefault(code => IsNearSum(table, column, code!.Value));
    }

    private static bool Is(string text, string[] words) => words.Contains(text.Trim(), StringComparer.OrdinalIgnoreCase);

    /// <summary>Whether, where the heading stands first, every measure that can be added up is near the sum of the other rows.</summary>
    private static bool IsNearSum(Table table, int column, int code)
    {
        var first = Array.IndexOf(table.Stub[column].Codes, code);
        var group = new RowGroups(table).GroupsOver(column).First(rows => rows.Contains(first));
        var measures = table.Measures.Where(measure => measure.Kind is MeasureKind.Count or MeasureKind.Estimate or MeasureKind.Amount).ToList();
        return measures.Count > 0 && group.Count > 2 && measures.TrueForAll(measure => IsNearSum(measure, first, group));
    }

    private static bool IsNearSum(Measure measure, int row, ArraySegment<int> group)
    {
        var sum = group.Where(other => other != row && measure.HasNumber(other)).Sum(other => Number(measure, other));
        return measure.HasNumber(row) && Math.Abs(Number(measure, row) - sum) <= Near * Math.Abs(sum);
    }

    private static decimal Number(Measure measure, int row) =>
        new decimal(measure.Unscaled[row]) / (decimal)PublishedValue.PowerOfTen(measure.DecimalsOf[row]);
}
