using System.Globalization;
using System.Text.RegularExpressions;
using ReleaseKit.Reading.Files;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>What labels.csv says about one value of a stub column.</summary>
internal sealed record LabelEntry(string? Id, decimal? Order, string? Parent, ReaderText? Name, Place At, Place ParentAt);

/// <summary>labels.csv: stub values' ids, order, parents and names by language. Columns column,value and any of id,order,parent,name_LANGUAGE.</summary>
internal sealed partial class LabelBook
{
    public const string FileName = "labels.csv";

    private static readonly string[] Known = ["column", "value", "id", "order", "parent", "name_en"];

    private readonly Dictionary<StubValue, LabelEntry> entries = [];

    public LabelEntry? Find(string column, string value) => entries.GetValueOrDefault(new StubValue(column, value));

    /// <summary>Entries that no table has a row heading for.</summary>
    public void CheckUsed(IReadOnlyList<Table> tables, ReadContext context)
    {
        var used = tables.SelectMany(table => table.Stub).GroupBy(stub => stub.Column)
            .ToDictionary(group => group.Key, group => group.SelectMany(stub => stub.Labels).Select(label => label.Value).ToHashSet());
        foreach (var (value, entry) in entries)
            if (!used.TryGetValue(value.Column, out var values))
                context.Add(LabelProblems.Unused(entry.At, value.Column, "stub column", used.Keys, context.Owner));
            else if (!values.Contains(value.Value))
                context.Add(LabelProblems.Unused(entry.At, value.Value, $"row heading in column \"{value.Column}\"", values, context.Owner));
            else if (entry.Parent is { } parent && !values.Contains(parent))
                context.Add(LabelProblems.UnknownParent(entry.ParentAt, value, parent, values, context.Owner));
    }

    /// <summary>The book of a folder; empty if it has no labels.csv, or one that cannot be read.</summary>
    public static LabelBook Read(FolderFiles files, ReadContext context)
    {
        var book = new LabelBook();
        if (!files.Exists(FileName) || files.Find(FileName, new Place(FileName), context) is not { } file)
            return book;
        using var rows = CsvFile.Open(file, FileName, context);
        if (rows is not null && ColumnsAreKnown(rows, context))
            while (rows.Read())
                book.Add(rows, context);
        LabelParents.BreakCycles(book.entries, context);
        return book;
    }

    private static bool ColumnsAreKnown(CsvFile rows, ReadContext context)
    {
        foreach (var unknown in rows.Headers.Where(name => !Known.Contains(name) && !NameColumn.IsMatch(name)))
            context.Add(LabelProblems.UnknownColumn(rows.PlaceOfHeader(IndexOf(rows, unknown)), unknown, Known, context.Owner));
        var missing = Known.Take(2).FirstOrDefault(name => !rows.Headers.Contains(name));
        if (missing is not null)
            context.Add(LabelProblems.MissingColumn(missing, context.Owner));
        return missing is null;
    }

    private void Add(CsvFile rows, ReadContext context)
    {
        var value = new StubValue(Field(rows, "column") ?? "", Field(rows, "value") ?? "");
        var entry = new LabelEntry(Field(rows, "id"), Order(rows, context), Field(rows, "parent"), Name(rows, context), rows.PlaceOf(0), PlaceOf(rows, "parent"));
        if (entry.Id is { } id && !Slug.IsOne(id))
            context.Add(LabelProblems.BadId(rows.PlaceOf(IndexOf(rows, "id")), id, context.Owner));
        if (!entries.TryAdd(value, entry))
            context.Add(LabelProblems.Twice(entry.At, value, entries[value].At, context.Owner));
    }

    private static decimal? Order(CsvFile rows, ReadContext context)
    {
        if (Field(rows, "order") is not { } text)
            return null;
        if (decimal.TryParse(text, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var order))
            return order;
        context.Add(LabelProblems.BadOrder(rows.PlaceOf(IndexOf(rows, "order")), text, context.Owner));
        return null;
    }

    private static ReaderText? Name(CsvFile rows, ReadContext context)
    {
        var names = new Dictionary<string, string>();
        for (var index = 0; index < rows.Headers.Count; index++)
            if (NameColumn.IsMatch(rows.Headers[index]) && rows.Text(index) is { Length: > 0 } name)
                names[rows.Headers[index]["name_".Length..]] = name;
        foreach (var name in names.Values)
            LabelChecks.Check(name, "name", rows.PlaceOf(0), context);
        return names.Count == 0 ? null : new ReaderText(names);
    }

    private static string? Field(CsvFile rows, string column) =>
        IndexOf(rows, column) is >= 0 and var index && rows.Text(index) is { Length: > 0 } text ? text : null;

    private static Place PlaceOf(CsvFile rows, string column) => rows.PlaceOf(Math.Max(0, IndexOf(rows, column)));

    private static int IndexOf(CsvFile rows, string column) => rows.Headers.ToList().IndexOf(column);

    [GeneratedRegex("^name_[a-z]{2,3}(-[A-Za-z0-9]{2,8})*$")]
    private static partial Regex NameColumn { get; }
}
