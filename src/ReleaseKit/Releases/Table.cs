namespace ReleaseKit.Releases;

/// <summary>A statistical table, held as columns: dictionary-coded labels for the stub, scaled integers for the measures.</summary>
public sealed record Table
{
    public required string Id { get; init; }
    public required string File { get; init; }
    public required ReaderText Title { get; init; }
    public ReaderText? Universe { get; init; }
    public ReaderText? Source { get; init; }
    public required IReadOnlyList<TableNote> Notes { get; init; }
    public required IReadOnlyList<StubColumn> Stub { get; init; }
    public required IReadOnlyList<Measure> Measures { get; init; }
    public required IReadOnlyList<SideColumn> SideColumns { get; init; }
    public required IReadOnlyList<Addition> Adds { get; init; }

    /// <summary>Index of the stub column whose values cut the table into pages, or null (then 200 rows a page).</summary>
    public int? CutBy { get; init; }

    /// <summary>Index of the stub column with a page for each of its values, or null.</summary>
    public int? Places { get; init; }
    public required int RowCount { get; init; }

    /// <summary>Where hidden cells come from: null if not said.</summary>
    public Hiding? Hidden { get; init; }
}

/// <summary>A note under a table; At is a query ("?ward=Skerry%20End") that says which rows or figures it is for, or null for the whole table.</summary>
public sealed record TableNote(string? At, ReaderText Text);

public enum HiddenBy { PublicRule, NoisedValue, ValueBeforeNoise }

public sealed record Hiding(HiddenBy By, bool InTotals)
{
    /// <summary>Where release.json says so.</summary>
    public Review.Place At { get; init; } = new("release.json");
}

/// <summary>measure adds up over a stub column to the row whose value there is Total.</summary>
public sealed record Addition(string Measure, string Over, string Total);

/// <summary>A column of row headings. Label codes index Labels; a label's page name comes from Names.</summary>
public sealed record StubColumn
{
    public required string Column { get; init; }
    public required ReaderText Title { get; init; }

    /// <summary>The value that stands for all (a total row), or null.</summary>
    public string? All { get; init; }

    /// <summary>True if the column holds ISO 8601 periods.</summary>
    public bool Period { get; init; }

    /// <summary>Distinct values in their order for readers (labels.csv order, else first appearance).</summary>
    public required IReadOnlyList<StubLabel> Labels { get; init; }

    /// <summary>For each row, the index into Labels.</summary>
    public required int[] Codes { get; init; }

    /// <summary>Index into Labels of the all value, or −1.</summary>
    public required int AllCode { get; init; }

    public StubLabel LabelOf(int row) => Labels[Codes[row]];
    public bool IsAll(int row) => AllCode >= 0 && Codes[row] == AllCode;
}

/// <summary>One value of a stub column: as in the CSV, its slug for ids and file names, its parent value if labels.csv gives one, its name for readers.</summary>
public sealed record StubLabel(string Value, string Slug, string? Parent, ReaderText? Name)
{
    public string In(string language) => Name is not null && Name.Has(language) ? Name.In(language) : Value;
}

public enum SideColumnOrigin { Public, Published, Confidential }

/// <summary>A declared column that is no stub, measure or status: scales, weights, keys. Numbers are NaN where the column is no number.</summary>
public sealed record SideColumn(string Column, SideColumnOrigin From, string? Mechanism, double[] Numbers)
{
    /// <summary>Where release.json says so.</summary>
    public Review.Place At { get; init; } = new("release.json");
}
