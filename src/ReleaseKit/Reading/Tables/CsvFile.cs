using System.Text;
using CsvHelper;
using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>
/// A CSV file (RFC 4180, UTF-8, comma, header row) read row by row. Opening it recognises other encodings and separators; ragged rows and broken quotes
/// are reported while reading and passed over.
/// </summary>
internal sealed class CsvFile : IDisposable
{
    private static readonly CsvReaderOptions Form = new() { Separator = ',', TrimWhitespace = true, TrackLineNumbers = true, MaxRecordSize = FolderLimits.RecordBytes };

    private readonly FileInfo file;
    private readonly CsvReader reader;
    private readonly string path;
    private readonly ReadContext context;
    private long lastReported;

    private CsvFile(FileInfo file, string path, ReadContext context)
    {
        (this.path, this.context) = (path, context);
        this.file = file;
        reader = CsvReader.FromFile(file.FullName, Form with { FieldCountMismatch = CsvFieldCountHandling.Skip, OnMalformedRecord = Report });
    }

    public IReadOnlyList<string> Headers => reader.Headers;

    public string FilePath => path;

    /// <summary>False once a row had to be passed over or the file broke off.</summary>
    public bool IsSound { get; private set; } = true;

    /// <summary>The line where the current row starts, from 1.</summary>
    public int Line => (int)reader.LineNumber;

    /// <summary>Opens a file; null, with a stop, if it is no such CSV.</summary>
    public static CsvFile? Open(FileInfo file, string path, ReadContext context)
    {
        if (ByteProblem(file, path, context.Owner) is { } problem)
        {
            context.Add(problem);
            return null;
        }
        var opened = new CsvFile(file, path, context);
        if (opened.HeaderIsSound())
            return opened;
        opened.Dispose();
        return null;
    }

    /// <summary>Goes to the next row; false at the end.</summary>
    public bool Read()
    {
        try
        {
            return reader.Read();
        }
        catch (CsvFormatException broken)
        {
            IsSound = false;
            context.Add(CsvProblems.RowTooLong(new Place(path, (int)broken.LineNumber, 1), context.Owner));
            return false;
        }
    }

    /// <summary>The bytes of a field, unquoted; valid until the next read.</summary>
    public ReadOnlySpan<byte> Span(int column) => reader.GetSpan(column);

    public string Text(int column) => reader.GetString(column);

    /// <summary>Where a field of the current row begins.</summary>
    public Place PlaceOf(int column)
    {
        var offset = 0;
        for (var before = 0; before < column; before++)
            offset += reader.GetRawSpan(before).Length + 1;
        return PlaceAfter(Encoding.UTF8.GetString(reader.RawRecord[..offset]), Line);
    }

    /// <summary>Where the name of a column begins.</summary>
    public Place PlaceOfHeader(int column) => HeaderPlaces[column];

    /// <summary>The row of names is read once more, since it is not kept as it stands in the file.</summary>
    private IReadOnlyList<Place> HeaderPlaces
    {
        get
        {
            if (field is not null)
                return field;
            using var names = CsvReader.FromFile(file.FullName, Form with { HasHeader = false });
            names.Read();
            return field = FieldPlaces(names);
        }
    }

    public void Dispose() => reader.Dispose();

    private List<Place> FieldPlaces(CsvReader row)
    {
        var (places, at) = (new List<Place>(), new Place(path, (int)row.LineNumber, 1));
        for (var column = 0; column < row.FieldCount; column++)
        {
            places.Add(at);
            var step = PlaceAfter(Encoding.UTF8.GetString(row.GetRawSpan(column)), at.Line);
            at = step with { Column = step.Column + (step.Line == at.Line ? at.Column : 1) };
        }

        return places;
    }

    private Place PlaceAfter(ReadOnlySpan<char> before, long line) => new(path, (int)line + before.Count('\n'), before.Length - before.LastIndexOf('\n'));

    private void Report(CsvMalformedRecord record)
    {
        IsSound = false;
        if (record.LineNumber == lastReported)
            return;
        lastReported = record.LineNumber;
        context.Add(record.Reason == CsvMalformedReason.FieldCountMismatch
            ? CsvProblems.Ragged(new Place(path, (int)record.LineNumber, 1), Headers.Count, record.RawRecord, context.Owner)
            : CsvProblems.Quotes(PlaceAfter(record.RawRecord.AsSpan(0, QuoteFault.In(record.RawRecord)), record.LineNumber), record.Reason, context.Owner));
    }

    private bool HeaderIsSound()
    {
        if (!TryReadHeader())
            return false;
        List<Finding> problems = Headers switch
        {
            [] => [CsvProblems.Empty(new Place(path), context.Owner)],
            [var one] when one.IndexOfAny([';', '\t', '|']) is >= 0 and var separator => [CsvProblems.Separator(new Place(path, 1, 1), one[separator], context.Owner)],
            _ => [.. Headers.Select(NameProblem).OfType<Finding>(), .. TwinColumns()],
        };
        problems.ForEach(context.Add);
        return problems.Count == 0;
    }

    private IEnumerable<Finding> TwinColumns() => Headers.Index().Where(name => !string.IsNullOrWhiteSpace(name.Item)).GroupBy(name => name.Item).Where(same => same.Count() > 1)
        .Select(same => CsvProblems.TwinColumns(PlaceOfHeader(same.Skip(1).First().Index), same.Key, context.Owner));

    private Finding? NameProblem(string name, int column) => name switch
    {
        _ when string.IsNullOrWhiteSpace(name) => CsvProblems.UnnamedColumn(PlaceOfHeader(column), column + 1, context.Owner),
        _ when HiddenCharacters.FirstIn(name) is >= 0 and var hidden => KeyProblems.HiddenCharacter(PlaceOfHeader(column), "A column name", name[hidden], context.Owner),
        _ => null,
    };

    private bool TryReadHeader()
    {
        try
        {
            reader.ReadHeader();
            return true;
        }
        catch (CsvFormatException)
        {
            context.Add(CsvProblems.RowTooLong(new Place(path, 1, 1), context.Owner));
            return false;
        }
    }

    private static Finding? ByteProblem(FileInfo file, string path, FindingOwner owner)
    {
        if (file.Length == 0)
            return CsvProblems.Empty(new Place(path), owner);
        if (file.Length > FolderLimits.TableBytes)
            return FileProblems.TooLarge(new Place(path), file.Length, FolderLimits.TableBytes, owner);
        return EncodingScan.Of(file) switch
        {
            { Encoding: ScannedEncoding.Utf16 } => CsvProblems.Encoding(new Place(path), "UTF-16", owner),
            { Encoding: ScannedEncoding.SingleByte } scan => CsvProblems.Encoding(new Place(path, scan.Line, scan.Column), "Windows-1252 or Latin-1", owner),
            { Encoding: ScannedEncoding.Nul } scan => CsvProblems.Nul(new Place(path, scan.Line, scan.Column), owner),
            _ => null,
        };
    }
}
