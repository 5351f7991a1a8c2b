using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Downloads;

/// <summary>A row of the table a row; each measure is followed by its margin, range, reliability, status and, where asked for, its reading.</summary>
internal sealed class WideCsv : IRowFile
{
    private readonly CsvFile csv;
    private readonly Table table;
    private readonly Coverage coverage;
    private readonly ILanguage? readings;

    /// <param name="stream">Where to write.</param>
    /// <param name="table">The table.</param>
    /// <param name="coverage">The coverage of margins and ranges.</param>
    /// <param name="readings">The language of the readings, or null for a file without.</param>
    public WideCsv(Stream stream, Table table, Coverage coverage, ILanguage? readings)
    {
        csv = new CsvFile(stream);
        (this.table, this.coverage, this.readings) = (table, coverage, readings);
        foreach (var column in WideColumns.Of(table, readings is not null))
            csv.Text(column.Name);
        csv.EndRow();
    }

    public void Add(int row, IReadOnlyList<AppraisedFigure> figures)
    {
        foreach (var column in table.Stub)
            csv.Text(column.LabelOf(row).Value);
        foreach (var figure in figures)
            WriteFigure(figure);
        csv.EndRow();
    }

    public void Dispose() => csv.Dispose();

    private void WriteFigure(AppraisedFigure figure)
    {
        var range = figure.Ranges.FirstOrDefault(range => range.Coverage == coverage);
        csv.Number(figure.HasNumber ? figure.Value : null)
            .Number(range?.Margin).Number(range?.Low).Number(range?.High)
            .Text(ReliabilityWord.Of(figure.Reliability)).Text(figure.Status.ToString());
        if (WideColumns.HasReadings(figure.Measure, readings is not null))
            csv.Text(readings!.ReadingOf(figure).Text);
    }
}
