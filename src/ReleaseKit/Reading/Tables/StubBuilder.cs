using System.Text;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>Gathers a column of row headings as codes into its distinct values; a value is made into a string once.</summary>
internal sealed class StubBuilder
{
    private readonly StubDraft draft;
    private readonly int field;
    private readonly List<int> codes = [];
    private readonly List<(string Value, Place At)> values = [];
    private readonly Dictionary<string, int>.AlternateLookup<ReadOnlySpan<char>> lookup = new Dictionary<string, int>().GetAlternateLookup<ReadOnlySpan<char>>();
    private char[] buffer = new char[256];

    public StubBuilder(StubDraft draft, int field) => (this.draft, this.field) = (draft, field);

    public void Add(CsvFile rows, ReadContext context)
    {
        var bytes = rows.Span(field);
        if (buffer.Length < bytes.Length)
            buffer = new char[bytes.Length];
        var text = buffer.AsSpan(0, Encoding.UTF8.GetChars(bytes, buffer));
        if (!lookup.TryGetValue(text, out var code))
            code = Meet(text, rows.PlaceOf(field), context);
        codes.Add(code);
    }

    public StubColumn Build(LabelBook book, ReadContext context)
    {
        var entries = values.Select(value => book.Find(draft.Column, value.Value)).ToList();
        var order = Enumerable.Range(0, values.Count).OrderBy(code => entries[code]?.Order ?? decimal.MaxValue).ToArray();
        var labels = order.Select(code => Label(values[code].Value, entries[code])).ToList();
        CheckSlugs(labels, order, context);
        var all = draft.All is null ? -1 : labels.FindIndex(label => label.Value == draft.All);
        if (draft.All is not null && all < 0 && values.Count > 0)
            context.Add(TotalProblems.NoTotalRow(draft.At, draft.Column, draft.All, values.Select(value => value.Value), context.Owner));
        return new StubColumn
        {
            Column = draft.Column,
            Title = draft.Title,
            All = draft.All,
            Period = draft.Period ?? false,
            Labels = labels,
            Codes = Recode(order),
            AllCode = all,
        };
    }

    private int Meet(ReadOnlySpan<char> text, Place at, ReadContext context)
    {
        var value = text.ToString();
        LabelChecks.Check(value, draft.Column, at, context.For(FindingOwner.Noise));
        if (draft.Period == true && value != draft.All && !Periods.IsPeriod(value))
            context.Add(CellProblems.BadPeriod(at, draft.Column, value, FindingOwner.Noise));
        values.Add((value, at));
        lookup[value] = values.Count - 1;
        return values.Count - 1;
    }

    private static StubLabel Label(string value, LabelEntry? entry) => new(value, entry?.Id ?? Slug.Of(value), entry?.Parent, entry?.Name);

    private void CheckSlugs(IReadOnlyList<StubLabel> labels, int[] order, ReadContext context)
    {
        var first = new Dictionary<string, StubLabel>();
        for (var index = 0; index < labels.Count; index++)
        {
            var (label, at) = (labels[index], values[order[index]].At);
            if (label.Slug.Length == 0 && label.Value.Length > 0)
                context.Add(TableProblems.SlugEmpty(at, draft.Column, label.Value, context.Owner));
            else if (!first.TryAdd(label.Slug, label))
                context.Add(TableProblems.SlugTwins(at, draft.Column, first[label.Slug].Value, label.Value, label.Slug, context.Owner));
        }
    }

    private int[] Recode(int[] order)
    {
        var place = new int[order.Length];
        for (var index = 0; index < order.Length; index++)
            place[order[index]] = index;
        var recoded = new int[codes.Count];
        for (var row = 0; row < recoded.Length; row++)
            recoded[row] = place[codes[row]];
        return recoded;
    }
}
