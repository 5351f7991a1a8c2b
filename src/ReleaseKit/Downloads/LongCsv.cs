using ReleaseKit.Appraisal;
using ReleaseKit.Releases;

namespace ReleaseKit.Downloads;

/// <summary>A figure a row, at the main coverage; the coverage is the attained one, rounded down.</summary>
internal sealed class LongCsv : IRowFile
{
    private readonly CsvFile csv;
    private readonly Table table;

    public LongCsv(Stream stream, Table table)
    {
        csv = new CsvFile(stream);
        this.table = table;
        foreach (var column in LongColumn.Of(table))
            csv.Text(column.Name);
        csv.EndRow();
    }

    public void Add(int row, IReadOnlyList<AppraisedFigure> figures)
    {
        foreach (var figure in figures)
            WriteFigure(row, figure);
    }

    public void Dispose() => csv.Dispose();

    // Without a sampling error the margin is the noise margin; no figure of a first edition has changed.
    private void WriteFigure(int row, AppraisedFigure figure)
    {
        csv.Text(figure.Address);
        foreach (var column in table.Stub)
            csv.Text(column.LabelOf(row).Value);
        var range = figure.Main;
        csv.Text(figure.Measure.Column).Number(figure.HasNumber ? figure.Value : null)
            .Number(range?.Margin).Number(range?.Margin).Number(range?.Low).Number(range?.High).Number(range?.UncutLow).Number(range?.UncutHigh)
            .Digits(range is null ? "" : PlainNumber.RoundedDown(range.Attained))
            .Text(ReliabilityWord.Of(figure.Reliability)).Text(figure.Status.ToString()).Text("")
            .EndRow();
    }
}
