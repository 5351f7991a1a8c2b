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
    private readonly CsvReader reader;
    private readonly string path;
    private readonly ReadContext context;
    private int lastReported;

    private CsvFile(FileInfo file, string path, ReadContext context)
    {
        (this.path, this.context) = (path, context);
        reader = CsvReader.FromFile(file.FullName, new CsvReaderOptions
        {
            Separator = ',',
            TrimWhitespace = true,
            TrackLineNumbers = true,
            MaxRecordSize = FolderLimits.RecordBytes,
            FieldCountMismatch = CsvFieldCountHandling.Skip,
            OnMalformedRecord = Report,
        });
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
        var record = reader.RawRecord;
        return record.Overlaps(reader.GetRawSpan(column), out var offset) ? PlaceAt(record[..offset]) : new Place(path, Line, 1);
    }

    /// <summary>Where the name of a column begins, as long as no name before it is quoted.</summary>
    public static Place PlaceOfHeader(string path, IReadOnlyList<string> headers, int index) =>
        new(path, 1, headers.Take(index).Sum(name => name.Length + 1) + 1);

    public void Dispose() => reader.Dispose();

    private Place PlaceAt(ReadOnlySpan<byte> before)
    {
        var breaks = before.Count((byte)'\n');
        var lineStart = before.LastIndexOf((byte)'\n') + 1;
        return new Place(path, Line + breaks, Encoding.UTF8.GetCharCount(before[lineStart..]) + 1);
    }

    private void Report(CsvMalformedRecord record)
    {
        IsSound = false;
        var at = new Place(path, (int)record.LineNumber, 1);
        if (at.Line == lastReported)
            return;
        lastReported = at.Line;
        context.Add(record.Reason == CsvMalformedReason.FieldCountMismatch
            ? CsvProblems.Ragged(at, Headers.Count, record.RawRecord, context.Owner)
            : CsvProblems.Quotes(at, record.Reason, context.Owner));
    }

    private bool HeaderIsSound()
    {
        var at = new Place(path, 1, 1);
        if (!TryReadHeader())
            return false;
        var problem = Headers switch
        {
            [] => CsvProblems.Empty(new Place(path), context.Owner),
            [var one] when one.IndexOfAny([';', '\t', '|']) is >= 0 and var separator => CsvProblems.Separator(at, one[separator], context.Owner),
            _ when Headers.FirstOrDefault(string.IsNullOrWhiteSpace) is not null => CsvProblems.UnnamedColumn(at, Headers, context.Owner),
            _ when Headers.GroupBy(name => name).FirstOrDefault(group => group.Count() > 1) is { } twins => CsvProblems.TwinColumns(at, twins.Key, context.Owner),
            _ when Headers.FirstOrDefault(name => HiddenCharacters.FirstIn(name) >= 0) is { } name =>
                KeyProblems.HiddenCharacter(at, "A column name", name[HiddenCharacters.FirstIn(name)], context.Owner),
            _ => null,
        };
        if (problem is not null)
            context.Add(problem);
        return problem is null;
    }

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
