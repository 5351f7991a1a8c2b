using System.Text;
using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading.Tables;

/// <summary>Gathers a column of figures: unscaled digits, decimals and status of each row.</summary>
internal sealed class MeasureBuilder
{
    private readonly FigureDraft draft;
    private readonly StatusDraft statuses;
    private readonly (int Value, int Status, int Unadjusted) fields;
    private readonly int longestMark;
    private readonly List<long> unscaled = [];
    private readonly List<byte> decimals = [];
    private readonly List<byte> status = [];
    private readonly List<PublishedValue?> unadjusted = [];

    /// <summary>A measure that stands in these fields of the CSV: its value, its status, its unadjusted value; −1 where there is none.</summary>
    public MeasureBuilder(FigureDraft draft, StatusDraft statuses, (int Value, int Status, int Unadjusted) fields)
    {
        (this.draft, this.statuses, this.fields) = (draft, statuses, fields);
        longestMark = statuses.Marks.Keys.Select(Encoding.UTF8.GetByteCount).DefaultIfEmpty(0).Max();
    }

    public void Add(CsvFile rows, ReadContext context)
    {
        var stated = fields.Status < 0 ? null : StatusIn(rows, context);
        var (value, letter) = Cell(rows, stated, context);
        unscaled.Add(value.Unscaled);
        decimals.Add(value.Decimals);
        status.Add((byte)letter);
        if (fields.Unadjusted >= 0)
            unadjusted.Add(rows.Span(fields.Unadjusted).IsEmpty ? null : Number(rows, fields.Unadjusted, draft.UnadjustedColumn!, context));
    }

    public Measure Build(IReadOnlyList<NoiseRule> rules, byte[] ruleOf) => new()
    {
        Column = draft.Column,
        Slug = Slug.Of(draft.Column),
        Title = draft.Title,
        Unit = draft.Unit,
        Kind = draft.Kind,
        Per = draft.Per,
        InOnes = draft.InOnes,
        Multiplier = draft.Multiplier,
        Decimals = draft.Decimals,
        Lowest = draft.Lowest,
        Highest = draft.Highest,
        Shown = draft.Shown,
        Rules = rules,
        RuleOf = ruleOf,
        Unscaled = [.. unscaled],
        DecimalsOf = [.. decimals],
        Status = [.. status],
        Unadjusted = fields.Unadjusted >= 0 ? [.. unadjusted] : null,
    };

    /// <summary>The letter of the status column, null if it is empty or not known.</summary>
    private char? StatusIn(CsvFile rows, ReadContext context)
    {
        var text = rows.Text(fields.Status);
        if (text.Length == 0)
            return null;
        if (statuses.Marks.TryGetValue(text, out var letter))
            return letter;
        if (text.Length == 1 && StatusesReader.Codes.Contains(text[0], StringComparison.Ordinal))
            return text[0];
        context.Add(CellProblems.UnknownStatus(rows.PlaceOf(fields.Status), text, context.Owner));
        return null;
    }

    private (PublishedValue Value, char Status) Cell(CsvFile rows, char? stated, ReadContext context)
    {
        var text = rows.Span(fields.Value);
        if (text.Length > 0 && text.Length <= longestMark && statuses.Marks.TryGetValue(Encoding.UTF8.GetString(text), out var mark))
            return (default, WithoutNumber(mark, rows, context));
        if (text.IsEmpty)
            return (default, WithoutNumber(stated ?? 'O', rows, context));
        if (Number(rows, fields.Value, draft.Column, context) is not { } value)
            return (default, 'O');
        if (stated is { } letter && !HasNumber(letter))
            context.Add(CellProblems.HiddenHasValue(rows.PlaceOf(fields.Value), draft.Column, letter, context.Owner));
        return (value, stated ?? 'A');
    }

    private char WithoutNumber(char letter, CsvFile rows, ReadContext context)
    {
        if (!HasNumber(letter))
            return letter;
        context.Add(CellProblems.StatusWithoutValue(rows.PlaceOf(fields.Value), draft.Column, letter, context.Owner));
        return 'O';
    }

    private PublishedValue? Number(CsvFile rows, int field, string column, ReadContext context)
    {
        var fault = FigureParser.Parse(rows.Span(field), out var digits, out var points);
        if (fault != NumberFault.None)
        {
            context.Add(CellProblems.Number(rows.PlaceOf(field), column, rows.Text(field), fault, context.Owner));
            return null;
        }
        if (draft.Kind != MeasureKind.Count)
            return new PublishedValue(digits, points);
        if ((Int128)digits * (long)draft.Multiplier % (Int128)PublishedValue.PowerOfTen(points) == 0)
            return WithoutZeros(digits, points);
        context.Add(CellProblems.CountNotWhole(rows.PlaceOf(field), column, rows.Text(field), context.Owner));
        return null;
    }

    /// <summary>A count as a program may have written it, 12.0, without the zeros after its point.</summary>
    private static PublishedValue WithoutZeros(long digits, byte points)
    {
        for (; points > 0 && digits % 10 == 0; points--)
            digits /= 10;
        return new PublishedValue(digits, points);
    }

    private static bool HasNumber(char letter) => letter is not ('Q' or 'O' or 'M' or 'L');
}
