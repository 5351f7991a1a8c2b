using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Reading.Mechanisms;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>Reads the CSV of a table, row by row, into columns. A table whose CSV cannot be read stays as a table without rows.</summary>
internal sealed class TableReader(TableDraft draft, MechanismsDraft mechanisms, LabelBook labels)
{
    private readonly ReadContext context = draft.Context.For(FindingOwner.Noise);
    private readonly List<int> lines = [];
    private StubBuilder[] stub = [];
    private MeasureBuilder[] measures = [];
    private SideBuilder[] sides = [];
    private IReadOnlySet<string> meant = new HashSet<string>();

    public ReadTable Read(FolderFiles files)
    {
        CheckNames();
        var file = files.Find(draft.File, draft.FileAt, draft.Context);
        using var rows = file is null ? null : CsvFile.Open(file, draft.File, context);
        var headers = rows?.Headers ?? [];
        var isWhole = rows is not null && CheckHeaders(rows);
        Prepare(headers);
        if (rows is not null && isWhole)
            isWhole = ReadRows(rows);
        return Build(isWhole);
    }

    private bool CheckHeaders(CsvFile rows)
    {
        var check = new HeaderCheck(draft, mechanisms, rows);
        meant = check.Meant;
        return check.Run();
    }

    private void Prepare(IReadOnlyList<string> headers)
    {
        int Field(string? name) => name is null ? -1 : headers.ToList().IndexOf(name);
        stub = [.. draft.Stub.Select(column => new StubBuilder(column, Field(column.Column)))];
        measures = [.. draft.Figures.Select(figure => new MeasureBuilder(
            figure, draft.Statuses, (Field(figure.Column), Field(draft.Statuses.ColumnOf(figure.Column)), Field(figure.UnadjustedColumn))))];
        sides = [.. draft.Columns.Select(column => new SideBuilder(column, Field(column.Column)))];
    }

    private bool ReadRows(CsvFile rows)
    {
        while (rows.Read() && lines.Count < FolderLimits.TableRows)
        {
            foreach (var column in stub)
                column.Add(rows, draft.Context);
            foreach (var measure in measures)
                measure.Add(rows, context);
            foreach (var side in sides)
                side.Add(rows);
            lines.Add(rows.Line);
        }
        if (lines.Count == FolderLimits.TableRows)
            context.Add(CsvProblems.TooManyRows(new Place(draft.File, lines[^1], 1), context.Owner));
        if (lines.Count == 0 && rows.IsSound)
            context.Add(CsvProblems.Empty(new Place(draft.File, 1, 1), context.Owner));
        return rows.IsSound && lines.Count > 0;
    }

    private ReadTable Build(bool isWhole)
    {
        var columns = stub.Select(column => column.Build(labels, draft.Context)).ToList();
        var rules = new RuleAssigner(draft, columns, lines.Count, mechanisms, meant);
        var table = new Table
        {
            Id = draft.Id,
            File = draft.File,
            Title = draft.Title,
            Universe = draft.Universe,
            Source = draft.Source,
            Notes = [.. draft.Notes.Select(note => note.Note)],
            Stub = columns,
            Measures = [.. measures.Select((measure, index) => measure.Build(rules.RulesOf(index), rules.Assign(index)))],
            SideColumns = [.. sides.Select(side => side.Build())],
            Adds = [.. draft.Adds.Select(addition => new Addition(addition.Figure, addition.Over, addition.Total ?? AllOf(addition.Over) ?? ""))],
            CutBy = StubIndex("cutBy", draft.CutBy),
            Places = StubIndex("places", draft.Places),
            RowCount = lines.Count,
            Hidden = draft.Hidden,
        };
        return new ReadTable(table, draft, lines, isWhole);
    }

    private int? StubIndex(string key, Named<string>? name)
    {
        if (name is null)
            return null;
        var names = draft.Stub.Select(column => column.Column).ToList();
        if (names.IndexOf(name.Value) is >= 0 and var index)
            return index;
        if (!meant.Contains(name.Value))
            draft.Context.Add(TableProblems.NotAStub(name.At, key, name.Value, names, draft.Context.Owner));
        return null;
    }

    private string? AllOf(string column) => draft.Stub.FirstOrDefault(stub => stub.Column == column)?.All;

    /// <summary>A column is stub, figure, status or one of "columns", and no two figures share a name in addresses.</summary>
    private void CheckNames()
    {
        var named = draft.Stub.Select(stub => (stub.Column, stub.At)).Concat(draft.Figures.Select(figure => (figure.Column, figure.At)))
            .Concat(draft.Columns.Select(column => (column.Column, column.At)));
        foreach (var twins in named.GroupBy(name => name.Column).Where(group => group.Count() > 1))
            draft.Context.Add(TableProblems.ColumnTwice(twins.Last().At, twins.Key, draft.Context.Owner));
        foreach (var twins in draft.Figures.DistinctBy(figure => figure.Column).GroupBy(figure => Slug.Of(figure.Column)).Where(group => group.Count() > 1 || group.Key.Length == 0))
            draft.Context.Add(TableProblems.ColumnTwins(twins.Last().At, twins.First().Column, twins.Last().Column, draft.Context.Owner));
    }
}
