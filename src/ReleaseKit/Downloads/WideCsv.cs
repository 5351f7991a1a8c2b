using ReleaseKit.Appraisal;
using ReleaseKit.Noise;
using ReleaseKit.Releases;
using ReleaseKit.Wording;

namespace ReleaseKit.Downloads;

/// <summary>A row of the table a row; each measure is followed by its margin, range, reliability, status and, where asked for, its reading.</summary>
internal sealed class WideCsv : IRowFile
{
    private static readonly string[] Companions = ["_margin", "_low", "_high", "_reliability", "_status"];
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
        WriteHeader();
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

    private void WriteHeader()
    {
        var taken = new HashSet<string>(StringComparer.Ordinal);
        foreach (var name in table.Stub.Select(column => column.Column).Concat(table.Measures.SelectMany(NamesOf)))
            csv.Text(Untaken(name, taken));
        csv.EndRow();
    }

    private IEnumerable<string> NamesOf(Measure measure) =>
        Companions.Prepend("").Concat(HasReadings(measure) ? ["_reading"] : []).Select(ending => measure.Column + ending);

    // A table may itself have a measure called in_arrears_margin: two columns of one name would mislead.
    private static string Untaken(string name, HashSet<string> taken)
    {
        while (!taken.Add(name))
            name += "_";
        return name;
    }

    private bool HasReadings(Measure measure) => readings is not null && measure.Shown;

    private void WriteFigure(AppraisedFigure figure)
    {
        var range = figure.Ranges.FirstOrDefault(range => range.Coverage == coverage);
        csv.Number(figure.HasNumber ? figure.Value : null)
            .Number(range?.Margin).Number(range?.Low).Number(range?.High)
            .Text(ReliabilityWord.Of(figure.Reliability)).Text(figure.Status.ToString());
        if (HasReadings(figure.Measure))
            csv.Text(readings!.ReadingOf(figure).Text);
    }
}
