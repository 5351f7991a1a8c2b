using ReleaseKit.Reading.Keys;
using ReleaseKit.Releases;
using ReleaseKit.Review;

namespace ReleaseKit.Reading.Tables;

/// <summary>What release.json says about one table, before its CSV is read.</summary>
internal sealed record TableDraft
{
    public required string Id { get; init; }
    public required Place At { get; init; }
    public required string File { get; init; }
    public required Place FileAt { get; init; }
    public required ReaderText Title { get; init; }
    public ReaderText? Universe { get; init; }
    public ReaderText? Source { get; init; }
    public required IReadOnlyList<NoteDraft> Notes { get; init; }
    public required IReadOnlyList<StubDraft> Stub { get; init; }
    public required IReadOnlyList<FigureDraft> Figures { get; init; }
    public required IReadOnlyList<SideDraft> Columns { get; init; }
    public required IReadOnlyList<AdditionDraft> Adds { get; init; }
    public required Named<string>? CutBy { get; init; }
    public required Named<string>? Places { get; init; }
    public Hiding? Hidden { get; init; }
    public required StatusDraft Statuses { get; init; }
    public required ReadContext Context { get; init; }
}

/// <summary>A value and where it stands.</summary>
internal sealed record Named<T>(T Value, Place At);

internal sealed record NoteDraft(TableNote Note, Place At);

/// <summary>A stub column as declared; "period" is null where nothing is said.</summary>
internal sealed record StubDraft(string Column, ReaderText Title, string? All, bool? Period, Place At);

internal sealed record SideDraft(string Column, SideColumnOrigin From, string? Mechanism, Place At);

internal sealed record AdditionDraft(string Figure, string Over, string? Total, Place At);

/// <summary>The pattern of status columns ("*_status", * is the measure's column), and what marks mean.</summary>
internal sealed record StatusDraft(string? Column, IReadOnlyDictionary<string, char> Marks, Place At)
{
    public string? ColumnOf(string measure) => Column?.Replace("*", measure, StringComparison.Ordinal);
}

/// <summary>One entry of "figures".</summary>
internal sealed record FigureDraft
{
    public required string Column { get; init; }
    public required Place At { get; init; }
    public required ReaderText Title { get; init; }
    public required Unit Unit { get; init; }
    public required MeasureKind Kind { get; init; }
    public double? Per { get; init; }
    public bool InOnes { get; init; }
    public double Multiplier { get; init; } = 1;
    public int? Decimals { get; init; }
    public double? Lowest { get; init; }
    public double? Highest { get; init; }
    public bool Shown { get; init; } = true;
    public string? UnadjustedColumn { get; init; }

    /// <summary>The rules of "noise"; null if the key is not given, so that mechanisms may cover the measure.</summary>
    public IReadOnlyList<RuleDraft>? Rules { get; init; }

    /// <summary>Whether a rule asks for something of a later version; then rows without a rule are no further fault.</summary>
    public bool HasLaterRules { get; init; }
}

/// <summary>One rule of "noise": where it holds, and what it ends in; the end is null if either could not be read.</summary>
internal sealed record RuleDraft(IReadOnlyList<StubValue> Where, Place WhereAt, RuleEnd? End, Place At);

internal abstract record RuleEnd
{
    internal sealed record Mechanism(string Id, Place At) : RuleEnd;

    internal sealed record SumOver(string Column, Place At) : RuleEnd;

    internal sealed record Exact(ReaderText Reason, Place At) : RuleEnd;

    internal sealed record Public(ReaderText Source) : RuleEnd;
}
