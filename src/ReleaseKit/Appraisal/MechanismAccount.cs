using ReleaseKit.Releases;

namespace ReleaseKit.Appraisal;

/// <summary>One measure: the index of its table in the release, and of its column in the table.</summary>
public readonly record struct MeasureRef(int Table, int Measure);

/// <summary>What one mechanism spent.</summary>
public sealed record MechanismAccount
{
    public required Mechanism Mechanism { get; init; }

    /// <summary>As the office declared it; null where nothing is declared.</summary>
    public LossTotal? Declared { get; init; }

    /// <summary>Upper bound, worked out from law and sensitivity; this one enters the totals. As declared for a law of that name.</summary>
    public required LossTotal Recomputed { get; init; }

    /// <summary>Lower bound from a named pair of neighbouring data.</summary>
    public required LossTotal Lower { get; init; }

    /// <summary>The recomputed loss in the currency of the account.</summary>
    public required double Amount { get; init; }

    /// <summary>Amount ÷ spent, from 0 to 1.</summary>
    public required double ShareOfSpent { get; init; }

    /// <summary>Measures that carry its noise, in the order of the release; empty for a choice of rows or bounds and for what is not published.</summary>
    public required IReadOnlyList<MeasureRef> Measures { get; init; }

    /// <summary>Tables that it touches, in the order of the release: those of its measures, or the one whose rows it chose.</summary>
    public required IReadOnlyList<int> Tables { get; init; }

    /// <summary>How many cells the account takes to carry a draw of it, whether published or not.</summary>
    public required long Cells { get; init; }

    /// <summary>How many published numbers carry a draw of it.</summary>
    public required long Published { get; init; }

    /// <summary>How many cells carry a draw of it and are hidden.</summary>
    public required long Hidden { get; init; }

    /// <summary>True if its loss is taken as the office states it, because it cannot be worked out here.</summary>
    public required bool OnlyDeclared { get; init; }
    public ReaderText? Level => Mechanism.Level;
}

/// <summary>
/// A piece of the account that no line of it cuts: one mechanism. Pieces add up to what was spent, whether gathered by
/// <c>Tables</c>, by <c>Measures</c>, by <c>LevelKey</c> or by mechanism.
/// </summary>
/// <param name="Mechanism">Id of the mechanism.</param>
/// <param name="Tables">Tables it touches; a set, compared by its members.</param>
/// <param name="Measures">Measures that carry its noise.</param>
/// <param name="LevelKey">The level's text in the main language; empty if the folder says none.</param>
/// <param name="Level">The level for readers, or null.</param>
/// <param name="Amount">In the currency of the account.</param>
public sealed record BudgetPiece(string Mechanism, IReadOnlyList<int> Tables, IReadOnlyList<MeasureRef> Measures, string LevelKey, ReaderText? Level, double Amount);
