namespace ReleaseKit.Charts.Tally;

/// <summary>A length of the stick: what it is called, what it cost in print and as a number.</summary>
public sealed record TallyPiece(string Key, string Name, string Amount, double Length);

/// <summary>What the split tally shows: one total, cut by table and cut by level.</summary>
public sealed record TallyAccount
{
    public required IReadOnlyList<TallyPiece> ByTable { get; init; }
    public required IReadOnlyList<TallyPiece> ByLevel { get; init; }

    /// <summary>What is left of the authorised loss; null if nothing is, or if what is authorised cannot be set beside it.</summary>
    public TallyPiece? Rest { get; init; }

    /// <summary>The whole stick: authorised loss, or what was spent if that is all that can be said.</summary>
    public required double Whole { get; init; }

    /// <summary>What stands at the end of the scale: "0.10 authorised".</summary>
    public required string WholeLabel { get; init; }

    /// <summary>A number of the scale in print, with so many decimals.</summary>
    public required Func<double, int, string> Print { get; init; }
}

/// <summary>The drawn stick, and the pieces too thin to carry a label: they are named in the table alone.</summary>
public sealed record DrawnTally(Drawing Drawing, IReadOnlyList<TallyPiece> Unlabelled);
