using ReleaseKit.Noise;

namespace ReleaseKit.Releases;

/// <summary>One publication event, read whole and immutable: what release.json, mechanisms.json, signoff.json, labels.csv and the tables say.</summary>
public sealed record Release
{
    public required ReaderText Title { get; init; }
    public required string Identifier { get; init; }
    public ReaderText? Lead { get; init; }
    public required Publisher Publisher { get; init; }
    public required DateTimeOffset Published { get; init; }

    /// <summary>ISO 8601 period or interval as written, e.g. "2031-01-01/2031-12-31".</summary>
    public string? ReferencePeriod { get; init; }

    /// <summary>ISO 8601 date or month of the next edition as written.</summary>
    public string? Next { get; init; }

    /// <summary>Where the edition will stand, with a closing slash; null if not given.</summary>
    public string? Address { get; init; }
    public Licence? Licence { get; init; }
    public required IReadOnlyList<string> Languages { get; init; }
    public string MainLanguage => Languages[0];
    public required Coverages Coverages { get; init; }
    public required ReliabilityThresholds Reliability { get; init; }
    public required Edition Edition { get; init; }
    public required IReadOnlyDictionary<string, Unit> Units { get; init; }
    public required Look Look { get; init; }
    public required IReadOnlyList<ProsePage> Narrative { get; init; }

    /// <summary>Short names for long figure addresses.</summary>
    public required IReadOnlyDictionary<string, string> Short { get; init; }
    public required IReadOnlyList<Headline> Headlines { get; init; }
    public required IReadOnlyList<Table> Tables { get; init; }
    public required IReadOnlyList<ChartOrder> Charts { get; init; }
    public required NoiseAccount Noise { get; init; }
    public required SignOff SignOff { get; init; }
}

public sealed record Publisher(string Name, string Contact, string? Homepage);

public sealed record Licence(string Name, string? Url);

/// <summary>The coverage that is printed everywhere, and the two beside it (one below, one above).</summary>
public sealed record Coverages(Coverage Main, Coverage Lower, Coverage Upper)
{
    public IReadOnlyList<Coverage> All => [Lower, Main, Upper];
}

/// <summary>margin ÷ figure up to Close is "close", up to Rough is "rough", above is "weak"; 0 &lt; Close &lt; Rough &lt; 1.</summary>
public sealed record ReliabilityThresholds(double Close, double Rough);

public enum EditionStatus { First, Provisional, Revised, Corrected, Withdrawn }

public sealed record Edition(int Number, int Printing, EditionStatus Status);

/// <summary>A unit by its key: plural patterns by language (CLDR categories one, other). A unit used but not declared has its key for all forms.</summary>
public sealed record Unit(string Key, IReadOnlyDictionary<string, UnitForms> Forms);

public sealed record UnitForms(string One, string Other);

public sealed record Look(string? Accent, string? Foot);

/// <summary>A prose file: its path in the folder, its language, its CommonMark source.</summary>
public sealed record ProsePage(string File, string Language, string Markdown)
{
    /// <summary>Where release.json names the file.</summary>
    public Review.Place At { get; init; } = new("release.json");
}

/// <summary>A headline: the address of one figure; title and meaning if given.</summary>
public sealed record Headline(string Address, ReaderText? Title, ReaderText? Meaning);

/// <summary>A chart asked for: form "ordered" over a selection of one measure.</summary>
public sealed record ChartOrder(string Id, ReaderText Title, string Figures, string Form)
{
    /// <summary>Where release.json names its figures.</summary>
    public Review.Place At { get; init; } = new("release.json");
}

/// <summary>signoff.json. Waivers and approvals as written.</summary>
public sealed record SignOff(IReadOnlyList<Waiver> Waivers, IReadOnlyList<Approval> Approvals)
{
    public static SignOff Empty { get; } = new([], []);
}

public sealed record Waiver(string Finding, string? At, string Reason, string By, DateOnly On, DateOnly? Until)
{
    /// <summary>Where it stands in signoff.json.</summary>
    public Review.Place Place { get; init; } = new("signoff.json");
}

public sealed record Approval(string By, string Role, DateOnly On, string Folder);
