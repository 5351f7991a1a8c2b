using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Charts.Ordered;

/// <summary>Names of the rows of a chart: the stub values that tell them apart, and no others.</summary>
internal sealed class RowNames
{
    private readonly string language;
    private readonly IReadOnlyList<StubColumn> columns;

    private RowNames(string language, IReadOnlyList<StubColumn> columns) => (this.language, this.columns) = (language, columns);

    /// <summary>The last column that alone tells all rows apart, else every column that varies; for a single row its last column.</summary>
    public static RowNames Of(IReadOnlyList<AppraisedFigure> figures, string language)
    {
        var stub = figures[0].Table.Stub;
        var alone = stub.LastOrDefault(column => figures.Select(figure => column.Codes[figure.Row]).Distinct().Count() == figures.Count);
        var varying = stub.Where(column => figures.Any(figure => column.Codes[figure.Row] != column.Codes[figures[0].Row])).ToList();
        return new RowNames(language, alone is not null ? [alone] : varying);
    }

    public string Of(AppraisedFigure figure) => string.Join(", ", columns.Reverse().Select(column => column.LabelOf(figure.Row).In(language)));
}
