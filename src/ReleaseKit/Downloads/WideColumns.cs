using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>What a column of a CSV download holds; the names are the endings of the wide files' columns.</summary>
internal enum ColumnKind
{
    Stub,
    Value,
    Margin,
    Low,
    High,
    Reliability,
    Status,
    Reading,
}

/// <summary>A column of a wide file: its name, what it holds, and the text that says of what (a stub column's title, or a measure's).</summary>
internal sealed record WideColumn(string Name, ColumnKind Kind, ReaderText Title, Measure? Measure = null);

/// <summary>The columns of a wide file: the stub, then each measure with its companions.</summary>
internal static class WideColumns
{
    private static readonly ColumnKind[] OfFigure =
        [ColumnKind.Value, ColumnKind.Margin, ColumnKind.Low, ColumnKind.High, ColumnKind.Reliability, ColumnKind.Status];

    public static IReadOnlyList<WideColumn> Of(Table table, bool withReadings)
    {
        var taken = new HashSet<string>(StringComparer.Ordinal);
        var stub = table.Stub.Select(column => new WideColumn(column.Column, ColumnKind.Stub, column.Title));
        var figures = table.Measures.SelectMany(measure => KindsOf(measure, withReadings).Select(kind => OfMeasure(measure, kind)));
        return [.. stub.Concat(figures).Select(column => column with { Name = Untaken(column.Name, taken) })];
    }

    public static bool HasReadings(Measure measure, bool withReadings) => withReadings && measure.Shown;

    private static IEnumerable<ColumnKind> KindsOf(Measure measure, bool withReadings) =>
        HasReadings(measure, withReadings) ? OfFigure.Append(ColumnKind.Reading) : OfFigure;

    private static WideColumn OfMeasure(Measure measure, ColumnKind kind)
    {
        var ending = kind == ColumnKind.Value ? "" : "_" + kind.ToString().ToLowerInvariant();
        return new WideColumn(measure.Column + ending, kind, measure.Title, measure);
    }

    // A table may itself have a measure called in_arrears_margin: two columns of one name would mislead.
    private static string Untaken(string name, HashSet<string> taken)
    {
        while (!taken.Add(name))
            name += "_";
        return name;
    }
}
