using ReleaseKit.Reading.Tables;
using ReleaseKit.Releases;

namespace ReleaseKit.Reading;

/// <summary>release.json as read: its head, and everything that is still to be held against tables and mechanisms, with places.</summary>
internal sealed record ReleaseDraft
{
    public required ReleaseHead Head { get; init; }
    public required IReadOnlyDictionary<string, Unit> Units { get; init; }
    public required IReadOnlyList<TableDraft> Tables { get; init; }
    public required IReadOnlyList<Named<(string File, string Language)>> Narrative { get; init; }
    public required IReadOnlyList<Named<(string Name, string Address)>> Short { get; init; }
    public required IReadOnlyList<Named<Headline>> Headlines { get; init; }
    public required IReadOnlyList<Named<ChartOrder>> Charts { get; init; }

    /// <summary>Whether every entry of "tables" could be read; if not, addresses that lead nowhere are no further fault.</summary>
    public required bool HasAllTables { get; init; }
}

/// <summary>What is said once for the whole release.</summary>
internal sealed record ReleaseHead
{
    public required ReaderText Title { get; init; }
    public required string Identifier { get; init; }
    public ReaderText? Lead { get; init; }
    public required Publisher Publisher { get; init; }
    public required DateTimeOffset Published { get; init; }
    public string? ReferencePeriod { get; init; }
    public string? Next { get; init; }
    public string? Address { get; init; }
    public Licence? Licence { get; init; }
    public required IReadOnlyList<string> Languages { get; init; }
    public required Coverages Coverages { get; init; }
    public required ReliabilityThresholds Reliability { get; init; }
    public required Edition Edition { get; init; }
    public required Look Look { get; init; }
}
