namespace ReleaseKit.Review;

/// <summary>What a finding does: a stop holds publication back, a caution asks for a look, a note tells.</summary>
public enum FindingLevel
{
    Stop,
    Caution,
    Note,
}

/// <summary>Whose finding it is: the owner of release.json and prose, of mechanisms.json and tables' noise, or of signoff.json.</summary>
public enum FindingOwner
{
    Writer,
    Noise,
    SignOff,
}

/// <summary>A place in a file of the folder; line and column count from 1, 0 where only the file is meant.</summary>
public readonly record struct Place(string File, int Line = 0, int Column = 0)
{
    /// <summary>A cell of a CSV file whose line and column are still to be looked up; null once they are.</summary>
    public Cell? Cell { get; init; }

    public static Place OfCell(string file, int row, string column) => new(file) { Cell = new Cell(row, column) };

    public override string ToString() => Line == 0 ? File : Column == 0 ? $"{File}:{Line}" : $"{File}:{Line}:{Column}";
}

/// <summary>A row of a table as it was read, from 0, and the name of a column of its CSV file.</summary>
public readonly record struct Cell(int Row, string Column);

/// <summary>One thing the review reports. <c>Slug</c> is a stable name; <c>Found</c> says what is there, <c>Why</c> why it matters, <c>Do</c> what to do, ready to paste.</summary>
public sealed record Finding(FindingLevel Level, string Slug, FindingOwner For, Place At, string Found, string Why, string Do)
{
    /// <summary>The address of the figure or selection it concerns, if any.</summary>
    public string? Address { get; init; }

    /// <summary>The column of a CSV file it concerns, where what is said of it has consequences elsewhere.</summary>
    public string? Column { get; init; }

    /// <summary>How many more of its kind were met and only counted, since so many were kept already; on the last that was kept.</summary>
    public int NotKept { get; init; }

    public FindingKind Kind => new(Level, Slug, For, At.File);
}
